// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/**
 * The step response exceeds its final value by no more than a part of it. The proof's unit is per cent of the final
 * value, its place a time in seconds.
 *
 * @param max
 *            largest overshoot in per cent, not negative
 */
public record StepOvershoot(double max) implements Requirement {

	/** Checks the limit. */
	public StepOvershoot {
		Exactly.checkLimit("the largest overshoot", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		StepResponse step = new StepResponse(subject.taps());
		int place = step.highest();
		return Exactly.atMost(step.error(place), max, Exactly.seconds(place, subject.sampleRate()), "");
	}
}
