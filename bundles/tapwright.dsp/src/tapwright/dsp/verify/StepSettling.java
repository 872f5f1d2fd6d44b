// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Rationals;

/**
 * After some time the step response stays within a tolerance of its final value. The proof's value is the time of the
 * first sample from which on it does, in seconds after the sample in which the step comes; its place is the same
 * time.
 *
 * @param within
 *            tolerance in per cent of the final value, not negative
 * @param max
 *            longest settling time in seconds, not negative
 */
public record StepSettling(double within, double max) implements Requirement {

	/** Checks the limits. */
	public StepSettling {
		Exactly.checkLimit("the settling tolerance", within);
		Exactly.checkLimit("the longest settling time", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		StepResponse step = new StepResponse(subject.taps());
		BigFraction tolerance = Rationals.exact(within);
		int first = step.length() - 1;
		while (first > 0 && step.error(first - 1).abs().compareTo(tolerance) <= 0) {
			first--;
		}
		return Exactly.atMost(Exactly.seconds(new BigFraction(first), subject.sampleRate()), max,
				Exactly.seconds(first, subject.sampleRate()), "");
	}
}
