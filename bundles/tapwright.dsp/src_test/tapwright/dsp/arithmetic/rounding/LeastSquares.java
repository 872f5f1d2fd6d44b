// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.QRDecomposition;

import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;

/** Filters of odd length and even symmetry to begin with: weighted least squares at many frequencies. */
final class LeastSquares {

	private static final int POINTS = 200;

	private LeastSquares() {
	}

	static ExactTaps fit(List<Band> bands, int length) {
		int unknowns = (length + 1) / 2;
		double[][] rows = new double[POINTS * bands.size()][unknowns];
		double[] wanted = new double[rows.length];
		for (int i = 0; i < rows.length; i++) {
			Band band = bands.get(i / POINTS);
			double f = band.from() + (band.to() - band.from()) * (i % POINTS) / (POINTS - 1);
			wanted[i] = band.weight(f) * band.desired(f);
			for (int k = 0; k < unknowns; k++) {
				rows[i][k] = band.weight(f) * (k == 0 ? 1 : 2 * Math.cos(2 * Math.PI * f * k));
			}
		}
		double[] half = new QRDecomposition(new Array2DRowRealMatrix(rows, false)).getSolver()
				.solve(new ArrayRealVector(wanted, false)).toArray();
		double[] taps = new double[length];
		for (int k = 0; k < unknowns; k++) {
			taps[length / 2 + k] = taps[length / 2 - k] = half[k];
		}
		return ExactTaps.ofDoubles(taps);
	}
}
