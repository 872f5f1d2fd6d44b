// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.Random;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;

/**
 * A reduced basis of the integer vectors in the geometry of a positive definite form.
 *
 * <p>
 * Source: A. K. Lenstra, H. W. Lenstra, L. Lovász, Factoring polynomials with rational coefficients, Mathematische Annalen 261,
 * 1982; with the factor 0.99 that is common practice.
 */
final class Lattice {

	private static final double LOVASZ = 0.99;

	/** The basis: vector k has the integer coordinates {@code basis[k]}. */
	final long[][] basis;
	/** Upper triangular: the form of the sum of z[k] basis[k] is the sum of squares of the rows times z. */
	final double[][] triangle;

	/**
	 * Reduces the unit vectors.
	 *
	 * @param factor
	 *            vectors whose scalar products are the form: unit vector k lies at {@code factor[k]}
	 */
	Lattice(double[][] factor) {
		int n = factor.length;
		basis = new long[n][n];
		double[][] b = new double[n][];
		for (int k = 0; k < n; k++) {
			basis[k][k] = 1;
			b[k] = factor[k].clone();
		}
		double[][] orthogonal = new double[n][n];
		double[] norms = new double[n];
		double[][] mu = new double[n][n];
		int k = 0;
		while (k < n) {
			reduce(b, k, orthogonal, norms, mu);
			if (k > 0 && norms[k] < (LOVASZ - mu[k][k - 1] * mu[k][k - 1]) * norms[k - 1]) {
				swap(b, k);
				k--;
			} else {
				k++;
			}
		}
		triangle = new double[n][n];
		for (int row = 0; row < n; row++) {
			double length = Math.sqrt(norms[row]);
			for (int column = row; column < n; column++) {
				triangle[row][column] = column == row ? length : mu[column][row] * length;
			}
		}
	}

	// Shortens vector k by those before it, last first, and brings its orthogonal part up to date.
	private void reduce(double[][] b, int k, double[][] orthogonal, double[] norms, double[][] mu) {
		boolean changed = true;
		while (changed) {
			changed = false;
			orthogonal[k] = b[k].clone();
			for (int j = 0; j < k; j++) {
				mu[k][j] = dot(b[k], orthogonal[j]) / norms[j];
				subtract(orthogonal[k], mu[k][j], orthogonal[j]);
			}
			norms[k] = dot(orthogonal[k], orthogonal[k]);
			for (int j = k - 1; j >= 0; j--) {
				long times = Math.round(mu[k][j]);
				if (times != 0) {
					changed = true;
					subtract(b[k], times, b[j]);
					for (int i = 0; i < basis.length; i++) {
						basis[k][i] -= times * basis[j][i];
					}
					for (int i = 0; i < j; i++) {
						mu[k][i] -= times * mu[j][i];
					}
				}
			}
		}
	}

	private void swap(double[][] b, int k) {
		double[] vector = b[k];
		b[k] = b[k - 1];
		b[k - 1] = vector;
		long[] coordinates = basis[k];
		basis[k] = basis[k - 1];
		basis[k - 1] = coordinates;
	}

	/** The integer vector with coordinates z in this basis. */
	long[] vector(long[] z) {
		long[] vector = new long[z.length];
		for (int k = 0; k < z.length; k++) {
			for (int i = 0; i < z.length; i++) {
				vector[i] += z[k] * basis[k][i];
			}
		}
		return vector;
	}

	/** The coordinates of a vector in this basis. */
	double[] coordinates(double[] vector) {
		int n = vector.length;
		double[][] columns = new double[n][n];
		for (int k = 0; k < n; k++) {
			for (int i = 0; i < n; i++) {
				columns[i][k] = basis[k][i];
			}
		}
		return new LUDecomposition(new Array2DRowRealMatrix(columns, false)).getSolver()
				.solve(new ArrayRealVector(vector, false)).toArray();
	}

	/**
	 * Coordinates of a vector near a point, found plane by plane.
	 *
	 * @param centre
	 *            coordinates of the point
	 * @param spread
	 *            standard deviation, in planes, of a random offset; 0 for the nearest planes
	 */
	long[] nearPlanes(double[] centre, double spread, Random random) {
		int n = centre.length;
		long[] z = new long[n];
		for (int k = n - 1; k >= 0; k--) {
			double sum = 0;
			for (int i = k + 1; i < n; i++) {
				sum += triangle[k][i] * (z[i] - centre[i]);
			}
			z[k] = Math.round(centre[k] - sum / triangle[k][k] + spread * random.nextGaussian());
		}
		return z;
	}

	private static double dot(double[] a, double[] b) {
		double sum = 0;
		for (int i = 0; i < a.length; i++) {
			sum += a[i] * b[i];
		}
		return sum;
	}

	private static void subtract(double[] a, double times, double[] b) {
		for (int i = 0; i < a.length; i++) {
			a[i] -= times * b[i];
		}
	}
}
