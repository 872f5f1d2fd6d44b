// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.linearprogram;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Bands;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.leastsquares.AmplitudeLimit;
import tapwright.dsp.design.leastsquares.Cuts;
import tapwright.dsp.design.leastsquares.LinearPhaseBasis;
import tapwright.dsp.design.leastsquares.PointCondition;
import tapwright.dsp.design.leastsquares.QuadraticProgram;
import tapwright.dsp.design.leastsquares.Side;
import tapwright.dsp.exact.Symmetry;

/**
 * Linear-phase design with the least largest weighted error over the bands among all filters that keep further limits (K.
 * Steiglitz, T. W. Parks and J. F. Kaiser, IEEE Transactions on Signal Processing 40(8), 1992).
 *
 * @param taps
 *            number of coefficients, at most {@link #LONGEST}
 * @param symmetry
 *            even or odd
 * @param bands
 *            target and weight; rising
 * @param limits
 *            on the amplitude, for instance in the transitions
 * @param monotone
 *            where the amplitude only falls or rises
 * @param conditions
 *            what must hold exactly at single frequencies
 * @param timeLimits
 *            on the impulse and step responses
 */
public record LinearProgram(int taps, Symmetry symmetry, List<Band> bands, List<AmplitudeLimit> limits, List<Monotone> monotone,
		List<PointCondition> conditions, List<TimeLimit> timeLimits) implements Design {

	/** The greatest number of coefficients. */
	public static final int LONGEST = 401;
	/** Up to which sum of absolute amplitude factors the lower bound holds. */
	public static final double LARGEST_FACTORS = 1000;

	private static final int ROUNDS = 120;
	/** How strongly a program holds on to the last solution. */
	private static final double HOLD = 1e-2;
	/** Limits are tightened by this, relatively to the largest desired amplitude. */
	private static final double MARGIN = 1e-9;
	private static final double SETTLED = 1e-11;

	/** Checks the parameters. */
	public LinearProgram {
		if (taps < 1 || taps > LONGEST) {
			throw new IllegalArgumentException("a design of " + taps + " coefficients was asked for; ask for 1 to " + LONGEST);
		}
		bands = Bands.rising(bands, true);
		limits = List.copyOf(limits);
		monotone = List.copyOf(monotone);
		conditions = List.copyOf(conditions);
		timeLimits = List.copyOf(timeLimits);
		for (TimeLimit limit : timeLimits) {
			if (limit.to() >= taps) {
				throw new IllegalArgumentException("a limit on samples " + limit.from() + " to " + limit.to() + " of " + taps
						+ " coefficients; the last one is " + (taps - 1));
			}
		}
		new LinearPhaseBasis(taps, symmetry);
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		LinearProgramSolution solution = solve(progress);
		return new DesignResult(solution.taps(), List.of(String.format(Locale.ROOT,
				"The largest weighted error is %.6g; by an estimate from the multipliers none that keeps the limits has less than %.6g.", solution.error(),
				solution.lower())));
	}

	/**
	 * Computes the coefficients and a bound on what is possible.
	 *
	 * @throws DesignException
	 *             when no filter keeps the limits or rounding errors prevail
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public LinearProgramSolution solve(Progress progress) throws DesignException {
		LinearPhaseBasis basis = new LinearPhaseBasis(taps, symmetry);
		int n = basis.size() + 1;
		double margin = MARGIN * scale();
		Cuts search = new Cuts(basis, sides(basis, margin), progress);
		List<Cuts.Cut> cuts = search.start();
		double[] centre = new double[n];
		for (int round = 0; round < ROUNDS; round++) {
			progress.report("linear program: round " + (round + 1), -1);
			QuadraticProgram program = program(centre);
			addFixedRows(program, basis, margin);
			for (Cuts.Cut cut : cuts) {
				program.atLeast(row(cut.row(), -1, cut.room()), -cut.bound());
			}
			program.solve(margin / 10, p -> p < conditions.size() ? "the condition at " + conditions.get(p).frequency()
					+ " cycles per sample contradicts the others or the symmetry"
					: "no filter of " + taps + " coefficients keeps all limits; loosen one or ask for more taps", progress);
			double[] x = program.x();
			List<Cuts.Cut> exceeded = search.exceeded(x, x[n - 1], margin / 2);
			double moved = 0;
			for (int k = 0; k < n; k++) {
				moved = Math.max(moved, HOLD * Math.abs(x[k] - centre[k]));
			}
			if (exceeded.isEmpty() && moved <= SETTLED) {
				return new LinearProgramSolution(basis.taps(x), x[n - 1], bound(program));
			}
			cuts.addAll(exceeded);
			centre = x.clone();
		}
		throw new DesignException("the linear program did not settle within " + ROUNDS + " rounds; loosen a limit a little or ask"
				+ " for fewer taps");
	}

	// For every x that keeps the rows: t = (c - sum of y row) x + sum of y row x >= -|c - sum| |x| + sum of y bound.
	private double bound(QuadraticProgram program) {
		double[] residual = program.rowSum();
		residual[residual.length - 1] -= 1;
		double largest = Arrays.stream(residual).map(Math::abs).max().orElse(0);
		return program.boundValue() - largest * LARGEST_FACTORS;
	}

	private static QuadraticProgram program(double[] centre) {
		int n = centre.length;
		double[][] inverse = new double[n][n];
		double[] b = new double[n];
		for (int k = 0; k < n; k++) {
			inverse[k][k] = 1 / Math.sqrt(HOLD);
			b[k] = HOLD * centre[k];
		}
		b[n - 1] -= 1;
		return new QuadraticProgram(inverse, b);
	}

	private List<Side> sides(LinearPhaseBasis basis, double margin) {
		List<Side> sides = new ArrayList<>();
		for (Band band : bands) {
			for (int sign : new int[] { 1, -1 }) {
				sides.add(new Side(band.from(), band.to(), 0, sign, f -> sign * band.desired(f), f -> 1 / band.weight(f)));
			}
		}
		for (AmplitudeLimit limit : limits) {
			sides.addAll(Side.of(limit, margin));
		}
		for (Monotone stretch : monotone) {
			sides.add(new Side(stretch.from(), stretch.to(), 1, stretch.rising() ? -1 : 1, f -> 0, f -> 0));
		}
		return sides;
	}

	private void addFixedRows(QuadraticProgram program, LinearPhaseBasis basis, double margin) {
		for (PointCondition condition : conditions) {
			program.equal(row(basis.row(condition.frequency(), condition.derivative()), 1, 0),
					condition.value() / Math.pow(basis.slopeScale(), condition.derivative()));
		}
		for (TimeLimit limit : timeLimits) {
			for (int k = limit.from(); k <= limit.to(); k++) {
				double[] values = limit.step() ? basis.stepRow(k) : basis.impulseRow(k);
				if (limit.lower() == limit.upper()) {
					program.equal(row(values, 1, 0), limit.lower());
					continue;
				}
				if (isFixed(limit.step(), k)) {
					continue; // the margin would contradict a value at the limit
				}
				if (!Double.isInfinite(limit.lower())) {
					program.atLeast(row(values, 1, 0), limit.lower() + margin);
				}
				if (!Double.isInfinite(limit.upper())) {
					program.atLeast(row(values, -1, 0), margin - limit.upper());
				}
			}
		}
	}

	private boolean isFixed(boolean step, int k) {
		int mirror = step ? k : taps - 1 - k;
		return timeLimits.stream().anyMatch(limit -> limit.lower() == limit.upper() && limit.step() == step
				&& (limit.from() <= k && k <= limit.to() || limit.from() <= mirror && mirror <= limit.to()));
	}

	private static double[] row(double[] factors, int sign, double room) {
		double[] row = new double[factors.length + 1];
		for (int k = 0; k < factors.length; k++) {
			row[k] = sign * factors[k];
		}
		row[factors.length] = room;
		return row;
	}

	private double scale() {
		double scale = 1e-12;
		for (Band band : bands) {
			scale = Math.max(scale, Math.max(Math.abs(band.desiredFrom()), Math.abs(band.desiredTo())));
		}
		return scale;
	}
}
