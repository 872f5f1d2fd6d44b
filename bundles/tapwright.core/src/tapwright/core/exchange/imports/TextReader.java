// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;

/**
 * Numbers separated by commas, semicolons, tabs or spaces. Comments begin with '#', '%' or '//'. The first line may name the
 * columns. Where semicolons separate, a comma may be the decimal sign.
 */
final class TextReader {

	private static final Pattern STEP = Pattern.compile("(?m)^(?:(?:#|//) one step (?:of the integers )?is worth: |/\\* Integers in steps of )2\\^(-?\\d{1,3})(?:\\. \\*/)?$");
	private static final Pattern DECIMAL_COMMA = Pattern.compile("[-+]?\\d*,\\d+([eE][-+]?\\d{1,4})?");
	/** More columns than this without names are the lines of one list. */
	private static final int MOST_COLUMNS = 3;

	private final Places source;
	private final List<List<Field>> rows = new ArrayList<>();
	private List<String> names = List.of();
	private boolean trailingSeparators;

	private record Field(String text, int offset) {
	}

	private TextReader(Places source) {
		this.source = source;
	}

	static List<ImportedTable> read(Places source) throws InputException {
		var reader = new TextReader(source);
		reader.split();
		return reader.tables();
	}

	/** What one step of exported words is worth, as a comment of ours says. */
	static Optional<Integer> step(String text) {
		Matcher matcher = STEP.matcher(text);
		return matcher.find() ? Optional.of(-Integer.parseInt(matcher.group(1))) : Optional.empty();
	}

	private void split() throws InputException {
		String text = source.text();
		String separator = separator(text);
		for (int from = 0; from < text.length();) {
			int newline = text.indexOf('\n', from);
			int to = newline < 0 ? text.length() : newline;
			String line = withoutComment(text.substring(from, to));
			if (!line.isBlank()) {
				row(fields(line, from, separator));
			}
			from = to + 1;
		}
	}

	private void row(List<Field> fields) throws InputException {
		boolean first = rows.isEmpty() && names.isEmpty();
		boolean named = first && fields.stream().noneMatch(field -> number(field.text()).isPresent());
		if (named) {
			names = fields.stream().map(field -> field.text().replaceAll("^\"|\"$", "")).toList();
			return;
		}
		for (Field field : fields) {
			if (number(field.text()).isEmpty()) {
				throw source.error(field.offset(), field.text().isEmpty() ? "a number is missing"
						: Places.quote(field.text()) + " is not a finite number");
			}
		}
		rows.add(fields);
	}

	private static String separator(String text) {
		String data = text.lines().map(TextReader::withoutComment)
				.reduce("", (all, line) -> all.length() < 10_000 ? all + line + "\n" : all);
		return data.contains(";") ? ";" : data.contains(",") ? "," : data.contains("\t") ? "\t" : " ";
	}

	private static String withoutComment(String line) {
		int end = line.length();
		for (String sign : List.of("#", "%", "//")) {
			int at = line.indexOf(sign);
			end = at >= 0 ? Math.min(end, at) : end;
		}
		return line.substring(0, end);
	}

	private List<Field> fields(String line, int offset, String separator) {
		var fields = new ArrayList<Field>();
		if (separator.equals(" ")) {
			Matcher matcher = Pattern.compile("\\S+").matcher(line);
			while (matcher.find()) {
				fields.add(new Field(matcher.group(), offset + matcher.start()));
			}
			return fields;
		}
		String[] parts = line.split(separator, -1);
		int at = offset;
		for (int k = 0; k < parts.length; k++) {
			String part = parts[k].strip();
			boolean last = k == parts.length - 1;
			if (last && k > 0 && part.isEmpty()) {
				trailingSeparators = true;
			} else {
				fields.add(new Field(part, at + parts[k].indexOf(part)));
			}
			at += parts[k].length() + 1;
		}
		return fields;
	}

	private List<ImportedTable> tables() throws InputException {
		if (rows.isEmpty()) {
			return List.of();
		}
		int columns = rows.getFirst().size();
		boolean equal = rows.stream().allMatch(row -> row.size() == columns);
		if (!names.isEmpty() && (!equal || names.size() != columns)) {
			List<Field> odd = rows.stream().filter(row -> row.size() != names.size()).findFirst().orElseThrow();
			throw source.error(odd.getFirst().offset(), "this line has " + odd.size() + " numbers, but there are "
					+ names.size() + " columns");
		}
		int line = source.line(rows.getFirst().getFirst().offset());
		if (names.isEmpty() && (!equal || trailingSeparators || columns > MOST_COLUMNS || rows.size() == 1)) {
			return List.of(table("", line, rows.stream().flatMap(List::stream).map(Field::text).toList()));
		}
		var tables = new ArrayList<ImportedTable>();
		for (int c = 0; c < columns; c++) {
			int column = c;
			List<String> texts = rows.stream().map(row -> row.get(column).text()).toList();
			String name = names.isEmpty() ? columns == 1 ? "" : "column " + (c + 1) : names.get(c);
			if (columns == 1 || c > 0 || !counts(texts)) {
				tables.add(table(name, line, texts));
			}
		}
		return exported(tables);
	}

	// Our own files give the integers and, for reading, their values.
	private List<ImportedTable> exported(List<ImportedTable> tables) {
		Optional<Integer> fraction = step(source.text());
		if (fraction.isEmpty() || !names.contains("integer")) {
			return tables;
		}
		return tables.stream().filter(table -> table.name().equals("integer") && table.isWhole())
				.map(table -> table.with(Optional.of(Formats.shortest(table.integers(), fraction.get(), true)),
						List.of())).toList();
	}

	// A first column 0, 1, 2, ... or 1, 2, 3, ... numbers the lines.
	private static boolean counts(List<String> texts) {
		if (texts.size() < 2 || !texts.getFirst().matches("[01]")) {
			return false;
		}
		int first = Integer.parseInt(texts.getFirst());
		for (int k = 0; k < texts.size(); k++) {
			if (!texts.get(k).equals(String.valueOf(first + k))) {
				return false;
			}
		}
		return true;
	}

	private static ImportedTable table(String name, int line, List<String> texts) {
		if (texts.stream().allMatch(text -> text.matches("[-+]?\\d{1,400}"))) {
			return ImportedTable.whole(name, line, texts.stream().map(BigInteger::new).toList(),
					Optional.<NumberFormat>empty());
		}
		return ImportedTable.real(name, line, texts.stream().map(text -> number(text).orElseThrow()).toList());
	}

	private static Optional<Double> number(String text) {
		String decimal = DECIMAL_COMMA.matcher(text).matches() ? text.replace(',', '.') : text;
		if (!decimal.matches("[-+]?(\\d{1,400}(\\.\\d{0,400})?|\\.\\d{1,400})([eE][-+]?\\d{1,4})?")) {
			return Optional.empty();
		}
		double value = Double.parseDouble(decimal);
		return Double.isFinite(value) ? Optional.of(value) : Optional.empty();
	}
}
