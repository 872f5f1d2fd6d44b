// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import tapwright.core.InputException;
import tapwright.core.interchange.JsonTree;
import tapwright.core.interchange.JsonTree.NumberLiteral;

/** Arrays of numbers in JSON, wherever they stand; an array inside an object has the name of its key. */
final class JsonReader {

	private static final Pattern SCALE = Pattern.compile("2\\^(-?\\d{1,4})");

	private final String file;
	private final List<ImportedTable> tables = new ArrayList<>();

	private JsonReader(String file) {
		this.file = file;
	}

	static List<ImportedTable> read(Places source) throws InputException {
		var reader = new JsonReader(source.file());
		try {
			reader.find("", JsonTree.parse(source.text()));
		} catch (InputException e) {
			throw new InputException(source.file(), e.describe());
		}
		return reader.tables;
	}

	private void find(String name, Object value) throws InputException {
		switch (value) {
		case List<?> list when !list.isEmpty() && list.stream()
				.allMatch(NumberLiteral.class::isInstance) -> tables.add(table(name, list, Optional.empty()));
		case List<?> list when list.stream().anyMatch(NumberLiteral.class::isInstance) -> throw new InputException(name,
				"holds numbers and other things");
		case List<?> list -> {
			for (int k = 0; k < list.size(); k++) {
				find(name + "[" + k + "]", list.get(k));
			}
		}
		case Map<?, ?> members when members.get("integers") instanceof List<?> integers && scale(members)
				.isPresent() -> {
			ImportedTable table = table(members.get("name") instanceof String given ? given : name, integers,
					scale(members));
			boolean rated = members.get("sampleRate") instanceof NumberLiteral;
			tables.add(rated ? table.atRate(number((NumberLiteral) members.get("sampleRate"))) : table);
		}
		case Map<?, ?> members -> {
			for (Map.Entry<?, ?> member : members.entrySet()) {
				find((String) member.getKey(), member.getValue());
			}
		}
		default -> { /* words and single numbers are no coefficients */ }
		}
	}

	private static Optional<Integer> scale(Map<?, ?> members) {
		Matcher matcher = SCALE.matcher(String.valueOf(members.get("scale")));
		return matcher.matches() ? Optional.of(-Integer.parseInt(matcher.group(1))) : Optional.empty();
	}

	private ImportedTable table(String name, List<?> elements, Optional<Integer> fraction) throws InputException {
		if (elements.size() > ImportedTable.MOST) {
			throw new InputException(name, "has more than " + ImportedTable.MOST + " numbers");
		}
		var texts = new ArrayList<String>();
		for (Object element : elements) {
			if (!(element instanceof NumberLiteral literal)) {
				throw new InputException(name, "holds numbers and other things");
			}
			texts.add(literal.text());
		}
		if (!texts.isEmpty() && texts.stream().allMatch(text -> text.matches("-?\\d{1,400}"))) {
			List<BigInteger> integers = texts.stream().map(BigInteger::new).toList();
			return new ImportedTable(name, 0, integers, List.of(),
					fraction.map(bits -> Formats.shortest(integers, bits, true)),
					OptionalDouble.empty(), List.of());
		}
		var values = new ArrayList<Double>();
		for (String text : texts) {
			values.add(number(new NumberLiteral(text)));
		}
		if (values.isEmpty()) {
			throw new InputException(file, name + " has no numbers");
		}
		return ImportedTable.real(name, 0, values);
	}

	private static double number(NumberLiteral literal) throws InputException {
		double value = Double.parseDouble(literal.text());
		if (!Double.isFinite(value)) {
			throw new InputException("", Places.quote(literal.text()) + " is beyond the largest double");
		}
		return value;
	}
}
