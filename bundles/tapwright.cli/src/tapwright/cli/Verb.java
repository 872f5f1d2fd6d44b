// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.util.List;

import tapwright.core.InputException;

/** One thing that the headless command can do. Stateless; a thin caller of the core. */
interface Verb {

	/** What a person types. */
	String name();

	/** One line for the list of verbs. */
	String summary();

	/** Usage, options and examples. */
	String help();

	/** The options that it knows. */
	List<Option> options();

	/**
	 * Does it.
	 *
	 * @return the exit code
	 * @throws InputException
	 *             when arguments or input are not understood; nothing was written then
	 * @throws IOException
	 *             when a file cannot be read or written
	 */
	int run(Arguments arguments, Console console) throws InputException, IOException;

	/**
	 * An option.
	 *
	 * @param name
	 *            with its dashes
	 * @param hasValue
	 *            whether a value follows
	 */
	record Option(String name, boolean hasValue) {
	}
}
