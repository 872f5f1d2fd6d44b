// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * A binary fixed-point format: an integer of {@code word} bits, two's complement when signed, times 2^-fraction. The terms are
 * those of ISO/IEC TR 18037:2008, clause 4.
 *
 * @param word
 *            bits in all, 1 to 128
 * @param fraction
 *            bits after the binary point; may be negative or larger than the word
 * @param signed
 *            two's complement, otherwise unsigned
 */
public record NumberFormat(int word, int fraction, boolean signed) implements Format {

	/** Longest word. */
	public static final int MAX_WORD = 128;

	/** Most bits before or after the binary point. */
	public static final int MAX_FRACTION = 1000;

	/** Checks the sizes. */
	public NumberFormat {
		if (word < 1 || word > MAX_WORD) {
			throw new IllegalArgumentException("a word of " + word + " bits; it must have 1 to " + MAX_WORD);
		}
		if (Math.abs(fraction) > MAX_FRACTION) {
			throw new IllegalArgumentException(
					fraction + " fraction bits; there must be -" + MAX_FRACTION + " to " + MAX_FRACTION);
		}
	}

	/** A signed format. */
	public NumberFormat(int word, int fraction) {
		this(word, fraction, true);
	}

	/** Smallest integer of the format. */
	public BigInteger min() {
		return signed ? BigInteger.ONE.shiftLeft(word - 1).negate() : BigInteger.ZERO;
	}

	/** Largest integer of the format. */
	public BigInteger max() {
		return BigInteger.ONE.shiftLeft(signed ? word - 1 : word).subtract(BigInteger.ONE);
	}

	/** What one step is worth: 2^-fraction. */
	public BigFraction step() {
		return ExactTaps.powerOfTwo(-fraction);
	}

	@Override
	public BigFraction minValue() {
		return value(min());
	}

	@Override
	public BigFraction maxValue() {
		return value(max());
	}

	/** What an integer of this format is worth. */
	public BigFraction value(BigInteger integer) {
		return step().multiply(integer);
	}

	/** Whether the integer lies in the range of the word. */
	public boolean contains(BigInteger integer) {
		return integer.compareTo(min()) >= 0 && integer.compareTo(max()) <= 0;
	}

	/** Brings an integer into the range of the word. */
	public BigInteger fit(BigInteger integer, Overflow overflow) {
		if (contains(integer)) {
			return integer;
		}
		return switch (overflow) {
		case SATURATE -> integer.signum() < 0 ? min() : max();
		case WRAP -> {
			BigInteger bits = integer.mod(BigInteger.ONE.shiftLeft(word));
			yield signed && bits.testBit(word - 1) ? bits.subtract(BigInteger.ONE.shiftLeft(word)) : bits;
		}
		};
	}

	/** The integer that stands for the value: first rounded to a step, then brought into the range. */
	public BigInteger quantize(BigFraction value, Rounding rounding, Overflow overflow) {
		return fit(steps(value, rounding), overflow);
	}

	/** The value rounded to whole steps, without limit to the range. */
	public BigInteger steps(BigFraction value, Rounding rounding) {
		BigInteger numerator = value.getNumerator();
		BigInteger denominator = value.getDenominator();
		return fraction >= 0 ? rounding.divide(numerator.shiftLeft(fraction), denominator)
				: rounding.divide(numerator, denominator.shiftLeft(-fraction));
	}

	@Override
	public BigFraction represent(BigFraction value, Rounding rounding, Overflow overflow) {
		return value(quantize(value, rounding, overflow));
	}

	@Override
	public ExactTaps nearest(ExactTaps taps) {
		BigInteger lowest = signed && taps.symmetry() == Symmetry.ODD ? max().negate() : min();
		List<BigInteger> integers = new ArrayList<>(taps.length());
		for (int k = 0; k < taps.length(); k++) {
			integers.add(quantize(taps.tap(k), Rounding.HALF_EVEN, Overflow.SATURATE).max(lowest));
		}
		return ExactTaps.ofIntegers(integers, step());
	}

	/**
	 * Whether every coefficient is a number of this format: an integer number of steps within the range.
	 *
	 * @param taps
	 *            coefficients of a filter
	 */
	public boolean contains(ExactTaps taps) {
		for (int k = 0; k < taps.length(); k++) {
			BigFraction tap = taps.tap(k);
			if (!represent(tap, Rounding.FLOOR, Overflow.SATURATE).equals(tap)) {
				return false;
			}
		}
		return true;
	}

	/** The format as a person writes it, for instance "16 bits, 15 after the point". */
	public String text() {
		return (signed ? "" : "unsigned ") + word + " bits, " + fraction + " after the point";
	}
}
