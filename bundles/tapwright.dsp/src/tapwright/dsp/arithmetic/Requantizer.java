// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * The passage of a number from one step size to another: rounding, then overflow.
 *
 * @param ratio
 *            step before divided by step after; positive
 * @param rounding
 *            used when the step gets coarser
 * @param range
 *            the format to stay within, if any
 * @param overflow
 *            used at the ends of the range
 */
public record Requantizer(BigFraction ratio, Rounding rounding, Optional<NumberFormat> range, Overflow overflow) {

	/** Converts an integer number of steps. */
	public BigInteger apply(BigInteger steps) {
		BigInteger rounded = round(steps);
		return range.isPresent() ? range.get().fit(rounded, overflow) : rounded;
	}

	/** Converts an integer number of steps without regard to the range. */
	public BigInteger round(BigInteger steps) {
		BigInteger scaled = steps.multiply(ratio.getNumerator());
		return isExact() ? scaled : rounding.divide(scaled, ratio.getDenominator());
	}

	/** Whether no number is ever rounded. */
	public boolean isExact() {
		return ratio.getDenominator().equals(BigInteger.ONE);
	}

	/**
	 * Bits to shift right by (left when negative) for the same effect as the ratio.
	 *
	 * @return nothing when the ratio is no power of two
	 */
	public Optional<Integer> shift() {
		BigInteger numerator = ratio.getNumerator();
		BigInteger denominator = ratio.getDenominator();
		boolean power = numerator.bitCount() == 1 && denominator.bitCount() == 1;
		return power ? Optional.of(denominator.bitLength() - numerator.bitLength()) : Optional.empty();
	}
}
