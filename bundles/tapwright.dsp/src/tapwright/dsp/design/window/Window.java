// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import java.util.Arrays;

/**
 * A window function. Symmetric windows serve filter design; periodic ones, a symmetric window one sample longer without
 * its last sample, serve spectral analysis. Windows are scaled to 1 at the middle, except where a window says
 * otherwise. Immutable.
 */
public sealed interface Window
		permits CommonWindow, GaussianWindow, TukeyWindow, KaiserWindow, DolphChebyshevWindow, SlepianWindow {

	/** The longest window, in samples. */
	int LONGEST = 32_768;

	/**
	 * Samples w[0..length-1] with w[k] = w[length-1-k] exactly; the single sample 1 for length 1.
	 *
	 * @throws IllegalArgumentException
	 *             when the length is below 1 or above {@link #LONGEST}
	 */
	default double[] symmetric(int length) {
		if (length < 1 || length > LONGEST) {
			throw new IllegalArgumentException("a window of " + length
					+ " samples was asked for; the length must be between 1 and "
					+ LONGEST);
		}
		double[] window = new double[length];
		if (length == 1) {
			window[0] = 1;
			return window;
		}
		double[] half = firstHalf(length);
		for (int k = 0; k < half.length; k++) {
			window[k] = half[k];
			window[length - 1 - k] = half[k];
		}
		return window;
	}

	/**
	 * Samples of the window that repeats with period {@code length}.
	 *
	 * @throws IllegalArgumentException
	 *             when the length is below 1 or not below {@link #LONGEST}
	 */
	default double[] periodic(int length) {
		return length == 1 ? symmetric(1) : Arrays.copyOf(symmetric(length + 1), length);
	}

	/**
	 * The first half of a symmetric window, the middle sample included.
	 *
	 * @param length
	 *            of the whole window, at least 2
	 * @return {@code (length + 1) / 2} samples
	 */
	double[] firstHalf(int length);
}
