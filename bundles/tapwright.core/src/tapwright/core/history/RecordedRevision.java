// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.nio.file.Path;
import java.util.List;

import tapwright.model.Evidence;
import tapwright.model.Revision;
import tapwright.model.Verdict;

/**
 * A revision whose file was read and checked, without the filter itself. Immutable.
 *
 * @param file
 *            where it is
 * @param sequence
 *            generation: 1 without parents, otherwise one more than the largest of the parents
 * @param hash
 *            of its content, 64 hexadecimal digits
 * @param content
 *            hash of filter and parameters alone: the same for revisions with the same content
 * @param parents
 *            hashes of the revisions that it was made from
 * @param author
 *            who recorded it
 * @param time
 *            when, as ISO 8601 in UTC
 * @param message
 *            why
 * @param verdict
 *            of the evidence that was recorded with it
 * @param results
 *            what was proven of each requirement
 */
public record RecordedRevision(Path file, int sequence, String hash, String content, List<String> parents, Author author, String time,
		String message, Verdict verdict, List<Result> results) {

	/** Digits of a hash in file names and for a person. */
	public static final int SHORT_DIGITS = 12;

	/**
	 * What was proven of one requirement.
	 *
	 * @param requirement
	 *            its id
	 * @param verdict
	 *            what was proven
	 * @param marginLow
	 *            lower end of the margin, in the unit of the limit
	 * @param marginHigh
	 *            upper end of the margin
	 */
	public record Result(String requirement, Verdict verdict, double marginLow, double marginHigh) {
	}

	static RecordedRevision of(Revision revision, String hash, Path file, int sequence) {
		Evidence evidence = revision.getEvidence();
		List<Result> results = evidence == null ? List.of() : evidence.getResults().stream().map(result -> new Result(
				result.getRequirement(), result.getVerdict(), result.getMarginLow(), result.getMarginHigh())).toList();
		return new RecordedRevision(file, sequence, hash, Snapshots.contentHash(revision), List.copyOf(revision.getParents()),
				new Author(revision.getAuthor(), revision.getEmail() == null ? "" : revision.getEmail()), revision.getTime(),
				revision.getMessage() == null ? "" : revision.getMessage(),
				evidence == null ? Verdict.UNPROVEN : evidence.getVerdict(), results);
	}

	/** The first digits of the hash, as in the file name. */
	public String shortHash() {
		return hash.substring(0, SHORT_DIGITS);
	}
}
