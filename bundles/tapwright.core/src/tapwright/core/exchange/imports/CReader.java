// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import tapwright.core.InputException;
import tapwright.core.exchange.imports.CTokens.Kind;
import tapwright.core.exchange.imports.CTokens.Token;
import tapwright.dsp.arithmetic.NumberFormat;

/**
 * Initialiser lists of a C or C++ source. Lists that begin with something else than a number are no coefficients and are passed
 * over; once a list has begun with a number, everything in it must be one.
 */
final class CReader {

	private static final Set<String> NO_NAMES = Set.of("return", "else", "do", "try", "struct", "union", "enum",
			"class", "namespace");

	private final Places source;
	private final CTokens words;
	private final List<Token> tokens;
	private final CExpression expression;
	private final List<ImportedTable> tables = new ArrayList<>();

	/** A declared array: its name, its type, its length when stated. */
	private record Declaration(String name, CType type, int length, int dimensions) {
	}

	private CReader(Places source) throws InputException {
		this.source = source;
		words = new CTokens(source);
		tokens = words.tokens();
		expression = new CExpression(source, words.macros());
	}

	static List<ImportedTable> read(Places source) throws InputException {
		var reader = new CReader(source);
		int at = 0;
		while (at < reader.tokens.size()) {
			at = reader.tokens.get(at).is("{") ? reader.list(at) : at + 1;
		}
		Optional<Integer> step = TextReader.step(source.text());
		if (step.isPresent() && reader.tables.size() == 1 && reader.tables.getFirst().format().isPresent()) {
			NumberFormat type = reader.tables.getFirst().format().get();
			return List.of(reader.tables.getFirst()
					.with(Optional.of(new NumberFormat(type.word(), step.get(), type.signed())), List.of()));
		}
		return reader.tables;
	}

	private int list(int brace) throws InputException {
		int first = brace;
		while (first < tokens.size() && tokens.get(first).is("{")) {
			first++;
		}
		Declaration declaration = declaration(brace);
		if (declaration == null || !beginsNumber(tokens.get(first))) {
			return brace + 1;
		}
		var lists = new ArrayList<List<CNumber>>();
		var offsets = new ArrayList<Integer>();
		int end = numbers(brace, declaration, lists, offsets);
		for (int k = 0; k < lists.size(); k++) {
			String name = lists.size() == 1 ? declaration.name() : declaration.name() + "[" + k + "]";
			add(name, declaration, lists.get(k), offsets.get(k));
		}
		return end;
	}

	private boolean beginsNumber(Token token) {
		return token.kind() == Kind.NUMBER || token.is("-") || token.is("+") || token.is("(")
				|| token.kind() == Kind.NAME && words.macros().containsKey(token.text());
	}

	// Looks back from the brace: NAME [LENGTH] ATTRIBUTES = {  or  NAME {
	private Declaration declaration(int brace) {
		int at = brace - 1;
		boolean assigned = at >= 0 && tokens.get(at).is("=");
		if (assigned) {
			at--;
		}
		int start = at;
		while (start >= 0 && !tokens.get(start).is(";") && !tokens.get(start).is("}") && !tokens.get(start).is("{")) {
			start--;
		}
		int bracket = at;
		while (bracket > start && !tokens.get(bracket).is("]")) {
			bracket--;
		}
		int length = -1;
		int dimensions = 0;
		int name = at;
		if (bracket > start) {
			int opening = bracket;
			while (opening > start && tokens.get(opening).is("]")) {
				int close = opening;
				while (opening > start && !tokens.get(opening).is("[")) {
					opening--;
				}
				length = close == opening + 1 ? -1 : length(opening + 1);
				dimensions++;
				opening--;
			}
			name = opening;
		} else if (assigned && !tokens.get(Math.max(name - 1, 0)).is(">")) {
			return null; // a structure; containers have their type in angle brackets
		}
		if (name <= start || tokens.get(name).kind() != Kind.NAME || NO_NAMES.contains(tokens.get(name).text())
				|| !assigned && name == start + 1) {
			return null;
		}
		var type = new StringBuilder();
		for (int k = start + 1; k < name; k++) {
			type.append(tokens.get(k).text()).append(' ');
		}
		return new Declaration(tokens.get(name).text(), CType.of(type.toString()), length, dimensions);
	}

	// A length that cannot be told from this file alone says nothing.
	private int length(int at) {
		try {
			CNumber value = expression.evaluate(tokens, at);
			boolean usable = tokens.get(expression.end()).is("]") && value.isWhole() && value.integer().signum() > 0
					&& value.integer().bitLength() < Integer.SIZE;
			return usable ? value.integer().intValue() : -1;
		} catch (InputException e) {
			return -1;
		}
	}

	private int numbers(int brace, Declaration declaration, List<List<CNumber>> lists,
			List<Integer> offsets) throws InputException {
		int depth = 0;
		int at = brace;
		boolean separated = true;
		List<CNumber> open = null;
		do {
			Token token = tokens.get(at);
			if (token.is("{")) {
				depth++;
				open = null;
				separated = true;
				at++;
			} else if (token.is("}")) {
				depth--;
				open = null;
				separated = false;
				at++;
			} else if (token.is(",")) {
				if (separated) {
					throw source.error(token.offset(), "a number is missing before ','");
				}
				separated = true;
				at++;
			} else {
				if (!separated && token.kind() != Kind.END) {
					throw source.error(token.offset(), "',' is missing before " + Places.quote(token.text()));
				}
				if (open == null) {
					open = new ArrayList<>();
					lists.add(open);
					offsets.add(token.offset());
				}
				CNumber value = expression.evaluate(tokens, at);
				open.add(declaration.type().convert(value, reason -> source.error(token.offset(), reason)));
				if (open.size() > ImportedTable.MOST) {
					throw source.error(token.offset(), "the list has more than " + ImportedTable.MOST + " numbers");
				}
				at = expression.end();
				separated = false;
			}
		} while (depth > 0);
		return at;
	}

	private void add(String name, Declaration declaration, List<CNumber> numbers, int offset) throws InputException {
		int length = declaration.dimensions() == 1 ? declaration.length() : -1;
		var notes = new ArrayList<String>();
		if (length >= 0 && length < numbers.size()) {
			throw source.error(offset, "the array has " + length + " elements, but " + numbers.size()
					+ " numbers follow");
		}
		if (length > ImportedTable.MOST) {
			throw source.error(offset, "the array has more than " + ImportedTable.MOST + " elements");
		}
		if (length > numbers.size()) {
			notes.add(length - numbers.size() + " elements without a number are zero");
			CNumber zero = declaration.type().real() ? CNumber.of(0.0) : CNumber.of(BigInteger.ZERO);
			while (numbers.size() < length) {
				numbers.add(zero);
			}
		}
		boolean whole = !declaration.type().real() && numbers.stream().allMatch(CNumber::isWhole);
		int line = source.line(offset);
		ImportedTable table = whole ? ImportedTable.whole(name, line, numbers.stream().map(CNumber::integer).toList(),
				declaration.type().format())
				: ImportedTable.real(name, line, numbers.stream().map(CNumber::toDouble).toList());
		tables.add(table.with(table.format(), notes));
	}
}
