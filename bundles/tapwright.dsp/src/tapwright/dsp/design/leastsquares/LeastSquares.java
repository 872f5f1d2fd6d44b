// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.List;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Bands;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.exact.Symmetry;

/**
 * Linear-phase design with the least integral of weight times squared error over all bands (D. W. Tufts and J. T. Francis,
 * Designing digital low-pass filters: comparison of some methods and criteria, IEEE Transactions on Audio and
 * Electroacoustics 18(4), 1970), optionally with exact demands at single frequencies.
 *
 * @param taps
 *            number of coefficients, at most {@link #LONGEST}
 * @param symmetry
 *            even, or odd for differentiators and Hilbert transformers
 * @param bands
 *            rising; they may touch
 * @param conditions
 *            what must hold exactly, fewer than the free coefficients
 */
public record LeastSquares(int taps, Symmetry symmetry, List<Band> bands, List<PointCondition> conditions) implements Design {

	/** The greatest number of coefficients. */
	public static final int LONGEST = 2001;

	/** Checks the parameters. */
	public LeastSquares {
		checkLength(taps, LONGEST);
		bands = Bands.rising(bands, true);
		conditions = List.copyOf(conditions);
		new LinearPhaseBasis(taps, symmetry);
	}

	/** Without conditions. */
	public LeastSquares(int taps, Symmetry symmetry, List<Band> bands) {
		this(taps, symmetry, bands, List.of());
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		LinearPhaseBasis basis = new LinearPhaseBasis(taps, symmetry);
		QuadraticProgram program = new SquaredError(basis, bands, progress).program();
		addConditions(program, basis, conditions);
		program.solve(0, p -> contradiction(conditions.get(p)), progress);
		return new DesignResult(basis.taps(program.x()));
	}

	static void checkLength(int taps, int longest) {
		if (taps < 1 || taps > longest) {
			throw new IllegalArgumentException("a design of " + taps + " coefficients was asked for; ask for 1 to " + longest);
		}
	}

	static void addConditions(QuadraticProgram program, LinearPhaseBasis basis, List<PointCondition> conditions) {
		for (PointCondition condition : conditions) {
			program.equal(condition.row(basis), condition.scaledValue(basis));
		}
	}

	static String contradiction(PointCondition condition) {
		return "the condition at " + condition.frequency() + " cycles per sample (derivative " + condition.derivative() + " = "
				+ condition.value() + ") contradicts the others or the symmetry; leave it out or ask for more taps";
	}
}
