// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import java.util.Arrays;

/** The eigenvector of a symmetric tridiagonal matrix for its largest eigenvalue. */
final class TopEigenvector {

	private TopEigenvector() {
	}

	/**
	 * Bisection by Sturm counts for the eigenvalue, then inverse iteration just above it, where the shifted matrix is
	 * definite and needs no pivoting (J. H. Wilkinson, The Algebraic Eigenvalue Problem, 1965, chapter 5).
	 *
	 * @param diagonal
	 *            d[0..n-1]
	 * @param beside
	 *            b[k] couples k and k+1; only n-1 entries are read; positive
	 * @return all of one sign, since the couplings are positive; not normalised
	 */
	static double[] of(double[] diagonal, double[] beside) {
		int n = diagonal.length;
		double low = Double.NEGATIVE_INFINITY;
		double high = Double.NEGATIVE_INFINITY;
		for (int k = 0; k < n; k++) {
			low = Math.max(low, diagonal[k]);
			high = Math.max(high, diagonal[k] + (k > 0 ? beside[k - 1] : 0) + (k + 1 < n ? beside[k] : 0));
		}
		high = Math.nextUp(high);
		for (double middle = low / 2 + high / 2; low < middle && middle < high; middle = low / 2 + high / 2) {
			if (isAbove(diagonal, beside, middle)) {
				high = middle;
			} else {
				low = middle;
			}
		}
		double shift = high;
		double[] vector = new double[n];
		Arrays.fill(vector, 1);
		for (int round = 0; round < 5; round++) {
			solve(diagonal, beside, shift, vector);
		}
		return vector;
	}

	// Whether every eigenvalue is below the shift: all pivots of shift - matrix are positive.
	private static boolean isAbove(double[] diagonal, double[] beside, double shift) {
		double pivot = shift - diagonal[0];
		for (int k = 1; k < diagonal.length && pivot > 0; k++) {
			pivot = shift - diagonal[k] - beside[k - 1] * beside[k - 1] / pivot;
		}
		return pivot > 0;
	}

	// One step of inverse iteration with shift - matrix, scaled to a largest entry of 1.
	private static void solve(double[] diagonal, double[] beside, double shift, double[] vector) {
		int n = diagonal.length;
		double[] pivot = new double[n];
		for (int k = 0; k < n; k++) {
			pivot[k] = shift - diagonal[k] - (k > 0 ? beside[k - 1] * beside[k - 1] / pivot[k - 1] : 0);
			vector[k] += k > 0 ? beside[k - 1] / pivot[k - 1] * vector[k - 1] : 0;
		}
		double largest = 0;
		for (int k = n - 1; k >= 0; k--) {
			vector[k] = (vector[k] + (k + 1 < n ? beside[k] * vector[k + 1] : 0)) / pivot[k];
			largest = Math.max(largest, Math.abs(vector[k]));
		}
		for (int k = 0; k < n; k++) {
			vector[k] /= largest;
		}
	}
}
