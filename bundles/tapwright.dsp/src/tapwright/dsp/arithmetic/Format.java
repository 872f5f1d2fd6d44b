// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** A finite set of rationals that numbers are stored in: {@link NumberFormat fixed} or {@link FloatFormat floating} point. */
public sealed interface Format permits NumberFormat, FloatFormat {

	/** Bits of the stored word. */
	int word();

	/** Smallest number of the format. */
	BigFraction minValue();

	/** Largest number of the format. */
	BigFraction maxValue();

	/** The number of the format that a value becomes, exactly. */
	BigFraction represent(BigFraction value, Rounding rounding, Overflow overflow);

	/**
	 * Each coefficient at the nearest number of the format, ties to even, limited to the range. Even or odd symmetry is kept; to
	 * keep the odd one, coefficients are limited to plus and minus the largest number.
	 *
	 * @param taps
	 *            coefficients of a filter
	 */
	ExactTaps nearest(ExactTaps taps);
}
