// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import tapwright.model.Evidence;
import tapwright.model.Result;
import tapwright.model.Verdict;

/**
 * How one requirement stood and stands.
 *
 * @param requirement
 *            its id
 * @param before
 *            nothing when it was not asked or not verified
 * @param after
 *            nothing when it is not asked or not verified
 */
public record MarginChange(String requirement, Optional<Standing> before, Optional<Standing> after) {

	/**
	 * What was proven.
	 *
	 * @param verdict
	 *            met, missed or unproven
	 * @param low
	 *            lower end of the margin, in the unit of the limit
	 * @param high
	 *            upper end
	 */
	public record Standing(Verdict verdict, double low, double high) {
	}

	static List<MarginChange> between(Evidence before, Evidence after) {
		Map<String, Standing> old = byId(before);
		Map<String, Standing> young = byId(after);
		var ids = new LinkedHashSet<>(old.keySet());
		ids.addAll(young.keySet());
		var changes = new ArrayList<MarginChange>();
		ids.forEach(id -> changes.add(new MarginChange(id, Optional.ofNullable(old.get(id)), Optional.ofNullable(young.get(id)))));
		return List.copyOf(changes);
	}

	private static Map<String, Standing> byId(Evidence evidence) {
		var standings = new LinkedHashMap<String, Standing>();
		if (evidence != null) {
			for (Result result : evidence.getResults()) {
				standings.put(result.getRequirement(), new Standing(result.getVerdict(), result.getMarginLow(), result.getMarginHigh()));
			}
		}
		return standings;
	}
}
