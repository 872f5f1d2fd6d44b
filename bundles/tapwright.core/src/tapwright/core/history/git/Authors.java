// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history.git;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;

import org.eclipse.jgit.errors.ConfigInvalidException;
import org.eclipse.jgit.lib.UserConfig;
import org.eclipse.jgit.util.SystemReader;

import tapwright.core.history.Author;

/** Who works here. */
public final class Authors {

	private Authors() {
	}

	/**
	 * The author by the git configuration of the folder's repository, otherwise by that of the person, otherwise the name of the
	 * computer's user.
	 *
	 * @throws IOException
	 *             when a git configuration cannot be read
	 */
	public static Author of(Path folder) throws IOException {
		try (GitFolder git = GitFolder.around(folder).orElse(null)) {
			Optional<Author> local = git == null ? ofPerson() : git.author();
			return local.orElseGet(() -> new Author(System.getProperty("user.name"), ""));
		}
	}

	private static Optional<Author> ofPerson() throws IOException {
		try {
			UserConfig user = SystemReader.getInstance().getUserConfig().get(UserConfig.KEY);
			return user.isAuthorNameImplicit() ? Optional.empty()
					: Optional.of(new Author(user.getAuthorName(), user.isAuthorEmailImplicit() ? "" : user.getAuthorEmail()));
		} catch (ConfigInvalidException e) {
			throw new IOException("the git configuration cannot be read: " + e.getMessage(), e);
		}
	}
}
