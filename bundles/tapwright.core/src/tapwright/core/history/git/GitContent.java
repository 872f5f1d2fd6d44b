// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history.git;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.eclipse.jgit.lib.FileMode;
import org.eclipse.jgit.lib.ObjectId;
import org.eclipse.jgit.lib.Repository;
import org.eclipse.jgit.treewalk.TreeWalk;
import org.eclipse.jgit.treewalk.filter.PathFilter;

import tapwright.core.portfolio.PortfolioContent;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.model.io.ModelFiles;

/**
 * The files of a portfolio as a commit has them, read from the object database: the work tree is neither read nor touched. Usable
 * from several threads until the folder that it came from is closed.
 */
public final class GitContent implements PortfolioContent {

	private final Repository repository;
	private final ObjectId tree;
	private final String prefix;

	GitContent(Repository repository, ObjectId tree, String prefix) {
		this.repository = repository;
		this.tree = tree.copy();
		this.prefix = prefix.isEmpty() ? "" : prefix + "/";
	}

	@Override
	public List<String> filters() throws IOException {
		var found = new ArrayList<String>();
		try (var walk = new TreeWalk(repository)) {
			walk.addTree(tree);
			walk.setRecursive(true);
			if (!prefix.isEmpty()) {
				walk.setFilter(PathFilter.create(prefix.substring(0, prefix.length() - 1)));
			}
			while (walk.next()) {
				String path = walk.getPathString().substring(prefix.length());
				if (FileMode.REGULAR_FILE.equals(walk.getFileMode(0)) && isFilter(path)) {
					found.add(path);
				}
			}
		}
		found.sort(null);
		return found;
	}

	@Override
	public byte[] read(String path) throws IOException {
		try (TreeWalk walk = TreeWalk.forPath(repository, prefix + path, tree)) {
			if (walk == null) {
				throw new NoSuchFileException(path);
			}
			return repository.open(walk.getObjectId(0)).getBytes();
		}
	}

	private static boolean isFilter(String path) {
		List<String> parts = Arrays.asList(path.split("/"));
		String name = parts.getLast();
		return name.endsWith("." + ModelFiles.FILTER_EXTENSION) && !name.startsWith(".")
				&& parts.subList(0, parts.size() - 1).stream().allMatch(part -> PortfolioFolder.isPresent(Path.of(part)));
	}
}
