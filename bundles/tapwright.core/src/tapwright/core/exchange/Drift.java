// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange;

import java.util.Optional;

/** How an exported text stands to the filter that it came from. */
public enum Drift {
	/** The text is as it was exported, and the filter still has these numbers. */
	NONE("is as it was exported and matches its filter"),
	/** The filter has other numbers now. */
	OUTDATED("was exported before the filter changed; export it again"),
	/** The text was changed by hand; the filter still has the numbers that were exported. */
	EDITED("was changed by hand after it was exported; export it again, or import it and record why"),
	/** Both. */
	EDITED_AND_OUTDATED("was changed by hand after it was exported, and the filter has changed since"),
	/** The text carries no hashes. */
	UNKNOWN("carries no hashes of an export, or they were removed");

	private final String words;

	Drift(String words) {
		this.words = words;
	}

	/** What to tell a person, without the name of the file. */
	public String words() {
		return words;
	}

	/** Compares a text with the filter as it is now. */
	public static Drift of(String text, HandOver filter) {
		Optional<Boolean> intact = Stamp.intact(text);
		Optional<String> numbers = Stamp.numbers(text);
		if (intact.isEmpty() || numbers.isEmpty()) {
			return UNKNOWN;
		}
		boolean current = numbers.get().equals(filter.numbersHash());
		if (intact.get()) {
			return current ? NONE : OUTDATED;
		}
		return current ? EDITED : EDITED_AND_OUTDATED;
	}
}
