// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

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
public record NumberFormat(int word, int fraction, boolean signed) {

	/** Longest word. */
	public static final int MAX_WORD = 128;

	/** Checks the sizes. */
	public NumberFormat {
		if (word < 1 || word > MAX_WORD) {
			throw new IllegalArgumentException("a word of " + word + " bits; it must have 1 to " + MAX_WORD);
		}
		if (Math.abs(fraction) > 1000) {
			throw new IllegalArgumentException(fraction + " fraction bits; there must be -1000 to 1000");
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
}
