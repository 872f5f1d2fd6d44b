// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.model.Revision;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelFiles;

/**
 * The revisions of one filter: files {@code revisions/NAME/SEQ-HASH.revision} in the folder of its portfolio. SEQ is the
 * generation in at least four decimal digits, HASH the first twelve digits of the hash over the {@link CanonicalForm}. Files are
 * only ever added. Holds no state, so that any number of threads and processes can use one folder.
 *
 * @param folder
 *            of the filter's revisions; need not exist
 */
public record RevisionStore(Path folder) {

	/** Folder of all revisions in a portfolio. */
	public static final String FOLDER = "revisions";
	/** Extension of revision files. */
	public static final String EXTENSION = "revision";

	private static final Pattern NAME = Pattern.compile("(\\d{4,7})-([0-9a-f]{12})\\." + EXTENSION);

	private record Checked(Revision revision, String hash) {
	}

	private record Reading(RecordedRevision revision, HistoryProblem problem) {
	}

	/** The revisions of a filter file: beside the root file of its portfolio, or beside the filter where there is no portfolio. */
	public static RevisionStore of(Path filter) {
		Path file = filter.toAbsolutePath().normalize();
		Path root = PortfolioFolder.above(file).orElse(file.getParent());
		return new RevisionStore(root.resolve(FOLDER).resolve(FilePartners.nameOf(file.getFileName().toString())));
	}

	/**
	 * Reads and checks all revisions, on all processors.
	 *
	 * @throws IOException
	 *             when the folder cannot be listed
	 */
	public History read() throws IOException {
		List<Reading> readings = files().parallelStream().map(RevisionStore::reading).toList();
		List<RecordedRevision> revisions = readings.stream().map(Reading::revision).filter(found -> found != null).toList();
		return new History(new RevisionGraph(revisions),
				readings.stream().map(Reading::problem).filter(found -> found != null).toList());
	}

	/**
	 * Reads one revision with its filter, and checks it again.
	 *
	 * @throws IOException
	 *             when it cannot be read or is not what was recorded
	 */
	public static Revision load(RecordedRevision recorded) throws IOException {
		Checked checked = check(Files.readAllBytes(recorded.file()), recorded.file());
		if (!checked.hash().equals(recorded.hash())) {
			throw damaged(recorded.file(), "it was changed since it was listed");
		}
		return checked.revision();
	}

	/**
	 * Reads the content of a revision file and checks it against the file's name.
	 *
	 * @throws ModelFileException
	 *             when it is not what was recorded under that name
	 */
	public static Revision checked(byte[] content, Path file) throws ModelFileException {
		return check(content, file).revision();
	}

	private static Checked check(byte[] content, Path file) throws ModelFileException {
		Matcher name = NAME.matcher(file.getFileName().toString());
		if (!name.matches()) {
			throw damaged(file, "its name is not a sequence number and a hash, as in 0001-0123456789ab." + EXTENSION);
		}
		Revision revision = ModelFiles.parse(content, file.toString(), Revision.class);
		if (revision.getFilter() == null || revision.getTime() == null || revision.getAuthor() == null
				|| revision.getAuthor().isBlank()) {
			throw damaged(file, "it lacks its filter, author or time");
		}
		String hash;
		try {
			hash = CanonicalForm.hash(revision);
		} catch (IllegalArgumentException e) {
			throw damaged(file, e.getMessage());
		}
		if (!hash.startsWith(name.group(2))) {
			throw damaged(file, "its content has the hash " + hash.substring(0, RecordedRevision.SHORT_DIGITS) + ", not "
					+ name.group(2) + ": it was edited, damaged or renamed");
		}
		return new Checked(revision, hash);
	}

	/**
	 * Adds a revision.
	 *
	 * @param revision
	 *            complete, parents included
	 * @param sequence
	 *            its generation
	 * @throws FileAlreadyExistsException
	 *             when that very revision is there already
	 * @throws IOException
	 *             when it cannot be written; nothing was added then
	 */
	public RecordedRevision add(Revision revision, int sequence) throws IOException {
		String hash = CanonicalForm.hash(revision);
		Path file = folder.resolve(
				"%s-%s.%s".formatted(padded(sequence), hash.substring(0, RecordedRevision.SHORT_DIGITS), EXTENSION));
		byte[] content = ModelFiles.toBytes(revision);
		if (!check(content, file).hash().equals(hash)) {
			throw new IOException(file + ": the revision would not be read back as it is; nothing was recorded");
		}
		AddedFiles.add(file, content);
		return RecordedRevision.of(revision, hash, file, sequence);
	}

	private List<Path> files() throws IOException {
		if (!Files.isDirectory(folder)) {
			return List.of();
		}
		try (Stream<Path> files = Files.list(folder)) {
			var found = new ArrayList<>(files.filter(RevisionStore::isRevision).toList());
			found.sort(null);
			return found;
		}
	}

	// Hidden files are those that a recording has not finished.
	private static boolean isRevision(Path file) {
		String name = file.getFileName().toString();
		return name.endsWith("." + EXTENSION) && !name.startsWith(".");
	}

	private static Reading reading(Path file) {
		try {
			Checked checked = check(Files.readAllBytes(file), file);
			String name = file.getFileName().toString();
			int sequence = Integer.parseInt(name.substring(0, name.indexOf('-')));
			return new Reading(RecordedRevision.of(checked.revision(), checked.hash(), file, sequence), null);
		} catch (ModelFileException e) {
			return new Reading(null, new HistoryProblem(file,
					(e.line() > 0 ? "line " + e.line() + ": " : "") + e.reason() + "; bring the file back from version control"));
		} catch (IOException e) {
			return new Reading(null, new HistoryProblem(file, "cannot be read: " + e.getMessage()));
		}
	}

	private static ModelFileException damaged(Path file, String reason) {
		return new ModelFileException(file.toString(), 0, 0, "this revision is not used: " + reason);
	}

	// Not by a formatter: digits would depend on the locale.
	private static String padded(int sequence) {
		String digits = Integer.toString(sequence);
		return "0".repeat(Math.max(0, 4 - digits.length())) + digits;
	}
}
