// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;

/**
 * Low-pass that is as flat as possible at both ends of the axis: with y = sin^2(pi f) the amplitude is
 * (1 - y)^zeros times the sum over l &lt; flatness of C(zeros - 1 + l, l) y^l. It falls monotonically from 1 to 0. Equal numbers give a
 * half-band filter. Source: O. Herrmann, On the approximation problem in nonrecursive digital filter design, IEEE Transactions on Circuit
 * Theory 18(3), 1971.
 *
 * @param flatness
 *            order of contact at frequency 0, in y; at least 1
 * @param zeros
 *            order of the zero at half the sample rate, in 1 - y; at least 1
 */
public record MaximallyFlat(int flatness, int zeros) implements ExactDesign {

	private static final int HIGHEST = 300;

	/** Checks the orders. */
	public MaximallyFlat {
		if (flatness < 1 || zeros < 1 || flatness + zeros > HIGHEST) {
			throw new IllegalArgumentException("orders " + flatness + " at 0 and " + zeros
					+ " at half the sample rate; each must be at least 1, and together at most " + HIGHEST);
		}
	}

	@Override
	public ExactTaps exact(Progress progress) {
		// y = (-z + 2 - 1/z) / 4 and 1 - y = (z + 2 + 1/z) / 4 as coefficient sets; Horner's scheme in y.
		ExactTaps y = quarter(-1, 2, -1);
		ExactTaps rest = quarter(1, 2, 1);
		BigInteger binomial = binomial(zeros + flatness - 2, flatness - 1);
		ExactTaps sum = ExactTaps.ofIntegers(List.of(binomial), BigFraction.ONE);
		for (int l = flatness - 2; l >= 0; l--) {
			progress.checkCancelled();
			sum = addToMiddle(sum.convolve(y), binomial(zeros - 1 + l, l));
		}
		for (int k = 0; k < zeros; k++) {
			progress.checkCancelled();
			sum = sum.convolve(rest);
		}
		return sum;
	}

	private static ExactTaps quarter(int... integers) {
		return ExactTaps.ofIntegers(Arrays.stream(integers).mapToObj(BigInteger::valueOf).toList(), new BigFraction(1, 4));
	}

	// The unit is a power of one quarter, so that its inverse is an integer.
	private static ExactTaps addToMiddle(ExactTaps taps, BigInteger value) {
		List<BigInteger> integers = new ArrayList<>(Collections.nCopies(taps.length(), BigInteger.ZERO));
		for (int k = 0; k < taps.length(); k++) {
			integers.set(k, taps.integer(k));
		}
		int middle = taps.length() / 2;
		integers.set(middle, integers.get(middle).add(value.multiply(taps.unit().getDenominator())));
		return ExactTaps.ofIntegers(integers, taps.unit());
	}

	private static BigInteger binomial(int n, int k) {
		BigInteger value = BigInteger.ONE;
		for (int j = 1; j <= k; j++) {
			value = value.multiply(BigInteger.valueOf(n - k + (long) j)).divide(BigInteger.valueOf(j));
		}
		return value;
	}
}
