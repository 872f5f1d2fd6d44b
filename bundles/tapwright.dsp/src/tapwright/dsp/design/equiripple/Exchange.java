// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.List;
import java.util.Locale;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.LinearPhaseType;

/**
 * The exchange for one number of unknowns (E. Ya. Remez, 1934; T. W. Parks and J. H. McClellan, Chebyshev approximation
 * for nonrecursive digital filters with linear phase, IEEE Transactions on Circuit Theory 19(2), 1972).
 */
final class Exchange {

	private static final int SMALL = 24;
	private static final double LOOSE = 1e-2;
	private static final int ROUNDS = 120;
	/** Rounds without progress; rounding errors can make it go on for ever. */
	private static final int PATIENCE = 20;
	/** When errors differ by less than this, refining the extrema pays. */
	private static final double CLOSE = 0.05;
	/** While they differ by more than this, a coarse search for them does. */
	private static final double FAR = 0.5;
	/** Tolerances below this need extrema refined twice. */
	private static final double TIGHT = 1e-6;
	private static final int COARSE_SAMPLES = 4;
	private static final int USUAL_SAMPLES = 7;
	private static final int THOROUGH_SAMPLES = 24;
	/** What the proof is left to judge when no more progress is made. */
	private static final double ACCEPTABLE = 1.5;
	/** A levelled error below this part of the largest weighted desired value drowns in rounding errors. */
	private static final double RESOLUTION = 1e-12;

	private final LinearPhaseType type;
	private final List<Band> bands;
	private final boolean thorough;
	private final Progress progress;

	/**
	 * An exchange.
	 *
	 * @param thorough
	 *            whether to search extrema so densely that hardly any can be missed
	 */
	Exchange(LinearPhaseType type, List<Band> bands, boolean thorough, Progress progress) {
		this.type = type;
		this.bands = bands;
		this.thorough = thorough;
		this.progress = progress;
	}

	/**
	 * What the exchange ends with.
	 *
	 * @param level
	 *            magnitude of the error at the points of the reference
	 * @param largest
	 *            largest error found
	 */
	record Outcome(Reference reference, Interpolant approximation, double level, double largest) {
	}

	/**
	 * Solves for {@code unknowns} coefficients until the largest error found exceeds the levelled one by at most the
	 * tolerance, relatively. A larger problem starts from the rough solution of one half as large.
	 */
	Outcome solve(int unknowns, double tolerance) throws DesignException {
		if (unknowns > SMALL) {
			return solve(unknowns, tolerance, solve((unknowns + 1) / 2, LOOSE).reference);
		}
		Target target = new Target(type, bands, unknowns);
		return run(target, unknowns, tolerance, Reference.spread(target, unknowns + 1));
	}

	/** The same from the reference of a solution with another number of coefficients. */
	Outcome solve(int unknowns, double tolerance, Reference other) throws DesignException {
		Target target = new Target(type, bands, unknowns);
		return run(target, unknowns, tolerance, other.scaled(target, unknowns + 1));
	}

	private Outcome run(Target target, int unknowns, double tolerance, Reference start) throws DesignException {
		Reference reference = start;
		Outcome best = null;
		int sinceBest = 0;
		double spread = 1;
		for (int round = 0; round < ROUNDS && sinceBest < PATIENCE; round++) {
			progress.checkCancelled();
			Interpolant approximation = levelled(target, reference);
			double level = Math.abs(approximation.error());
			int polish = spread > CLOSE ? 0 : tolerance < TIGHT ? 2 : 1;
			int density = thorough ? THOROUGH_SAMPLES : spread > FAR ? COARSE_SAMPLES : USUAL_SAMPLES;
			Peaks peaks = new Extrema(target, approximation, unknowns, density, polish).find(reference);
			double largest = peaks.largest();
			spread = (largest - level) / largest;
			if (!(spread > -CLOSE)) {
				break;
			}
			if (best == null || spread < best.largest / best.level - 1) {
				best = new Outcome(reference, approximation, level, largest);
				sinceBest = 0;
			} else {
				sinceBest++;
			}
			if (spread <= tolerance && (polish > 0 || tolerance >= LOOSE)) {
				return best;
			}
			if (peaks.count <= unknowns) {
				break;
			}
			reference = peaks.best(unknowns + 1);
		}
		if (best == null || !(best.largest <= ACCEPTABLE * best.level)) {
			throw lost(best);
		}
		return best;
	}

	// The approximation whose weighted error has one size and alternating signs on the reference.
	private static Interpolant levelled(Target target, Reference reference) {
		int n = reference.x().length;
		double[] desired = new double[n];
		double[] weight = new double[n];
		fill(target, reference, desired, weight);
		return Interpolant.levelled(reference.x(), desired, weight);
	}

	private static void fill(Target target, Reference reference, double[] desired, double[] weight) {
		int n = reference.x().length;
		for (int from = 0; from < n;) {
			int to = from + 1;
			while (to < n && reference.band()[to] == reference.band()[from]) {
				to++;
			}
			target.fill(reference.band()[from], reference.x(), from, to, desired, weight);
			from = to;
		}
	}

	// Rounding errors have taken over, or the exchange circles.
	private DesignException lost(Outcome best) {
		double scale = 0;
		for (Band band : bands) {
			scale = Math.max(scale, Math.max(Math.abs(band.desiredFrom()) * band.weightFrom(),
					Math.abs(band.desiredTo()) * band.weightTo()));
		}
		if (best == null || best.level < RESOLUTION * scale) {
			return new DesignException("the best weighted error is smaller than double precision resolves ("
					+ RESOLUTION * scale
					+ " here); reduce the taps or narrow the transitions");
		}
		return new DesignException(String.format(Locale.ROOT,
				"the exchange did not settle: errors stay between %.3g and %.3g; reduce the"
				+ " taps, widen very narrow bands or make the transitions more equal in width", best.level,
				best.largest));
	}
}
