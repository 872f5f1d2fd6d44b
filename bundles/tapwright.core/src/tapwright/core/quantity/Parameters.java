// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import java.util.Collection;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.SequencedSet;

import tapwright.core.InputException;
import tapwright.model.Parameter;

/**
 * The named numbers of a portfolio. Immutable once made; a value that cannot be found is an error for those who ask for it, not
 * for the others.
 */
public final class Parameters implements Expression.Names {

	/** No parameters. */
	public static final Parameters NONE = new Parameters(List.of());

	/** A person builds on a few others; this keeps a hostile file from exhausting the stack. */
	private static final int LONGEST_CHAIN = 100;

	private record Definition(String text, String unit) {
	}

	private final Map<String, Definition> definitions = new LinkedHashMap<>();
	private final Map<String, Quantity> values = new HashMap<>();
	private final Map<String, InputException> problems = new LinkedHashMap<>();

	/** Evaluates all parameters. */
	public Parameters(Collection<Parameter> parameters) {
		for (Parameter parameter : parameters) {
			String name = parameter.getName();
			if (name == null || !name.matches("[A-Za-z][A-Za-z0-9_]*") || Units.of(name).isPresent() || name.equals("min")
					|| name.equals("max")) {
				problems.put(String.valueOf(name), new InputException("parameter " + name, "the name must be a letter "
						+ "followed by letters, digits and underscores, and no unit"));
			} else if (definitions.put(name, new Definition(String.valueOf(parameter.getValue()),
					parameter.getUnit().getLiteral())) != null) {
				problems.put(name, new InputException("parameter " + name, "is defined twice; remove one"));
			}
		}
		definitions.keySet().forEach(name -> evaluate(name, new LinkedHashSet<>()));
	}

	@Override
	public Quantity value(String name) throws InputException {
		InputException problem = problems.get(name);
		if (problem != null) {
			throw new InputException("", problem.describe());
		}
		Quantity value = values.get(name);
		if (value == null) {
			throw new InputException("", definitions.isEmpty() ? "there is no parameter '" + name + "'; the portfolio has none"
					: "there is no parameter '" + name + "'; the portfolio has " + String.join(", ", definitions.keySet()));
		}
		return value;
	}

	/** What is wrong with the parameters themselves, by name. */
	public Map<String, InputException> problems() {
		return Collections.unmodifiableMap(problems);
	}

	private void evaluate(String name, SequencedSet<String> open) {
		if (values.containsKey(name) || problems.containsKey(name)) {
			return;
		}
		open.add(name);
		Definition definition = definitions.get(name);
		try {
			Quantity value = Expression.evaluate(definition.text(), other -> {
				if (open.contains(other)) {
					throw new InputException("", "goes round in a circle: " + String.join(" -> ", open) + " -> " + other);
				}
				if (open.size() > LONGEST_CHAIN) {
					throw new InputException("", "refers to more than " + LONGEST_CHAIN + " parameters one behind the other");
				}
				if (definitions.containsKey(other)) {
					evaluate(other, open);
				}
				return value(other);
			});
			values.put(name, inUnit(value, definition.unit()));
		} catch (InputException e) {
			problems.put(name, new InputException("parameter " + name, e.getMessage()));
		}
		open.remove(name);
	}

	/** Gives a plain number the unit that is expected in its place; refuses another unit. */
	static Quantity inUnit(Quantity value, String symbol) throws InputException {
		Quantity unit = Units.of(symbol).orElseThrow();
		if (value.dimension().equals(unit.dimension())) {
			return value;
		}
		if (!value.dimension().equals(Dimension.NONE)) {
			throw new InputException("", "is in " + Units.symbol(value.dimension()) + ", but "
					+ (symbol.equals("1") ? "a plain number" : symbol) + " is expected");
		}
		return value.times(unit);
	}
}
