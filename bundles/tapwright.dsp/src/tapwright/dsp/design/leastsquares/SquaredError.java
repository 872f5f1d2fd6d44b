// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.List;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;

/**
 * The weighted squared error over bands as a quadratic program. The factor of its matrix comes from the matrix itself
 * (Cholesky) while that is well conditioned, otherwise from a QR decomposition of weighted samples of the basis at
 * Gauss-Legendre nodes, whose condition is only the square root.
 */
final class SquaredError {

	/** Square of the ratio of pivots below which the matrix is too ill conditioned for Cholesky: condition about 1e10. */
	private static final double ILL = 1e-10;
	/** Below this ratio of diagonal entries even the QR decomposition has no digits left. */
	private static final double HOPELESS = 1e-13;
	private static final int LARGEST_FOR_QR = 600;
	private static final int NODES = 12;

	private final LinearPhaseBasis basis;
	private final List<Band> bands;
	private final Progress progress;

	SquaredError(LinearPhaseBasis basis, List<Band> bands, Progress progress) {
		this.basis = basis;
		this.bands = bands;
		this.progress = progress;
	}

	/** The program for coefficients a of the amplitude, without limits. */
	QuadraticProgram program() throws DesignException {
		int n = basis.size();
		double[][] lower = cholesky();
		if (lower == null) {
			if (n > LARGEST_FOR_QR) {
				throw illConditioned();
			}
			return decomposed();
		}
		return new QuadraticProgram(inverse(lower), target());
	}

	private double[] target() {
		double[] b = new double[basis.size()];
		for (Band band : bands) {
			BandIntegrals integrals = new BandIntegrals(band);
			for (int k = 0; k < b.length; k++) {
				b[k] += integrals.target(basis.harmonic(k), basis.sines());
			}
		}
		return b;
	}

	// The lower factor, or null when the matrix is too ill conditioned.
	private double[][] cholesky() {
		int n = basis.size();
		int first = (int) Math.round(2 * basis.type().firstHarmonic());
		double[] moment = new double[2 * n + first];
		for (Band band : bands) {
			BandIntegrals integrals = new BandIntegrals(band);
			for (int m = 0; m < moment.length; m++) {
				moment[m] += integrals.weightCosine(m);
			}
		}
		double[][] l = new double[n][];
		double least = Double.POSITIVE_INFINITY;
		double most = 0;
		for (int i = 0; i < n; i++) {
			progress.checkCancelled();
			l[i] = new double[i + 1];
			for (int k = 0; k <= i; k++) {
				double sum = moment[i + k + first];
				double value = (moment[i - k] + (basis.sines() ? -sum : sum)) / 2;
				for (int m = 0; m < k; m++) {
					value -= l[i][m] * l[k][m];
				}
				l[i][k] = k < i ? value / l[k][k] : value;
			}
			double pivot = l[i][i];
			least = Math.min(least, pivot);
			most = Math.max(most, pivot);
			if (!(least > ILL * most)) {
				return null;
			}
			l[i][i] = Math.sqrt(pivot);
		}
		return l;
	}

	// Row k of the inverse of a lower factor is column k of its transpose.
	private double[][] inverse(double[][] l) {
		int n = l.length;
		double[][] inverse = new double[n][n];
		for (int i = 0; i < n; i++) {
			progress.checkCancelled();
			for (int m = 0; m < i; m++) {
				double factor = l[i][m];
				for (int k = 0; k <= m; k++) {
					inverse[i][k] -= factor * inverse[m][k];
				}
			}
			for (int k = 0; k < i; k++) {
				inverse[i][k] /= l[i][i];
			}
			inverse[i][i] = 1 / l[i][i];
		}
		return inverse;
	}

	private QuadraticProgram decomposed() throws DesignException {
		int n = basis.size();
		GaussIntegrator rule = new GaussIntegratorFactory().legendre(NODES);
		double widest = 1 / (2 * basis.harmonic(n - 1) + 1);
		int count = 0;
		for (Band band : bands) {
			count += NODES * panels(band, widest);
		}
		double[][] samples = new double[count][];
		double[] desired = new double[count];
		int at = 0;
		for (Band band : bands) {
			int panels = panels(band, widest);
			double half = (band.to() - band.from()) / panels / 2;
			for (int panel = 0; panel < panels; panel++) {
				progress.checkCancelled();
				for (int node = 0; node < NODES; node++) {
					double f = band.from() + half * (2 * panel + 1 + rule.getPoint(node));
					double root = Math.sqrt(half * rule.getWeight(node) * band.weight(f));
					double[] row = basis.row(f, 0);
					for (int k = 0; k < n; k++) {
						row[k] *= root;
					}
					desired[at] = root * band.desired(f);
					samples[at++] = row;
				}
			}
		}
		QRDecomposition qr = new QRDecomposition(new Array2DRowRealMatrix(samples, false));
		progress.checkCancelled();
		RealMatrix upper = qr.getR();
		double[][] lower = new double[n][];
		double most = 0;
		double least = Double.POSITIVE_INFINITY;
		for (int i = 0; i < n; i++) {
			lower[i] = new double[i + 1];
			for (int k = 0; k <= i; k++) {
				lower[i][k] = upper.getEntry(k, i);
			}
			most = Math.max(most, Math.abs(lower[i][i]));
			least = Math.min(least, Math.abs(lower[i][i]));
		}
		if (!(least > HOPELESS * most)) {
			throw illConditioned();
		}
		// With the factor R the linear part is R'Q'd: its product with the inverse is Q'd, which never squares the condition.
		double[] projected = qr.getQT().operate(desired);
		double[] b = new double[n];
		for (int i = 0; i < n; i++) {
			for (int k = 0; k <= i; k++) {
				b[i] += lower[i][k] * projected[k];
			}
		}
		double[][] inverse = inverse(lower);
		return new QuadraticProgram(inverse, b);
	}

	private static int panels(Band band, double widest) {
		return (int) Math.ceil((band.to() - band.from()) / widest);
	}

	private static DesignException illConditioned() {
		return new DesignException("the bands leave so much of the frequency axis free that double precision cannot tell one"
				+ " solution from another; reduce the taps or narrow the gaps, for instance with a band of small weight in them");
	}
}
