// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.core.history.History;
import tapwright.core.history.HistoryProblem;
import tapwright.core.history.RecordedRevision;
import tapwright.core.history.RevisionStore;
import tapwright.core.history.SignOffs;
import tapwright.core.history.git.GitCommit;
import tapwright.core.history.git.GitFolder;

/** Lists the revisions of a filter. */
final class HistoryVerb implements Verb {

	@Override
	public String name() {
		return "history";
	}

	@Override
	public String summary() {
		return "lists the revisions of a filter with verdicts, sign-offs and git commits";
	}

	@Override
	public String help() {
		return """
				usage: tapwright history FILE

				Lists all revisions of the filter, the newest first, and checks each of them. '*' marks a head.

				examples:
				  tapwright history marram/hydrophone-decimator-1.filter

				exit codes: 0 all revisions are what was recorded; 1 something needs attention; 2 bad usage or input""";
	}

	@Override
	public List<Option> options() {
		return List.of();
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().size() != 1) {
			throw new InputException("", "give one file; 'tapwright history --help' has an example");
		}
		Path file = VerifyVerb.path(arguments.operands().getFirst());
		RevisionStore store = RevisionStore.of(file);
		if (!Files.exists(file) && !Files.isDirectory(store.folder())) {
			throw new InputException(file.toString(), "there is no such file, and there are no revisions of that name");
		}
		History history = store.read();
		SignOffs.Reading signOffs = new SignOffs(store).read();
		Map<String, GitCommit> commits = commits(store, history);
		for (RecordedRevision revision : history.graph().revisions()) {
			console.out().println((history.graph().heads().contains(revision) ? "* " : "  ") + revision.sequence() + "  "
					+ revision.shortHash() + "  " + revision.verdict().getLiteral() + "  " + revision.time() + "  "
					+ revision.author().name() + "  " + revision.message().lines().findFirst().orElse(""));
			GitCommit commit = commits.get(revision.file().getFileName().toString());
			if (commit != null) {
				console.out().println("      commit " + commit.shortHash() + "  " + commit.title());
			}
			signOffs.on(revision.hash()).forEach(decision -> console.out().println("      " + decision.decision().getLiteral() + " by "
					+ decision.reviewer().name() + (decision.comment().isEmpty() ? "" : ": " + decision.comment())));
		}
		if (history.graph().revisions().isEmpty()) {
			console.out().println("no revisions");
		}
		List<HistoryProblem> problems = history.problems();
		problems.forEach(problem -> console.err().println("tapwright history: " + problem.describe()));
		signOffs.problems().forEach(problem -> console.err().println("tapwright history: " + problem.describe()));
		return problems.isEmpty() && signOffs.problems().isEmpty() ? Main.OK : Main.NOT_MET;
	}

	private static Map<String, GitCommit> commits(RevisionStore store, History history) throws IOException {
		if (!Files.isDirectory(store.folder())) {
			return Map.of();
		}
		try (GitFolder git = GitFolder.around(store.folder().getParent()).orElse(null)) {
			return git == null ? Map.of() : git.introduced(store.folder().getFileName().toString(),
					history.graph().revisions().stream().map(revision -> revision.file().getFileName().toString()).toList());
		}
	}
}
