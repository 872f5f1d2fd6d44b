// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.nio.file.Path;
import java.util.Locale;

import tapwright.core.InputException;

/** Kinds of files with signals, by the ends of their names. */
public enum SignalKind {
	/** RIFF/WAVE. */
	WAV,
	/** Numbers as text, a line for each moment, a column for each channel. */
	CSV,
	/** Words of one channel without any frame, the lowest byte first. */
	RAW;

	/**
	 * The kind of a file.
	 *
	 * @throws InputException
	 *             when the name does not tell
	 */
	public static SignalKind of(Path file) throws InputException {
		String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
		return switch (name.substring(name.lastIndexOf('.') + 1)) {
		case "wav" -> WAV;
		case "csv", "txt" -> CSV;
		case "raw", "bin" -> RAW;
		default -> throw new InputException(file.toString(),
				"the name must end with .wav, .csv, .txt, .raw or .bin, which tells the kind of file");
		};
	}
}
