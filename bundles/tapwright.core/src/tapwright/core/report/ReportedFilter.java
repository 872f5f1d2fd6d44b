// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.core.verify.kind.GainKind;
import tapwright.dsp.verify.GainLimit;
import tapwright.dsp.verify.Subject;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.Requirement;

/**
 * What a report says of one filter file. Made on the thread that owns the model objects.
 *
 * @param name
 *            of the filter
 * @param page
 *            name of its page
 * @param result
 *            of its verification
 * @param subject
 *            the numbers that ship, when they can be used
 * @param limits
 *            its gain limits
 */
record ReportedFilter(String name, String page, Result result, Optional<Subject> subject, List<GainLimit> limits) {

	static ReportedFilter of(Result result, String page) {
		Optional<Filter> filter = result.source().filter();
		if (filter.isEmpty()) {
			return new ReportedFilter(result.source().file().getFileName().toString(), page, result, Optional.empty(),
					List.of());
		}
		var question = FilterQuestion.of(filter.get(), result.source().parameters(), result.source().partners());
		var limits = new ArrayList<GainLimit>();
		var numbers = new Numbers(result.source().parameters());
		for (Requirement requirement : filter.get().getRequirements()) {
			if (requirement instanceof GainRequirement gain) {
				try {
					limits.add(new GainKind().statement(gain, numbers, result.source().partners()));
				} catch (InputException | IllegalArgumentException e) {
					continue; // the evidence names it as a problem, and there is no line to draw
				}
			}
		}
		return new ReportedFilter(question.name(), page, result, question.subject(), List.copyOf(limits));
	}

	/** Unproven when the file cannot be read. */
	Verdict verdict() {
		return result.evidence() == null ? Verdict.UNPROVEN : result.evidence().verdict();
	}

	/** The verdict as people read it. */
	String verdictWord() {
		return word(verdict());
	}

	static String word(Verdict verdict) {
		return verdict.name().toLowerCase(Locale.ROOT);
	}

	List<RequirementEvidence> requirements() {
		return result.evidence() == null ? List.of() : result.evidence().requirements();
	}

	/** What a reader should look at first: the requirement with the worst verdict, of several the one with the least margin. */
	Optional<RequirementEvidence> first() {
		return requirements().stream().min(Comparator.<RequirementEvidence>comparingInt(requirement -> switch (requirement.proof().verdict()) {
		case MISSED -> 0;
		case UNPROVEN -> 1;
		case MET -> 2;
		}).thenComparingDouble(requirement -> requirement.valueUnit().equals("dB") ? requirement.proof().margin()
				.middle() : Double.MAX_VALUE));
	}

	long count(Verdict verdict) {
		return requirements().stream().filter(requirement -> requirement.proof().verdict() == verdict).count();
	}
}
