// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What the history of one filter holds at one moment. Immutable.
 *
 * @param graph
 *            the revisions that are what was recorded
 * @param damaged
 *            the files that are not; nothing in them is used
 */
public record History(RevisionGraph graph, List<HistoryProblem> damaged) {

	/** Takes a copy. */
	public History {
		damaged = List.copyOf(damaged);
	}

	/** Damaged files, parents that are missing, and more than one head. */
	public List<HistoryProblem> problems() {
		var problems = new ArrayList<>(damaged);
		for (RecordedRevision revision : graph.revisions()) {
			for (String parent : revision.parents()) {
				if (graph.find(parent).isEmpty()) {
					problems.add(new HistoryProblem(revision.file(), "was made from revision " + abbreviated(parent)
							+ ", which is missing or damaged; bring that file back from version control"));
				}
			}
		}
		graph.revisions().stream().filter(this::isMisnumbered).forEach(revision -> problems.add(new HistoryProblem(revision.file(),
				"its content is what was recorded, but its sequence number is not one more than that of its parents; it was renamed")));
		List<RecordedRevision> heads = graph.heads();
		if (heads.size() > 1) {
			problems.add(new HistoryProblem(heads.getFirst().file().getParent(), "there are " + heads.size() + " heads: "
					+ String.join(" and ", heads.stream().map(head -> head.shortHash() + " by " + head.author().name()).toList())
					+ "; reconcile them by recording a revision made from both"));
		}
		return problems;
	}

	private boolean isMisnumbered(RecordedRevision revision) {
		var parents = revision.parents().stream().map(graph::find).toList();
		return parents.stream().allMatch(Optional::isPresent)
				&& revision.sequence() != 1 + parents.stream().mapToInt(parent -> parent.get().sequence()).max().orElse(0);
	}

	private static String abbreviated(String hash) {
		return hash.substring(0, Math.min(RecordedRevision.SHORT_DIGITS, hash.length()));
	}
}
