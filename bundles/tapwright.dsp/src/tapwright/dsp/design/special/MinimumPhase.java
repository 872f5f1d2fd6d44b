// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.SingularMatrixException;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.response.Fft;

/**
 * The minimum-phase filter whose squared gain is the amplitude of a symmetric filter of odd length, lifted where that is
 * negative (O. Herrmann and H. W. Schuessler, Design of nonrecursive digital filters with minimum phase, Electronics Letters
 * 6(11), 1970; recalled). A first answer comes from the cepstrum, then Newton's method on the autocorrelation makes it exact
 * (G. Wilson, Factorization of the covariance generating function of a pure moving average process, SIAM Journal on
 * Numerical Analysis 6(1), 1969; recalled). The answer is given only when the Schur-Cohn recursion confirms, in double
 * precision, that all its zeros lie inside the unit circle.
 *
 * @param prototype
 *            symmetric, odd length, positive amplitude at its largest; not shared with the caller
 */
public record MinimumPhase(double[] prototype) implements Design {

	/** The greatest number of coefficients of the prototype. */
	public static final int LONGEST = 1001;

	private static final int NEWTON_STEPS = 60;
	/** Lifts above the least one, relative to the largest amplitude, tried in turn. */
	private static final double[] LIFTS = { 1e-13, 1e-12, 1e-11, 1e-10, 1e-9, 1e-8, 1e-7 };
	private static final double EXACT = 1e-13;
	/** The first steps may lead away before the method converges. */
	private static final int PATIENCE = 4;

	/** Checks the prototype. */
	public MinimumPhase {
		prototype = prototype.clone();
		int n = prototype.length;
		if (n % 2 == 0 || n > LONGEST) {
			throw new IllegalArgumentException("the prototype has " + n + " coefficients; it needs an odd number up to " + LONGEST);
		}
		for (int k = 0; k < n; k++) {
			if (!Double.isFinite(prototype[k]) || prototype[k] != prototype[n - 1 - k]) {
				throw new IllegalArgumentException("coefficient " + k + " of the prototype is " + prototype[k] + " and its mirror image "
						+ prototype[n - 1 - k] + "; the prototype must be finite and symmetric");
			}
		}
	}

	/** The prototype; a new array. */
	@Override
	public double[] prototype() {
		return prototype.clone();
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof MinimumPhase same && Arrays.equals(prototype, same.prototype);
	}

	@Override
	public int hashCode() {
		return Arrays.hashCode(prototype);
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		int c = prototype.length / 2;
		double[] r = Arrays.copyOfRange(prototype, c, prototype.length);
		int size = Math.max(1 << 13, Integer.highestOneBit(64 * (c + 1)));
		double[] amplitude = amplitude(r, size);
		double least = Arrays.stream(amplitude).min().orElseThrow();
		double most = Arrays.stream(amplitude).max().orElseThrow();
		if (!(most > 0) || -least > most / 2) {
			throw new DesignException("the prototype's amplitude runs from " + least + " to " + most
					+ "; it must be positive but for small ripples, so that it can be lifted");
		}
		for (double lift : LIFTS) {
			double added = Math.max(0, -least * (1 + 1e-4)) + lift * most;
			double[] lifted = r.clone();
			lifted[0] += added;
			double[] h = newton(lifted, cepstrum(lifted, size), progress);
			if (residual(lifted, h) <= EXACT * lifted[0] && isMinimumPhase(h)) {
				return new DesignResult(h, List.of(String.format(Locale.ROOT,
						"The squared gain is the prototype's amplitude plus %.4g.", added)));
			}
		}
		throw new DesignException("double precision cannot separate the zeros of this prototype from the unit circle; add a little to"
				+ " its middle coefficient");
	}

	private static double[] amplitude(double[] r, int size) {
		double[] re = new double[size];
		double[] im = new double[size];
		re[0] = r[0];
		for (int k = 1; k < r.length; k++) {
			re[k] = r[k];
			re[size - k] = r[k];
		}
		return transformed(re, im)[0];
	}

