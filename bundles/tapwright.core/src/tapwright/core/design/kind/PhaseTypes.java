// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import tapwright.core.InputException;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;
import tapwright.model.PhaseType;

/** The symmetry that a kind of linear phase asks for. */
final class PhaseTypes {

	private PhaseTypes() {
	}

	/**
	 * The symmetry; even when any kind will do.
	 *
	 * @throws InputException
	 *             when the number of coefficients does not fit the kind
	 */
	static Symmetry symmetry(PhaseType type, int taps) throws InputException {
		Symmetry symmetry = switch (type) {
		case ANY, I, II -> Symmetry.EVEN;
		case III, IV -> Symmetry.ODD;
		};
		if (taps > 0 && type != PhaseType.ANY && !LinearPhaseType.of(taps, symmetry).name().equals(type.name())) {
			throw new InputException("type", "type " + type.getLiteral() + " needs an " + (taps % 2 == 0 ? "odd" : "even")
					+ " number of coefficients, not " + taps);
		}
		return symmetry;
	}
}
