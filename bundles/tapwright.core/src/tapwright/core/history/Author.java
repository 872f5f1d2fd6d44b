// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.util.Objects;

/**
 * Who adds something to the history.
 *
 * @param name
 *            for a person to read
 * @param email
 *            empty when there is none
 */
public record Author(String name, String email) {

	/** Checks that there is a name. */
	public Author {
		Objects.requireNonNull(email);
		if (name.isBlank()) {
			throw new IllegalArgumentException("the author has no name; set user.name in the git configuration, or give a name");
		}
	}
}
