// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Locale;

import com.google.gson.stream.JsonWriter;

import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.verify.Proof;

/** The format tapwright-evidence/1, described by schema/tapwright-evidence-1.schema.json. */
final class JsonFormat implements EvidenceFormat {

	private static final String FORMAT = "tapwright-evidence/1";

	@Override
	public String name() {
		return "json";
	}

	@Override
	public String write(VerificationRun run) {
		var text = new StringWriter();
		try (var json = new JsonWriter(text)) {
			json.setIndent("  ");
			json.setHtmlSafe(false);
			json.beginObject();
			json.name("format").value(FORMAT);
			json.name("tool").value(Tool.NAME);
			json.name("filters").beginArray();
			for (Result result : run.results()) {
				filter(json, result);
			}
			json.endArray().endObject();
		} catch (IOException e) {
			throw new UncheckedIOException("writing to memory", e);
		}
		return text.append('\n').toString();
	}

	private static void filter(JsonWriter json, Result result) throws IOException {
		json.beginObject();
		json.name("file").value(result.source().file().toString().replace('\\', '/'));
		if (result.evidence() == null) {
			json.name("verdict").value("unproven");
			json.name("requirements").beginArray().endArray();
		} else {
			json.name("name").value(result.evidence().name());
			json.name("hash").value(result.evidence().hash());
			json.name("verdict").value(word(result.evidence().verdict()));
			json.name("requirements").beginArray();
			for (RequirementEvidence requirement : result.evidence().requirements()) {
				requirement(json, requirement);
			}
			json.endArray();
		}
		if (!result.problems().isEmpty()) {
			json.name("problems").beginArray();
			for (String problem : result.problems()) {
				json.value(problem);
			}
			json.endArray();
		}
		json.endObject();
	}

	private static void requirement(JsonWriter json, RequirementEvidence requirement) throws IOException {
		Proof proof = requirement.proof();
		json.beginObject();
		json.name("id").value(requirement.id());
		json.name("kind").value(requirement.kind());
		json.name("verdict").value(word(proof.verdict()));
		json.name("worst").beginObject();
		if (!Double.isNaN(proof.worst())) {
			json.name("at");
			number(json, proof.worst());
		}
		json.name("value");
		enclosure(json, proof.value());
		json.endObject();
		if (!Double.isNaN(proof.limit())) {
			json.name("limit");
			number(json, proof.limit());
		}
		json.name("margin");
		enclosure(json, proof.margin());
		json.name("message").value(requirement.message());
		json.endObject();
	}

	private static void enclosure(JsonWriter json, Enclosure enclosure) throws IOException {
		json.beginArray();
		number(json, enclosure.lo());
		number(json, enclosure.hi());
		json.endArray();
	}

	// JSON has no infinity; the words are those that Java and JavaScript read as numbers.
	private static void number(JsonWriter json, double value) throws IOException {
		if (Double.isInfinite(value)) {
			json.value(value > 0 ? "Infinity" : "-Infinity");
		} else if (value == Math.rint(value) && Math.abs(value) < 1e15) {
			json.value((long) value);
		} else {
			json.value(value);
		}
	}

	private static String word(Enum<?> verdict) {
		return verdict.name().toLowerCase(Locale.ROOT);
	}
}
