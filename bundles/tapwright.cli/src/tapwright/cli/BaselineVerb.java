// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.history.BaselineDifference;
import tapwright.core.history.BaselineStore;
import tapwright.core.history.RecordedRevision;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.model.Baseline;
import tapwright.model.io.ModelFiles;

/** Freezes the heads of all filters of a portfolio, or compares two such states. */
final class BaselineVerb implements Verb {

	@Override
	public String name() {
		return "baseline";
	}

	@Override
	public String summary() {
		return "freezes the revisions of a whole portfolio under a name, or compares two baselines";
	}

	@Override
	public String help() {
		return """
				usage: tapwright baseline NAME DIR [-m MESSAGE] [--unrecorded] [--author NAME] [--email ADDRESS]
				       tapwright baseline OLD NEW DIR --difference

				Freezes the head of every filter of the portfolio in DIR. Refused while a filter has several heads, was
				never recorded, or differs from its head.

				  -m MESSAGE       what the baseline is for
				  --unrecorded     freezes the heads even where filters differ from them
				  --difference     lists the filters that two baselines have differently
				  --author NAME    who freezes; by default as in the git configuration, else the computer's user
				  --email ADDRESS  address of the author

				examples:
				  tapwright baseline release-1 marram -m "first sea trial"
				  tapwright baseline release-1 release-2 marram --difference

				exit codes: 0 frozen, or nothing differs; 1 baselines differ; 2 bad usage or input, or refused""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("-m", true), new Option("--unrecorded", false), new Option("--difference", false),
				new Option("--author", true), new Option("--email", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		boolean difference = arguments.has("--difference");
		List<String> operands = arguments.operands();
		if (operands.size() != (difference ? 3 : 2)) {
			throw new InputException("", (difference ? "give two names and a portfolio" : "give a name and a portfolio")
					+ "; 'tapwright baseline --help' has examples");
		}
		Path portfolio = VerifyVerb.path(operands.getLast());
		if (!PortfolioFolder.isPortfolio(portfolio)) {
			throw new InputException(portfolio.toString(), "is no portfolio: it has no file " + ModelFiles.PORTFOLIO_FILE);
		}
		var store = new BaselineStore(portfolio);
		return difference ? compare(store, operands, console) : freeze(store, arguments, console);
	}

	private static int freeze(BaselineStore store, Arguments arguments, Console console) throws InputException, IOException {
		Baseline baseline = store.freeze(arguments.operands().getFirst(),
				RecordVerb.author(arguments, store.portfolio().resolve(ModelFiles.PORTFOLIO_FILE)),
				arguments.option("-m").orElse(""), arguments.has("--unrecorded"), Clock.systemUTC());
		console.out().println("froze " + baseline.getEntries().size() + " filters as " + baseline.getName());
		return Main.OK;
	}

	private static int compare(BaselineStore store, List<String> names, Console console) throws InputException, IOException {
		List<BaselineDifference> differences = BaselineDifference.between(store, store.read(names.get(0)), store.read(names.get(1)));
		for (BaselineDifference difference : differences) {
			String what = difference.before().isEmpty() ? "added" : difference.after().isEmpty() ? "removed" : "changed";
			console.out().println(what + "  " + difference.filter() + "  " + words(difference.before()) + " -> " + words(difference.after()));
		}
		if (differences.isEmpty()) {
			console.out().println("nothing differs");
		}
		return differences.isEmpty() ? Main.OK : Main.NOT_MET;
	}

	private static String words(Optional<RecordedRevision> revision) {
		return revision.map(found -> found.shortHash() + " (" + found.verdict().getLiteral() + ")").orElse("-");
	}
}
