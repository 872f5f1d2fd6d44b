// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.io.EOFException;
import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import com.google.gson.Strictness;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonToken;
import com.google.gson.stream.MalformedJsonException;

import tapwright.core.InputException;

/**
 * Strict JSON (RFC 8259) as maps, lists, strings, booleans and number literals. Numbers keep their text, so that nothing is rounded
 * before its meaning is known; a key that stands twice is an error.
 */
public final class JsonTree {

	/** A number as it was written. */
	public record NumberLiteral(String text) {
	}

	private JsonTree() {
	}

	/**
	 * Reads one JSON value.
	 *
	 * @throws InputException
	 *             with line and column when it is not JSON
	 */
	public static Object parse(String text) throws InputException {
		try (var reader = new JsonReader(new StringReader(text))) {
			reader.setStrictness(Strictness.STRICT);
			Object value = value(reader, "");
			if (reader.peek() != JsonToken.END_DOCUMENT) {
				throw new InputException("", "there is more text behind the end of the JSON value");
			}
			return value;
		} catch (EOFException e) {
			throw new InputException("", "is not JSON: the text ends too early");
		} catch (MalformedJsonException e) {
			throw new InputException("", "is not JSON: " + firstLine(e.getMessage()));
		} catch (IOException e) {
			throw new InputException("", "cannot be read: " + e.getMessage());
		}
	}

	/** Appends a key to a JSON pointer. */
	static String pointer(String parent, String key) {
		return parent + "/" + key.replace("~", "~0").replace("/", "~1");
	}

	private static Object value(JsonReader reader, String pointer) throws IOException, InputException {
		return switch (reader.peek()) {
		case BEGIN_OBJECT -> object(reader, pointer);
		case BEGIN_ARRAY -> array(reader, pointer);
		case STRING -> reader.nextString();
		case NUMBER -> new NumberLiteral(reader.nextString());
		case BOOLEAN -> reader.nextBoolean();
		case NULL -> throw new InputException(pointer, "is null; leave the key out instead");
		default -> throw new InputException(pointer, "is not a JSON value");
		};
	}

	private static Map<String, Object> object(JsonReader reader, String pointer) throws IOException, InputException {
		var members = new LinkedHashMap<String, Object>();
		reader.beginObject();
		while (reader.hasNext()) {
			String key = reader.nextName();
			String place = pointer(pointer, key);
			if (members.put(key, value(reader, place)) != null) {
				throw new InputException(place, "stands twice; remove one");
			}
		}
		reader.endObject();
		return members;
	}

	private static List<Object> array(JsonReader reader, String pointer) throws IOException, InputException {
		var elements = new ArrayList<>();
		reader.beginArray();
		while (reader.hasNext()) {
			elements.add(value(reader, pointer + "/" + elements.size()));
		}
		reader.endArray();
		return elements;
	}

	// The library adds a second line with the address of its help page.
	private static String firstLine(String message) {
		return message.lines().findFirst().orElse("");
	}
}
