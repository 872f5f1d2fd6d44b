// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.IntStream;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;
import tapwright.dsp.arithmetic.NumberFormat;

/**
 * Coefficients as words of two's complement in hexadecimal digits, in the text that a template gives.
 *
 * @param template
 *            name of the template
 */
record WordTable(String name, String label, String suffix, String template) implements ExportFormat {

	@Override
	public List<ExportedFile> write(HandOver filter) throws InputException {
		NumberFormat word = filter.word();
		List<BigInteger> integers = filter.integers();
		Map<String, List<String>> values = Values.of(filter);
		values.put("word", List.of(String.valueOf(word.word())));
		values.put("signed", List.of(word.signed() ? "signed" : "unsigned"));
		values.put("sign-mark", List.of(word.signed() ? "s" : ""));
		List<String> digits = integers.stream().map(integer -> hexadecimal(integer, word.word())).toList();
		values.put("words", digits);
		values.put("index", IntStream.range(0, digits.size()).mapToObj(String::valueOf).toList());
		values.put("comma", IntStream.range(0, digits.size()).mapToObj(k -> k + 1 < digits.size() ? "," : "").toList());
		values.put("integers", integers.stream().map(BigInteger::toString).toList());
		return List.of(new ExportedFile(values.get("identifier").getFirst() + suffix,
				Stamp.seal(Template.named(template).fill(values))));
	}

	private static String hexadecimal(BigInteger integer, int bits) {
		String digits = integer.mod(BigInteger.ONE.shiftLeft(bits)).toString(16).toUpperCase(Locale.ROOT);
		return "0".repeat((bits + 3) / 4 - digits.length()) + digits;
	}
}
