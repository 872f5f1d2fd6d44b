// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.Arrays;

/**
 * The sum of L cosines that takes given values at L + 1 points x = cos(2 pi f), in barycentric form (J.-P. Berrut and
 * L. N. Trefethen, Barycentric Lagrange interpolation, SIAM Review 46(3), 2004).
 */
final class Interpolant {

	private static final int BLOCK = 64;
	private static final int FACTORS_BEFORE_SCALING = 12;

	private final double[] x;
	private final double[] weights;
	private final double[] values;
	private final double error;

	private Interpolant(double[] x, double[] weights, double[] values, double error) {
		this.x = x;
		this.weights = weights;
		this.values = values;
		this.error = error;
	}

	/** The weighted error, approximation minus desired, at the first point; NaN when that has no meaning. */
	double error() {
		return error;
	}

	/** With the same points and other values. */
	Interpolant with(double[] otherValues) {
		return new Interpolant(x, weights, otherValues, Double.NaN);
	}

	/** The points. */
	double[] points() {
		return x;
	}

	/** The values at the points. */
	double[] values() {
		return values;
	}

	/**
	 * The sum of L cosines whose weighted error from the desired values has one size at all L + 1 points, with
	 * alternating signs.
	 *
	 * @param x
	 *            the points, falling
	 */
	static Interpolant levelled(double[] x, double[] desired, double[] weight) {
		double[] weights = weights(x);
		double top = 0;
		double bottom = 0;
		for (int i = 0; i < x.length; i++) {
			top += weights[i] * desired[i];
			bottom += (i % 2 == 0 ? weights[i] : -weights[i]) / weight[i];
		}
		double error = -top / bottom;
		double[] values = new double[x.length];
		for (int i = 0; i < x.length; i++) {
			values[i] = desired[i] + (i % 2 == 0 ? error : -error) / weight[i];
		}
		return new Interpolant(x, weights, values, error);
	}

	/** Values at t[0..count-1]. */
	void evaluate(double[] t, int count, double[] result) {
		double[] at = new double[BLOCK];
		double[] top = new double[BLOCK];
		double[] bottom = new double[BLOCK];
		for (int start = 0; start < count; start += BLOCK) {
			int size = Math.min(BLOCK, count - start);
			System.arraycopy(t, start, at, 0, size);
			sums(at, top, bottom);
			for (int p = 0; p < size; p++) {
				double value = top[p] / bottom[p];
				result[start + p] = Double.isFinite(value) ? value : valueAt(at[p]);
			}
		}
	}

	// Points outside and references inside, so that the compiler makes vector instructions of the inner loop.
	private void sums(double[] at, double[] top, double[] bottom) {
		for (int p = 0; p < BLOCK; p++) {
			top[p] = 0;
			bottom[p] = 0;
		}
		for (int j = 0; j < x.length; j++) {
			double xj = x[j];
			double wj = weights[j];
			double yj = values[j];
			for (int p = 0; p < BLOCK; p++) {
				double quotient = wj / (at[p] - xj);
				bottom[p] += quotient;
				top[p] += quotient * yj;
			}
		}
	}

	// A point that is a reference point divides by zero above.
	private double valueAt(double t) {
		for (int j = 0; j < x.length; j++) {
			if (x[j] == t) {
				return values[j];
			}
		}
		return Double.NaN;
	}

	/**
	 * 1 / product of 2 (x[i] - x[j]), all times one power of two. The factor 2 is one over the capacity of [-1, 1];
	 * mantissas and exponents are collected apart since the products leave the range of doubles for long filters.
	 */
	private static double[] weights(double[] x) {
		int n = x.length;
		double[] product = new double[n];
		long[] exponent = new long[n];
		Arrays.fill(product, 1);
		for (int j = 0; j < n; j++) {
			double xj = x[j];
			for (int i = 0; i < j; i++) {
				product[i] *= 2 * (x[i] - xj);
			}
			for (int i = j + 1; i < n; i++) {
				product[i] *= 2 * (x[i] - xj);
			}
			if (j % FACTORS_BEFORE_SCALING == 0 || j == n - 1) {
				for (int i = 0; i < n; i++) {
					int e = Math.getExponent(product[i]);
					exponent[i] += e;
					product[i] = Math.scalb(product[i], -e);
				}
			}
		}
		long smallest = Long.MAX_VALUE;
		for (long e : exponent) {
			smallest = Math.min(smallest, e);
		}
		for (int i = 0; i < n; i++) {
			// Weights 2^-1000 below the largest are nothing beside it.
			product[i] = Math.scalb(1 / product[i], (int) Math.max(smallest - exponent[i], -1100));
		}
		return product;
	}
}
