// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

import tapwright.core.InputException;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.model.Baseline;
import tapwright.model.BaselineEntry;
import tapwright.model.ModelFactory;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelFiles;

/**
 * The baselines of a portfolio: files {@code baselines/NAME.baseline}. They are only ever added.
 *
 * @param portfolio
 *            folder with the root file
 */
public record BaselineStore(Path portfolio) {

	/** Folder of all baselines in a portfolio. */
	public static final String FOLDER = "baselines";
	/** Extension of baseline files. */
	public static final String EXTENSION = "baseline";

	/**
	 * Freezes the heads of all filters.
	 *
	 * @param name
	 *            letters, digits, '.', '_' and '-'
	 * @param unrecorded
	 *            whether filters may differ from their head; the head is frozen then. A filter without exactly one head is always
	 *            refused
	 * @throws InputException
	 *             when the name is taken or impossible, there are no filters, or a filter cannot be frozen: all such filters are named
	 */
	public Baseline freeze(String name, Author author, String message, boolean unrecorded, Clock clock) throws InputException, IOException {
		Path file = file(name);
		if (Files.exists(file)) {
			throw taken(name);
		}
		Baseline baseline = ModelFactory.eINSTANCE.createBaseline();
		baseline.setName(name);
		baseline.setAuthor(author.name());
		baseline.setEmail(author.email());
		baseline.setTime(clock.instant().truncatedTo(ChronoUnit.MILLIS).toString());
		baseline.setMessage(message.strip());
		var refused = new ArrayList<String>();
		for (Path filter : PortfolioFolder.files(portfolio, ModelFiles.FILTER_EXTENSION)) {
			freeze(WorkingFilter.read(filter), unrecorded, baseline, refused);
		}
		if (!refused.isEmpty()) {
			throw new InputException("", "nothing was frozen: " + String.join("; ", refused));
		}
		if (baseline.getEntries().isEmpty()) {
			throw new InputException(portfolio.toString(), "holds no filter");
		}
		try {
			AddedFiles.add(file, ModelFiles.toBytes(baseline));
		} catch (FileAlreadyExistsException e) {
			throw taken(name);
		}
		return baseline;
	}

	/**
	 * Reads a baseline.
	 *
	 * @throws InputException
	 *             when there is none of that name, or the name is impossible
	 * @throws IOException
	 *             when it cannot be read or is damaged
	 */
	public Baseline read(String name) throws InputException, IOException {
		Path file = file(name);
		if (!Files.exists(file)) {
			throw new InputException(name, "there is no such baseline in " + portfolio
					+ (names().isEmpty() ? "; it has none" : "; it has " + String.join(", ", names())));
		}
		Baseline baseline = ModelFiles.load(file, Baseline.class);
		if (!name.equals(baseline.getName())) {
			throw new ModelFileException(file.toString(), 0, 0, "holds the baseline '" + baseline.getName() + "'; it was renamed");
		}
		for (BaselineEntry entry : baseline.getEntries()) {
			if (entry.getFilter() == null || entry.getRevision() == null || !entry.getRevision().matches("[0-9a-f]{64}")) {
				throw new ModelFileException(file.toString(), 0, 0, "the entry of filter '" + entry.getFilter()
						+ "' is damaged; bring the file back from version control");
			}
		}
		return baseline;
	}

	/** Names of all baselines in order. */
	public List<String> names() throws IOException {
		Path folder = portfolio.resolve(FOLDER);
		if (!Files.isDirectory(folder)) {
			return List.of();
		}
		try (Stream<Path> files = Files.list(folder)) {
			return files.map(file -> file.getFileName().toString()).filter(name -> name.endsWith("." + EXTENSION) && !name.startsWith("."))
					.map(FilePartners::nameOf).sorted().toList();
		}
	}

	/** The revisions of a filter of this portfolio by the name that entries use. */
	public RevisionStore revisions(String filter) {
		return new RevisionStore(portfolio.resolve(RevisionStore.FOLDER).resolve(filter));
	}

	/**
	 * The recorded revision of an entry.
	 *
	 * @throws ModelFileException
	 *             when it is missing or damaged
	 */
	public RecordedRevision revision(BaselineEntry entry) throws IOException {
		RevisionStore store = revisions(entry.getFilter());
		return store.read().graph().find(entry.getRevision()).orElseThrow(() -> new ModelFileException(store.folder().toString(), 0, 0,
				"revision " + entry.getRevision().substring(0, RecordedRevision.SHORT_DIGITS)
						+ " of the baseline is missing or damaged; bring it back from version control"));
	}

	private static void freeze(WorkingFilter working, boolean unrecorded, Baseline baseline, List<String> refused)
			throws InputException, IOException {
		String filter = FilePartners.nameOf(working.file().getFileName().toString());
		List<RecordedRevision> heads = working.store().read().graph().heads();
		if (heads.size() != 1) {
			refused.add(filter + (heads.isEmpty() ? " was never recorded" : " has " + heads.size() + " heads"));
		} else if (!unrecorded && Recorder.hasUnrecordedChanges(working)) {
			refused.add(filter + " has changes that are not recorded");
		} else {
			BaselineEntry entry = ModelFactory.eINSTANCE.createBaselineEntry();
			entry.setFilter(filter);
			entry.setIdentity(working.filter().getIdentity());
			entry.setRevision(heads.getFirst().hash());
			baseline.getEntries().add(entry);
		}
	}

	private Path file(String name) throws InputException {
		if (!name.matches("[A-Za-z0-9][A-Za-z0-9._-]{0,99}")) {
			throw new InputException(name, "a baseline's name has letters, digits, '.', '_' and '-', and starts with a letter or digit");
		}
		return portfolio.resolve(FOLDER).resolve(name + "." + EXTENSION);
	}

	private static InputException taken(String name) {
		return new InputException(name, "there is a baseline of that name already; baselines are never replaced");
	}
}
