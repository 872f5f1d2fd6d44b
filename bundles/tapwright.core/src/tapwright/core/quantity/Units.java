// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

/** The units that a number can carry, by the symbols of the SI where it has one. */
public final class Units {

	private static final Dimension SECOND = new Dimension(1, 0, 0, 0, 0);
	private static final Dimension HERTZ = Dimension.NONE.over(SECOND);
	private static final Map<String, Quantity> UNITS = new LinkedHashMap<>();

	static {
		add("1", 1, 1, Dimension.NONE);
		add("Hz", 1, 1, HERTZ);
		add("kHz", 1000, 1, HERTZ);
		add("MHz", 1_000_000, 1, HERTZ);
		add("GHz", 1_000_000_000, 1, HERTZ);
		add("s", 1, 1, SECOND);
		add("ms", 1, 1000, SECOND);
		add("us", 1, 1_000_000, SECOND);
		add("µs", 1, 1_000_000, SECOND);
		add("ns", 1, 1_000_000_000, SECOND);
		add("dB", 1, 1, new Dimension(0, 1, 0, 0, 0));
		add("%", 1, 1, new Dimension(0, 0, 1, 0, 0));
		add("ppm", 1, 1, new Dimension(0, 0, 0, 1, 0));
		add("bit", 1, 1, new Dimension(0, 0, 0, 0, 1));
	}

	private Units() {
	}

	/** The unit with the given symbol. */
	public static Optional<Quantity> of(String symbol) {
		return Optional.ofNullable(UNITS.get(symbol));
	}

	/** Symbols of all units, for a message. */
	public static String symbols() {
		return String.join(", ", UNITS.keySet().stream().filter(symbol -> !symbol.equals("1")).toList());
	}

	/** The symbol of the base unit of a dimension, or a description when it has none. */
	static String symbol(Dimension dimension) {
		return dimension.equals(Dimension.NONE) ? "a plain number"
				: UNITS.entrySet().stream().filter(unit -> unit.getValue().dimension().equals(dimension)).map(Map.Entry::getKey)
						.findFirst().orElse("a product of units");
	}

	private static void add(String symbol, long numerator, long denominator, Dimension dimension) {
		UNITS.put(symbol, new Quantity(new BigFraction(numerator, denominator), dimension));
	}
}
