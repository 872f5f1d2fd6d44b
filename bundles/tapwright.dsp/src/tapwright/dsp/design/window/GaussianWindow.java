// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * The Gaussian window exp(-(alpha t)^2 / 2) with t from -1 to 1 over the window (F. J. Harris, On the use of windows
 * for harmonic analysis with the discrete Fourier transform, Proceedings of the IEEE 66(1), 1978).
 *
 * @param alpha
 *            half the window's length in standard deviations, positive
 */
public record GaussianWindow(double alpha) implements Window {

	/** Checks the parameter. */
	public GaussianWindow {
		if (!(alpha > 0) || Double.isInfinite(alpha)) {
			throw new IllegalArgumentException("alpha of the Gaussian window is " + alpha
					+ "; it must be a positive number");
		}
	}

	@Override
	public double[] firstHalf(int length) {
		double[] half = new double[(length + 1) / 2];
		for (int k = 0; k < half.length; k++) {
			double t = alpha * (2.0 * k - (length - 1)) / (length - 1);
			half[k] = Math.exp(-t * t / 2);
		}
		return half;
	}
}
