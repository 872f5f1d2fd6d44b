// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import java.math.BigDecimal;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.InputException;
import tapwright.dsp.exact.ExactTaps;

/**
 * Plain arithmetic: numbers with or without a unit, names, + - * / and parentheses, min(a, b, ...) and max(a, b, ...). Evaluated
 * while it is read, in exact rationals.
 */
public final class Expression {

	/** Gives names their values. */
	@FunctionalInterface
	public interface Names {

		/** No names. */
		Names NONE = name -> {
			throw new InputException("", "there is no parameter '" + name + "'");
		};

		/**
		 * The value of a name.
		 *
		 * @throws InputException
		 *             when there is no such name, or its own value cannot be found
		 */
		Quantity value(String name) throws InputException;
	}

	/** A person writes a few levels; this keeps a hostile file from exhausting the stack. */
	private static final int DEEPEST = 100;
	private static final int LONGEST = 10_000;
	private static final int LARGEST_EXPONENT = 400;

	private final String text;
	private final Names names;
	private int position;
	private int depth;

	private Expression(String text, Names names) {
		this.text = text;
		this.names = names;
	}

	/**
	 * The exact value of an expression.
	 *
	 * @throws InputException
	 *             when it cannot be understood; the message quotes it
	 */
	public static Quantity evaluate(String text, Names names) throws InputException {
		if (text.length() > LONGEST) {
			throw new InputException("", "the expression has " + text.length() + " characters; at most " + LONGEST + " are read");
		}
		var expression = new Expression(text, names);
		try {
			Quantity value = expression.sum();
			expression.skipSpace();
			if (expression.position < text.length()) {
				throw new InputException("", "'" + text.substring(expression.position) + "' is not understood");
			}
			return value;
		} catch (InputException e) {
			throw new InputException("", e.getMessage() + " (in '" + text + "')");
		}
	}

	private Quantity sum() throws InputException {
		if (++depth > DEEPEST) {
			throw new InputException("", "more than " + DEEPEST + " levels of parentheses");
		}
		Quantity value = product();
		while (true) {
			if (accept('+')) {
				value = value.plus(product());
			} else if (accept('-')) {
				value = value.minus(product());
			} else {
				depth--;
				return value;
			}
		}
	}

	private Quantity product() throws InputException {
		Quantity value = signed();
		while (true) {
			if (accept('*')) {
				value = value.times(signed());
			} else if (accept('/')) {
				value = value.over(signed());
			} else {
				return value;
			}
		}
	}

	private Quantity signed() throws InputException {
		boolean negative = false;
		while (true) {
			if (accept('-')) {
				negative = !negative;
			} else if (!accept('+')) {
				Quantity value = operand();
				return negative ? value.negate() : value;
			}
		}
	}

	private Quantity operand() throws InputException {
		if (accept('(')) {
			Quantity value = sum();
			expect(')');
			return value;
		}
		skipSpace();
		if (position == text.length()) {
			throw new InputException("", text.isBlank() ? "a number is missing" : "a number is missing at the end");
		}
		char first = text.charAt(position);
		if (isDigit(first) || first == '.') {
			return number();
		}
		if (Character.isLetter(first)) {
			String name = word();
			return accept('(') ? function(name) : names.value(name);
		}
		throw new InputException("", "'" + first + "' stands where a number is expected");
	}

	private Quantity function(String name) throws InputException {
		if (!name.equals("min") && !name.equals("max")) {
			throw new InputException("", "there is no function '" + name + "'; min and max exist");
		}
		Quantity value = sum();
		while (accept(',')) {
			Quantity next = sum();
			value = name.equals("min") ? value.lesser(next) : value.greater(next);
		}
		expect(')');
		return value;
	}

	private Quantity number() throws InputException {
		int start = position;
		digits();
		if (position < text.length() && text.charAt(position) == '.') {
			position++;
			digits();
		}
		exponent();
		String digits = text.substring(start, position);
		if (digits.equals(".")) {
			throw new InputException("", "'.' is not a number");
		}
		Quantity value = Quantity.plain(fraction(digits));
		int behind = position;
		skipSpace();
		if (position < text.length() && (Character.isLetter(text.charAt(position)) || text.charAt(position) == '%')) {
			String symbol = text.charAt(position) == '%' ? "%" : word();
			if (symbol.equals("%")) {
				position++;
			}
			Quantity unit = Units.of(symbol).orElseThrow(() -> new InputException("",
					"'" + symbol + "' is not a unit; known are " + Units.symbols()));
			return value.times(unit);
		}
		position = behind;
		return value;
	}

	private static BigFraction fraction(String digits) throws InputException {
		BigDecimal decimal = new BigDecimal(digits);
		// The exponent is bounded so that '1e999999999' cannot fill the memory.
		if (Math.abs((long) decimal.precision() - decimal.scale()) > LARGEST_EXPONENT || Math.abs(decimal.scale()) > LONGEST) {
			throw new InputException("", digits + " is too large or too small");
		}
		return decimal.scale() > 0 ? new BigFraction(decimal.unscaledValue(), BigDecimal.TEN.pow(decimal.scale()).toBigInteger())
				: new BigFraction(decimal.toBigIntegerExact());
	}

	/** An exact scale: a decimal, a fraction 'a/b', or a power of two '2^-15'. */
	public static BigFraction scale(String text) throws InputException {
		String trimmed = text.strip();
		if (trimmed.matches("2\\^[-+]?\\d{1,4}")) {
			return ExactTaps.powerOfTwo(Integer.parseInt(trimmed.substring(2)));
		}
		Quantity value = evaluate(trimmed, Names.NONE);
		if (!value.dimension().equals(Dimension.NONE) || value.value().compareTo(BigFraction.ZERO) <= 0) {
			throw new InputException("", "'" + text + "' must be a positive plain number, such as 2^-15, 1/35 or 0.001");
		}
		return value.value();
	}

	private void exponent() {
		int start = position;
		if (position < text.length() && (text.charAt(position) == 'e' || text.charAt(position) == 'E')) {
			position++;
			if (position < text.length() && (text.charAt(position) == '-' || text.charAt(position) == '+')) {
				position++;
			}
			int first = position;
			digits();
			if (position == first || position - first > 4) {
				position = start; // not an exponent, a unit perhaps
			}
		}
	}

	private void digits() {
		while (position < text.length() && isDigit(text.charAt(position))) {
			position++;
		}
	}

	private String word() {
		int start = position;
		while (position < text.length()
				&& (Character.isLetterOrDigit(text.charAt(position)) || text.charAt(position) == '_')) {
			position++;
		}
		return text.substring(start, position);
	}

	private boolean accept(char symbol) {
		skipSpace();
		if (position < text.length() && text.charAt(position) == symbol) {
			position++;
			return true;
		}
		return false;
	}

	private void expect(char symbol) throws InputException {
		if (!accept(symbol)) {
			throw new InputException("", "'" + symbol + "' is missing");
		}
	}

	private void skipSpace() {
		while (position < text.length() && Character.isWhitespace(text.charAt(position))) {
			position++;
		}
	}

	private static boolean isDigit(char symbol) {
		return symbol >= '0' && symbol <= '9';
	}
}
