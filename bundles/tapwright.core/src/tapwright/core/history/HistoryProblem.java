// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.nio.file.Path;

/**
 * Something in the files of the history that a person has to look at.
 *
 * @param file
 *            the file, or the folder of the filter's revisions
 * @param reason
 *            what is wrong and what to do
 */
public record HistoryProblem(Path file, String reason) {

	/** File and reason in one line. */
	public String describe() {
		return file + ": " + reason;
	}
}
