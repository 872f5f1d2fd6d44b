// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/**
 * The gain at one frequency is exactly zero. Always decided, since a frequency over a sample rate is a rational
 * number. The proof's value is the gain as a plain number, its place the frequency in hertz.
 *
 * @param frequency
 *            in hertz, not negative
 */
public record Null(double frequency) implements Requirement {

	/** Checks the frequency. */
	public Null {
		Frequencies.check("the frequency of the null", frequency);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		Frequencies.checkBelowHalf("the frequency of the null", frequency, subject.sampleRate());
		ExactTaps taps = subject.taps();
		BigFraction turns = LimitLine.turns(frequency, subject.sampleRate());
		BigInteger[] integers = new BigInteger[taps.length()];
		for (int k = 0; k < integers.length; k++) {
			integers[k] = taps.integer(k);
		}
		if (UnitRoot.isRoot(integers, turns)) {
			return new Proof(Verdict.MET, frequency, Enclosure.of(0), 0, Enclosure.of(0), "");
		}
		Enclosure gain = GainAtFrequency.enclose(taps, turns);
		return new Proof(Verdict.MISSED, frequency, gain, 0, new Enclosure(-gain.hi(), Math.min(-gain.lo(),
				-Double.MIN_VALUE)), "");
	}
}
