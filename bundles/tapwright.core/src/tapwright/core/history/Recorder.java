// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.time.Clock;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import tapwright.core.InputException;
import tapwright.core.format.Tool;
import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.verify.Effort;
import tapwright.model.Revision;
import tapwright.model.Verdict;

/**
 * Records revisions. Two that record at the same moment both succeed: each revision is a file of its own, and the filter then has
 * two heads.
 *
 * @param author
 *            of the revisions
 * @param clock
 *            for their times
 * @param effort
 *            to verify what is recorded
 */
public record Recorder(Author author, Clock clock, Effort effort) {

	/**
	 * What came of it.
	 *
	 * @param revision
	 *            the new revision
	 * @param warnings
	 *            what a person should know: requirements that are not met, damaged files of the history
	 */
	public record Recording(RecordedRevision revision, List<String> warnings) {
	}

	/**
	 * Records the present state as the child of the only head, or as the first revision.
	 *
	 * @throws InputException
	 *             when nothing changed since the head, there are several heads, there is no message, or a parameter has no value
	 * @throws IOException
	 *             when a file cannot be read or written; nothing was recorded then
	 */
	public Recording record(WorkingFilter working, String message) throws InputException, IOException {
		History history = working.store().read();
		List<RecordedRevision> heads = history.graph().heads();
		if (heads.size() > 1) {
			throw new InputException("", "there are " + heads.size() + " heads: "
					+ String.join(", ", heads.stream().map(RecordedRevision::shortHash).toList())
					+ "; compare them, put the filter into the state that shall hold, and record it as a reconciliation");
		}
		if (heads.isEmpty() && !history.damaged().isEmpty()) {
			throw new InputException("", "all revisions are damaged, so that there is none to go on from: "
					+ history.damaged().getFirst().describe());
		}
		Revision revision = working.snapshot();
		if (!heads.isEmpty() && Snapshots.contentHash(revision).equals(heads.getFirst().content())) {
			throw new InputException(working.file().toString(),
					"has not changed since revision " + heads.getFirst().shortHash() + "; there is nothing to record");
		}
		return add(working, revision, history, message);
	}

	/**
	 * Records the present state as made from all heads, so that one head remains.
	 *
	 * @throws InputException
	 *             when there are not several heads, there is no message, or a parameter has no value
	 * @throws IOException
	 *             when a file cannot be read or written; nothing was recorded then
	 */
	public Recording reconcile(WorkingFilter working, String message) throws InputException, IOException {
		History history = working.store().read();
		if (history.graph().heads().size() < 2) {
			throw new InputException(working.file().toString(), "has only one head; there is nothing to reconcile");
		}
		return add(working, working.snapshot(), history, message);
	}

	/** Whether a filter differs from the only head, has several heads, or was never recorded. */
	public static boolean hasUnrecordedChanges(WorkingFilter working) throws InputException, IOException {
		List<RecordedRevision> heads = working.store().read().graph().heads();
		return heads.size() != 1 || !Snapshots.contentHash(working.snapshot()).equals(heads.getFirst().content());
	}

	private Recording add(WorkingFilter working, Revision revision, History history, String message) throws InputException, IOException {
		if (message.isBlank()) {
			throw new InputException("", "a revision needs a message that says why it was made");
		}
		FilterEvidence found = working.question().answer(effort);
		List<RecordedRevision> parents = history.graph().heads();
		parents.forEach(parent -> revision.getParents().add(parent.hash()));
		revision.setAuthor(author.name());
		revision.setEmail(author.email());
		revision.setTime(clock.instant().truncatedTo(ChronoUnit.MILLIS).toString());
		revision.setMessage(message.strip());
		revision.setEvidence(Snapshots.evidence(found, Tool.NAME));
		int sequence = 1 + parents.stream().mapToInt(RecordedRevision::sequence).max().orElse(0);
		RecordedRevision recorded;
		try {
			recorded = working.store().add(revision, sequence);
		} catch (IllegalArgumentException e) {
			throw new InputException(working.file().toString(), e.getMessage());
		}
		return new Recording(recorded, warnings(found, recorded, history));
	}

	private static List<String> warnings(FilterEvidence found, RecordedRevision recorded, History history) {
		var warnings = new ArrayList<String>();
		if (recorded.verdict() != Verdict.MET) {
			warnings.add("recorded as " + recorded.verdict().getLiteral());
		}
		found.requirements().stream().filter(requirement -> requirement.proof().verdict() != tapwright.dsp.verify.Verdict.MET)
				.forEach(requirement -> warnings
						.add(requirement.proof().verdict().name().toLowerCase(Locale.ROOT) + " " + requirement.message()));
		found.problems().forEach(problem -> warnings.add(problem.describe()));
		history.damaged().forEach(problem -> warnings.add(problem.describe()));
		return warnings;
	}
}
