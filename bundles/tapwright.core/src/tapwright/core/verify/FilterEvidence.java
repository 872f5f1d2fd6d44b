// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.List;
import java.util.Optional;

import tapwright.dsp.verify.Verdict;

/**
 * The results of verifying one filter. Immutable.
 *
 * @param name
 *            of the filter
 * @param hash
 *            SHA-256 of all that the results depend on, in hexadecimal digits
 * @param requirements
 *            one for each requirement that could be put to the proof, in the order of the filter
 * @param problems
 *            what kept requirements, or the filter, from being verified
 */
public record FilterEvidence(String name, String hash, List<RequirementEvidence> requirements, List<InputProblem> problems) {

	/** Takes copies. */
	public FilterEvidence {
		requirements = List.copyOf(requirements);
		problems = List.copyOf(problems);
	}

	/**
	 * Missed when any requirement is missed; met when there are requirements and all are met; otherwise unproven.
	 */
	public Verdict verdict() {
		if (any(Verdict.MISSED)) {
			return Verdict.MISSED;
		}
		return any(Verdict.UNPROVEN) || !problems.isEmpty() || requirements.isEmpty() ? Verdict.UNPROVEN : Verdict.MET;
	}

	/** The requirement with the given id. */
	public Optional<RequirementEvidence> find(String id) {
		return requirements.stream().filter(requirement -> requirement.id().equals(id)).findFirst();
	}

	private boolean any(Verdict verdict) {
		return requirements.stream().anyMatch(requirement -> requirement.proof().verdict() == verdict);
	}
}
