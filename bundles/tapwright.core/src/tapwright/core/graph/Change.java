// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.Set;

/**
 * What happened to the files of a portfolio.
 *
 * @param everything
 *            anything may have happened: all files are read again
 * @param changed
 *            paths of files that are new or have new content
 * @param removed
 *            paths of files that are gone
 */
public record Change(boolean everything, Set<String> changed, Set<String> removed) {

	/** Anything may have happened. */
	public static final Change EVERYTHING = new Change(true, Set.of(), Set.of());

	/** Takes copies. */
	public Change {
		changed = Set.copyOf(changed);
		removed = Set.copyOf(removed);
	}

	/** These files and no others changed. */
	public static Change of(Set<String> changed, Set<String> removed) {
		return new Change(false, changed, removed);
	}

	/** Whether nothing happened. */
	public boolean isEmpty() {
		return !everything && changed.isEmpty() && removed.isEmpty();
	}
}
