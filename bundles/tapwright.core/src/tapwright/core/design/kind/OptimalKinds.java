// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.core.design.ImpliedLimits;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.leastsquares.ConstrainedLeastSquares;
import tapwright.dsp.design.leastsquares.LeastSquares;
import tapwright.dsp.design.leastsquares.PointCondition;
import tapwright.dsp.design.linearprogram.LinearProgram;
import tapwright.dsp.design.linearprogram.Monotone;
import tapwright.dsp.exact.Symmetry;
import tapwright.model.BandDesign;
import tapwright.model.ConstrainedLeastSquaresDesign;
import tapwright.model.LeastSquaresDesign;
import tapwright.model.LinearProgramDesign;
import tapwright.model.ModelPackage.Literals;

/** Methods that keep limits and conditions while they minimise an error. */
public final class OptimalKinds {

	/** All of them. */
	public static final List<DesignKind<?>> ALL = List.of(new PlainDesignKind<>(LeastSquaresDesign.class, (design, input) -> {
		int taps = taps(design, input);
		return new LeastSquares(taps, PhaseTypes.symmetry(design.getType(), taps), input.bands(design),
				new ImpliedLimits(input).conditions());
	}), new PlainDesignKind<>(ConstrainedLeastSquaresDesign.class, (design, input) -> {
		int taps = taps(design, input);
		var limits = new ImpliedLimits(input);
		return new ConstrainedLeastSquares(taps, PhaseTypes.symmetry(design.getType(), taps), input.bands(design),
				limits.amplitudes(), limits.conditions());
	}), new PlainDesignKind<>(LinearProgramDesign.class, OptimalKinds::linearProgram));

	private OptimalKinds() {
	}

	private static LinearProgram linearProgram(LinearProgramDesign design, DesignInput input) throws InputException {
		int taps = taps(design, input);
		List<Band> bands = input.bands(design);
		var limits = new ImpliedLimits(input);
		var conditions = new ArrayList<>(limits.conditions());
		if (limits.limitTheStep() && conditions.stream().noneMatch(condition -> condition.frequency() == 0)) {
			conditions.add(new PointCondition(0, 0, bands.getFirst().desiredFrom())); // the final value that the limits refer to
		}
		List<Monotone> monotone = design.isMonotone()
				? List.of(new Monotone(bands.getFirst().from(), bands.getFirst().to(), false)) : List.of();
		return new LinearProgram(taps, Symmetry.EVEN, bands, limits.amplitudes(), monotone, conditions, limits.steps(taps, bands));
	}

	private static int taps(BandDesign design, DesignInput input) throws InputException {
		return input.numbers().getInt(design, Literals.BAND_DESIGN__TAPS);
	}
}
