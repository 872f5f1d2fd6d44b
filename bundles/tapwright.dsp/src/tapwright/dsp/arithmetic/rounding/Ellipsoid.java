// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.Arrays;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;

/**
 * A small ellipsoid around all coefficients whose errors on the grid stay within a bound.
 *
 * <p>
 * For weights w[i] that are not negative and sum to 1, errors that all stay within E satisfy sum w[i] error[i]^2 <= E^2, which is
 * an ellipsoid (q - c)' G (q - c) <= E^2 - r with G = sum w[i] row[i] row[i]', its centre c the weighted least-squares solution
 * and r the weighted sum of squares there. Every choice of weights is valid; the one with the least volume is approached by
 * multiplying each weight by the ratio that is 1 at the optimum, as for D-optimal designs: S. D. Silvey, D. M. Titterington, B.
 * Torsney, An algorithm for optimal designs on a finite design space, Communications in Statistics A 7(14), 1978.
 */
final class Ellipsoid {

	private static final int ROUNDS = 40;
	/** Share of evenly spread weight that keeps the form positive definite. */
	private static final double EVEN = 1e-3;

	/** The centre. */
	final double[] centre;
	/** Vectors whose scalar products are the form. */
	final double[][] factor;
	/** Weighted sum of squares at the centre. */
	final double residual;

	private Ellipsoid(double[] centre, double[][] factor, double residual) {
		this.centre = centre;
		this.factor = factor;
		this.residual = residual;
	}

	/** The ellipsoid for errors up to {@code bound}. */
	static Ellipsoid around(AmplitudeGrid grid, double bound) {
		int m = grid.rows.length;
		double[] weights = new double[m];
		Arrays.fill(weights, 1.0 / m);
		for (int round = 0; round < ROUNDS; round++) {
			CholeskyDecomposition form = form(grid, weights);
			double[] centre = centre(grid, weights, form);
			double residual = residual(grid, weights, centre);
			double[][] inverse = form.getSolver().getInverse().getData();
			double room = Math.max(bound * bound - residual, bound * bound * 1e-3);
			double sum = 0;
			for (int i = 0; i < m; i++) {
				double error = error(grid, i, centre);
				double left = Math.max(bound * bound - error * error, room * 0.1);
				weights[i] *= leverage(grid.rows[i], inverse) / grid.unknowns * room / left;
				sum += weights[i];
			}
			for (int i = 0; i < m; i++) {
				weights[i] /= sum;
			}
		}
		for (int i = 0; i < m; i++) {
			weights[i] = (1 - EVEN) * weights[i] + EVEN / m;
		}
		CholeskyDecomposition form = form(grid, weights);
		double[] centre = centre(grid, weights, form);
		return new Ellipsoid(centre, form.getL().getData(), residual(grid, weights, centre));
	}

	/** Ratio of the largest to the least diagonal element of the factor, squared: a sign of a form that is nearly singular. */
	double condition() {
		double least = Double.MAX_VALUE;
		double largest = 0;
		for (int k = 0; k < factor.length; k++) {
			least = Math.min(least, factor[k][k]);
			largest = Math.max(largest, factor[k][k]);
		}
		return largest * largest / (least * least);
	}

	private static CholeskyDecomposition form(AmplitudeGrid grid, double[] weights) {
		int n = grid.unknowns;
		double[][] form = new double[n][n];
		for (int i = 0; i < weights.length; i++) {
			double[] row = grid.rows[i];
			if (weights[i] > 1e-12) {
				for (int k = 0; k < n; k++) {
					double scaled = weights[i] * row[k];
					for (int l = 0; l <= k; l++) {
						form[k][l] += scaled * row[l];
					}
				}
			}
		}
		double scale = 0;
		for (int k = 0; k < n; k++) {
			scale = Math.max(scale, form[k][k]);
		}
		for (int k = 0; k < n; k++) {
			for (int l = 0; l < k; l++) {
				form[l][k] = form[k][l];
			}
		}
		return new CholeskyDecomposition(new Array2DRowRealMatrix(form, false), 1e-9, 1e-14 * scale);
	}

	private static double[] centre(AmplitudeGrid grid, double[] weights, CholeskyDecomposition form) {
		double[] right = new double[grid.unknowns];
		for (int i = 0; i < weights.length; i++) {
			for (int k = 0; k < right.length; k++) {
				right[k] += weights[i] * grid.targets[i] * grid.rows[i][k];
			}
		}
		return form.getSolver().solve(new ArrayRealVector(right, false)).toArray();
	}

	private static double residual(AmplitudeGrid grid, double[] weights, double[] centre) {
		double sum = 0;
		for (int i = 0; i < weights.length; i++) {
			double error = error(grid, i, centre);
			sum += weights[i] * error * error;
		}
		return sum;
	}

	private static double error(AmplitudeGrid grid, int i, double[] centre) {
		double error = grid.targets[i];
		for (int k = 0; k < centre.length; k++) {
			error -= grid.rows[i][k] * centre[k];
		}
		return error;
	}

	private static double leverage(double[] row, double[][] inverse) {
		double sum = 0;
		for (int k = 0; k < row.length; k++) {
			double inner = inverse[k][k] * row[k] / 2;
			for (int l = 0; l < k; l++) {
				inner += inverse[k][l] * row[l];
			}
			sum += 2 * row[k] * inner;
		}
		return sum;
	}
}
