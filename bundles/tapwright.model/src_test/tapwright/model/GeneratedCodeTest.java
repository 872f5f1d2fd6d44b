// SPDX-License-Identifier: EPL-2.0
package tapwright.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.GeneralSecurityException;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The generator keeps the SHA-256 of the model and of each file that it made from it; whoever changes the model or the
 * generated code by hand is told here.
 */
class GeneratedCodeTest {

	private static final String ADVICE = "Change the model, then run releng/generate-model.";

	private static Path bundles;
	private static Map<String, String> recorded;

	@BeforeAll
	static void readWhatTheGeneratorRecorded() throws IOException {
		bundles = bundles();
		recorded = new TreeMap<>();
		for (var line : Files.readAllLines(bundles.resolve("tapwright.model/model/generated.sha256"))) {
			var hashAndFile = line.split(" +", 2);
			recorded.put(hashAndFile[1], hashAndFile[0]);
		}
		assertFalse(recorded.isEmpty());
	}

	@Test
	void theCodeIsAsNewAsTheModelItWasGeneratedFrom() throws IOException, GeneralSecurityException {
		for (var file : recorded.entrySet()) {
			var path = bundles.resolve(file.getKey());
			assertEquals(file.getValue(), Files.exists(path) ? hash(path) : "no such file",
					() -> file.getKey() + " has changed since the code was generated. " + ADVICE);
		}
	}

	@Test
	void nothingLiesBesideTheGeneratedCode() throws IOException {
		for (var folder : new String[] { "tapwright.model/src-gen", "tapwright.model.edit/src-gen" }) {
			try (var files = Files.walk(bundles.resolve(folder))) {
				var unknown = files.filter(Files::isRegularFile)
						.map(path -> bundles.relativize(path).toString().replace('\\', '/'))
						.filter(path -> !recorded.containsKey(path)).toList();
				assertEquals(List.of(), unknown, () -> "Not from the generator. " + ADVICE);
			}
		}
	}

	private static String hash(Path path) throws IOException, GeneralSecurityException {
		var digest = MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(path));
		return HexFormat.of().formatHex(digest);
	}

	/** The folder of all bundles, from wherever inside the checkout the test is run. */
	private static Path bundles() {
		var folder = Path.of("").toAbsolutePath();
		while (!Files.exists(folder.resolve("bundles/tapwright.model"))) {
			folder = folder.getParent();
		}
		return folder.resolve("bundles");
	}
}
