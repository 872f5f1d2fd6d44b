// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * The delay of the filter as a whole stays within limits: (N-1)/2 samples for symmetric or antisymmetric
 * coefficients, otherwise the group delay at 0 Hz, sum of k h[k] over sum of h[k]. In seconds; the proof has no
 * place.
 *
 * @param min
 *            shortest delay in seconds, negative infinity for none
 * @param max
 *            longest delay in seconds, infinity for none
 */
public record BulkDelay(double min, double max) implements Requirement {

	/** Checks the limits. */
	public BulkDelay {
		if (!(min <= max)) {
			throw new IllegalArgumentException("the delay limits " + min + " and " + max
					+ " s leave nothing between them");
		}
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		return Exactly.between(Exactly.seconds(samples(subject.taps()), subject.sampleRate()), min, max, Double.NaN,
				"");
	}

	private static BigFraction samples(ExactTaps taps) {
		if (taps.symmetry() != Symmetry.NONE) {
			return new BigFraction(taps.length() - 1, 2);
		}
		BigInteger sum = BigInteger.ZERO;
		BigInteger moment = BigInteger.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			sum = sum.add(taps.integer(k));
			moment = moment.add(taps.integer(k).multiply(BigInteger.valueOf(k)));
		}
		if (sum.signum() == 0) {
			throw new IllegalArgumentException("the gain at 0 Hz is zero and the coefficients are not symmetric, "
					+ "so the filter has no "
					+ "bulk delay; limit the group delay over a band instead");
		}
		return new BigFraction(moment, sum);
	}
}
