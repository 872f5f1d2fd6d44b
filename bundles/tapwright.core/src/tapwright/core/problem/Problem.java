// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.Objects;
import java.util.Optional;

import tapwright.core.verify.RequirementEvidence;
import tapwright.model.Severity;

/**
 * One problem. Immutable.
 *
 * @param kind
 *            what it is
 * @param severity
 *            how grave: that of the requirement where there is one
 * @param filter
 *            name of the filter; empty when it concerns none
 * @param requirement
 *            id of the requirement; empty when it concerns none
 * @param message
 *            what is wrong, by how much, and what to do
 * @param location
 *            where in the file, for a person
 * @param line
 *            from 1; 0 when the place is not a line
 * @param evidence
 *            the numbers, for missed and unproven requirements
 */
public record Problem(ProblemKind kind, Severity severity, String filter, String requirement, String message, String location,
		int line, Optional<RequirementEvidence> evidence) {

	/** Checks that nothing is missing. */
	public Problem {
		Objects.requireNonNull(kind);
		Objects.requireNonNull(severity);
		Objects.requireNonNull(filter);
		Objects.requireNonNull(requirement);
		Objects.requireNonNull(message);
		Objects.requireNonNull(location);
		Objects.requireNonNull(evidence);
	}
}
