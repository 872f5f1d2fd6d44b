// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.design.Band;
import tapwright.model.DesignBand;
import tapwright.model.ModelPackage;

/** The bands that a design states. */
final class StatedBands {

	private StatedBands() {
	}

	static List<Band> of(List<DesignBand> stated, double sampleRate, Numbers numbers) throws InputException {
		var bands = new ArrayList<Band>();
		for (DesignBand band : stated) {
			double desired = numbers.get(band, ModelPackage.Literals.DESIGN_BAND__DESIRED);
			double weight = numbers.get(band, ModelPackage.Literals.DESIGN_BAND__WEIGHT, 1);
			try {
				bands.add(new Band(numbers.get(band, ModelPackage.Literals.DESIGN_BAND__FROM) / sampleRate,
						numbers.get(band, ModelPackage.Literals.DESIGN_BAND__TO) / sampleRate, desired,
						numbers.get(band, ModelPackage.Literals.DESIGN_BAND__DESIRED_TO, desired), weight,
						numbers.get(band, ModelPackage.Literals.DESIGN_BAND__WEIGHT_TO, weight)));
			} catch (IllegalArgumentException e) {
				throw new InputException("bands", e.getMessage());
			}
		}
		return bands;
	}
}
