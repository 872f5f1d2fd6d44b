// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOvers;
import tapwright.core.history.History;
import tapwright.core.history.RecordedRevision;
import tapwright.core.history.RevisionStore;
import tapwright.core.history.SignOffs;
import tapwright.model.io.ModelFiles;

/**
 * What was recorded of one filter.
 *
 * @param present
 *            short hash of the revision that the file is now; empty when it has unrecorded changes
 * @param revisions
 *            newest first
 * @param decisions
 *            of reviewers
 * @param problems
 *            of files that are damaged
 */
record ReportedHistory(String present, List<RecordedRevision> revisions, List<SignOffs.Recorded> decisions,
		List<String> problems) {

	static final ReportedHistory NONE = new ReportedHistory("", List.of(), List.of(), List.of());

	static ReportedHistory of(Path file) throws InputException, IOException {
		if (!file.toString().endsWith("." + ModelFiles.FILTER_EXTENSION)) {
			return NONE;
		}
		RevisionStore store = RevisionStore.of(file);
		History history = store.read();
		List<RecordedRevision> revisions = history.graph().revisions().stream()
				.sorted(Comparator.comparingInt(RecordedRevision::sequence).reversed()
						.thenComparing(RecordedRevision::hash)).toList();
		SignOffs.Reading reading = new SignOffs(store).read();
		return new ReportedHistory(revisions.isEmpty() ? "" : HandOvers.revision(file), revisions, reading.decisions(),
				history.problems().stream().map(problem -> problem.file().getFileName() + " " + problem.reason())
						.toList());
	}
}
