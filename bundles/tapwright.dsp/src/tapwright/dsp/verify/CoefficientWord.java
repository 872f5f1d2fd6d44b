// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * The coefficients, as integers times one common scale, fit a two's complement word of some length. Factors of two
 * that all integers share count as part of the scale. The proof's unit is bits, its place the index of the
 * coefficient that needs most.
 *
 * @param max
 *            longest word in bits, at least 1
 */
public record CoefficientWord(int max) implements Requirement {

	/** Checks the limit. */
	public CoefficientWord {
		if (max < 1) {
			throw new IllegalArgumentException("a coefficient word of " + max + " bits; it must have at least 1");
		}
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		ExactTaps taps = subject.taps();
		int shared = Integer.MAX_VALUE;
		for (int k = 0; k < taps.length(); k++) {
			BigInteger integer = taps.integer(k);
			shared = integer.signum() == 0 ? shared : Math.min(shared, integer.getLowestSetBit());
		}
		int bits = 1;
		int place = 0;
		for (int k = 0; k < taps.length(); k++) {
			BigInteger integer = taps.integer(k);
			int needed = integer.signum() == 0 ? 1 : integer.shiftRight(shared).bitLength() + 1;
			if (needed > bits) {
				bits = needed;
				place = k;
			}
		}
		return Exactly.atMost(new BigFraction(bits), max, place, "");
	}
}
