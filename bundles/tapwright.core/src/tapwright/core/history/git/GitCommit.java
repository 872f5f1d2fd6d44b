// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history.git;

import java.time.Instant;

import org.eclipse.jgit.revwalk.RevCommit;

import tapwright.core.history.Author;

/**
 * A commit, for a person to find it again.
 *
 * @param hash
 *            of the commit, in full
 * @param author
 *            who wrote it
 * @param time
 *            when it was committed
 * @param title
 *            first line of its message
 */
public record GitCommit(String hash, Author author, Instant time, String title) {

	private static final int SHORT_DIGITS = 10;

	static GitCommit of(RevCommit commit) {
		String name = commit.getAuthorIdent().getName();
		return new GitCommit(commit.getName(), new Author(name.isBlank() ? "unknown" : name, commit.getAuthorIdent().getEmailAddress()),
				Instant.ofEpochSecond(commit.getCommitTime()), commit.getShortMessage());
	}

	/** The first digits of the hash. */
	public String shortHash() {
		return hash.substring(0, SHORT_DIGITS);
	}
}
