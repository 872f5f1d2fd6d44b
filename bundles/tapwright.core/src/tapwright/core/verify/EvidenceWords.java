// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.Locale;

import tapwright.core.quantity.Words;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.verify.Proof;

/** Says in one line what was proven. */
final class EvidenceWords {

	private static final int FEWEST_DIGITS = 4;
	private static final int MOST_DIGITS = 17;

	private EvidenceWords() {
	}

	static String message(RequirementEvidence evidence) {
		return evidence.id() + ": " + evidence.description() + ": " + result(evidence);
	}

	/** Value, place and distance to the limit, without the statement. */
	static String result(RequirementEvidence evidence) {
		Proof proof = evidence.proof();
		var words = new StringBuilder();
		if (known(proof.value())) {
			words.append(value(proof, evidence.valueUnit()));
			if (!Double.isNaN(proof.worst()) && !evidence.placeUnit().isEmpty()) {
				words.append(" at ").append(Words.of(proof.worst(), evidence.placeUnit(), 5));
			}
		}
		String distance = distance(evidence);
		if (!distance.isEmpty()) {
			words.append(words.isEmpty() ? "" : ", ").append(distance);
		}
		if (!proof.note().isEmpty()) {
			words.append(words.isEmpty() ? "" : "; ").append(proof.note());
		}
		return words.isEmpty() ? proof.verdict().name().toLowerCase(Locale.ROOT) : words.toString();
	}

	private static String value(Proof proof, String unit) {
		Enclosure value = proof.value();
		if (value.contains(0) && Double.isFinite(value.width())) { // digits of a number that may be zero would say nothing
			return Words.of(0, unit);
		}
		if (Double.isInfinite(value.lo()) && value.hi() > value.lo()) {
			return "at most " + Words.of(value.hi(), unit, digits(proof));
		}
		return Double.isInfinite(value.hi()) ? "at least " + Words.of(value.lo(), unit, digits(proof))
				: Words.of(value.middle(), unit, digits(proof));
	}

	private static String distance(RequirementEvidence evidence) {
		Enclosure margin = evidence.proof().margin();
		if (!known(margin) || Double.isInfinite(margin.middle())) {
			return "";
		}
		return switch (evidence.proof().verdict()) {
		case MISSED -> "short by " + Words.of(-margin.middle(), evidence.valueUnit(), 3);
		case MET -> margin.hi() == 0 ? "" : Words.of(margin.middle(), evidence.valueUnit(), 3) + " to spare";
		case UNPROVEN -> "between " + Words.of(margin.lo(), evidence.valueUnit(), 3) + " and "
				+ Words.of(margin.hi(), evidence.valueUnit(), 3) + " to spare";
		};
	}

	// Enough digits that value and limit look different when they are.
	private static int digits(Proof proof) {
		double margin = Math.abs(proof.margin().middle());
		double value = Math.abs(proof.value().middle());
		if (!(margin > 0) || !(value > 0) || Double.isInfinite(margin) || Double.isInfinite(value)) {
			return FEWEST_DIGITS;
		}
		int needed = (int) Math.ceil(Math.log10(value / margin)) + 2;
		return Math.clamp(needed, FEWEST_DIGITS, MOST_DIGITS);
	}

	private static boolean known(Enclosure enclosure) {
		return enclosure.lo() > Double.NEGATIVE_INFINITY || enclosure.hi() < Double.POSITIVE_INFINITY;
	}
}
