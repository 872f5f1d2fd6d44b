// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.look;

import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.eclipse.swt.graphics.Image;

import tapwright.core.quantity.Words;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Verdict;

/** How verdicts and margins look: a shape and a word for each, never colour alone. */
public final class Verdicts {

	private static final int MARGIN_DIGITS = 3;
	private static final int PLACE_DIGITS = 5;
	private static final int VALUE_DIGITS = 5;

	private Verdicts() {
	}

	/** Name of the icon of a verdict. */
	public static String icon(Verdict verdict) {
		return word(verdict);
	}

	/** The icon of a verdict. UI thread. */
	public static Image image(Verdict verdict) {
		return Icons.get(icon(verdict));
	}

	/** The word for a verdict. */
	public static String word(Verdict verdict) {
		return verdict.name().toLowerCase(Locale.ROOT);
	}

	/** The margin with its unit and sign: '+0.41 dB'. */
	public static String margin(RequirementEvidence evidence) {
		Enclosure margin = evidence.proof().margin();
		if (!isKnown(margin)) {
			return "";
		}
		if (isExact(evidence)) {
			return "exact";
		}
		double middle = margin.middle();
		return (middle > 0 ? "+" : "") + Words.of(middle, evidence.valueUnit(), MARGIN_DIGITS).replace('-', '−');
	}

	/** Whether a statement holds with nothing to spare and nothing to lose, as statements of equality do. */
	public static boolean isExact(RequirementEvidence evidence) {
		Proof proof = evidence.proof();
		return proof.verdict() == Verdict.MET && proof.margin().lo() == 0 && proof.margin().hi() == 0;
	}

	/** The worst value with its unit. */
	public static String value(RequirementEvidence evidence) {
		Enclosure value = evidence.proof().value();
		return isKnown(value) ? Words.of(value.middle(), evidence.valueUnit(), VALUE_DIGITS).replace('-', '−') : "";
	}

	/** The limit with its unit. */
	public static String limit(RequirementEvidence evidence) {
		double limit = evidence.proof().limit();
		return Double.isFinite(limit) ? Words.of(limit, evidence.valueUnit(), VALUE_DIGITS).replace('-', '−') : "";
	}

	/** The worst place with its unit; empty when there is none. */
	public static String place(RequirementEvidence evidence) {
		double worst = evidence.proof().worst();
		return Double.isNaN(worst) || evidence.placeUnit().isEmpty() ? ""
				: Words.of(worst, evidence.placeUnit(), PLACE_DIGITS);
	}

	/** Whether a proof has a finite margin to show and to sort by. */
	public static boolean hasMargin(Proof proof) {
		return isKnown(proof.margin());
	}

	private static boolean isKnown(Enclosure enclosure) {
		return Double.isFinite(enclosure.lo()) && Double.isFinite(enclosure.hi());
	}

	/** What became of a filter's requirements: '1 missed, 4 met'. */
	public static String summary(FilterEvidence evidence) {
		if (evidence.requirements().isEmpty() && evidence.problems().isEmpty()) {
			return "no requirements";
		}
		String counts = Stream.of(Verdict.MISSED, Verdict.UNPROVEN, Verdict.MET)
				.map(verdict -> count(evidence, verdict)).filter(words -> !words.isEmpty()).collect(Collectors.joining(", "));
		int problems = evidence.problems().size();
		String wrong = problems == 0 ? "" : problems == 1 ? "1 input to correct" : problems + " inputs to correct";
		return counts.isEmpty() || wrong.isEmpty() ? counts + wrong : counts + ", " + wrong;
	}

	private static String count(FilterEvidence evidence, Verdict verdict) {
		long count = evidence.requirements().stream().filter(found -> found.proof().verdict() == verdict).count();
		return count == 0 ? "" : count + " " + word(verdict);
	}
}
