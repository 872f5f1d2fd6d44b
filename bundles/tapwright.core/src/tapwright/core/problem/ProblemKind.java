// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.Locale;

/** Kinds of problem. The codes are stable: markers and quick fixes are found by them. */
public enum ProblemKind {

	/** A requirement is proven not to hold. */
	MISSED,
	/** Neither met nor missed could be proven. */
	UNPROVEN,
	/** A file is not well formed or holds what the model does not know. */
	UNREADABLE,
	/** A number or a reference in a filter makes no sense, so that something cannot be verified. */
	INVALID,
	/** Two filters have the same identity or the same name. */
	DUPLICATE,
	/** A parameter of the portfolio has no value. */
	PARAMETER,
	/** The coefficients were not computed by the design as it is now. */
	STALE,
	/** Two gain limits that no filter can meet together. */
	CONTRADICTORY,
	/** A filter that nothing is asked of. */
	EMPTY,
	/** A filter is deployed where it cannot run as it is stated. */
	DEPLOYMENT,
	/** A processor has more to do, or more to keep, than it can. */
	OVERLOAD,
	/** A signal path is not proven from end to end. */
	PATH;

	/** The code: the name in lower case. */
	public String code() {
		return name().toLowerCase(Locale.ROOT);
	}
}
