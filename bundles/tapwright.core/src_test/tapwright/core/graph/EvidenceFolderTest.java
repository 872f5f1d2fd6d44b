// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Effort;

class EvidenceFolderTest {

	@TempDir
	private Path folder;
	private FilterQuestion question;
	private FilterEvidence evidence;

	@BeforeEach
	void prove() throws InputException {
		// the last one has no place and an infinite margin: numbers that JSON has no words for
		question = FilterQuestion.of(FilterJson.read("""
				{"format": "tapwright-filter/1", "name": "a \\u201cquoted\\u201d name", "sampleRate": 1000,
				  "coefficients": {"values": [0.1, 0.7, 0.1]},
				  "requirements": [{"id": "met", "kind": "gain", "from": 0, "to": 100, "max": 0},
				    {"id": "missed", "severity": "should", "kind": "gain", "from": 0, "to": 500, "min": -1},
				    {"id": "linear", "kind": "linear-phase"}]}"""), Parameters.NONE);
		evidence = question.answer(Effort.STANDARD);
	}

	@Test
	void givesBackExactlyWhatWasPut() throws IOException {
		store("1").put(evidence);
		assertEquals(Optional.of(evidence), store("1").find(evidence.hash()));
	}

	@Test
	void answersWithoutComputingInTheNextSession() {
		new EvidenceCache(store("1")).answer(question, Effort.STANDARD);
		var next = new EvidenceCache(store("1"));
		assertEquals(evidence, next.answer(question, Effort.STANDARD));
		assertEquals(0, next.computed());
	}

	@Test
	void doesNotUseEvidenceOfAnotherVersion() throws IOException {
		store("1").put(evidence);
		assertEquals(Optional.empty(), store("2").find(evidence.hash()));
	}

	@Test
	void takesADamagedFileAsMissingAndReplacesIt() throws IOException {
		store("1").put(evidence);
		Path file = file("1");
		String whole = Files.readString(file);
		for (String damaged : List.of("", "{", "null", "[]", "{}", whole.substring(0, whole.length() / 2),
				whole.replace("MISSED", "PASSED"), whole.replace(evidence.hash(), "0"))) {
			Files.writeString(file, damaged);
			assertEquals(Optional.empty(), store("1").find(evidence.hash()), damaged);
		}
		store("1").put(evidence);
		assertEquals(Optional.of(evidence), store("1").find(evidence.hash()));
	}

	@Test
	void removesWhatNobodyAsksForAndAllOfOtherVersions() throws IOException {
		store("1").put(evidence);
		store("2").put(evidence);
		store("2").retain(Set.of(evidence.hash()));
		assertFalse(Files.exists(file("1").getParent()));
		assertTrue(Files.exists(file("2")));
		store("2").retain(Set.of());
		assertFalse(Files.exists(file("2")));
	}

	@Test
	void tellsVersionControlToIgnoreItself() throws IOException {
		store("1").put(evidence);
		assertEquals("*\n", Files.readString(folder.resolve("derived/.gitignore")));
	}

	@Test
	void reportsAFolderThatCannotBeWrittenAndAnswersAllTheSame() throws IOException {
		Files.writeString(folder.resolve("derived"), "a file where the folder should be");
		var cache = new EvidenceCache(store("1"));
		assertEquals(evidence, cache.answer(question, Effort.STANDARD));
		assertTrue(cache.takeFailure().isPresent());
		assertEquals(Optional.empty(), cache.takeFailure());
	}

	private EvidenceFolder store(String version) {
		return new EvidenceFolder(folder.resolve("derived"), version);
	}

	private Path file(String version) {
		return folder.resolve("derived/evidence/" + version + "/" + evidence.hash() + ".json");
	}
}
