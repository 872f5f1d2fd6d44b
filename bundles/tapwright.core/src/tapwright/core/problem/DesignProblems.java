// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.design.Designer;
import tapwright.core.quantity.Expression;
import tapwright.model.Filter;
import tapwright.model.Severity;

/** Finds coefficients that the stated design does not stand behind. */
public final class DesignProblems {

	private DesignProblems() {
	}

	/**
	 * The problem when the design, or a number that it uses, changed after it computed the coefficients, or when it never ran. A
	 * design whose numbers make no sense is a problem, too: it can never run. A filter without a design, or whose coefficients
	 * are given, has none.
	 */
	public static List<Problem> of(Filter filter, String name, Expression.Names parameters) {
		try {
			return Designer.of(filter, parameters).flatMap(designer -> stale(filter, designer))
					.map(message -> List.of(problem(ProblemKind.STALE, name, message))).orElse(List.of());
		} catch (InputException e) {
			return List.of(problem(ProblemKind.STALE, name, "the design cannot run as it is stated: " + e.describe()));
		}
	}

	private static Optional<String> stale(Filter filter, Designer designer) {
		if (filter.getCoefficients() == null) {
			return Optional.of("the design has not run yet, so there are no coefficients; run it");
		}
		String made = Objects.requireNonNullElse(filter.getCoefficients().getDesignHash(), "");
		if (made.isEmpty()) {
			return Optional.of("the coefficients do not come from the stated design; run it, or state that they are given");
		}
		return made.equals(designer.hash()) ? Optional.empty()
				: Optional.of("the design or a number that it uses was changed since it computed the coefficients; run it again");
	}

	private static Problem problem(ProblemKind kind, String filter, String message) {
		return new Problem(kind, Severity.SHOULD, filter, "", message, "design", 0, Optional.empty());
	}
}
