// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * The step response goes below zero by no more than a part of its final value. The proof's unit is per cent of the
 * final value, its place a time in seconds.
 *
 * @param max
 *            largest undershoot in per cent, not negative
 */
public record StepUndershoot(double max) implements Requirement {

	/** Checks the limit. */
	public StepUndershoot {
		Exactly.checkLimit("the largest undershoot", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		StepResponse step = new StepResponse(subject.taps());
		int place = step.lowest();
		BigFraction below = step.error(place).add(100).negate();
		// Before the step the response is zero.
		return Exactly.atMost(below.compareTo(BigFraction.ZERO) < 0 ? BigFraction.ZERO : below, max,
				Exactly.seconds(place, subject.sampleRate()), "");
	}
}
