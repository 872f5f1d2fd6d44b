// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;

/**
 * What a declaration says of its numbers.
 *
 * @param real
 *            whether they are floating-point numbers
 * @param single
 *            whether those have single precision
 * @param format
 *            of integers, when their length is the same on usual machines
 */
record CType(boolean real, boolean single, Optional<NumberFormat> format) {

	private static final Pattern EXACT = Pattern.compile("(u?)int(8|16|32|64)_t");

	/** From the words before a declared name. */
	static CType of(String declaration) {
		Set<String> words = new HashSet<>(Arrays.asList(declaration.split("[^A-Za-z0-9_]+")));
		if (words.contains("float") || words.contains("double")) {
			return new CType(true, words.contains("float"), Optional.empty());
		}
		for (String word : words) {
			Matcher exact = EXACT.matcher(word);
			if (exact.matches()) {
				return integers(Integer.parseInt(exact.group(2)), exact.group(1).isEmpty());
			}
		}
		boolean signed = !words.contains("unsigned");
		// Lengths that every usual compiler has; 'long' differs between them. Common practice, no source.
		if (words.contains("char")) {
			return integers(8, signed);
		}
		if (words.contains("short")) {
			return integers(16, signed);
		}
		return words.contains("int") && !words.contains("long") ? integers(32, signed)
				: new CType(false, false, Optional.empty());
	}

	private static CType integers(int bits, boolean signed) {
		return new CType(false, false, Optional.of(new NumberFormat(bits, 0, signed)));
	}

	/** The number as a variable of this type holds it. */
	CNumber convert(CNumber value, Function<String, InputException> error) throws InputException {
		if (real) {
			double number = value.toDouble();
			double held = single ? (float) number : number;
			if (!Double.isFinite(held)) {
				throw error.apply(number + " is beyond the largest number of its type");
			}
			return CNumber.of(held);
		}
		if (format.isEmpty() || format.get().contains(whole(value, error))) {
			return format.isEmpty() ? value : CNumber.of(whole(value, error));
		}
		NumberFormat type = format.get();
		BigInteger integer = whole(value, error);
		// 0xFFFE in a signed array of 16 bits is how people write -2.
		if (integer.signum() > 0 && integer.bitLength() <= type.word()) {
			return CNumber.of(type.fit(integer, Overflow.WRAP));
		}
		throw error.apply(integer + " is not in the range of its type, " + type.min() + " to " + type.max());
	}

	private static BigInteger whole(CNumber value, Function<String, InputException> error) throws InputException {
		if (!value.isWhole()) {
			throw error.apply(value.real() + " would lose its fraction in an array of integers");
		}
		return value.integer();
	}
}
