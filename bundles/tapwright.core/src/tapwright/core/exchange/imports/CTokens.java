// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import tapwright.core.InputException;

/** The words of a C or C++ source without comments, and its macros without parameters. */
final class CTokens {

	/** Kinds of words. */
	enum Kind {
		NUMBER, NAME, TEXT, SIGN, END
	}

	/** A word and where it stands. */
	record Token(Kind kind, String text, int offset) {

		boolean is(String sign) {
			return (kind == Kind.SIGN || kind == Kind.NAME) && text.equals(sign);
		}
	}

	private static final Pattern WORD = Pattern.compile("""
			(?<space>[\\s\\\\]++|//[^\\n]*+)|(?<comment>/\\*)|(?<directive>\\#)\
			|(?<number>\\.?[0-9](?:[eEpP][-+]|'[0-9A-Za-z]|[.\\w])*+)|(?<name>[A-Za-z_]\\w*+)\
			|(?<quote>["'])|(?<sign><<|>>|.)""", Pattern.DOTALL);
	private static final Pattern DEFINITION = Pattern.compile("#\\s*define\\s+([A-Za-z_]\\w*)[ \\t]+(.+)",
			Pattern.DOTALL);

	private final Places source;
	private final List<Token> tokens = new ArrayList<>();
	private final Map<String, List<Token>> macros = new HashMap<>();

	CTokens(Places source) throws InputException {
		this.source = source;
		read(0, source.text().length(), tokens);
		tokens.add(new Token(Kind.END, "", source.text().length()));
	}

	List<Token> tokens() {
		return tokens;
	}

	/** What macros without parameters stand for. */
	Map<String, List<Token>> macros() {
		return macros;
	}

	private void read(int from, int to, List<Token> into) throws InputException {
		String text = source.text();
		Matcher matcher = WORD.matcher(text).region(from, to);
		for (int at = from; at < to && matcher.region(at, to).lookingAt(); at = Math.max(matcher.end(), next)) {
			next = 0;
			if (matcher.group("comment") != null) {
				int end = text.indexOf("*/", matcher.end());
				if (end < 0 || end + 2 > to) {
					throw source.error(at, "the comment does not end");
				}
				next = end + 2;
			} else if (matcher.group("directive") != null) {
				next = directive(at);
			} else if (matcher.group("quote") != null) {
				next = literal(at, matcher.group().charAt(0), to);
				into.add(new Token(Kind.TEXT, text.substring(at, next), at));
			} else if (matcher.group("space") == null) {
				Kind kind = matcher.group("number") != null ? Kind.NUMBER : matcher.group("name") != null ? Kind.NAME
						: Kind.SIGN;
				into.add(new Token(kind, matcher.group(), at));
			}
		}
	}

	private int next;

	private int literal(int at, char quote, int to) throws InputException {
		String text = source.text();
		for (int k = at + 1; k < to && text.charAt(k) != '\n'; k++) {
			if (text.charAt(k) == '\\') {
				k++;
			} else if (text.charAt(k) == quote) {
				return k + 1;
			}
		}
		throw source.error(at, "the text in quotes does not end on its line");
	}

	// Directives go to the end of the line; a backslash at the end takes the next line along.
	private int directive(int at) throws InputException {
		String text = source.text();
		int end = at;
		do {
			int line = text.indexOf('\n', end);
			end = line < 0 ? text.length() : line + 1;
		} while (end < text.length() && text.substring(at, end).stripTrailing().endsWith("\\"));
		Matcher definition = DEFINITION.matcher(text.substring(at, end));
		if (definition.matches()) {
			var body = new ArrayList<Token>();
			int kept = next;
			read(at + definition.start(2), end, body);
			next = kept;
			macros.put(definition.group(1), body);
		}
		return end;
	}
}
