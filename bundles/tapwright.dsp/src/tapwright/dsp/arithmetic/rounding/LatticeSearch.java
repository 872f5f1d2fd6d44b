// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.Random;

import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * Looks for the integers whose largest weighted error is least, in the geometry of the ellipsoid around all that are better than
 * the best so far.
 *
 * <p>
 * Sources: the reduced basis and its nearest planes, D. M. Kodek, LLL algorithm and the optimal finite wordlength FIR design, IEEE
 * Transactions on Signal Processing 60(3), 2012; steps along its vectors, N. Brisebarre, S.-I. Filip, G. Hanrot, A lattice basis
 * reduction approach for the design of finite wordlength FIR filters, IEEE Transactions on Signal Processing 66(10), 2018;
 * nearest planes, L. Babai, On Lovász' lattice reduction and the nearest lattice point problem, Combinatorica 6, 1986. The
 * ellipsoid and its complete search are ours.
 *
 * <p>
 * Why a complete search proves the optimum: integers that are better than the best have errors below the bound on the grid too,
 * so that they lie in the ellipsoid, all of whose integer vectors are visited. Rounding of doubles is covered by searching an
 * ellipsoid whose squared radius is larger by {@link #SLACK}, far more than the form's condition times 2^-53 can amount to; where
 * the condition is too bad for that, no proof is claimed.
 */
final class LatticeSearch {

	private static final double SLACK = 1e-6;
	private static final double WORST_CONDITION = 1e6;
	private static final int STARTS = 400;
	private static final int DEEPEST = 3;

	/** Share of the error below which two roundings count as equally good in a proof. */
	private static final double TOLERANCE = 1e-6;

	private final Best best;
	private final NumberFormat format;
	private final AmplitudeGrid grid;
	private final PeakError error;
	private final Random random;
	/** Least proven error so far, and the coefficients that have it. */
	private double bound;
	private ExactTaps holder;
	/** The least that the error of refused coefficients could be. */
	private double doubt = Double.POSITIVE_INFINITY;

	LatticeSearch(RoundingTask task, Best best) {
		ExactTaps taps = task.ideal();
		if (task.bands().isEmpty() || taps.symmetry() == Symmetry.NONE) {
			throw new IllegalArgumentException("rounding by lattice needs symmetric coefficients and bands with desired amplitudes;"
					+ " search pairs instead");
		}
		this.best = best;
		error = new PeakError(task.bands());
		grid = new AmplitudeGrid(task.bands(), taps.length(), LinearPhaseType.of(taps.length(), taps.symmetry()),
				task.format().step());
		random = new Random(best.seed());
		format = task.format();
		holder = best.rounded().taps();
		bound = holder.symmetry() == taps.symmetry() ? error.of(holder).hi() : Double.MAX_VALUE;
	}

	/**
	 * Searches until nothing better turns up or the time is over.
	 *
	 * @param complete
	 *            goes on until all integers that could be better are visited
	 */
	void run(boolean complete) {
		boolean improved = true;
		while (improved && !best.isOver()) {
			Ellipsoid ellipsoid = Ellipsoid.around(grid, bound);
			Lattice lattice = new Lattice(ellipsoid.factor);
			double[] centre = lattice.coordinates(ellipsoid.centre);
			improved = descend(lattice, centre);
			if (!improved && complete) {
				visitAll(ellipsoid, lattice, centre);
			}
		}
	}

	private boolean descend(Lattice lattice, double[] centre) {
		Descent descent = new Descent(grid, lattice);
		double before = bound;
		for (int start = 0; start < STARTS && !best.isOver(); start++) {
			// The first start is the nearest planes' vector, and goes deep; the others scatter more and more.
			double spread = 0.6 * start / STARTS;
			long[] integers = lattice.vector(lattice.nearPlanes(centre, spread, random));
			double peak = descent.run(integers, start == 0 ? DEEPEST : 2, best::isOver);
			if (peak < bound * 1.02) {
				descent.run(integers, DEEPEST, best::isOver);
			}
			if (take(integers)) {
				descent.run(integers, DEEPEST, best::isOver);
				take(integers);
				return true;
			}
		}
		return bound < before;
	}

	// Offers integers whose largest error, proven over whole bands, is the least so far.
	private boolean take(long[] integers) {
		if (!(grid.peak(integers) < bound)) {
			return false;
		}
		ExactTaps taps = grid.taps(integers);
		if (!format.contains(taps)) {
			return false;
		}
		Enclosure peak = error.of(taps);
		if (!(peak.hi() < bound)) {
			doubt = Math.min(doubt, peak.lo());
			return false;
		}
		bound = peak.hi();
		holder = taps;
		best.offer(taps);
		return true;
	}

	private void visitAll(Ellipsoid ellipsoid, Lattice lattice, double[] centre) {
		LeafTest test = new LeafTest(grid, lattice);
		boolean complete = new Enumeration(lattice, centre).run(squaredRadius(ellipsoid), z -> {
			if (test.isBelow(z, bound)) {
				take(lattice.vector(z));
			}
			return squaredRadius(ellipsoid);
		}, best::isOver);
		boolean certain = ellipsoid.condition() < WORST_CONDITION && doubt >= bound * (1 - TOLERANCE);
		if (complete && certain && best.rounded().taps().equals(holder)) {
			best.proven();
		}
	}

	private double squaredRadius(Ellipsoid ellipsoid) {
		return bound * bound * (1 + SLACK) - ellipsoid.residual;
	}
}
