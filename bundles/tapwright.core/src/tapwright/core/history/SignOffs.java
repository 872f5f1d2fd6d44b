// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Stream;

import tapwright.core.InputException;
import tapwright.model.Decision;
import tapwright.model.ModelFactory;
import tapwright.model.SignOff;
import tapwright.model.io.ModelFiles;

/**
 * The sign-offs of one filter: files {@code HASH-REVIEWER.signoff} beside its revisions, one for each reviewer of a revision. They
 * are only ever added: who thinks again signs off a later revision.
 *
 * @param store
 *            the revisions
 */
public record SignOffs(RevisionStore store) {

	/** Extension of sign-off files. */
	public static final String EXTENSION = "signoff";

	/**
	 * One decision that was read.
	 *
	 * @param file
	 *            where it is
	 * @param revision
	 *            full hash of the revision
	 * @param reviewer
	 *            who decided
	 * @param time
	 *            when, as ISO 8601 in UTC
	 * @param decision
	 *            what was decided
	 * @param comment
	 *            why, and on what conditions
	 */
	public record Recorded(Path file, String revision, Author reviewer, String time, Decision decision, String comment) {
	}

	/**
	 * All decisions, the oldest first, and what is wrong with files that are not used.
	 */
	public record Reading(List<Recorded> decisions, List<HistoryProblem> problems) {

		/** The decisions on a revision. */
		public List<Recorded> on(String revision) {
			return decisions.stream().filter(decision -> decision.revision().equals(revision)).toList();
		}
	}

	/**
	 * How the present state of a filter stands to the last decision.
	 *
	 * @param last
	 *            the last decision on a head or an ancestor of it
	 * @param changedSince
	 *            whether the content is no longer what was decided on
	 */
	public record Standing(Recorded last, boolean changedSince) {
	}

	/**
	 * Adds a decision on a revision.
	 *
	 * @throws InputException
	 *             when that reviewer has already decided on it, or conditions are not stated
	 */
	public Recorded add(RecordedRevision revision, String filter, Author reviewer, Decision decision, String comment, Clock clock)
			throws InputException, IOException {
		if (decision == Decision.ACCEPTED_WITH_CONDITIONS && comment.isBlank()) {
			throw new InputException("comment", "say on what conditions the revision is accepted");
		}
		SignOff signOff = ModelFactory.eINSTANCE.createSignOff();
		signOff.setFilter(filter);
		signOff.setRevision(revision.hash());
		signOff.setReviewer(reviewer.name());
		signOff.setEmail(reviewer.email());
		signOff.setTime(clock.instant().truncatedTo(ChronoUnit.MILLIS).toString());
		signOff.setDecision(decision);
		signOff.setComment(comment.strip());
		Path file = store.folder().resolve(fileName(revision.hash(), reviewer.name()));
		try {
			AddedFiles.add(file, ModelFiles.toBytes(signOff));
		} catch (FileAlreadyExistsException e) {
			throw new InputException(file.toString(), reviewer.name() + " has already decided on revision " + revision.shortHash()
					+ "; a decision is never replaced");
		}
		return recorded(file, signOff);
	}

	/** Reads all decisions. */
	public Reading read() throws IOException {
		var decisions = new ArrayList<Recorded>();
		var problems = new ArrayList<HistoryProblem>();
		for (Path file : files()) {
			try {
				SignOff signOff = ModelFiles.load(file, SignOff.class);
				if (signOff.getRevision() == null || signOff.getReviewer() == null || signOff.getReviewer().isBlank()
						|| signOff.getTime() == null
						|| !file.getFileName().toString().equals(fileName(signOff.getRevision(), signOff.getReviewer()))) {
					problems.add(new HistoryProblem(file, "this sign-off is not used: its name is not that of its revision and reviewer"));
				} else {
					decisions.add(recorded(file, signOff));
				}
			} catch (IOException e) {
				problems.add(new HistoryProblem(file, "this sign-off is not used: " + e.getMessage()));
			}
		}
		decisions.sort((one, other) -> one.time().compareTo(other.time()));
		return new Reading(List.copyOf(decisions), List.copyOf(problems));
	}

	/**
	 * The last decision on what the heads come from, and whether the filter has changed since.
	 *
	 * @param content
	 *            content hash of the present state
	 * @return null when nobody has decided yet
	 */
	public static Standing standing(Reading reading, RevisionGraph graph, String content) {
		Standing standing = null;
		for (RecordedRevision head : graph.heads()) {
			for (String hash : graph.ancestry(head.hash())) {
				for (Recorded decision : reading.on(hash)) {
					if (standing == null || decision.time().compareTo(standing.last().time()) > 0) {
						standing = new Standing(decision, !graph.find(hash).orElseThrow().content().equals(content));
					}
				}
			}
		}
		return standing;
	}

	/** The file name of a reviewer's decision: letters, digits, '.', '_' and '-' stand for themselves, other bytes of UTF-8 as '%XX'. */
	static String fileName(String hash, String reviewer) {
		var name = new StringBuilder(hash.substring(0, Math.min(RecordedRevision.SHORT_DIGITS, hash.length()))).append('-');
		for (byte unit : reviewer.getBytes(StandardCharsets.UTF_8)) {
			if (unit >= '0' && unit <= '9' || unit >= 'a' && unit <= 'z' || unit >= 'A' && unit <= 'Z' || ".-_".indexOf(unit) >= 0) {
				name.append((char) unit);
			} else {
				name.append('%').append(HexFormat.of().withUpperCase().toHexDigits(unit));
			}
		}
		return name.append('.').append(EXTENSION).toString();
	}

	private List<Path> files() throws IOException {
		if (!Files.isDirectory(store.folder())) {
			return List.of();
		}
		try (Stream<Path> files = Files.list(store.folder())) {
			return files.filter(file -> file.toString().endsWith("." + EXTENSION)).sorted().toList();
		}
	}

	private static Recorded recorded(Path file, SignOff signOff) {
		return new Recorded(file, signOff.getRevision(),
				new Author(signOff.getReviewer(), signOff.getEmail() == null ? "" : signOff.getEmail()), signOff.getTime(),
				signOff.getDecision(), signOff.getComment() == null ? "" : signOff.getComment());
	}
}
