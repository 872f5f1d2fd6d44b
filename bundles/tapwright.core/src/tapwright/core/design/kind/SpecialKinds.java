// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import java.util.List;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.core.design.DesignKinds;
import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.special.CicCompensator;
import tapwright.dsp.design.special.Comb;
import tapwright.dsp.design.special.Complement;
import tapwright.dsp.design.special.HalfBand;
import tapwright.dsp.design.special.MinimumPhase;
import tapwright.model.CicCompensatorDesign;
import tapwright.model.CombDesign;
import tapwright.model.ComplementDesign;
import tapwright.model.HalfBandDesign;
import tapwright.model.MinimumPhaseDesign;
import tapwright.model.ModelPackage.Literals;

/** Methods for one purpose, and methods that start from another design. */
public final class SpecialKinds {

	/** All of them. */
	public static final List<DesignKind<?>> ALL = List.of(
			new PlainDesignKind<>(HalfBandDesign.class, (design, input) -> new HalfBand(
					input.numbers().getInt(design, Literals.HALF_BAND_DESIGN__TAPS),
					input.numbers().get(design, Literals.HALF_BAND_DESIGN__PASS_EDGE) / input.sampleRate(), design.isHilbert())),
			new PlainDesignKind<>(CicCompensatorDesign.class, (design, input) -> new CicCompensator(
					input.numbers().getInt(design, Literals.CIC_COMPENSATOR_DESIGN__TAPS),
					input.numbers().getInt(design, Literals.CIC_COMPENSATOR_DESIGN__SECTIONS),
					input.numbers().getInt(design, Literals.CIC_COMPENSATOR_DESIGN__RATE),
					input.numbers().get(design, Literals.CIC_COMPENSATOR_DESIGN__PASS_EDGE) / input.sampleRate(),
					input.numbers().get(design, Literals.CIC_COMPENSATOR_DESIGN__STOP_EDGE) / input.sampleRate(),
					input.numbers().get(design, Literals.CIC_COMPENSATOR_DESIGN__STOP_WEIGHT, 1))),
			new PlainDesignKind<>(CombDesign.class, (design, input) -> new Comb(period(design, input), design.isDifference())),
			new PlainDesignKind<>(MinimumPhaseDesign.class,
					(design, input) -> new MinimumPhaseOf(prototype(design.getPrototype(), input))),
			new PlainDesignKind<>(ComplementDesign.class,
					(design, input) -> new Complement(prototype(design.getPrototype(), input))));

	/** The minimum-phase filter of whatever another design gives. */
	record MinimumPhaseOf(Design prototype) implements Design {

		@Override
		public DesignResult compute(Progress progress) throws DesignException {
			double[] taps = prototype.compute(progress).taps();
			try {
				return new MinimumPhase(taps).compute(progress);
			} catch (IllegalArgumentException e) {
				throw new DesignException(e.getMessage());
			}
		}
	}

	private SpecialKinds() {
	}

	private static int period(CombDesign design, DesignInput input) throws InputException {
		double samples = input.numbers().get(design, Literals.COMB_DESIGN__PERIOD) * input.sampleRate();
		if (Math.abs(samples - Math.rint(samples)) > 1e-9 * samples || samples > Integer.MAX_VALUE) {
			throw new InputException("period", "is " + samples + " samples; it must be a whole number of samples");
		}
		return (int) Math.rint(samples);
	}

	private static Design prototype(tapwright.model.Design design, DesignInput input) throws InputException {
		if (design == null) {
			throw new InputException("prototype", "is missing; add the design to start from");
		}
		return DesignKinds.method(design, input)
				.orElseThrow(() -> new InputException("prototype", "must be a method, not given coefficients"));
	}
}
