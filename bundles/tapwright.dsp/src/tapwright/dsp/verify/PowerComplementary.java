// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/**
 * The squared gains of this filter and of a partner at the same sample rate add up to one, within a tolerance in dB
 * (of power) at every frequency. The proof's value is the sum in dB, its place a frequency in hertz.
 * <p>
 * The sum of squared gains is the amplitude of symmetric coefficients: the sum of the two autocorrelations. So this
 * is a gain limit, with twice the decibels, on those.
 *
 * @param partner
 *            coefficients of the other filter
 * @param max
 *            largest deviation from 0 dB, not negative
 */
public record PowerComplementary(ExactTaps partner, double max) implements Requirement {

	/** Checks the limit. */
	public PowerComplementary {
		Objects.requireNonNull(partner);
		Exactly.checkLimit("the largest deviation of the power sum", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		double half = subject.sampleRate() / 2;
		Subject sum = new Subject(sum(subject.taps(), partner), subject.sampleRate());
		Proof proof = GainLimit.between(0, half, -2 * max, 2 * max).prove(sum, effort);
		return new Proof(proof.verdict(), proof.worst(), halved(proof.value()), proof.limit() / 2,
				halved(proof.margin()),
				proof.note());
	}

	private static Enclosure halved(Enclosure decibels) {
		return new Enclosure(decibels.lo() / 2, decibels.hi() / 2);
	}

	private static ExactTaps sum(ExactTaps a, ExactTaps b) {
		BigFraction first = a.unit().pow(2);
		BigFraction second = b.unit().pow(2);
		BigInteger firstFactor = first.getNumerator().multiply(second.getDenominator());
		BigInteger secondFactor = second.getNumerator().multiply(first.getDenominator());
		int reach = Math.max(a.length(), b.length()) - 1;
		List<BigInteger> symmetric = new ArrayList<>();
		for (int lag = -reach; lag <= reach; lag++) {
			symmetric.add(correlation(a, Math.abs(lag)).multiply(firstFactor)
					.add(correlation(b, Math.abs(lag)).multiply(secondFactor)));
		}
		return ExactTaps.ofIntegers(symmetric,
				new BigFraction(BigInteger.ONE, first.getDenominator().multiply(second.getDenominator())));
	}

	private static BigInteger correlation(ExactTaps taps, int lag) {
		BigInteger sum = BigInteger.ZERO;
		for (int k = 0; k + lag < taps.length(); k++) {
			sum = sum.add(taps.integer(k).multiply(taps.integer(k + lag)));
		}
		return sum;
	}
}
