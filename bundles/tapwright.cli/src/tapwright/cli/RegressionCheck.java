// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeMap;

import tapwright.core.InputException;
import tapwright.core.history.BaselineStore;
import tapwright.core.history.PastEvidence;
import tapwright.core.history.Regression;
import tapwright.core.history.git.GitFolder;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.dsp.Progress;
import tapwright.model.io.ModelFiles;

/** The options --against and --since of a verification. */
final class RegressionCheck {

	private final PastEvidence past;
	private final double erosion;

	/**
	 * Finds out how the portfolio stood.
	 *
	 * @throws InputException
	 *             when there is no such baseline or commit, or the options do not fit the paths
	 */
	RegressionCheck(Arguments arguments, List<Path> paths) throws InputException, IOException {
		boolean against = arguments.has("--against");
		boolean since = arguments.has("--since");
		String option = against ? "--against" : "--since";
		if (!against && !since) {
			past = null;
			erosion = 0;
			return;
		}
		if (against && since) {
			throw new InputException(option, "cannot be given together with --since");
		}
		if (arguments.has("--shard")) {
			throw new InputException(option, "needs the whole portfolio; leave out --shard");
		}
		if (paths.size() != 1 || !PortfolioFolder.isPortfolio(paths.getFirst())) {
			throw new InputException(option, "needs one portfolio as PATH: a folder with a file " + ModelFiles.PORTFOLIO_FILE);
		}
		Path portfolio = paths.getFirst();
		erosion = PastEvidence.erosion(portfolio);
		past = against ? baseline(portfolio, arguments.option(option).orElseThrow())
				: commit(portfolio, arguments.option(option).orElseThrow());
	}

	/** Writes what stands worse; whether anything has regressed. */
	boolean report(VerificationRun run, PrintStream out) {
		if (past == null) {
			return false;
		}
		var now = new TreeMap<String, FilterEvidence>();
		for (VerificationRun.Result result : run.results()) {
			if (result.evidence() != null) {
				now.put(FilePartners.nameOf(result.source().file().getFileName().toString()), result.evidence());
			}
		}
		List<Regression> found = past.regressions(now, erosion);
		past.problems().forEach(problem -> out.println("not compared  " + problem));
		found.forEach(regression -> out.println(word(regression) + "  " + regression.message()));
		long regressed = found.stream().filter(regression -> regression.kind().counts()).count();
		out.println(regressed == 0 ? "nothing regressed" : regressed + " regressed");
		return regressed > 0;
	}

	private static PastEvidence baseline(Path portfolio, String name) throws InputException, IOException {
		var store = new BaselineStore(portfolio);
		return PastEvidence.of(store, store.read(name));
	}

	private static PastEvidence commit(Path portfolio, String revision) throws InputException, IOException {
		try (GitFolder git = GitFolder.around(portfolio).orElse(null)) {
			if (git == null) {
				throw new InputException("--since", portfolio + " is in no git work tree");
			}
			return PastEvidence.of(git.at(revision), Progress.NONE);
		}
	}

	private static String word(Regression regression) {
		return switch (regression.kind()) {
		case LOST -> "regressed";
		case ERODED -> "eroded";
		case WITHDRAWN -> "withdrawn";
		};
	}
}
