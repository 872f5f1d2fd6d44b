// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * From some time on the impulse response stays below a part of its largest magnitude. The proof's unit is per cent of
 * the largest magnitude, its place a time in seconds.
 *
 * @param after
 *            start of the tail in seconds, included; not negative
 * @param max
 *            largest magnitude in the tail, in per cent of the largest of all, not negative
 */
public record ImpulseTail(double after, double max) implements Requirement {

	/** Checks the limits. */
	public ImpulseTail {
		Exactly.checkLimit("the start of the tail", after);
		Exactly.checkLimit("the largest magnitude in the tail", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		ExactTaps taps = subject.taps();
		BigFraction start = Rationals.exact(after).multiply(Rationals.exact(subject.sampleRate()));
		BigInteger peak = BigInteger.ZERO;
		BigInteger tail = BigInteger.ZERO;
		int place = taps.length();
		for (int k = 0; k < taps.length(); k++) {
			BigInteger size = taps.integer(k).abs();
			peak = peak.max(size);
			if (size.compareTo(tail) > 0 && start.compareTo(new BigFraction(k)) <= 0) {
				tail = size;
				place = k;
			}
		}
		BigFraction part = peak.signum() == 0 ? BigFraction.ZERO
				: new BigFraction(tail.multiply(BigInteger.valueOf(100)), peak);
		return Exactly.atMost(part, max, Exactly.seconds(place, subject.sampleRate()), "");
	}
}
