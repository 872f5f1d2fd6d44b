// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;

import tapwright.core.portfolio.Sources;
import tapwright.core.verify.VerificationRun;
import tapwright.dsp.verify.Effort;

/** Clauses are those of SARIF 2.1.0. */
class SarifFormatTest {

	private static final String FILTER = """
			{"format": "tapwright-filter/1", "name": "a", "sampleRate": 1000, "coefficients": {"values": [0.25, 0.5, 0.25]},
			 "requirements": [{"id": "met", "kind": "gain", "from": 400, "to": 500, "max": -20},
			  {"id": "must", "kind": "gain", "from": 400, "to": 500, "max": -30},
			  {"id": "should", "kind": "taps", "max": 2, "severity": "should"}]}
			""";

	@TempDir
	Path folder;

	@Test
	void everyRequirementIsAResultOfTheRuleOfItsKind() throws Exception {
		JsonObject run = run(FILTER);
		List<JsonElement> results = run.getAsJsonArray("results").asList();
		assertEquals(List.of("pass none", "fail error", "fail warning"), results.stream()
				.map(JsonElement::getAsJsonObject)
				.map(result -> result.get("kind").getAsString() + " " + result.get("level").getAsString()).toList());
		for (JsonElement element : results) {
			JsonObject result = element.getAsJsonObject();
			JsonElement rule = run.getAsJsonObject("tool").getAsJsonObject("driver").getAsJsonArray("rules")
					.get(result.get("ruleIndex").getAsInt());
			assertEquals(result.get("ruleId"), rule.getAsJsonObject().get("id")); // clause 3.27.6
			assertTrue(uri(result).endsWith("a%20b.json"), uri(result));
		}
		assertTrue(run.getAsJsonArray("invocations").get(0).getAsJsonObject().get("executionSuccessful")
				.getAsBoolean());
	}

	@Test
	void whatCannotBeReadIsANotification() throws Exception {
		JsonObject invocation = run("{").getAsJsonArray("invocations").get(0).getAsJsonObject();
		assertEquals(false, invocation.get("executionSuccessful").getAsBoolean());
		JsonObject notification = invocation.getAsJsonArray("toolExecutionNotifications").get(0).getAsJsonObject();
		assertEquals("error", notification.get("level").getAsString());
		assertTrue(notification.getAsJsonObject("message").get("text").getAsString().contains("is not JSON"));
	}

	private JsonObject run(String content) throws Exception {
		Path file = Files.writeString(folder.resolve("a b.json"), content);
		String text = EvidenceFormat.of("sarif").orElseThrow()
				.write(VerificationRun.of(Sources.read(List.of(file)), Effort.STANDARD));
		JsonObject log = JsonParser.parseString(text).getAsJsonObject();
		assertEquals("2.1.0", log.get("version").getAsString());
		return log.getAsJsonArray("runs").get(0).getAsJsonObject();
	}

	private static String uri(JsonObject result) {
		return result.getAsJsonArray("locations").get(0).getAsJsonObject().getAsJsonObject("physicalLocation")
				.getAsJsonObject("artifactLocation").get("uri").getAsString();
	}
}
