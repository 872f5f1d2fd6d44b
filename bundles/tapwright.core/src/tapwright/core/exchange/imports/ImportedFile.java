// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.model.Filter;

/**
 * What was found in a file: a whole filter in our interchange format, or arrays of coefficients. A preview; nothing has been
 * written.
 *
 * @param file
 *            its name
 * @param format
 *            that it was read in
 * @param filter
 *            when it holds one
 * @param tables
 *            otherwise; empty when nothing was found
 */
public record ImportedFile(String file, ImportFormat format, Optional<Filter> filter, List<ImportedTable> tables) {

	/** Largest file that is read, in bytes. */
	public static final int LARGEST = 64 << 20;

	/**
	 * Reads a file's content.
	 *
	 * @param file
	 *            name, for the guess of the format and for messages
	 * @throws InputException
	 *             with file, line, column and reason
	 */
	public static ImportedFile read(String file, byte[] content, ImportOptions options) throws InputException {
		if (content.length > LARGEST) {
			throw new InputException(file, "has more than " + (LARGEST >> 20) + " MiB; coefficients need far less");
		}
		checkWord(file, options);
		ImportFormat format = options.format().orElseGet(() -> ImportFormat.guess(file, content));
		if (format == ImportFormat.JSON) {
			String text = text(file, content);
			if (text.contains("\"" + FilterJson.FORMAT + "\"")) {
				return new ImportedFile(file, format, Optional.of(filter(file, text)), List.of());
			}
		}
		List<ImportedTable> found = switch (format) {
		case C -> CReader.read(new Places(file, text(file, content)));
		case TEXT -> TextReader.read(new Places(file, text(file, content)));
		case JSON -> JsonReader.read(new Places(file, text(file, content)));
		case HEX -> HexReader.read(new Places(file, text(file, content)), options);
		case BINARY -> BinaryReader.read(file, content, options);
		case WAV -> WavImport.read(file, content);
		};
		var tables = new ArrayList<ImportedTable>();
		for (ImportedTable table : found) {
			tables.add(Formats.settle(table, options, table.line() > 0 ? file + ":" + table.line() : file));
		}
		return new ImportedFile(file, format, Optional.empty(), List.copyOf(tables));
	}

	private static void checkWord(String file, ImportOptions options) throws InputException {
		int word = options.word().orElse(1);
		if (word < 1 || word > NumberFormat.MAX_WORD) {
			throw new InputException(file, "a word of " + word + " bits; it must have 1 to " + NumberFormat.MAX_WORD);
		}
	}

	private static Filter filter(String file, String text) throws InputException {
		try {
			return FilterJson.read(text);
		} catch (InputException e) {
			throw new InputException(file, e.describe());
		}
	}

	// Sources of other programs are often in older encodings; numbers look the same in all of them.
	private static String text(String file, byte[] content) throws InputException {
		String text;
		try {
			text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(content)).toString();
		} catch (CharacterCodingException e) {
			text = new String(content, StandardCharsets.ISO_8859_1);
		}
		if (text.startsWith("\uFEFF")) {
			text = text.substring(1);
		}
		int zero = text.indexOf('\0');
		if (zero >= 0) {
			throw new Places(file, text).error(zero, "a byte that is no text; is this a binary image?");
		}
		return text.replace("\r\n", "\n").replace('\r', '\n');
	}
}
