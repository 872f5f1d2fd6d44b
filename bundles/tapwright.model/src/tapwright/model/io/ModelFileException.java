// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import java.io.IOException;

/** A file that cannot be read as model content: says where and why. */
public class ModelFileException extends IOException {

	private static final long serialVersionUID = 1L;

	private final String file;
	private final int line;
	private final int column;
	private final String reason;

	/**
	 * @param file
	 *            name of the file, for a person
	 * @param line
	 *            from 1; 0 when it is not known
	 * @param column
	 *            from 1; 0 when it is not known
	 * @param reason
	 *            what is wrong and what to do
	 */
	public ModelFileException(String file, int line, int column, String reason) {
		super(line > 0 ? file + ":" + line + ":" + column + ": " + reason : file + ": " + reason);
		this.file = file;
		this.line = line;
		this.column = column;
		this.reason = reason;
	}

	/** Name of the file. */
	public String file() {
		return file;
	}

	/** Line from 1, or 0. */
	public int line() {
		return line;
	}

	/** Column from 1, or 0. */
	public int column() {
		return column;
	}

	/** What is wrong, without the place. */
	public String reason() {
		return reason;
	}
}
