// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.util.ArrayDeque;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

import tapwright.core.InputException;

/** How the revisions of one filter follow from each other. Immutable. */
public final class RevisionGraph {

	private static final Comparator<RecordedRevision> NEWEST_FIRST = Comparator.comparingInt(RecordedRevision::sequence).reversed()
			.thenComparing(RecordedRevision::time, Comparator.reverseOrder()).thenComparing(RecordedRevision::hash);

	private final Map<String, RecordedRevision> revisions = new LinkedHashMap<>();
	private final List<RecordedRevision> heads;

	/** The graph of the given revisions, in any order. */
	public RevisionGraph(Collection<RecordedRevision> revisions) {
		revisions.stream().sorted(NEWEST_FIRST).forEach(revision -> this.revisions.put(revision.hash(), revision));
		var parents = new HashSet<String>();
		revisions.forEach(revision -> parents.addAll(revision.parents()));
		heads = this.revisions.values().stream().filter(revision -> !parents.contains(revision.hash())).toList();
	}

	/** All revisions, the newest first; a revision stands before its parents. */
	public Collection<RecordedRevision> revisions() {
		return List.copyOf(revisions.values());
	}

	/** The revisions that no other was made from, the newest first: one, or several after a merge of two branches. */
	public List<RecordedRevision> heads() {
		return heads;
	}

	/** The revision with the given full hash. */
	public Optional<RecordedRevision> find(String hash) {
		return Optional.ofNullable(revisions.get(hash));
	}

	/**
	 * The revision that a person means.
	 *
	 * @param text
	 *            at least four first digits of the hash, a sequence number, or 'head'
	 * @throws InputException
	 *             when there is none, or there are several
	 */
	public RecordedRevision named(String text) throws InputException {
		List<RecordedRevision> found = text.equals("head") ? heads
				: revisions.values().stream().filter(revision -> text.matches("\\d{1,7}") && revision.sequence() == Integer.parseInt(text)
						|| text.length() >= 4 && revision.hash().startsWith(text)).toList();
		if (found.size() != 1) {
			throw new InputException(text, found.isEmpty() ? "there is no such revision; 'tapwright history' lists them"
					: "means several revisions: " + String.join(", ", found.stream().map(RecordedRevision::shortHash).toList()));
		}
		return found.getFirst();
	}

	/** The revision and all that it was made from, directly or not, the nearest first. */
	public Set<String> ancestry(String hash) {
		var reached = new LinkedHashSet<String>();
		var open = new ArrayDeque<>(List.of(hash));
		while (!open.isEmpty()) {
			String next = open.removeFirst();
			if (revisions.containsKey(next) && reached.add(next)) {
				open.addAll(revisions.get(next).parents());
			}
		}
		return reached;
	}

	/**
	 * The revision that two others both come from and that is nearest to them: of several, that with the largest sequence number.
	 */
	public Optional<RecordedRevision> mergeBase(String one, String other) {
		Set<String> common = new HashSet<>(ancestry(one));
		common.retainAll(ancestry(other));
		return revisions.values().stream().filter(revision -> common.contains(revision.hash())).findFirst();
	}
}
