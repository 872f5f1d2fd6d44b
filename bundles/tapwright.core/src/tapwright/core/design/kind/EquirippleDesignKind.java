// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.exact.Symmetry;
import tapwright.model.EquirippleDesign;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.PhaseType;

/** Smallest largest weighted error. */
public final class EquirippleDesignKind implements DesignKind<EquirippleDesign> {

	private static final double USUAL_TOLERANCE = 1e-4;

	@Override
	public Class<EquirippleDesign> type() {
		return EquirippleDesign.class;
	}

	@Override
	public Equiripple method(EquirippleDesign design, DesignInput input) throws InputException {
		int taps = input.numbers().getInt(design, Literals.BAND_DESIGN__TAPS);
		Symmetry symmetry = switch (design.getType()) {
		case ANY, I, II -> Symmetry.EVEN;
		case III, IV -> Symmetry.ODD;
		};
		if (taps > 0 && design.getType() != PhaseType.ANY
				&& !LinearPhaseType.of(taps, symmetry).name().equals(design.getType().name())) {
			throw new InputException("type", "type " + design.getType().getLiteral() + " needs an "
					+ (taps % 2 == 0 ? "odd" : "even") + " number of coefficients, not " + taps);
		}
		return new Equiripple(taps, symmetry, input.bands(design),
				input.numbers().get(design, Literals.EQUIRIPPLE_DESIGN__TOLERANCE, USUAL_TOLERANCE));
	}
}
