// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;

import tapwright.model.Baseline;
import tapwright.model.BaselineEntry;

/**
 * One filter that two baselines have differently.
 *
 * @param filter
 *            its name
 * @param before
 *            its revision in the first; nothing when it was added
 * @param after
 *            its revision in the second; nothing when it was removed
 */
public record BaselineDifference(String filter, Optional<RecordedRevision> before, Optional<RecordedRevision> after) {

	/**
	 * All filters that differ, in the order of their names.
	 *
	 * @throws IOException
	 *             when a revision is missing or damaged
	 */
	public static List<BaselineDifference> between(BaselineStore store, Baseline before, Baseline after) throws IOException {
		Map<String, BaselineEntry> old = byFilter(before);
		Map<String, BaselineEntry> young = byFilter(after);
		var names = new TreeSet<>(old.keySet());
		names.addAll(young.keySet());
		var differences = new ArrayList<BaselineDifference>();
		for (String name : names) {
			BaselineEntry one = old.get(name);
			BaselineEntry other = young.get(name);
			if (one == null || other == null || !one.getRevision().equals(other.getRevision())) {
				differences.add(new BaselineDifference(name, find(store, one), find(store, other)));
			}
		}
		return differences;
	}

	private static Optional<RecordedRevision> find(BaselineStore store, BaselineEntry entry) throws IOException {
		return entry == null ? Optional.empty() : Optional.of(store.revision(entry));
	}

	private static Map<String, BaselineEntry> byFilter(Baseline baseline) {
		var entries = new TreeMap<String, BaselineEntry>();
		baseline.getEntries().forEach(entry -> entries.put(entry.getFilter(), entry));
		return entries;
	}
}
