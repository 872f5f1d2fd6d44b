// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.compare.Comparison;
import tapwright.core.compare.ComparisonFormat;
import tapwright.core.format.Tool;
import tapwright.core.history.RevisionGraph;
import tapwright.core.history.RevisionStore;
import tapwright.core.history.Snapshots;
import tapwright.core.history.WorkingFilter;
import tapwright.dsp.verify.Effort;
import tapwright.model.Revision;
import tapwright.model.io.ModelFiles;

/** Shows what differs between two states of a filter, or between two filters. */
final class CompareVerb implements Verb {

	@Override
	public String name() {
		return "compare";
	}

	@Override
	public String summary() {
		return "shows what differs between revisions, the present state, or two filters";
	}

	@Override
	public String help() {
		return """
				usage: tapwright compare FILE [A [B]] [--format FORMAT]
				       tapwright compare FILE OTHER.filter [--format FORMAT]

				A and B are revisions: the first digits of a hash, a sequence number, or 'head'. Without B the
				revision is compared with the present state of the file, without A the head.

				  --format FORMAT  text (for reading; the default) or json

				examples:
				  tapwright compare marram/hydrophone-decimator-1.filter
				  tapwright compare marram/hydrophone-decimator-1.filter 3 head --format json

				exit codes: 0 nothing differs; 1 something differs; 2 bad usage or input""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--format", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		List<String> operands = arguments.operands();
		if (operands.isEmpty() || operands.size() > 3) {
			throw new InputException("", "give a file and at most two revisions; 'tapwright compare --help' has examples");
		}
		String format = arguments.option("--format").orElse("text");
		if (!format.equals("text") && !format.equals("json")) {
			throw new InputException("--format", "there is no format '" + format + "'; known are text, json");
		}
		Path file = VerifyVerb.path(operands.getFirst());
		boolean filters = operands.size() == 2 && operands.get(1).endsWith("." + ModelFiles.FILTER_EXTENSION);
		Revision before = filters ? present(file) : recorded(file, operands.size() > 1 ? operands.get(1) : "head");
		Revision after = filters ? present(VerifyVerb.path(operands.get(1)))
				: operands.size() == 3 ? recorded(file, operands.get(2)) : present(file);
		Comparison comparison = Comparison.of(before, after);
		console.out().print(format.equals("json") ? ComparisonFormat.json(comparison) : ComparisonFormat.text(comparison));
		return comparison.isEmpty() ? Main.OK : Main.NOT_MET;
	}

	private static Revision present(Path file) throws InputException, IOException {
		WorkingFilter working = WorkingFilter.read(file);
		Revision state = working.snapshot();
		state.setEvidence(Snapshots.evidence(working.question().answer(Effort.STANDARD), Tool.NAME));
		return state;
	}

	private static Revision recorded(Path file, String name) throws InputException, IOException {
		RevisionGraph graph = RevisionStore.of(file).read().graph();
		return RevisionStore.load(graph.named(name));
	}
}
