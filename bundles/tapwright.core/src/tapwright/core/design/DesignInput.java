// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.design.Band;
import tapwright.model.BandDesign;
import tapwright.model.Filter;

/**
 * What a method may look at besides its own parameters.
 *
 * @param filter
 *            the filter to design
 * @param sampleRate
 *            in hertz
 * @param numbers
 *            evaluates what people wrote
 */
public record DesignInput(Filter filter, double sampleRate, Numbers numbers) {

	/** The target: the design's own bands, or else those that the gain requirements imply. */
	public List<Band> bands(BandDesign design) throws InputException {
		return design.getBands().isEmpty() ? ImpliedBands.of(filter.getRequirements(), sampleRate, numbers)
				: StatedBands.of(design.getBands(), sampleRate, numbers);
	}
}
