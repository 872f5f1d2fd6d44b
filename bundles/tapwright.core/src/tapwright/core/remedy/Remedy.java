// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import java.util.List;

import tapwright.core.verify.FilterEvidence;

/**
 * A change that is proven to meet a requirement.
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
		NEW_DESIGN
	}

	/** Makes the change; on the thread that owns the filter. */
	public void apply() {
		edits.forEach(Edit::apply);
	}
}
