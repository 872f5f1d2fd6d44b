// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigInteger;
import java.util.List;

import com.google.gson.stream.JsonWriter;

import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;
import tapwright.core.format.Tool;

/** The format tapwright-coefficients/1: one JSON object with the numbers that ship. */
final class JsonExport implements ExportFormat {

	static final String FORMAT = "tapwright-coefficients/1";

	@Override
	public String name() {
		return "json";
	}

	@Override
	public String label() {
		return "JSON with the coefficients";
	}

	@Override
	public List<ExportedFile> write(HandOver filter) {
		var text = new StringWriter();
		try (var json = new JsonWriter(text)) {
			json.setIndent("  ");
			json.setHtmlSafe(false);
			json.beginObject();
			json.name("format").value(FORMAT);
			json.name("tool").value(Tool.NAME);
			json.name("tapwright-numbers").value(filter.numbersHash());
			json.name("tapwright-text").value(Stamp.placeholder());
			json.name("name").value(filter.name());
			if (!filter.revision().isEmpty()) {
				json.name("revision").value(filter.revision());
			}
			json.name("sampleRate").value(filter.sampleRate());
			lines(json, "requirements", filter.requirements());
			lines(json, "formats", filter.formats());
			if (filter.whole()) {
				json.name("scale").value(Values.unit(filter.stored().unit()));
				json.name("integers").beginArray();
				for (BigInteger integer : filter.integers()) {
					json.value(integer);
				}
				json.endArray();
			}
			json.name("values").beginArray();
			for (double tap : filter.taps().toDoubles()) {
				json.value(tap);
			}
			json.endArray();
			json.endObject();
		} catch (IOException e) {
			throw new UncheckedIOException("writing to memory", e);
		}
		return List.of(new ExportedFile(Values.identifier(filter.name()) + ".json",
				Stamp.seal(text.append('\n').toString())));
	}

	private static void lines(JsonWriter json, String name, List<String> lines) throws IOException {
		json.name(name).beginArray();
		for (String line : lines) {
			json.value(line);
		}
		json.endArray();
	}
}
