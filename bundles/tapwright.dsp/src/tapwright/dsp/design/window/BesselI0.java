// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/** The modified Bessel function of the first kind and order zero. */
final class BesselI0 {

	/** Above this argument the function comes too near to the largest double. */
	static final double LARGEST = 700;

	private BesselI0() {
	}

	/**
	 * I0(x) = sum over k of ((x/2)^k / k!)^2, summed as it stands: every term is positive, so nothing cancels. The term
	 * with the most weight is near k = x/2 and has collected three roundings per step, hence the relative error is
	 * below (2 |x| + 10) 2^-53.
	 *
	 * @param x
	 *            at most {@link #LARGEST} in magnitude
	 */
	static double of(double x) {
		double quarter = x * x / 4;
		double term = 1;
		double sum = 1;
		for (int k = 1; term > sum * 0x1p-56; k++) {
			term *= quarter / ((double) k * k);
			sum += term;
		}
		return sum;
	}
}
