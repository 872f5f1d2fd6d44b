// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Bands;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.exact.Symmetry;

/**
 * Least squares within limits on the amplitude (I. W. Selesnick, M. Lang and C. S. Burrus, Constrained least square design
 * of FIR filters without specified transition bands, IEEE Transactions on Signal Processing 44(8), 1996; the trade between
 * energy and peak: J. W. Adams, FIR digital filters with least-squares stopbands subject to peak-gain constraints, IEEE
 * Transactions on Circuits and Systems 38(4), 1991). Solved by a dual active-set method with cuts where the limits are
 * exceeded, which ends also for many bands.
 *
 * @param taps
 *            number of coefficients, at most {@link #LONGEST}
 * @param symmetry
 *            even or odd
 * @param bands
 *            target and weight of the squared error; rising
 * @param limits
 *            on the amplitude, anywhere
 * @param conditions
 *            what must hold exactly
 */
public record ConstrainedLeastSquares(int taps, Symmetry symmetry, List<Band> bands, List<AmplitudeLimit> limits,
		List<PointCondition> conditions) implements Design {

	/** The greatest number of coefficients. */
	public static final int LONGEST = 801;

	private static final int ROUNDS = 60;
	/** Limits are tightened by this, so that what remains between samples does not exceed them. */
	private static final double MARGIN = 1e-8;

	/** Checks the parameters. */
	public ConstrainedLeastSquares {
		LeastSquares.checkLength(taps, LONGEST);
		bands = Bands.rising(bands, true);
		limits = List.copyOf(limits);
		conditions = List.copyOf(conditions);
		new LinearPhaseBasis(taps, symmetry);
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		LinearPhaseBasis basis = new LinearPhaseBasis(taps, symmetry);
		QuadraticProgram program = new SquaredError(basis, bands, progress).program();
		LeastSquares.addConditions(program, basis, conditions);
		List<Side> sides = new ArrayList<>();
		for (AmplitudeLimit limit : limits) {
			sides.addAll(Side.of(limit, MARGIN * scale()));
		}
		Cuts cuts = new Cuts(basis, sides, progress);
		for (int round = 0; round < ROUNDS; round++) {
			program.solve(MARGIN * scale() / 10, p -> p < conditions.size() ? LeastSquares.contradiction(conditions.get(p))
					: "no filter of " + taps + " coefficients stays within all limits; loosen a limit, widen a transition or ask for"
							+ " more taps", progress);
			progress.report("constrained least squares: round " + (round + 1), -1);
			List<Cuts.Cut> exceeded = cuts.exceeded(program.x(), 0, MARGIN * scale() / 2);
			if (exceeded.isEmpty()) {
				return new DesignResult(basis.taps(program.x()));
			}
			for (Cuts.Cut cut : exceeded) {
				program.atLeast(Arrays.stream(cut.row()).map(value -> -value).toArray(), -cut.bound());
			}
		}
		throw new DesignException("the limits are still exceeded after " + ROUNDS + " rounds; loosen a limit a little");
	}

	private double scale() {
		double scale = 1e-12;
		for (Band band : bands) {
			scale = Math.max(scale, Math.max(Math.abs(band.desiredFrom()), Math.abs(band.desiredTo())));
		}
		return scale;
	}
}
