// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;

/** Kinds of files that coefficients can be read from. */
public enum ImportFormat {
	/** C or C++ source with initialiser lists. */
	C("c", "C or C++ source", "c", "h", "cc", "cpp", "cxx", "hh", "hpp", "hxx", "inc"),
	/** Numbers separated by commas, semicolons, tabs or spaces. */
	TEXT("text", "numbers as text", "csv", "tsv"),
	/** JSON: our own formats or arrays of numbers. */
	JSON("json", "JSON", "json"),
	/** Hexadecimal words as text, or records with addresses and check sums. */
	HEX("hex", "hexadecimal memory image", "hex", "mem"),
	/** Words without any frame. */
	BINARY("binary", "binary memory image"),
	/** An impulse response as RIFF/WAVE. */
	WAV("wav", "WAV impulse response", "wav");

	private static final Pattern WORDS = Pattern.compile("(?m)^\\s*(//.*|#.*|@?[0-9A-Fa-f]{2,32}(\\s+[0-9A-Fa-f]{2,32})*\\s*(//.*)?)?$");

	private final String key;
	private final String label;
	private final List<String> extensions;

	ImportFormat(String key, String label, String... extensions) {
		this.key = key;
		this.label = label;
		this.extensions = List.of(extensions);
	}

	/** What a person types to choose it. */
	public String key() {
		return key;
	}

	/** What it is, for a list of choices. */
	public String label() {
		return label;
	}

	/** The format of a key. */
	public static Optional<ImportFormat> of(String key) {
		return Arrays.stream(values()).filter(format -> format.key.equals(key)).findFirst();
	}

	/** Whether a file of a folder is taken for coefficients by its name; others must be named one by one. */
	public static boolean isUsual(String fileName) {
		String extension = extension(fileName);
		return Arrays.stream(values()).anyMatch(format -> format.extensions.contains(extension));
	}

	/** The most likely format, from the content first and the name second. */
	public static ImportFormat guess(String fileName, byte[] content) {
		if (content.length >= 12 && new String(content, 0, 4, StandardCharsets.ISO_8859_1).equals("RIFF")) {
			return WAV;
		}
		for (byte value : content) {
			if (value >= 0 && value < ' ' && value != '\t' && value != '\n' && value != '\r' && value != '\f') {
				return BINARY;
			}
		}
		String extension = extension(fileName);
		for (ImportFormat format : values()) {
			if (format.extensions.contains(extension)) {
				return format;
			}
		}
		String text = new String(content, StandardCharsets.ISO_8859_1).strip();
		if (text.startsWith("{") || text.startsWith("[")) {
			return JSON;
		}
		if (text.contains("{")) {
			return C;
		}
		boolean words = text.chars().anyMatch(c -> c >= 'A' && c <= 'F' || c >= 'a' && c <= 'f') && text.lines()
				.allMatch(line -> WORDS.matcher(line).matches());
		return text.startsWith(":") || words ? HEX : TEXT;
	}

	private static String extension(String fileName) {
		return fileName.substring(fileName.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
	}
}
