// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.concurrent.CancellationException;

import tapwright.core.portfolio.FolderContent;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Verdict;
import tapwright.model.io.ModelFiles;

/**
 * How long a portfolio of 1,000 filters takes: all of it, after the save of one filter, after the change of a parameter that all depend
 * on, again from the stored evidence, and until cancelling takes effect. Arguments: a folder that does not exist yet, the number of filters.
 */
final class ScaleBenchmark {

	private static final long SEED = 20260101;

	private final Path folder;
	private final PortfolioVerifier verifier;
	private VerifiedPortfolio state = VerifiedPortfolio.EMPTY;

	private ScaleBenchmark(Path folder) {
		this.folder = folder;
		this.verifier = new PortfolioVerifier(new FolderContent(folder), cache(folder));
	}

	/** Prints milliseconds and megabytes. */
	public static void main(String[] arguments) throws IOException {
		Path folder = Path.of(arguments[0]);
		LargePortfolio.write(folder, Integer.parseInt(arguments[1]), SEED);
		new ScaleBenchmark(folder).run();
	}

	private void run() throws IOException {
		time("all filters, nothing known", Change.EVERYTHING);
		for (Verdict verdict : Verdict.values()) {
			System.out.println("  " + verdict + ": " + state.filters().stream().flatMap(filter -> filter.evidence().stream())
					.filter(evidence -> evidence.verdict() == verdict).count());
		}
		System.gc();
		System.out.println("memory: " + (Runtime.getRuntime().totalMemory() - Runtime.getRuntime().freeMemory()) / 1_000_000 + " MB");
		Path one = LargePortfolio.file(folder, 1);
		Files.writeString(one, Files.readString(one).replace("-52", "-51.5"));
		time("one filter saved", Change.of(Set.of(one.getFileName().toString()), Set.of()));
		LargePortfolio.writeRoot(folder, "0.11");
		Change root = Change.of(Set.of(ModelFiles.PORTFOLIO_FILE), Set.of());
		cancel(root);
		time("the rest after a parameter of all was changed and verifying was cancelled", root);
		var again = new ScaleBenchmark(folder);
		again.time("all filters, evidence stored", Change.EVERYTHING);
	}

	private void time(String what, Change change) throws IOException {
		long start = System.nanoTime();
		state = verifier.update(state, change, Progress.NONE);
		System.out.println(what + ": " + (System.nanoTime() - start) / 1_000_000 + " ms");
	}

	private void cancel(Change change) throws IOException {
		long start = System.nanoTime();
		long stop = start + 500_000_000;
		try {
			verifier.update(state, change, new Progress() {
				@Override
				public boolean isCancelled() {
					return System.nanoTime() > stop;
				}
			});
		} catch (CancellationException e) {
			System.out.println("cancelled after half a second: stopped " + (System.nanoTime() - stop) / 1_000_000 + " ms later");
		}
	}

	private static EvidenceCache cache(Path folder) {
		return new EvidenceCache(new EvidenceFolder(folder.resolve(".tapwright"), "benchmark"));
	}
}
