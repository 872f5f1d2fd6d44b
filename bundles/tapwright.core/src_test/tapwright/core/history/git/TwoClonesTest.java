// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history.git;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.core.InputException;
import tapwright.core.history.Author;
import tapwright.core.history.History;
import tapwright.core.history.PastEvidence;
import tapwright.core.history.RecordedRevision;
import tapwright.core.history.Recorder;
import tapwright.core.history.RevisionStore;
import tapwright.core.history.WorkingFilter;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;

/** Two people with a clone each, using the git of this machine as people do. */
class TwoClonesTest {

	private static final String FILTER = """
			<?xml version="1.0" encoding="UTF-8"?>
			<tapwright:Filter xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI"
			    xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:tapwright="urn:tapwright:1"
			    name="smooth" sampleRate="1000">
			  <requirements xsi:type="tapwright:GainRequirement" id="stop" from="400" to="500" max="-20"/>
			  <coefficients xsi:type="tapwright:RealCoefficients">
			    <values>0.25</values>
			    <values>0.5</values>
			    <values>0.25</values>
			  </coefficients>
			</tapwright:Filter>
			""";
	private static final String PORTFOLIO = """
			<?xml version="1.0" encoding="UTF-8"?>
			<tapwright:Portfolio xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:tapwright="urn:tapwright:1" name="buoy"/>
			""";

	@TempDir
	Path folder;

	@BeforeEach
	void needsGit() throws Exception {
		boolean there;
		try {
			there = new ProcessBuilder("git", "--version").start().waitFor() == 0;
		} catch (IOException e) {
			there = false;
		}
		assumeTrue(there, "git is not installed");
	}

	@Test
	void twoPeopleRecordMergeAndReconcile() throws Exception {
		Path first = portfolio();
		RecordedRevision base = record(first, "base");
		commit(first, "first state");
		git(folder, "clone", "-q", "first", "second");
		Path second = folder.resolve("second/buoy");
		configure(folder.resolve("second"), "Second");
		edit(first, "-19");
		RecordedRevision mine = record(first, "mine");
		commit(first, "mine");
		edit(second, "-18");
		RecordedRevision theirs = record(second, "theirs");
		assertEquals(new Author("Second", "second@marram.invalid"), theirs.author());
		commit(second, "theirs");
		git(second, "pull", "-q", "--no-rebase", "--no-edit", "-X", "ours", "origin", "main");

		History merged = RevisionStore.of(second.resolve("smooth.filter")).read();
		assertEquals(2, merged.graph().heads().size());
		assertTrue(merged.problems().getFirst().reason().contains("2 heads"));
		assertEquals(base.hash(), merged.graph().mergeBase(mine.hash(), theirs.hash()).orElseThrow().hash());
		RecordedRevision both = recorder(second).reconcile(WorkingFilter.read(second.resolve("smooth.filter")), "both").revision();
		assertEquals(2, both.parents().size());
		commit(second, "reconciled");
		git(second, "push", "-q", "origin", "HEAD:merged");
		git(first, "merge", "-q", "merged");
		History after = RevisionStore.of(first.resolve("smooth.filter")).read();
		assertEquals(List.of(), after.problems());
		assertEquals(both.hash(), after.graph().heads().getFirst().hash());

		try (GitFolder git = GitFolder.around(first.resolve("revisions")).orElseThrow()) {
			Map<String, GitCommit> commits = git.introduced("smooth", after.graph().revisions().stream()
					.map(revision -> revision.file().getFileName().toString()).toList());
			assertEquals("mine", commits.get(mine.file().getFileName().toString()).title());
			assertEquals("theirs", commits.get(theirs.file().getFileName().toString()).title());
			assertEquals("reconciled", commits.get(both.file().getFileName().toString()).title());
		}
	}

	@Test
	void findsWhatRegressedSinceACommitWithoutTouchingTheWorkTree() throws Exception {
		Path first = portfolio();
		commit(first, "good");
		git(first, "worktree", "add", "-q", folder.resolve("linked").toString(), "-b", "linked");
		git(folder, "clone", "-q", "--depth", "1", "file://" + folder.resolve("first"), "shallow");
		for (Path place : List.of(first, folder.resolve("linked/buoy"), folder.resolve("shallow/buoy"))) {
			edit(place, "-30");
			String before = git(place, "status", "--porcelain");
			try (GitFolder git = GitFolder.around(place).orElseThrow()) {
				PastEvidence past = PastEvidence.of(git.at("HEAD"), Progress.NONE);
				WorkingFilter now = WorkingFilter.read(place.resolve("smooth.filter"));
				var regressions = past.regressions(Map.of("smooth", now.question().answer(Effort.STANDARD)), 0.5);
				assertEquals(1, regressions.size(), place.toString());
				assertTrue(regressions.getFirst().message().contains("was met, is missed now"), regressions.toString());
				assertThrows(InputException.class, () -> git.at("no-such-branch"));
			}
			assertEquals(before, git(place, "status", "--porcelain"));
		}
	}

	@Test
	void worksWithoutGit() throws Exception {
		assertTrue(GitFolder.around(folder).isEmpty());
		Files.writeString(folder.resolve("smooth.filter"), FILTER);
		assertEquals(1, record(folder, "alone").sequence());
	}

	private Path portfolio() throws Exception {
		Path root = Files.createDirectories(folder.resolve("first"));
		git(root, "init", "-q", "-b", "main");
		configure(root, "First");
		Path portfolio = Files.createDirectories(root.resolve("buoy"));
		Files.writeString(portfolio.resolve("portfolio.tapwright"), PORTFOLIO);
		Files.writeString(portfolio.resolve("smooth.filter"), FILTER);
		return portfolio;
	}

	private void configure(Path root, String name) throws Exception {
		git(root, "config", "user.name", name);
		git(root, "config", "user.email", name.toLowerCase(Locale.ROOT) + "@marram.invalid");
	}

	private void commit(Path place, String message) throws Exception {
		git(place, "add", "-A", ".");
		git(place, "commit", "-q", "-m", message);
	}

	private static void edit(Path portfolio, String limit) throws IOException {
		Path file = portfolio.resolve("smooth.filter");
		Files.writeString(file, Files.readString(file).replaceFirst("max=\"[^\"]*\"", "max=\"" + limit + "\""));
	}

	private static Recorder recorder(Path portfolio) throws IOException {
		return new Recorder(Authors.of(portfolio), Clock.systemUTC(), Effort.STANDARD);
	}

	private static RecordedRevision record(Path portfolio, String message) throws Exception {
		return recorder(portfolio).record(WorkingFilter.read(portfolio.resolve("smooth.filter")), message).revision();
	}

	private String git(Path place, String... arguments) throws Exception {
		var command = new ArrayList<>(List.of("git"));
		command.addAll(List.of(arguments));
		Process process = new ProcessBuilder(command).directory(place.toFile()).redirectErrorStream(true).start();
		String output = new String(process.getInputStream().readAllBytes());
		assertEquals(0, process.waitFor(), () -> command + ": " + output);
		return output;
	}
}
