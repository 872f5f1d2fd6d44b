// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history.git;

import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Collection;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;

import org.eclipse.jgit.errors.MissingObjectException;
import org.eclipse.jgit.errors.RevisionSyntaxException;
import org.eclipse.jgit.lib.Constants;
import org.eclipse.jgit.lib.ObjectId;
import org.eclipse.jgit.lib.Repository;
import org.eclipse.jgit.lib.UserConfig;
import org.eclipse.jgit.revwalk.RevCommit;
import org.eclipse.jgit.revwalk.RevSort;
import org.eclipse.jgit.revwalk.RevWalk;
import org.eclipse.jgit.storage.file.FileRepositoryBuilder;
import org.eclipse.jgit.treewalk.AbstractTreeIterator;
import org.eclipse.jgit.treewalk.CanonicalTreeParser;
import org.eclipse.jgit.treewalk.EmptyTreeIterator;
import org.eclipse.jgit.treewalk.TreeWalk;
import org.eclipse.jgit.treewalk.filter.AndTreeFilter;
import org.eclipse.jgit.treewalk.filter.PathFilter;
import org.eclipse.jgit.treewalk.filter.TreeFilter;

import tapwright.core.InputException;
import tapwright.core.history.Author;

/** A folder in the work tree of a git repository. Reads the object database only; close it. */
public final class GitFolder implements AutoCloseable {

	private final Repository repository;
	private final String prefix;

	private GitFolder(Repository repository, String prefix) {
		this.repository = repository;
		this.prefix = prefix;
	}

	/**
	 * Opens the repository around a folder: a clone, shallow or not, or a linked work tree.
	 *
	 * @return nothing when the folder is in no work tree
	 * @throws IOException
	 *             when the repository cannot be read
	 */
	public static Optional<GitFolder> around(Path folder) throws IOException {
		Path real = folder.toRealPath();
		var builder = new FileRepositoryBuilder().readEnvironment().findGitDir(real.toFile());
		if (builder.getGitDir() == null) {
			return Optional.empty();
		}
		Repository repository = builder.setMustExist(true).build();
		if (repository.isBare() || !real.startsWith(repository.getWorkTree().toPath().toRealPath())) {
			repository.close();
			return Optional.empty();
		}
		Path below = repository.getWorkTree().toPath().toRealPath().relativize(real);
		return Optional.of(new GitFolder(repository, below.toString().replace(File.separatorChar, '/')));
	}

	/** Who commits here, by the git configuration; nothing when git would have to guess. */
	public Optional<Author> author() {
		UserConfig user = repository.getConfig().get(UserConfig.KEY);
		if (user.isAuthorNameImplicit()) {
			return Optional.empty();
		}
		return Optional.of(new Author(user.getAuthorName(), user.isAuthorEmailImplicit() ? "" : user.getAuthorEmail()));
	}

	/**
	 * The folder as it was in a commit.
	 *
	 * @param revision
	 *            as git names commits: a branch, a tag, a hash, HEAD~3
	 * @throws InputException
	 *             when there is no such commit, or a shallow clone does not have it
	 */
	public GitContent at(String revision) throws InputException, IOException {
		try (var walk = new RevWalk(repository)) {
			ObjectId id = repository.resolve(revision + "^{commit}");
			if (id == null) {
				throw new InputException(revision, "git has no such commit here; a shallow clone may lack it: fetch more of the history");
			}
			return new GitContent(repository, walk.parseCommit(id).getTree(), prefix);
		} catch (RevisionSyntaxException e) {
			throw new InputException(revision, "is not a name that git understands");
		} catch (MissingObjectException e) {
			throw new InputException(revision, "the clone is shallow and does not hold that commit; fetch more of the history");
		}
	}

	/**
	 * The commit that brought in each file, of those that HEAD comes from. In a shallow clone the oldest commit that is there
	 * stands for all before it.
	 *
	 * @param below
	 *            a folder in this one, with '/' between the parts
	 * @param paths
	 *            of files in it
	 * @return commits by path; files that were never committed are missing
	 */
	public Map<String, GitCommit> introduced(String below, Collection<String> paths) throws IOException {
		var found = new TreeMap<String, GitCommit>();
		Set<String> open = new HashSet<>(paths);
		ObjectId head = repository.resolve(Constants.HEAD);
		String base = prefix.isEmpty() ? below : prefix + "/" + below;
		if (head == null || open.isEmpty()) {
			return found;
		}
		try (var walk = new RevWalk(repository)) {
			walk.markStart(walk.parseCommit(head));
			walk.sort(RevSort.TOPO);
			walk.sort(RevSort.REVERSE, true);
			for (RevCommit commit : walk) {
				for (String path : added(walk, commit, base)) {
					if (open.remove(path)) {
						found.put(path, GitCommit.of(commit));
					}
				}
				if (open.isEmpty()) {
					break;
				}
			}
		}
		return found;
	}

	@Override
	public void close() {
		repository.close();
	}

	// Names below the folder that a commit has and its first parent has not. A merge brings in what its other parents made, but
	// those stand before it.
	private Set<String> added(RevWalk walk, RevCommit commit, String folder) throws IOException {
		var names = new HashSet<String>();
		try (var tree = new TreeWalk(repository)) {
			tree.addTree(iterator(walk, commit));
			tree.addTree(commit.getParentCount() == 0 ? new EmptyTreeIterator() : iterator(walk, walk.parseCommit(commit.getParent(0))));
			tree.setRecursive(true);
			tree.setFilter(AndTreeFilter.create(PathFilter.create(folder),
					TreeFilter.ANY_DIFF));
			while (tree.next()) {
				if (tree.getObjectId(1).equals(ObjectId.zeroId())) {
					names.add(tree.getPathString().substring(folder.length() + 1));
				}
			}
		}
		return names;
	}

	private AbstractTreeIterator iterator(RevWalk walk, RevCommit commit) throws IOException {
		try (var reader = repository.newObjectReader()) {
			return new CanonicalTreeParser(null, reader, commit.getTree());
		}
	}
}
