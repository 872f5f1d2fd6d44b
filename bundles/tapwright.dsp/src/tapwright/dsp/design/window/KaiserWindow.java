// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * The Kaiser window I0(beta sqrt(1 - t^2)) / I0(beta) with t from -1 to 1 over the window (J. F. Kaiser, Nonrecursive
 * digital filter design using the I0-sinh window function, Proceedings of the IEEE International Symposium on Circuits
 * and Systems, 1974).
 *
 * @param beta
 *            0 (rectangular) to 700; larger means lower side lobes and a wider main lobe
 */
public record KaiserWindow(double beta) implements Window {

	/** Checks the parameter. */
	public KaiserWindow {
		if (!(beta >= 0 && beta <= BesselI0.LARGEST)) {
			throw new IllegalArgumentException("beta of the Kaiser window is " + beta + "; it must be between 0 and "
					+ BesselI0.LARGEST);
		}
	}

	@Override
	public double[] firstHalf(int length) {
		double[] half = new double[(length + 1) / 2];
		double top = BesselI0.of(beta);
		double span = length - 1;
		for (int k = 0; k < half.length; k++) {
			// 1 - t^2 = 4 k (span - k) / span^2 without cancellation.
			half[k] = BesselI0.of(beta * 2 * Math.sqrt(k * (span - k)) / span) / top;
		}
		return half;
	}
}
