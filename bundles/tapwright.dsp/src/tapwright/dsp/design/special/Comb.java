// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;

/**
 * Half the difference, or half the sum, of the newest sample and one a period ago: zeros at the multiples of 1 / period, or
 * half-way between them, and gain 1 between the zeros. Closed form.
 *
 * @param period
 *            in samples, at least 1
 * @param difference
 *            whether frequency 0 is a zero
 */
public record Comb(int period, boolean difference) implements ExactDesign {

	/** Checks the period. */
	public Comb {
		if (period < 1) {
			throw new IllegalArgumentException("a period of " + period + " samples; it must be at least 1");
		}
		ExactDesign.checkLength(period + 1L);
	}

	@Override
	public ExactTaps exact(Progress progress) {
		List<BigInteger> integers = new ArrayList<>(Collections.nCopies(period + 1, BigInteger.ZERO));
		integers.set(0, BigInteger.ONE);
		integers.set(period, difference ? BigInteger.ONE.negate() : BigInteger.ONE);
		return ExactTaps.ofIntegers(integers, new BigFraction(1, 2));
	}
}
