// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.function.BooleanSupplier;

/**
 * Visits the integer vectors inside an ellipsoid, depth first and nearest first; the ellipsoid may shrink on the way.
 *
 * <p>
 * Source: C. P. Schnorr, M. Euchner, Lattice basis reduction: improved practical algorithms and solving subset sum problems,
 * Mathematical Programming 66, 1994; the method is due to U. Fincke and M. Pohst, Improved methods for calculating vectors of
 * short length in a lattice, Mathematics of Computation 44(170), 1985.
 */
final class Enumeration {

	/** Takes the coordinates of vectors that were found. */
	interface Visitor {

		/**
		 * Looks at a vector.
		 *
		 * @param z
		 *            coordinates in the lattice's basis; must not be kept
		 * @return square of the radius for what follows
		 */
		double visit(long[] z);
	}

	private static final int CHECK_EVERY = 1 << 14;

	private final double[][] r;
	private final double[] centre;
	private final int n;

	/**
	 * Prepares the visits.
	 *
	 * @param lattice
	 *            basis in the geometry of the ellipsoid
	 * @param centre
	 *            of the ellipsoid, in coordinates of the basis
	 */
	Enumeration(Lattice lattice, double[] centre) {
		r = lattice.triangle;
		this.centre = centre;
		n = centre.length;
	}

	/**
	 * Visits vectors.
	 *
	 * @param squaredRadius
	 *            at the beginning
	 * @param stop
	 *            asked now and then
	 * @return whether all vectors were visited, that is, the search was not stopped
	 */
	boolean run(double squaredRadius, Visitor visitor, BooleanSupplier stop) {
		double radius = squaredRadius;
		long[] z = new long[n];
		long[] step = new long[n];
		double[] middle = new double[n];
		double[] used = new double[n + 1];
		int k = n - 1;
		enter(k, z, step, middle);
		int count = 0;
		while (true) {
			if (++count % CHECK_EVERY == 0 && stop.getAsBoolean()) {
				return false;
			}
			double distance = r[k][k] * (z[k] - middle[k]);
			double total = used[k + 1] + distance * distance;
			if (total <= radius) {
				used[k] = total;
				if (k == 0) {
					radius = Math.min(radius, visitor.visit(z));
					next(k, z, step);
				} else {
					k--;
					enter(k, z, step, middle);
				}
			} else {
				if (k == n - 1) {
					return true;
				}
				k++;
				next(k, z, step);
			}
		}
	}

	private void enter(int k, long[] z, long[] step, double[] middle) {
		double sum = 0;
		for (int i = k + 1; i < n; i++) {
			sum += r[k][i] * (z[i] - centre[i]);
		}
		middle[k] = centre[k] - sum / r[k][k];
		z[k] = Math.round(middle[k]);
		step[k] = z[k] <= middle[k] ? 1 : -1;
	}

	// The next nearest integer to the middle: one side, then the other.
	private static void next(int k, long[] z, long[] step) {
		z[k] += step[k];
		step[k] = step[k] > 0 ? -step[k] - 1 : -step[k] + 1;
	}
}
