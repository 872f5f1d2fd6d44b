// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.IntFunction;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;
import tapwright.core.format.Tool;
import tapwright.core.quantity.Words;

/** The values that every template may use, and the words in which they are written. */
final class Values {

	private Values() {
	}

	/** What every exported text says of its filter. */
	static Map<String, List<String>> of(HandOver filter) {
		var values = new HashMap<String, List<String>>();
		String identifier = identifier(filter.name());
		values.put("name", List.of(comment(filter.name())));
		values.put("identifier", List.of(identifier));
		values.put("macro", List.of(identifier.toUpperCase(Locale.ROOT)));
		values.put("tool", List.of(Tool.NAME));
		values.put("revision", filter.revision().isEmpty() ? List.of() : List.of(filter.revision()));
		values.put("sample-rate", List.of(comment(Words.exactly(filter.sampleRate(), "Hz"))));
		values.put("requirements", filter.requirements().stream().map(Values::comment).toList());
		values.put("formats", filter.formats().stream().map(Values::comment).toList());
		values.put("taps", List.of(String.valueOf(filter.taps().length())));
		values.put("unit", List.of(unit(filter.stored().unit())));
		values.put("numbers-hash", List.of(filter.numbersHash()));
		values.put("text-hash", List.of(Stamp.placeholder()));
		return values;
	}

	/** A name that every language takes: letters, digits and single underscores, a letter first. */
	static String identifier(String name) {
		String words = name.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "_").replaceAll("^_+|_+$", "");
		return words.isEmpty() ? "filter" : Character.isLetter(words.charAt(0)) ? words : "filter_" + words;
	}

	/** The exact value of one step, as a power of two where it is one. */
	static String unit(BigFraction unit) {
		boolean power = unit.getNumerator().bitCount() == 1 && unit.getDenominator().bitCount() == 1;
		return power ? "2^" + (unit.getNumerator().bitLength() - unit.getDenominator().bitLength())
				: unit.getNumerator() + " / " + unit.getDenominator();
	}

	/** One element on each line, a comma behind all but the last. */
	static List<String> elements(int count, IntFunction<String> element) {
		var lines = new ArrayList<String>(count);
		for (int k = 0; k < count; k++) {
			lines.add(element.apply(k) + (k + 1 < count ? "," : ""));
		}
		return lines;
	}

	/** Several elements on each line, a comma behind all but the last. */
	static List<String> rows(int count, int perLine, IntFunction<String> element) {
		List<String> all = elements(count, element);
		var lines = new ArrayList<String>();
		for (int k = 0; k < count; k += perLine) {
			lines.add(String.join(" ", all.subList(k, Math.min(count, k + perLine))));
		}
		return lines;
	}

	/**
	 * Text for a comment of any language: ASCII, one line, and nothing that begins or ends a comment or joins lines.
	 */
	static String comment(String text) {
		return text.replace("±", "+/-").replace("µ", "u").replaceAll("[^\\x20-\\x7e]", "?").replace('\\', '?')
				.replaceAll("\\*(?=/)", "* ").replaceAll("/(?=\\*)", "/ ").replaceAll("\\?(?=\\?)", "? ");
	}
}
