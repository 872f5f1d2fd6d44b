// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * How much a filter can enlarge its input.
 *
 * @param absoluteSum
 *            sum of the sizes of all coefficients: the largest output for inputs between -1 and 1
 * @param energy
 *            sum of the squares of all coefficients: the output power for white noise of power 1
 */
public record Gains(BigFraction absoluteSum, BigFraction energy) {

	/** The gains of a filter. */
	public static Gains of(ExactTaps taps) {
		BigFraction sum = BigFraction.ZERO;
		BigFraction squares = BigFraction.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			sum = sum.add(taps.tap(k).abs());
			squares = squares.add(taps.tap(k).multiply(taps.tap(k)));
		}
		return new Gains(sum, squares);
	}

	/** Bits before the point that an output needs beyond those of the input, so that no bounded input overflows; at least 0. */
	public int guardBits() {
		int bits = 0;
		while (absoluteSum.compareTo(ExactTaps.powerOfTwo(bits)) > 0) {
			bits++;
		}
		return bits;
	}

	/**
	 * The largest factor on all coefficients for which no output exceeds the largest input.
	 *
	 * @throws ArithmeticException
	 *             when all coefficients are zero
	 */
	public BigFraction safeScale() {
		return absoluteSum.reciprocal();
	}
}
