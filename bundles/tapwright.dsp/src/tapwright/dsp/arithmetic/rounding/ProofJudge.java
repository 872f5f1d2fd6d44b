// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Requirement;
import tapwright.dsp.verify.Subject;
import tapwright.dsp.verify.Verdict;

/**
 * Judges coefficients by proofs of requirements. The loss is the least margin with its sign changed, so that it is not positive
 * where all requirements are met; margins count in their own units.
 *
 * @param requirements
 *            at least one
 * @param sampleRate
 *            hertz
 * @param arithmetic
 *            what the filter runs in, if that is stated; its coefficient format is left to the rounding
 * @param effort
 *            for each proof
 */
public record ProofJudge(List<Requirement> requirements, double sampleRate, Optional<Arithmetic> arithmetic, Effort effort)
		implements Judge {

	/** Checks that there is something to prove. */
	public ProofJudge {
		requirements = List.copyOf(requirements);
		Objects.requireNonNull(arithmetic);
		Objects.requireNonNull(effort);
		if (requirements.isEmpty()) {
			throw new IllegalArgumentException("there is no requirement to judge by; add at least one");
		}
	}

	/**
	 * {@inheritDoc} Infinite when a margin is not known.
	 */
	@Override
	public double loss(ExactTaps taps) {
		double loss = Double.NEGATIVE_INFINITY;
		for (Requirement requirement : requirements) {
			double margin = prove(requirement, taps).margin().lo();
			loss = Math.max(loss, Double.isNaN(margin) ? Double.POSITIVE_INFINITY : -margin);
		}
		return loss;
	}

	/** Whether every requirement is proven to be met. */
	public boolean isMet(ExactTaps taps) {
		for (Requirement requirement : requirements) {
			if (prove(requirement, taps).verdict() != Verdict.MET) {
				return false;
			}
		}
		return true;
	}

	private Proof prove(Requirement requirement, ExactTaps taps) {
		return requirement.prove(new Subject(taps, sampleRate, arithmetic), effort);
	}
}
