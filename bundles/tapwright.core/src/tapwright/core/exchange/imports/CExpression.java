// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

import tapwright.core.InputException;
import tapwright.core.exchange.imports.CTokens.Kind;
import tapwright.core.exchange.imports.CTokens.Token;

/** Constant expressions of C: + - * / and shifts over literals, parentheses, casts and macros without parameters. */
final class CExpression {

	private static final int DEEPEST = 100;
	private static final int LARGEST_SHIFT = 128;
	private static final int LONGEST = 2000;
	/** Macros that use macros can multiply; a file of coefficients never comes near. */
	private static final int MOST_STEPS = 20_000_000;
	private static final Set<String> TYPE_WORDS = Set.of("float", "double", "char", "short", "int", "long", "signed",
			"unsigned", "const",
			"int8_t", "int16_t", "int32_t", "int64_t", "uint8_t", "uint16_t", "uint32_t", "uint64_t");

	private final Places source;
	private final Map<String, List<Token>> macros;
	private final Set<String> open = new HashSet<>();
	private List<Token> tokens;
	private int at;
	private int depth;
	private int steps;

	CExpression(Places source, Map<String, List<Token>> macros) {
		this.source = source;
		this.macros = macros;
	}

	/** Evaluates from an index on; {@link #end()} tells where it ended. */
	CNumber evaluate(List<Token> words, int from) throws InputException {
		tokens = words;
		at = from;
		depth = 0;
		open.clear();
		return sum();
	}

	int end() {
		return at;
	}

	private Token peek() {
		return at < tokens.size() ? tokens.get(at)
				: new Token(Kind.END, "", tokens.isEmpty() ? 0 : tokens.getLast().offset());
	}

	private CNumber sum() throws InputException {
		CNumber left = shift(product());
		while (peek().is("+") || peek().is("-")) {
			Token sign = tokens.get(at++);
			left = combine(sign, left, shift(product()));
		}
		return left;
	}

	// Shifts bind less than sums in C; people write (1 << 15) with parentheses, and what is ambiguous is refused.
	private CNumber shift(CNumber left) throws InputException {
		if (!peek().is("<<") && !peek().is(">>")) {
			return left;
		}
		Token sign = tokens.get(at++);
		CNumber right = unary();
		if (peek().is("+") || peek().is("-") || peek().is("*") || peek().is("/") || peek().is("<<") || peek()
				.is(">>")) {
			throw source.error(peek().offset(), "put parentheses around the shift");
		}
		return combine(sign, left, right);
	}

	private CNumber product() throws InputException {
		CNumber left = unary();
		while (peek().is("*") || peek().is("/")) {
			Token sign = tokens.get(at++);
			left = combine(sign, left, unary());
		}
		return left;
	}

	private CNumber unary() throws InputException {
		Token token = peek();
		if (++depth > DEEPEST) {
			throw source.error(token.offset(), "the expression is nested too deeply");
		}
		if (++steps > MOST_STEPS) {
			throw source.error(token.offset(), "the macros expand to too many words");
		}
		try {
			return unary(token);
		} finally {
			depth--;
		}
	}

	private CNumber unary(Token token) throws InputException {
		at++;
		if (token.is("-") || token.is("+")) {
			CNumber value = unary();
			return token.is("+") ? value : value.isWhole() ? CNumber.of(value.integer().negate())
					: CNumber.of(-value.real());
		}
		if (token.is("(")) {
			if (isCast()) {
				return cast(token);
			}
			CNumber value = sum();
			if (!peek().is(")")) {
				throw source.error(peek().offset(), "')' is missing");
			}
			at++;
			return value;
		}
		if (token.kind() == Kind.NUMBER) {
			return CNumber.parse(token.text()).orElseThrow(() -> source.error(token.offset(), Places.quote(token.text())
					+ " is not a number that C knows"));
		}
		if (token.kind() == Kind.NAME && macros.containsKey(token.text())) {
			return macro(token);
		}
		throw source.error(token.offset(), token.kind() == Kind.END ? "the file ends inside a list of numbers"
				: Places.quote(token.text()) + (token.kind() == Kind.NAME
						? " is no macro that this file defines as a number" : " is not a number"));
	}

	private boolean isCast() {
		int k = at;
		while (k < tokens.size() && TYPE_WORDS.contains(tokens.get(k).text())) {
			k++;
		}
		return k > at && k < tokens.size() && tokens.get(k).is(")");
	}

	private CNumber cast(Token open) throws InputException {
		var type = new StringBuilder();
		for (; !peek().is(")"); at++) {
			type.append(peek().text()).append(' ');
		}
		at++;
		CType target = CType.of(type.toString());
		CNumber value = unary();
		return target.convert(value, reason -> source.error(open.offset(), reason));
	}

	private CNumber macro(Token token) throws InputException {
		if (!open.add(token.text())) {
			throw source.error(token.offset(), "macro " + Places.quote(token.text()) + " stands for itself");
		}
		List<Token> outer = tokens;
		int back = at;
		tokens = macros.get(token.text());
		at = 0;
		CNumber value = sum();
		if (peek().kind() != Kind.END) {
			throw source.error(peek().offset(), Places.quote(peek().text()) + " is not expected in a number");
		}
		tokens = outer;
		at = back;
		open.remove(token.text());
		return value;
	}

	private CNumber combine(Token sign, CNumber left, CNumber right) throws InputException {
		if (left.isWhole() && right.isWhole()) {
			CNumber value = CNumber.of(integers(sign, left.integer(), right.integer()));
			if (value.integer().bitLength() > LONGEST) {
				throw source.error(sign.offset(), "the number is too large");
			}
			return value;
		}
		double value = switch (sign.text()) {
		case "+" -> left.toDouble() + right.toDouble();
		case "-" -> left.toDouble() - right.toDouble();
		case "*" -> left.toDouble() * right.toDouble();
		case "/" -> left.toDouble() / right.toDouble();
		default -> throw source.error(sign.offset(), "only integers can be shifted");
		};
		if (!Double.isFinite(value)) {
			throw source.error(sign.offset(), "the result is not a finite number");
		}
		return CNumber.of(value);
	}

	private BigInteger integers(Token sign, BigInteger left, BigInteger right) throws InputException {
		switch (sign.text()) {
		case "+" -> {
			return left.add(right);
		}
		case "-" -> {
			return left.subtract(right);
		}
		case "*" -> {
			return left.multiply(right);
		}
		case "/" -> {
			if (right.signum() == 0) {
				throw source.error(sign.offset(), "division by zero");
			}
			return left.divide(right);
		}
		default -> {
			if (right.signum() < 0 || right.bitLength() > 31 || right.intValue() > LARGEST_SHIFT) {
				throw source.error(sign.offset(), "a shift by " + right + " bits; it must be 0 to " + LARGEST_SHIFT);
			}
			return sign.is("<<") ? left.shiftLeft(right.intValue()) : left.shiftRight(right.intValue());
		}
		}
	}
}
