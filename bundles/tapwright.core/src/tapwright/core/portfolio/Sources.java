// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.Partners;
import tapwright.model.Filter;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelFiles;

/** Finds and reads filters by paths that a person gives: portfolios, folders, filter files, interchange files. */
public final class Sources {

	/** Extension of interchange files. */
	public static final String INTERCHANGE_EXTENSION = "json";

	private final Map<Path, Parameters> parametersOf = new HashMap<>();
	private final List<FilterSource> sources = new ArrayList<>();

	private Sources() {
	}

	/**
	 * Reads all filters that the paths lead to, each once, in order. A file that cannot be read becomes a source with a problem.
	 *
	 * @throws InputException
	 *             when a path leads nowhere, or to no filter at all
	 */
	public static List<FilterSource> read(List<Path> paths) throws InputException, IOException {
		var sources = new Sources();
		Set<Path> files = new LinkedHashSet<>();
		for (Path path : paths) {
			files.addAll(sources.files(path));
		}
		files.forEach(sources::add);
		return sources.sources;
	}

	private List<Path> files(Path path) throws InputException, IOException {
		if (Files.isDirectory(path)) {
			var files = new ArrayList<>(PortfolioFolder.files(path, ModelFiles.FILTER_EXTENSION));
			for (Path json : PortfolioFolder.files(path, INTERCHANGE_EXTENSION)) {
				if (isInterchange(json)) {
					files.add(json);
				}
			}
			if (files.isEmpty()) {
				throw new InputException(path.toString(), "holds no filter: no file ends with ." + ModelFiles.FILTER_EXTENSION
						+ ", and no ." + INTERCHANGE_EXTENSION + " file has the format " + FilterJson.FORMAT);
			}
			return files;
		}
		if (!Files.exists(path)) {
			throw new InputException(path.toString(), "there is no such file or folder");
		}
		if (path.getFileName().toString().equals(ModelFiles.PORTFOLIO_FILE)) {
			return files(path.toAbsolutePath().getParent());
		}
		return List.of(path);
	}

	// Other programs keep JSON files in the same folders; only those that name the format are ours.
	private static boolean isInterchange(Path file) throws IOException {
		try {
			return Files.readString(file).contains("tapwright-filter/");
		} catch (CharacterCodingException e) {
			return false;
		}
	}

	private void add(Path file) {
		try {
			Parameters parameters = parameters(file);
			Filter filter = load(file);
			if (filter.getName() == null) {
				filter.setName(FilePartners.nameOf(file.getFileName().toString()));
			}
			sources.add(new FilterSource(file, Optional.of(filter), parameters, partners(file, parameters), ""));
		} catch (InputException e) {
			sources.add(unreadable(file, file + ": " + e.describe()));
		} catch (ModelFileException e) {
			sources.add(unreadable(file, e.getMessage()));
		} catch (IOException e) {
			sources.add(unreadable(file, file + ": cannot be read: " + e.getMessage()));
		}
	}

	private static Filter load(Path file) throws IOException, InputException {
		if (!file.toString().endsWith("." + INTERCHANGE_EXTENSION)) {
			return ModelFiles.load(file, Filter.class);
		}
		try {
			return FilterJson.read(Files.readString(file));
		} catch (CharacterCodingException e) {
			throw new InputException("", "is not text in UTF-8");
		}
	}

	private Parameters parameters(Path file) throws IOException {
		Optional<Path> folder = PortfolioFolder.above(file);
		if (folder.isEmpty()) {
			return Parameters.NONE;
		}
		Parameters known = parametersOf.get(folder.get());
		if (known == null) {
			known = new Parameters(PortfolioFolder.read(folder.get()).getParameters());
			parametersOf.put(folder.get(), known);
		}
		return known;
	}

	private static Partners partners(Path file, Parameters parameters) {
		return PortfolioFolder.above(file).map(folder -> (Partners) new FilePartners(new FolderContent(folder), parameters)).orElse(Partners.NONE);
	}

	private static FilterSource unreadable(Path file, String problem) {
		return new FilterSource(file, Optional.empty(), Parameters.NONE, Partners.NONE, problem);
	}
}
