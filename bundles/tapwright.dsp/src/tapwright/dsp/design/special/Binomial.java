// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;

/**
 * The mean of two samples, {@code order} times one after the other: binomial coefficients over 2^order. The amplitude is
 * cos(pi f)^order, so the response has neither ripple nor overshoot.
 *
 * @param order
 *            number of coefficients less one, not negative
 */
public record Binomial(int order) implements ExactDesign {

	/** Checks the order. */
	public Binomial {
		ExactDesign.checkLength(order + 1L);
	}

	@Override
	public ExactTaps exact(Progress progress) {
		List<BigInteger> row = new ArrayList<>(order + 1);
		BigInteger value = BigInteger.ONE;
		for (int k = 0; k <= order; k++) {
			row.add(value);
			value = value.multiply(BigInteger.valueOf(order - k)).divide(BigInteger.valueOf(k + 1L));
		}
		return ExactTaps.ofIntegers(row, ExactTaps.powerOfTwo(-order));
	}
}
