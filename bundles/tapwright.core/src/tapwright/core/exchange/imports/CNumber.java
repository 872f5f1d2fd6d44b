// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A number of a C program: an integer or a double.
 *
 * @param integer
 *            null when it is real
 * @param real
 *            the double, when it is real
 */
record CNumber(BigInteger integer, double real) {

	private static final Pattern INTEGER = Pattern.compile("(0[xX][0-9a-fA-F]+|0[bB][01]+|[0-9]+)([uUlL]{0,3})");
	private static final Pattern REAL = Pattern
			.compile("((?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][-+]?[0-9]{1,6})?|0[xX](?:[0-9a-fA-F]+\\.?[0-9a-fA-F]*|\\.[0-9a-fA-F]+)[pP][-+]?[0-9]{1,6})([fFlL]?)");
	private static final int LONGEST = 400;

	static CNumber of(BigInteger integer) {
		return new CNumber(integer, 0);
	}

	static CNumber of(double real) {
		return new CNumber(null, real);
	}

	/** A literal (ISO/IEC 9899:1999, clause 6.4.4); digit separators of C++14 and binary integers are taken too. */
	static Optional<CNumber> parse(String literal) {
		String text = literal.replace("'", "");
		if (text.length() > LONGEST) {
			return Optional.empty();
		}
		Matcher integer = INTEGER.matcher(text);
		if (integer.matches()) {
			return integer(integer.group(1));
		}
		Matcher real = REAL.matcher(text);
		if (!real.matches()) {
			return Optional.empty();
		}
		double value = real.group(2).equalsIgnoreCase("f") ? Float.parseFloat(real.group(1))
				: Double.parseDouble(real.group(1));
		return Double.isFinite(value) ? Optional.of(of(value)) : Optional.empty();
	}

	private static Optional<CNumber> integer(String digits) {
		if (digits.length() > 2 && Character.isLetter(digits.charAt(1))) {
			return Optional.of(of(new BigInteger(digits.substring(2), Character.toLowerCase(digits.charAt(1)) == 'x'
					? 16 : 2)));
		}
		if (digits.length() > 1 && digits.charAt(0) == '0') {
			return digits.matches("[0-7]+") ? Optional.of(of(new BigInteger(digits, 8))) : Optional.empty();
		}
		return Optional.of(of(new BigInteger(digits)));
	}

	boolean isWhole() {
		return integer != null;
	}

	double toDouble() {
		return isWhole() ? integer.doubleValue() : real;
	}
}
