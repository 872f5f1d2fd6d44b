// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import tapwright.core.history.Regression.Kind;
import tapwright.core.quantity.Words;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.RequirementEvidence;
import tapwright.model.Evidence;
import tapwright.model.Result;
import tapwright.model.Verdict;

/** Finds what stands worse than before. Stateless; the builder, the command and the margin board ask the same. */
public final class Regressions {

	/** The unit that the portfolio's threshold of erosion is in. */
	private static final String EROSION_UNIT = "dB";

	private Regressions() {
	}

	/**
	 * Compares what was recorded with what is proven now.
	 *
	 * @param filter
	 *            name of the filter
	 * @param before
	 *            recorded evidence
	 * @param after
	 *            present evidence; nothing when the filter is gone or unreadable
	 * @param erosion
	 *            largest loss of margin that is not reported, in dB; margins in other units are not compared with it
	 */
	public static List<Regression> between(String filter, Evidence before, Optional<FilterEvidence> after, double erosion) {
		var regressions = new ArrayList<Regression>();
		if (after.isEmpty()) {
			return List.of(new Regression(filter, "", Kind.WITHDRAWN, filter + ": the filter is no longer there"));
		}
		for (Result result : before.getResults()) {
			if (result.getVerdict() == Verdict.MET) {
				compare(filter, result, after.get(), erosion).ifPresent(regressions::add);
			}
		}
		return regressions;
	}

	private static Optional<Regression> compare(String filter, Result before, FilterEvidence evidence, double erosion) {
		String id = before.getRequirement();
		Optional<RequirementEvidence> found = evidence.find(id);
		if (found.isEmpty()) {
			boolean asked = evidence.problems().stream().anyMatch(problem -> problem.requirement().equals(id));
			return Optional.of(asked ? new Regression(filter, id, Kind.LOST, filter + ": " + id + ": was met, cannot be verified now")
					: new Regression(filter, id, Kind.WITHDRAWN, filter + ": " + id + ": was met, is no longer asked"));
		}
		RequirementEvidence after = found.get();
		if (after.proof().verdict() != tapwright.dsp.verify.Verdict.MET) {
			return Optional.of(new Regression(filter, id, Kind.LOST, filter + ": was met, is "
					+ after.proof().verdict().name().toLowerCase(Locale.ROOT) + " now: " + after.message()));
		}
		// Certain even if the old margin was the smallest and the new one the largest that the enclosures allow.
		double loss = before.getMarginLow() - after.proof().margin().hi();
		if (after.valueUnit().equals(EROSION_UNIT) && loss > erosion) {
			return Optional.of(new Regression(filter, id, Kind.ERODED, filter + ": the margin of " + id + " shrank by "
					+ Words.of(loss, EROSION_UNIT, 3) + " to " + Words.of(after.proof().margin().middle(), EROSION_UNIT, 3)));
		}
		return Optional.empty();
	}
}
