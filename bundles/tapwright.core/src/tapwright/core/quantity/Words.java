// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers with units as engineers read them: '8.013 kHz', '-79.62 dB', '1.5 ms'. The same in every locale. */
public final class Words {

	private static final int USUAL_DIGITS = 4;

	private record Prefix(String symbol, int power) {
	}

	private static final Prefix[] PREFIXES = { new Prefix("G", 9), new Prefix("M", 6), new Prefix("k", 3), new Prefix("", 0),
			new Prefix("m", -3), new Prefix("µ", -6), new Prefix("n", -9) };

	private Words() {
	}

	/** The number with four significant digits and a prefix that fits. */
	public static String of(double value, String unit) {
		return of(value, unit, USUAL_DIGITS);
	}

	/** All digits that the number has, with a prefix that fits: for numbers that people wrote. */
	public static String exactly(double value, String unit) {
		return of(value, unit, 17);
	}

	/**
	 * The number with a prefix that fits.
	 *
	 * @param digits
	 *            significant digits, at least 1
	 */
	public static String of(double value, String unit, int digits) {
		if (!Double.isFinite(value)) {
			return withUnit(Double.isNaN(value) ? "?" : value > 0 ? "infinity" : "-infinity", unit);
		}
		BigDecimal shortest = new BigDecimal(Double.toString(value)).round(new MathContext(digits, RoundingMode.HALF_EVEN));
		if (!unit.equals("Hz") && !unit.equals("s")) {
			return withUnit(plain(shortest), unit);
		}
		Prefix prefix = prefix(shortest, unit);
		return withUnit(plain(shortest.scaleByPowerOfTen(-prefix.power())), prefix.symbol() + unit);
	}

	/** A band: 'from 8 to 24 kHz'. */
	public static String band(double from, double to) {
		String low = exactly(from, "Hz");
		String high = exactly(to, "Hz");
		String unit = high.substring(high.indexOf(' '));
		if (from == 0) {
			return "from 0 to " + high;
		}
		return "from " + (low.endsWith(unit) ? low.substring(0, low.length() - unit.length()) : low) + " to " + high;
	}

	private static Prefix prefix(BigDecimal value, String unit) {
		if (value.signum() == 0) {
			return new Prefix("", 0);
		}
		int magnitude = value.precision() - value.scale() - 1;
		for (Prefix prefix : PREFIXES) {
			boolean possible = unit.equals("s") ? prefix.power() <= 0 : prefix.power() >= -3;
			if (possible && magnitude >= prefix.power()) {
				return prefix;
			}
		}
		return unit.equals("s") ? new Prefix("n", -9) : new Prefix("m", -3);
	}

	private static String plain(BigDecimal value) {
		BigDecimal stripped = value.signum() == 0 ? BigDecimal.ZERO : value.stripTrailingZeros();
		int magnitude = stripped.precision() - stripped.scale() - 1;
		return magnitude < -6 || magnitude > 15 ? stripped.toString() : stripped.toPlainString();
	}

	private static String withUnit(String number, String unit) {
		return switch (unit) {
		case "", "1" -> number;
		default -> number + " " + unit;
		};
	}
}
