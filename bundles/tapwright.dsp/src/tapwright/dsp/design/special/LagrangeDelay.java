// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * A delay by any number of samples by interpolation with a polynomial, maximally flat at frequency 0: h[k] is the product over j != k of
 * (delay - j) / (k - j). Source: T. I. Laakso, V. Valimaki, M. Karjalainen and U. K. Laine, Splitting the unit delay, IEEE Signal Processing
 * Magazine 13(1), 1996.
 *
 * @param order
 *            of the polynomial: number of coefficients less one
 * @param delay
 *            in samples, 0 to {@code order}; best within half a sample of order / 2
 */
public record LagrangeDelay(int order, double delay) implements ExactDesign {

	private static final int HIGHEST = 100;

	/** Checks the numbers. */
	public LagrangeDelay {
		if (order < 0 || order > HIGHEST) {
			throw new IllegalArgumentException("an interpolation of order " + order + "; it must be 0 to " + HIGHEST);
		}
		if (!(delay >= 0 && delay <= order)) {
			throw new IllegalArgumentException("a delay of " + delay + " samples; order " + order + " allows 0 to " + order);
		}
	}

	@Override
	public ExactTaps exact(Progress progress) {
		BigFraction d = Rationals.exact(delay);
		List<BigFraction> values = new ArrayList<>();
		BigInteger denominator = BigInteger.ONE;
		for (int k = 0; k <= order; k++) {
			progress.checkCancelled();
			BigFraction value = BigFraction.ONE;
			for (int j = 0; j <= order; j++) {
				if (j != k) {
					value = value.multiply(d.subtract(j)).divide(k - j);
				}
			}
			values.add(value);
			denominator = denominator.divide(denominator.gcd(value.getDenominator())).multiply(value.getDenominator());
		}
		BigInteger common = denominator;
		return ExactTaps.ofIntegers(
				values.stream().map(value -> value.getNumerator().multiply(common.divide(value.getDenominator()))).toList(),
				new BigFraction(BigInteger.ONE, common));
	}
}
