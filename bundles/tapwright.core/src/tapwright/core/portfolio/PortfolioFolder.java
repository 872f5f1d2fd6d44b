// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import tapwright.model.Portfolio;
import tapwright.model.io.ModelFiles;

/** Where the files of a portfolio are. */
public final class PortfolioFolder {

	/** Folders whose files are history or derived, not present filters. */
	private static final Set<String> OTHER_FOLDERS = Set.of("revisions", "baselines", "target", "bin");

	private PortfolioFolder() {
	}

	/** The folder with the root file that a file or folder lies in; nothing when there is none above it. */
	public static Optional<Path> above(Path fileOrFolder) {
		for (Path folder = fileOrFolder.toAbsolutePath().normalize(); folder != null; folder = folder.getParent()) {
			if (isPortfolio(folder)) {
				return Optional.of(folder);
			}
		}
		return Optional.empty();
	}

	/** Whether a folder holds the root file of a portfolio. */
	public static boolean isPortfolio(Path folder) {
		return Files.isRegularFile(folder.resolve(ModelFiles.PORTFOLIO_FILE));
	}

	/**
	 * The root object of a portfolio.
	 *
	 * @throws IOException
	 *             when it cannot be read; says where and why
	 */
	public static Portfolio read(Path folder) throws IOException {
		return ModelFiles.load(folder.resolve(ModelFiles.PORTFOLIO_FILE), Portfolio.class);
	}

	/** Files with the given extension in a folder and below, in the order of their names; history and hidden folders are left out. */
	public static List<Path> files(Path folder, String extension) throws IOException {
		var found = new ArrayList<Path>();
		Files.walkFileTree(folder, new SimpleFileVisitor<>() {
			@Override
			public FileVisitResult preVisitDirectory(Path visited, BasicFileAttributes attributes) {
				return visited.equals(folder) || isPresent(visited) ? FileVisitResult.CONTINUE : FileVisitResult.SKIP_SUBTREE;
			}

			@Override
			public FileVisitResult visitFile(Path visited, BasicFileAttributes attributes) {
				String name = visited.getFileName().toString();
				if (name.endsWith("." + extension) && !name.startsWith(".")) {
					found.add(visited);
				}
				return FileVisitResult.CONTINUE;
			}
		});
		found.sort(null);
		return found;
	}

	/** Whether a folder can hold present filters. */
	public static boolean isPresent(Path folder) {
		String name = folder.getFileName().toString();
		return !name.startsWith(".") && !OTHER_FOLDERS.contains(name);
	}
}
