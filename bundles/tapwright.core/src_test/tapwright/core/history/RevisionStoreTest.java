// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.model.Revision;
import tapwright.model.Verdict;

class RevisionStoreTest {

	@TempDir
	Path folder;

	private Path file;

	@BeforeEach
	void makePortfolio() throws IOException {
		file = Samples.portfolio(folder);
	}

	@Test
	void recordsAndReadsBackWhatWasRecorded() throws Exception {
		RecordedRevision recorded = record("first");
		assertTrue(recorded.file().toString().matches(".*revisions.smooth.0001-" + recorded.shortHash() + "\\.revision"),
				recorded.file().toString());
		History history = history();
		assertEquals(List.of(recorded), List.copyOf(history.graph().revisions()));
		assertEquals(List.of(), history.problems());
		assertEquals(Verdict.MET, recorded.verdict());
		assertEquals("2026-03-01T12:00:00Z", recorded.time());
		Revision revision = RevisionStore.load(recorded);
		assertEquals("1000", revision.getParameters().getFirst().getValue());
		assertEquals("rate", revision.getFilter().getSampleRate());
	}

	@Test
	void refusesAFilterThatHasNotChanged() throws Exception {
		record("first");
		assertTrue(assertThrows(InputException.class, () -> record("again")).describe().contains("has not changed"));
		assertEquals(1, history().graph().revisions().size());
	}

	@Test
	void noticesAParameterThatChanged() throws Exception {
		record("first");
		Samples.tamper(folder.resolve("portfolio.tapwright"), "1 kHz", "2 kHz");
		assertTrue(Recorder.hasUnrecordedChanges(WorkingFilter.read(file)));
		assertEquals(2, record("faster").sequence());
	}

	@Test
	void recordsAMissedRequirementWithAWarning() throws Exception {
		var recording = Samples.recorder().record(Samples.edit(file, "-30"), "too strict");
		assertEquals(Verdict.MISSED, recording.revision().verdict());
		assertTrue(recording.warnings().toString().contains("stop"), recording.warnings().toString());
	}

	@Test
	void neverReplacesAFile() throws Exception {
		RecordedRevision recorded = record("first");
		byte[] before = Files.readAllBytes(recorded.file());
		assertThrows(FileAlreadyExistsException.class, () -> RevisionStore.of(file).add(RevisionStore.load(recorded), 1));
		assertEquals(-1, Arrays.mismatch(before, Files.readAllBytes(recorded.file())));
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "max=\"-20\"|max=\"-19\"|edited", "<values>0.5</values>|<values>0.5000000000000001</values>|edited",
			"author=\"Owner\"|author=\"Other\"|edited", "</tapwright:Revision>||line", "author=\"Owner\"|author=\"\"|author" })
	void reportsAndNeverUsesAChangedFile(String from, String to, String reason) throws Exception {
		RecordedRevision recorded = record("first");
		Samples.tamper(recorded.file(), from, to == null ? "" : to);
		History history = history();
		assertEquals(List.of(), List.copyOf(history.graph().revisions()));
		assertEquals(recorded.file(), history.problems().getFirst().file());
		assertTrue(history.problems().getFirst().reason().contains(reason), history.problems().toString());
		assertThrows(IOException.class, () -> RevisionStore.load(recorded));
		Samples.edit(file, "-10");
		assertThrows(InputException.class, () -> record("on top of damage"));
	}

	@Test
	void reportsEveryTruncation() throws Exception {
		RecordedRevision recorded = record("first");
		byte[] whole = Files.readAllBytes(recorded.file());
		for (int length = 0; length < whole.length - 1; length += 7) {
			Files.write(recorded.file(), Arrays.copyOf(whole, length));
			assertEquals(1, history().damaged().size(), "length " + length);
		}
	}

	@Test
	void reportsARenamedFile() throws Exception {
		RecordedRevision recorded = record("first");
		Files.move(recorded.file(), recorded.file().resolveSibling("0001-0123456789ab.revision"));
		assertTrue(history().problems().getFirst().reason().contains("renamed"), history().problems().toString());
		Files.move(recorded.file().resolveSibling("0001-0123456789ab.revision"), recorded.file().resolveSibling("copy.revision"));
		assertTrue(history().problems().getFirst().reason().contains("its name"), history().problems().toString());
		Files.move(recorded.file().resolveSibling("copy.revision"), recorded.file().resolveSibling("0007-" + recorded.shortHash() + ".revision"));
		assertTrue(history().problems().getFirst().reason().contains("sequence number"), history().problems().toString());
	}

	@Test
	void reportsAMissingParent() throws Exception {
		RecordedRevision first = record("first");
		Samples.edit(file, "-10");
		record("second");
		Files.delete(first.file());
		assertTrue(history().problems().getFirst().reason().contains(first.shortHash()), history().problems().toString());
	}

	@Test
	void reconcilesTwoHeads() throws Exception {
		RecordedRevision base = record("base");
		Samples.edit(file, "-10");
		RecordedRevision mine = record("mine");
		Path aside = folder.resolve("aside");
		Files.move(mine.file(), aside);
		Samples.edit(file, "-15");
		RecordedRevision theirs = record("theirs");
		Files.move(aside, mine.file());
		RevisionGraph graph = history().graph();
		assertEquals(2, graph.heads().size());
		assertEquals(base, graph.mergeBase(mine.hash(), theirs.hash()).orElseThrow());
		assertTrue(history().problems().getFirst().reason().contains("2 heads"), history().problems().toString());
		Samples.edit(file, "-12");
		assertThrows(InputException.class, () -> record("neither"));
		RecordedRevision both = Samples.recorder().reconcile(WorkingFilter.read(file), "between both").revision();
		assertEquals(2, both.parents().size());
		assertEquals(3, both.sequence());
		assertEquals(List.of(both), history().graph().heads());
		assertEquals(List.of(), history().problems());
	}

	private RecordedRevision record(String message) throws InputException, IOException {
		return Samples.recorder().record(WorkingFilter.read(file), message).revision();
	}

	private History history() throws IOException {
		return RevisionStore.of(file).read();
	}
}
