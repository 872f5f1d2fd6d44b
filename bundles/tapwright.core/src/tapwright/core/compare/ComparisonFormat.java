// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

import com.google.gson.GsonBuilder;

import tapwright.core.compare.ContentChange.Part;
import tapwright.core.compare.MarginChange.Standing;
import tapwright.core.quantity.Words;
import tapwright.dsp.arithmetic.Cost;

/** Writes a comparison for a person or for a program. Stateless; '\n' between lines. */
public final class ComparisonFormat {

	private static final String FORMAT = "tapwright-comparison/1";

	private ComparisonFormat() {
	}

	/** For a person. */
	public static String text(Comparison comparison) {
		if (comparison.isEmpty()) {
			return "nothing differs\n";
		}
		var text = new StringBuilder();
		for (Part part : Part.values()) {
			List<ContentChange> changes = comparison.changes().stream().filter(change -> change.part() == part).toList();
			if (!changes.isEmpty()) {
				text.append(word(part)).append('\n');
				changes.forEach(change -> text.append("  ").append(change.words()).append('\n'));
			}
		}
		CoefficientTable table = comparison.coefficients();
		if (table.changed() > 0) {
			text.append("coefficients: ").append(table.changed()).append(" differ, in ")
					.append(table.unit() == CoefficientTable.Unit.STEP ? "steps" : "units of the last place").append('\n');
			table.rows().stream().filter(CoefficientTable.Row::changed).forEach(row -> text.append("  ").append(row.index()).append("  ")
					.append(number(row.before())).append(" -> ").append(number(row.after())).append("  ")
					.append(number(row.difference())).append('\n'));
		}
		comparison.response().filter(response -> response.largest() > Double.NEGATIVE_INFINITY)
				.ifPresent(response -> text.append("responses differ by up to ").append(Words.of(response.largest(), "dB"))
						.append(" at ").append(Words.of(response.largestAt(), "Hz")).append('\n'));
		text.append("margins\n");
		comparison.margins().forEach(margin -> text.append("  ").append(margin.requirement()).append(": ")
				.append(words(margin.before())).append(" -> ").append(words(margin.after())).append('\n'));
		if (!comparison.costBefore().equals(comparison.costAfter())) {
			text.append("cost: ").append(words(comparison.costBefore().orElse(null))).append(" -> ")
					.append(words(comparison.costAfter().orElse(null))).append('\n');
		}
		return text.toString();
	}

	/** For a program: the format tapwright-comparison/1. */
	public static String json(Comparison comparison) {
		var root = new LinkedHashMap<String, Object>();
		root.put("format", FORMAT);
		root.put("changes", comparison.changes().stream().map(change -> members("part", word(change.part()), "place", change.place(),
				"before", change.before(), "after", change.after())).toList());
		root.put("coefficients", members("unit", word(comparison.coefficients().unit()), "changed", rows(comparison.coefficients())));
		comparison.response().ifPresent(response -> root.put("response",
				members("largestDifference", json(response.largest()), "at", response.largestAt())));
		root.put("margins", comparison.margins().stream().map(margin -> members("requirement", margin.requirement(), "before",
				margin.before().map(ComparisonFormat::json).orElse(null), "after", margin.after().map(ComparisonFormat::json).orElse(null)))
				.toList());
		root.put("cost", members("before", comparison.costBefore().map(ComparisonFormat::json).orElse(null), "after",
				comparison.costAfter().map(ComparisonFormat::json).orElse(null)));
		return new GsonBuilder().setPrettyPrinting().disableHtmlEscaping().create().toJson(root) + "\n";
	}

	private static List<Object> rows(CoefficientTable table) {
		var rows = new ArrayList<>();
		table.rows().stream().filter(CoefficientTable.Row::changed).forEach(row -> rows.add(members("index", row.index(), "before",
				json(row.before()), "after", json(row.after()), "difference", json(row.difference()))));
		return rows;
	}

	private static Map<String, Object> json(Standing standing) {
		return members("verdict", standing.verdict().getLiteral(), "margin", List.of(json(standing.low()), json(standing.high())));
	}

	private static Map<String, Object> json(Cost cost) {
		return members("multiplies", cost.multiplies(), "adds", cost.adds(), "coefficientWords", cost.coefficientWords(), "delayWords",
				cost.delayWords());
	}

	// JSON has no infinity and no NaN; the words are those that Java and JavaScript read as numbers.
	private static Object json(double value) {
		return Double.isFinite(value) ? (Object) value : Double.toString(value);
	}

	private static Map<String, Object> members(Object... namesAndValues) {
		var members = new LinkedHashMap<String, Object>();
		for (int k = 0; k < namesAndValues.length; k += 2) {
			if (namesAndValues[k + 1] != null) {
				members.put((String) namesAndValues[k], namesAndValues[k + 1]);
			}
		}
		return members;
	}

	private static String words(Optional<Standing> standing) {
		return standing.map(found -> found.verdict().getLiteral() + " by " + Words.of(found.low(), "")).orElse("-");
	}

	private static String words(Cost cost) {
		return cost == null ? "-" : cost.multiplies() + " multiplies, " + cost.adds() + " adds, " + cost.memoryWords() + " words";
	}

	private static String number(double value) {
		return Double.isNaN(value) ? "-" : Words.exactly(value, "");
	}

	private static String word(Enum<?> name) {
		return name.name().toLowerCase(Locale.ROOT);
	}
}
