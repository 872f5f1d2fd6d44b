// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.List;

import tapwright.model.Revision;

/**
 * Two states and the one that both come from: what each did, and where both did different things to the same place.
 *
 * @param one
 *            from the base to the first
 * @param other
 *            from the base to the second
 * @param between
 *            from the first to the second
 * @param conflicts
 *            changes of the first at places that the second changed otherwise
 * @param coefficientsConflict
 *            whether both changed the coefficients, and not to the same numbers
 */
public record ThreeWay(Comparison one, Comparison other, Comparison between, List<ContentChange> conflicts,
		boolean coefficientsConflict) {

	/** Compares two states with their base. On the thread that owns the model objects. */
	public static ThreeWay of(Revision base, Revision one, Revision other) {
		Comparison first = Comparison.of(base, one);
		Comparison second = Comparison.of(base, other);
		Comparison between = Comparison.of(one, other);
		List<ContentChange> conflicts = first.changes().stream().filter(change -> second.changes().stream()
				.anyMatch(theirs -> samePlace(change, theirs) && !change.after().equals(theirs.after()))).toList();
		return new ThreeWay(first, second, between, conflicts, first.coefficients().changed() > 0
				&& second.coefficients().changed() > 0 && between.coefficients().changed() > 0);
	}

	private static boolean samePlace(ContentChange one, ContentChange other) {
		return one.part() == other.part() && one.place().equals(other.place());
	}
}
