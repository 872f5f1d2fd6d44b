// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.locks.LockSupport;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Several processes, and processes that die, on one store. */
class ProcessesTest {

	private static final int KILLS = Boolean.getBoolean("tapwright.thorough") ? 1000 : 8;
	private static final int EACH = 40;

	@TempDir
	Path folder;

	@Test
	void bothSurviveWhenTwoProcessesRecordAtTheSameTime() throws Exception {
		Process one = RecordingProcess.start(folder, 1, EACH);
		Process other = RecordingProcess.start(folder, 2, EACH);
		Set<String> recorded = new HashSet<>();
		for (Process process : List.of(one, other)) {
			try (BufferedReader lines = process.inputReader()) {
				lines.lines().forEach(recorded::add);
			}
			assertEquals(0, process.waitFor());
		}
		// Every other revision is the same in both processes.
		assertEquals(EACH / 2 * 3, recorded.size());
		assertValid(folder, recorded);
	}

	@Test
	void storeIsValidAfterAProcessWasKilledAtAnyMoment() throws Exception {
		var random = new Random(7);
		for (int kill = 0; kill < KILLS; kill++) {
			Path store = folder.resolve(Integer.toString(kill));
			Set<String> recorded = new HashSet<>();
			Process process = RecordingProcess.start(store, 1, Integer.MAX_VALUE);
			try (BufferedReader lines = process.inputReader()) {
				for (int k = random.nextInt(5); k >= 0; k--) {
					recorded.add(lines.readLine());
				}
				LockSupport.parkNanos(random.nextInt(3_000_000)); // the random point itself, nothing is waited for
				process.destroyForcibly().waitFor();
			}
			assertValid(store, recorded);
		}
	}

	private static void assertValid(Path folder, Set<String> recorded) throws Exception {
		History history = new RevisionStore(folder).read();
		assertEquals(List.of(), history.damaged());
		for (String hash : recorded) {
			RevisionStore.load(history.graph().find(hash).orElseThrow());
		}
		try (var files = Files.list(folder)) {
			assertTrue(files.allMatch(file -> file.toString().endsWith(".revision") || file.getFileName().toString().startsWith(".")));
		}
	}
}
