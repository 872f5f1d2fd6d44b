// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Symmetry;

/**
 * The real amplitude of symmetric or antisymmetric coefficients is nowhere negative. The proof's value is the
 * smallest amplitude, its place a frequency in hertz. Coefficients without symmetry have no real amplitude and miss
 * the requirement.
 */
public record NonNegativeAmplitude() implements Requirement {

	@Override
	public Proof prove(Subject subject, Effort effort) {
		if (subject.taps().symmetry() == Symmetry.NONE) {
			return new Proof(Verdict.MISSED, Double.NaN, new Enclosure(Double.NEGATIVE_INFINITY,
					Double.POSITIVE_INFINITY), 0,
					new Enclosure(Double.NEGATIVE_INFINITY, -Double.MIN_VALUE),
					"The coefficients are not symmetric, so there is no real amplitude.");
		}
		Patience patience = new Patience(effort);
		AmplitudeMinimum minimum = AmplitudeMinimum.over(subject.taps(), BigFraction.ZERO, BigFraction.ONE_HALF,
				patience);
		String note = minimum.verdict() != Verdict.UNPROVEN ? ""
				: patience.wasOver() ? "The time limit of the proof ended before it was decided."
						: "The smallest amplitude is closer to zero than 1e-25 of the sum of absolute coefficients.";
		return new Proof(minimum.verdict(), Frequencies.hertz(minimum.place(), subject.sampleRate()), minimum.least(),
				0,
				minimum.least(), note);
	}
}
