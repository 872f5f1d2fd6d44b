// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.model.EquirippleDesign;
import tapwright.model.ModelPackage.Literals;

/** Smallest largest weighted error. */
public final class EquirippleDesignKind implements DesignKind<EquirippleDesign> {

	@Override
	public Class<EquirippleDesign> type() {
		return EquirippleDesign.class;
	}

	@Override
	public Equiripple method(EquirippleDesign design, DesignInput input) throws InputException {
		int taps = input.numbers().getInt(design, Literals.BAND_DESIGN__TAPS);
		return new Equiripple(taps, PhaseTypes.symmetry(design.getType(), taps), input.bands(design),
				input.numbers().get(design, Literals.EQUIRIPPLE_DESIGN__TOLERANCE, Equiripple.STANDARD));
	}
}
