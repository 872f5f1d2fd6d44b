// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

import tapwright.core.InputException;
import tapwright.core.format.Tool;
import tapwright.core.graph.Change;
import tapwright.core.graph.EvidenceCache;
import tapwright.core.graph.EvidenceStore;
import tapwright.core.graph.PortfolioVerifier;
import tapwright.core.graph.VerifiedFilter;
import tapwright.core.graph.VerifiedPortfolio;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioContent;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.Progress;
import tapwright.model.Baseline;
import tapwright.model.BaselineEntry;
import tapwright.model.Evidence;
import tapwright.model.ModelPackage;
import tapwright.model.Portfolio;

/**
 * How the filters of a portfolio stood at an earlier time.
 *
 * @param evidence
 *            by the names of the filter files
 * @param problems
 *            what of that time cannot be used, in words
 */
public record PastEvidence(SortedMap<String, Evidence> evidence, List<String> problems) {

	/**
	 * As a baseline has them: what was proven when its revisions were recorded.
	 *
	 * @throws IOException
	 *             when a revision is missing or damaged
	 */
	public static PastEvidence of(BaselineStore store, Baseline baseline) throws IOException {
		var evidence = new TreeMap<String, Evidence>();
		for (BaselineEntry entry : baseline.getEntries()) {
			Evidence recorded = RevisionStore.load(store.revision(entry)).getEvidence();
			if (recorded != null) {
				evidence.put(entry.getFilter(), recorded);
			}
		}
		return new PastEvidence(evidence, List.of());
	}

	/** As earlier files of the portfolio have them: verified now, with the present program. */
	public static PastEvidence of(PortfolioContent content, Progress progress) throws IOException {
		VerifiedPortfolio verified = new PortfolioVerifier(content, new EvidenceCache(EvidenceStore.NONE))
				.update(VerifiedPortfolio.EMPTY, Change.EVERYTHING, progress);
		var evidence = new TreeMap<String, Evidence>();
		var problems = new ArrayList<String>();
		for (VerifiedFilter filter : verified.filters()) {
			filter.evidence().ifPresentOrElse(
					found -> evidence.put(FilePartners.nameOf(filter.path()), Snapshots.evidence(found, Tool.NAME)),
					() -> problems.add(filter.path() + " of that time: " + filter.ownProblems().getFirst().message()));
		}
		return new PastEvidence(evidence, problems);
	}

	/**
	 * What stands worse now.
	 *
	 * @param now
	 *            present evidence of all filters that can be read, by the names of their files
	 * @param erosion
	 *            largest loss of margin that is not reported, in dB
	 */
	public List<Regression> regressions(Map<String, FilterEvidence> now, double erosion) {
		var regressions = new ArrayList<Regression>();
		evidence.forEach((filter, before) -> regressions
				.addAll(Regressions.between(filter, before, Optional.ofNullable(now.get(filter)), erosion)));
		return regressions;
	}

	/**
	 * The portfolio's threshold of erosion, in dB.
	 *
	 * @throws InputException
	 *             when it cannot be evaluated
	 */
	public static double erosion(Path portfolio) throws InputException, IOException {
		Portfolio root = PortfolioFolder.read(portfolio);
		return new Numbers(new Parameters(root.getParameters())).get(root, ModelPackage.Literals.PORTFOLIO__EROSION);
	}
}
