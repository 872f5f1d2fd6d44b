// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

import org.eclipse.emf.ecore.EClass;

import com.google.gson.stream.JsonWriter;

import tapwright.core.meta.Meta;
import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Severity;

/**
 * Static Analysis Results Interchange Format 2.1.0 (OASIS Standard, 27 March 2020): a rule for each requirement kind, a result
 * for each requirement. Missed is 'fail' with the level of its severity, met is 'pass', unproven is 'open' (clause 3.27.9).
 * Whatever kept a filter from being verified is a notification of the run (clause 3.20.21).
 */
final class SarifFormat implements EvidenceFormat {

	private static final String SCHEMA = "https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json";

	@Override
	public String name() {
		return "sarif";
	}

	@Override
	public String write(VerificationRun run) {
		var text = new StringWriter();
		try (var json = new JsonWriter(text)) {
			json.setIndent("  ");
			json.setHtmlSafe(false);
			json.beginObject();
			json.name("$schema").value(SCHEMA);
			json.name("version").value("2.1.0");
			json.name("runs").beginArray();
			run(json, run);
			json.endArray().endObject();
		} catch (IOException e) {
			throw new UncheckedIOException("writing to memory", e);
		}
		return text.append('\n').toString();
	}

	private static void run(JsonWriter json, VerificationRun run) throws IOException {
		List<String> rules = rules(run);
		json.beginObject();
		json.name("tool").beginObject().name("driver").beginObject();
		json.name("name").value("Tapwright");
		json.name("version").value(Tool.VERSION);
		json.name("rules").beginArray();
		for (String rule : rules) {
			rule(json, rule);
		}
		json.endArray().endObject().endObject();
		json.name("columnKind").value("utf16CodeUnits");
		invocation(json, run);
		json.name("results").beginArray();
		for (Result result : run.results()) {
			if (result.evidence() != null) {
				for (RequirementEvidence requirement : result.evidence().requirements()) {
					result(json, result.source().file(), requirement, rules.indexOf(requirement.kind()));
				}
			}
		}
		json.endArray().endObject();
	}

	private static List<String> rules(VerificationRun run) {
		var kinds = new TreeSet<String>();
		for (Result result : run.results()) {
			if (result.evidence() != null) {
				result.evidence().requirements().forEach(requirement -> kinds.add(requirement.kind()));
			}
		}
		return new ArrayList<>(kinds);
	}

	private static void rule(JsonWriter json, String kind) throws IOException {
		EClass type = Meta.requirementKinds().stream().filter(candidate -> Meta.kind(candidate).equals(kind))
				.findFirst().orElseThrow();
		json.beginObject();
		json.name("id").value(kind);
		json.name("name").value(type.getName());
		message(json, "shortDescription", Meta.label(type));
		message(json, "fullDescription", Meta.documentation(type).isEmpty() ? Meta.label(type)
				: Meta.documentation(type));
		json.endObject();
	}

	private static void invocation(JsonWriter json, VerificationRun run) throws IOException {
		json.name("invocations").beginArray().beginObject();
		json.name("executionSuccessful").value(run.problems().isEmpty());
		json.name("toolExecutionNotifications").beginArray();
		for (Result result : run.results()) {
			for (String problem : result.problems()) {
				json.beginObject();
				json.name("level").value("error");
				message(json, "message", problem);
				locations(json, result.source().file());
				json.endObject();
			}
		}
		json.endArray().endObject().endArray();
	}

	private static void result(JsonWriter json, Path file, RequirementEvidence requirement,
			int rule) throws IOException {
		Verdict verdict = requirement.proof().verdict();
		json.beginObject();
		json.name("ruleId").value(requirement.kind());
		json.name("ruleIndex").value(rule);
		json.name("kind").value(switch (verdict) {
		case MET -> "pass";
		case MISSED -> "fail";
		case UNPROVEN -> "open";
		});
		json.name("level").value(verdict != Verdict.MISSED ? "none" : requirement.severity() == Severity.MUST ? "error"
				: "warning");
		message(json, "message", requirement.message());
		locations(json, file);
		json.name("partialFingerprints").beginObject();
		json.name("requirement/v1").value(file.getFileName() + "#" + requirement.id());
		json.endObject().endObject();
	}

	private static void message(JsonWriter json, String name, String text) throws IOException {
		json.name(name).beginObject().name("text").value(text).endObject();
	}

	private static void locations(JsonWriter json, Path file) throws IOException {
		json.name("locations").beginArray().beginObject();
		json.name("physicalLocation").beginObject().name("artifactLocation").beginObject();
		json.name("uri").value(uri(file));
		json.endObject().endObject().endObject().endArray();
	}

	// Relative paths stay relative, so that results mean the same in every checkout.
	private static String uri(Path file) {
		if (file.isAbsolute()) {
			return file.toUri().toString();
		}
		try {
			return new URI(null, null, file.normalize().toString().replace('\\', '/'), null).getRawPath();
		} catch (URISyntaxException e) {
			throw new IllegalStateException("a path is always a URI", e);
		}
	}
}
