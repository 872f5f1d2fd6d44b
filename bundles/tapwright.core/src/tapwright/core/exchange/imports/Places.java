// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import tapwright.core.InputException;

/**
 * A text with the name of its file, for messages that say where.
 *
 * @param file
 *            name of the file
 * @param text
 *            its content
 */
record Places(String file, String text) {

	/** An error at an offset of the text. */
	InputException error(int offset, String reason) {
		int end = Math.min(offset, text.length());
		int line = 1;
		int start = 0;
		for (int k = 0; k < end; k++) {
			if (text.charAt(k) == '\n') {
				line++;
				start = k + 1;
			}
		}
		return new InputException(file + ":" + line + ":" + (end - start + 1), reason);
	}

	/** The line of an offset, from 1. */
	int line(int offset) {
		return 1 + (int) text.chars().limit(offset).filter(c -> c == '\n').count();
	}

	/** A piece of the text as it can stand in a message. */
	static String quote(String piece) {
		String clean = piece.replaceAll("\\p{Cntrl}", "?");
		return "'" + (clean.length() > 40 ? clean.substring(0, 40) + "..." : clean) + "'";
	}
}
