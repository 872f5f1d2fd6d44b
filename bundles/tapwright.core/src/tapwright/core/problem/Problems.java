// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.quantity.Parameters;
import tapwright.core.quantity.Words;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.InputProblem;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Severity;

/** Puts what was found into problems. */
public final class Problems {

	private static final int PLACE_DIGITS = 5;

	private Problems() {
	}

	/** What is not met in a filter, and what kept it from being verified. */
	public static List<Problem> of(FilterEvidence evidence) {
		var problems = new ArrayList<Problem>();
		for (InputProblem invalid : evidence.problems()) {
			problems.add(new Problem(ProblemKind.INVALID, Severity.MUST, evidence.name(), invalid.requirement(), invalid.describe(),
					location(invalid.requirement()), 0, Optional.empty()));
		}
		for (RequirementEvidence requirement : evidence.requirements()) {
			if (requirement.proof().verdict() != Verdict.MET) {
				problems.add(notMet(evidence.name(), requirement));
			}
		}
		if (evidence.requirements().isEmpty() && evidence.problems().isEmpty()) {
			problems.add(new Problem(ProblemKind.EMPTY, Severity.SHOULD, evidence.name(), "",
					"the filter has no requirements, so nothing is proven of it; state what it is meant to do", location(""), 0,
					Optional.empty()));
		}
		return problems;
	}

	/**
	 * A file that cannot be read.
	 *
	 * @param line
	 *            from 1; 0 when it is not known
	 */
	public static Problem unreadable(String reason, int line) {
		return new Problem(ProblemKind.UNREADABLE, Severity.MUST, "", "", "the file cannot be read: " + reason,
				line > 0 ? "line " + line : "file", line, Optional.empty());
	}

	/** Parameters that have no value. */
	public static List<Problem> of(Parameters parameters) {
		var problems = new ArrayList<Problem>();
		for (Map.Entry<String, InputException> problem : parameters.problems().entrySet()) {
			problems.add(new Problem(ProblemKind.PARAMETER, Severity.MUST, "", "", problem.getValue().describe(),
					"parameter " + problem.getKey(), 0, Optional.empty()));
		}
		return problems;
	}

	/**
	 * A filter that claims what another one has.
	 *
	 * @param what
	 *            'name' or 'identity'
	 * @param others
	 *            the other files
	 */
	static Problem duplicate(String filter, String what, List<String> others) {
		return new Problem(ProblemKind.DUPLICATE, Severity.MUST, filter, "",
				"the " + what + " of this filter is also that of " + String.join(", ", others) + "; give it one of its own", "filter", 0,
				Optional.empty());
	}

	private static Problem notMet(String filter, RequirementEvidence requirement) {
		ProblemKind kind = requirement.proof().verdict() == Verdict.MISSED ? ProblemKind.MISSED : ProblemKind.UNPROVEN;
		double worst = requirement.proof().worst();
		String place = Double.isNaN(worst) || requirement.placeUnit().isEmpty() ? ""
				: " at " + Words.of(worst, requirement.placeUnit(), PLACE_DIGITS);
		return new Problem(kind, requirement.severity(), filter, requirement.id(), requirement.message(),
				location(requirement.id()) + place, 0, Optional.of(requirement));
	}

	private static String location(String requirement) {
		return requirement.isEmpty() ? "filter" : "requirement " + requirement;
	}
}
