// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.proof;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.Partners;
import tapwright.core.verify.RequirementKind;
import tapwright.core.verify.RequirementKinds;
import tapwright.dsp.verify.Subject;
import tapwright.model.Filter;
import tapwright.model.Requirement;

/**
 * A filter at one moment: what is asked of it, and what pictures need. Taken on the thread that owns the model; immutable.
 *
 * @param question
 *            the questions to be answered
 * @param statements
 *            by id, the statements that make sense
 */
public record FilterSnapshot(FilterQuestion question, Map<String, tapwright.dsp.verify.Requirement> statements) {

	/** Takes the snapshot of a filter with the given parameters and partners. */
	public static FilterSnapshot of(Filter filter, Expression.Names parameters, Partners partners) {
		var numbers = new Numbers(parameters);
		Map<String, tapwright.dsp.verify.Requirement> statements = new LinkedHashMap<>();
		for (Requirement requirement : filter.getRequirements()) {
			statement(requirement, numbers, partners).ifPresent(statement -> statements.put(requirement.getId(), statement));
		}
		return new FilterSnapshot(FilterQuestion.of(filter, parameters, partners), Collections.unmodifiableMap(statements));
	}

	/** Name of the filter. */
	public String name() {
		return question.name();
	}

	/** The numbers that ship; nothing when there are none. */
	public Optional<Subject> subject() {
		return question.subject();
	}

	// What makes no sense is reported by the question; here it only leaves no trace in the picture.
	private static <T extends Requirement> Optional<tapwright.dsp.verify.Requirement> statement(T requirement, Numbers numbers,
			Partners partners) {
		try {
			RequirementKind<T> kind = RequirementKinds.of(requirement);
			return Optional.of(kind.statement(requirement, numbers, partners));
		} catch (InputException | IllegalArgumentException e) {
			return Optional.empty();
		}
	}
}
