// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

import tapwright.core.verify.FilterEvidence;
import tapwright.model.Filter;

/**
 * A change with what is proven of the filter after it.
 *
 * @param kind
 *            which sort of change it is
 * @param description
 *            what to change, in a few words: 'coefficients of 17 instead of 14 bits'
 * @param edits
 *            the change itself
 * @param outcome
 *            what is proven of the filter after the change
 */
public record Remedy(Kind kind, String description, List<Edit> edits, FilterEvidence outcome) {

	/** Sorts of change. */
	public enum Kind {
		/** The limit becomes what the filter achieves. */
		RELAXED_LIMIT,
		/** The coefficient format gets more bits. */
		LONGER_WORD,
		/** The filter is designed again with as few coefficients as are proven to meet everything. */
		NEW_DESIGN,
		/** The stated design runs again. */
		SAME_DESIGN
	}

	/**
	 * The same change of another filter with the same content; on the thread that owns that filter.
	 *
	 * @param asked
	 *            the filter that the remedy was asked for
	 */
	public Remedy on(Filter other, Filter asked) {
		return new Remedy(kind, description, edits.stream().map(edit -> edit.on(other, asked)).toList(), outcome);
	}

	/** What is proven of the filter after the change, one line for each requirement: 'met, stop: gain from ...'. */
	public String preview() {
		return outcome.requirements().stream()
				.map(requirement -> requirement.proof().verdict().name().toLowerCase(Locale.ROOT) + ", " + requirement.message())
				.collect(Collectors.joining("\n"));
	}

	/** Makes the change; on the thread that owns the filter. */
	public void apply() {
		edits.forEach(Edit::apply);
	}
}
