// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.Arrays;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * The magnitude at one frequency has exactly some value. Always decided, since a frequency over a sample rate is a
 * rational number. The proof's value is the gain as a plain number, its place the frequency in hertz.
 *
 * @param frequency
 *            in hertz, not negative
 * @param value
 *            magnitude as a plain number, exactly this double; not negative
 */
public record ExactGain(double frequency, double value) implements Requirement {

	/** Checks the numbers. */
	public ExactGain {
		Frequencies.check("the frequency of the exact gain", frequency);
		Exactly.checkLimit("the exact gain", value);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		Frequencies.checkBelowHalf("the frequency of the exact gain", frequency, subject.sampleRate());
		ExactTaps taps = subject.taps();
		BigFraction turns = LimitLine.turns(frequency, subject.sampleRate());
		if (UnitRoot.isRoot(difference(taps), turns)) {
			return new Proof(Verdict.MET, frequency, Enclosure.of(value), value, Enclosure.of(0), "");
		}
		Enclosure gain = GainAtFrequency.enclose(taps, turns);
		double low = Math.max(0, Math.max(gain.lo() - value, value - gain.hi()));
		double high = Math.max(gain.hi() - value, value - gain.lo());
		return new Proof(Verdict.MISSED, frequency, gain, value,
				new Enclosure(-Math.nextUp(high), Math.min(-Math.nextDown(low), -Double.MIN_VALUE)), "");
	}

	// |H|^2 less the squared value, over the squared unit, times x^(N-1) and a denominator: integers.
	private BigInteger[] difference(ExactTaps taps) {
		int n = taps.length();
		BigFraction square = Rationals.exact(value).divide(taps.unit()).pow(2);
		BigInteger[] sums = new BigInteger[2 * n - 1];
		Arrays.fill(sums, BigInteger.ZERO);
		for (int i = 0; i < n; i++) {
			for (int k = 0; k < n; k++) {
				sums[n - 1 + i - k] = sums[n - 1 + i - k].add(taps.integer(i).multiply(taps.integer(k)));
			}
		}
		for (int k = 0; k < sums.length; k++) {
			sums[k] = sums[k].multiply(square.getDenominator());
		}
		sums[n - 1] = sums[n - 1].subtract(square.getNumerator());
		return sums;
	}
}