	private static double[][] transformed(double[] re, double[] im) {
		Fft fft = Fft.ofSize(re.length);
		fft.transform(re, im);
		double[] real = new double[re.length];
		double[] imaginary = new double[re.length];
		for (int f = 0; f < re.length; f++) {
			real[f] = re[fft.position(f)];
			imaginary[f] = im[fft.position(f)];
		}
		return new double[][] { real, imaginary };
	}

	// The half of the cepstrum that belongs to positive times has the wanted phase.
	private static double[] cepstrum(double[] r, int size) {
		double[] amplitude = amplitude(r, size);
		double floor = 1e-16 * Arrays.stream(amplitude).max().orElseThrow();
		double[] log = Arrays.stream(amplitude).map(value -> 0.5 * Math.log(Math.max(value, floor))).toArray();
		double[] folded = transformed(log, new double[size])[0];
		for (int k = 0; k < size; k++) {
			folded[k] *= (k == 0 || k == size / 2 ? 1.0 : k < size / 2 ? 2.0 : 0.0) / size;
		}
		double[][] spectrum = transformed(folded, new double[size]);
		double[] re = new double[size];
		double[] im = new double[size];
		for (int f = 0; f < size; f++) {
			double gain = Math.exp(spectrum[0][f]);
			re[f] = gain * Math.cos(spectrum[1][f]);
			im[f] = -gain * Math.sin(spectrum[1][f]);
		}
		// The inverse transform of conjugated values is real, up to the factor.
		double[] h = Arrays.copyOf(transformed(re, im)[0], r.length);
		for (int k = 0; k < h.length; k++) {
			h[k] /= size;
		}
		return h;
	}

	private static double[] newton(double[] r, double[] start, Progress progress) {
		double[] best = start;
		double least = residual(r, start);
		double[] h = start;
		int idle = 0;
		int n = h.length;
		for (int step = 0; step < NEWTON_STEPS && least > EXACT / 100 * r[0]; step++) {
			progress.checkCancelled();
			double[][] matrix = new double[n][n];
			double[] right = new double[n];
			for (int m = 0; m < n; m++) {
				right[m] = r[m] + lag(h, m);
				for (int k = 0; k < n; k++) {
					matrix[m][k] = (k >= m ? h[k - m] : 0) + (k + m < n ? h[k + m] : 0);
				}
			}
			try {
				h = new LUDecomposition(new Array2DRowRealMatrix(matrix, false), 0).getSolver()
						.solve(new ArrayRealVector(right, false)).toArray();
			} catch (SingularMatrixException e) {
				return best; // judged by its residual: a zero on the circle needs a larger lift
			}
			double residual = residual(r, h);
			idle = residual < least ? 0 : idle + 1;
			if (idle > PATIENCE) {
				return best;
			}
			best = idle == 0 ? h : best;
			least = Math.min(least, residual);
		}
		return best;
	}

	private static double residual(double[] r, double[] h) {
		double largest = 0;
		for (int m = 0; m < r.length; m++) {
			largest = Math.max(largest, Math.abs(r[m] - lag(h, m)));
		}
		return largest;
	}

	private static double lag(double[] h, int m) {
		double sum = 0;
		for (int k = m; k < h.length; k++) {
			sum += h[k] * h[k - m];
		}
		return sum;
	}

	/** Whether all reflection coefficients are below 1 in modulus, which puts all zeros inside the unit circle. */
	static boolean isMinimumPhase(double[] h) {
		double[] a = h.clone();
		for (int n = a.length - 1; n > 0; n--) {
			double k = a[n] / a[0];
			if (!(Math.abs(k) < 1)) {
				return false;
			}
			double[] next = new double[n];
			for (int i = 0; i < n; i++) {
				next[i] = (a[i] - k * a[n - i]) / (1 - k * k);
			}
			a = next;
		}
		return a[0] != 0;
	}
}
