// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.Collections;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;

/**
 * The mean of the last samples, once or several times one after the other. Its gain is 1 at frequency 0 and 0 at the multiples of
 * 1 / length. Several times, it is the response of a cascaded integrator-comb decimator (E. B. Hogenauer, An economical class of digital
 * filters for decimation and interpolation, IEEE Transactions on Acoustics, Speech, and Signal Processing 29(2), 1981).
 *
 * @param length
 *            samples of one mean
 * @param sections
 *            how many means follow each other, at least 1
 */
public record MovingAverage(int length, int sections) implements ExactDesign {

	private static final int MOST_SECTIONS = 64;

	/** Checks the numbers. */
	public MovingAverage {
		if (length < 1) {
			throw new IllegalArgumentException("a mean of " + length + " samples; it needs at least 1");
		}
		if (sections < 1 || sections > MOST_SECTIONS) {
			throw new IllegalArgumentException(sections + " sections; there must be 1 to " + MOST_SECTIONS);
		}
		ExactDesign.checkLength((length - 1L) * sections + 1);
	}

	@Override
	public ExactTaps exact(Progress progress) {
		ExactTaps mean = ExactTaps.ofIntegers(Collections.nCopies(length, BigInteger.ONE), new BigFraction(1, length));
		ExactTaps taps = mean;
		for (int k = 1; k < sections; k++) {
			progress.checkCancelled();
			taps = taps.convolve(mean);
		}
		return taps;
	}
}
