// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.util.Map;

import tapwright.core.InputException;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;

/** Filters in the format tapwright-filter/1. */
public final class FilterJson {

	/** Name and version of the format, the first key of a file. */
	public static final String FORMAT = "tapwright-filter/1";

	private static final String FORMAT_KEY = "format";

	private FilterJson() {
	}

	/**
	 * Reads a filter.
	 *
	 * @throws InputException
	 *             with a pointer to the place
	 */
	public static Filter read(String text) throws InputException {
		if (!(JsonTree.parse(text) instanceof Map<?, ?> members)) {
			throw new InputException("", "must be a JSON object with \"format\": \"" + FORMAT + "\"");
		}
		Object format = members.get(FORMAT_KEY);
		if (!FORMAT.equals(format)) {
			throw new InputException("/" + FORMAT_KEY,
					format == null ? "is missing; it must be \"" + FORMAT + "\"" : "must be \"" + FORMAT + "\"");
		}
		members.remove(FORMAT_KEY);
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		ObjectReader.fill(filter, members, "");
		return filter;
	}

	/** Writes a filter: deterministic, two spaces of indentation, '\n' between lines. */
	public static String write(Filter filter) {
		return ObjectWriter.write(filter, FORMAT_KEY, FORMAT);
	}
}
