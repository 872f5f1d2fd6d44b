// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * The Tukey window: flat with cosine tapers at both ends (J. W. Tukey, An introduction to the calculations of numerical
 * spectrum analysis, in Spectral Analysis of Time Series, 1967).
 *
 * @param taper
 *            share of the window that is tapered, 0 (rectangular) to 1 (Hann)
 */
public record TukeyWindow(double taper) implements Window {

	/** Checks the parameter. */
	public TukeyWindow {
		if (!(taper >= 0 && taper <= 1)) {
			throw new IllegalArgumentException("the tapered share of the Tukey window is " + taper
					+ "; it must be between 0 and 1");
		}
	}

	@Override
	public double[] firstHalf(int length) {
		double[] half = new double[(length + 1) / 2];
		double ramp = taper * (length - 1) / 2;
		for (int k = 0; k < half.length; k++) {
			half[k] = k < ramp ? 0.5 * (1 - Math.cos(Math.PI * k / ramp)) : 1;
		}
		return half;
	}
}
