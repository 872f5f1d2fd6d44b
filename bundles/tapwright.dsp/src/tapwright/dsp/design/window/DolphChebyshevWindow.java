// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * The Dolph-Chebyshev window: the narrowest main lobe for side lobes that are all equally high (C. L. Dolph, A current
 * distribution for broadside arrays which optimizes the relationship between beam width and side-lobe level,
 * Proceedings of the IRE 34(6), 1946). Scaled so that its largest sample is 1, which may be the first and last one at
 * low attenuation.
 *
 * @param attenuation
 *            of the side lobes below the main lobe in dB, above 0, at most 300
 */
public record DolphChebyshevWindow(double attenuation) implements Window {

	/** Checks the parameter. */
	public DolphChebyshevWindow {
		if (!(attenuation > 0 && attenuation <= 300)) {
			throw new IllegalArgumentException("the side-lobe attenuation of the Dolph-Chebyshev window is "
					+ attenuation
					+ " dB; it must be above 0 and at most 300 dB");
		}
	}

	@Override
	public double[] firstHalf(int length) {
		int order = length - 1;
		double ratio = Math.pow(10, attenuation / 20);
		double x0 = Math.cosh(acosh(ratio) / order);
		// The amplitude T_order(x0 cos(pi k / length)) at the DFT frequencies, real because of the symmetry.
		double[] amplitude = new double[(length + 1) / 2];
		for (int k = 0; k < amplitude.length; k++) {
			amplitude[k] = chebyshev(order, x0 * Math.cos(Math.PI * k / length));
		}
		double[] cosines = new double[2 * length];
		for (int k = 0; k < cosines.length; k++) {
			cosines[k] = Math.cos(Math.PI * k / length);
		}
		double[] half = new double[(length + 1) / 2];
		double largest = 0;
		for (int n = 0; n < half.length; n++) {
			// Twice the distance to the middle is a whole number: the angle is 2 pi k (middle - n) / length.
			long step = order - 2L * n;
			double sum = amplitude[0];
			for (int k = 1; k < amplitude.length; k++) {
				sum += 2 * amplitude[k] * cosines[(int) (k * step % (2 * length))];
			}
			half[n] = sum;
			largest = Math.max(largest, Math.abs(sum));
		}
		for (int n = 0; n < half.length; n++) {
			half[n] /= largest;
		}
		return half;
	}

	private static double acosh(double x) {
		return Math.log(x + Math.sqrt((x - 1) * (x + 1)));
	}

	// Arguments are never negative here.
	private static double chebyshev(int order, double x) {
		return x <= 1 ? Math.cos(order * Math.acos(x)) : Math.cosh(order * acosh(x));
	}
}
