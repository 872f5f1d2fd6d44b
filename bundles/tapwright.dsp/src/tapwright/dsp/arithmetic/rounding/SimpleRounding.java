// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.exact.Symmetry;

/** Roundings that are written down at once. */
final class SimpleRounding {

	private static final int GAINS = 200;

	private SimpleRounding() {
	}

	/** Gains evenly spread over the logarithm from -3 to 3 dB. */
	static void gains(RoundingTask task, Best best) {
		for (int n = 0; n <= GAINS && !best.isOver(); n++) {
			BigFraction gain = Rationals.exact(Math.pow(2, (n - GAINS / 2) / (double) GAINS));
			ExactTaps scaled = ExactTaps.ofIntegers(integers(task.ideal()), task.ideal().unit().multiply(gain));
			best.offer(task.format().nearest(scaled));
		}
	}

	/**
	 * Noise-shaped rounding from the ends to the middle and from the middle to the ends, with the error added (its spectrum has a
	 * zero at frequency 0) or subtracted (at half the sample rate).
	 * <p>
	 * Source: the error feedback of H. A. Spang and P. M. Schultheiss, Reduction of quantizing noise by use of feedback, IRE
	 * Transactions on Communications Systems 10(4), 1962, with coefficients in place of samples.
	 */
	static void errorFeedback(RoundingTask task, Best best) {
		for (int sign = -1; sign <= 1; sign += 2) {
			for (boolean outwards : new boolean[] { false, true }) {
				if (!best.isOver()) {
					best.offer(fedBack(task.ideal(), task.format(), sign, outwards));
				}
			}
		}
	}

	private static ExactTaps fedBack(ExactTaps ideal, NumberFormat format, int sign, boolean outwards) {
		int length = ideal.length();
		Symmetry symmetry = ideal.symmetry();
		int count = symmetry == Symmetry.NONE ? length : (length + 1) / 2;
		BigInteger[] steps = new BigInteger[length];
		BigFraction error = BigFraction.ZERO;
		for (int n = 0; n < count; n++) {
			int k = outwards ? count - 1 - n : n;
			BigFraction wanted = ideal.tap(k).add(error.multiply(sign));
			// The middle of an odd-symmetric set stays zero.
			boolean zero = symmetry == Symmetry.ODD && 2 * k == length - 1;
			steps[k] = zero ? BigInteger.ZERO : format.steps(wanted, Rounding.HALF_EVEN);
			error = wanted.subtract(format.value(steps[k]));
			if (symmetry != Symmetry.NONE) {
				steps[length - 1 - k] = symmetry == Symmetry.ODD ? steps[k].negate() : steps[k];
			}
		}
		return ExactTaps.ofIntegers(List.of(steps), format.step());
	}

	private static List<BigInteger> integers(ExactTaps taps) {
		List<BigInteger> integers = new ArrayList<>();
		for (int k = 0; k < taps.length(); k++) {
			integers.add(taps.integer(k));
		}
		return integers;
	}
}
