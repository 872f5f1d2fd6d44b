// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A text with places for values, <code>${like-this}</code>. A line whose value has several lines is repeated for each of them, so
 * that what stands around the value, such as the sign of a comment, is there every time; a line whose value has none is left
 * out.
 */
final class Template {

	private static final Pattern PLACE = Pattern.compile("\\$\\{([a-z-]+)}");

	private final String name;
	private final List<String> lines;

	private Template(String name, String text) {
		this.name = name;
		this.lines = text.lines().toList();
	}

	/** The template of a name in the folder of templates. */
	static Template named(String name) {
		String resource = "templates/" + name + ".txt";
		try (InputStream stream = Template.class.getResourceAsStream(resource)) {
			if (stream == null) {
				throw new IllegalArgumentException("there is no " + resource);
			}
			return new Template(name, new String(stream.readAllBytes(), StandardCharsets.UTF_8));
		} catch (IOException e) {
			throw new UncheckedIOException(resource, e);
		}
	}

	/** The text with all values in place. */
	String fill(Map<String, List<String>> values) {
		var text = new StringBuilder();
		for (String line : lines) {
			int copies = 1;
			for (Matcher matcher = PLACE.matcher(line); matcher.find();) {
				int size = value(values, matcher.group(1)).size();
				copies = size == 1 ? copies : size;
			}
			for (int copy = 0; copy < copies; copy++) {
				text.append(line(line, values, copy).stripTrailing()).append('\n');
			}
		}
		return text.toString();
	}

	private String line(String line, Map<String, List<String>> values, int copy) {
		return PLACE.matcher(line).replaceAll(match -> {
			List<String> value = value(values, match.group(1));
			return Matcher.quoteReplacement(value.get(value.size() == 1 ? 0 : copy));
		});
	}

	private List<String> value(Map<String, List<String>> values, String key) {
		List<String> value = values.get(key);
		if (value == null) {
			throw new IllegalArgumentException("template '" + name + "' asks for '" + key + "', which has no value");
		}
		return value;
	}
}
