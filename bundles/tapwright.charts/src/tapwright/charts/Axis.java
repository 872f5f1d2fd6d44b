// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/**
 * What is shown along one side of a plot.
 *
 * @param title
 *            words without the unit
 * @param unit
 *            symbol of the values' unit; empty for plain numbers
 * @param logarithmic
 *            whether equal ratios get equal lengths; values must then be positive
 */
public record Axis(String title, String unit, boolean logarithmic) {

	/** An axis with equal steps. */
	public Axis(String title, String unit) {
		this(title, unit, false);
	}

	/** Power of ten of the prefix that suits values up to the given one: 3 for 'kHz'; 0 for units that take no prefix. */
	public int prefixPower(double largest) {
		double size = Math.abs(largest);
		if (!(unit.equals("Hz") || unit.equals("s")) || !(size > 0) || Double.isInfinite(size)) {
			return 0;
		}
		int power = Math.floorDiv((int) Math.floor(Math.log10(size) + 1e-9), 3) * 3;
		return unit.equals("s") ? Math.clamp(power, -9, 0) : Math.clamp(power, -3, 9);
	}

	/** The title with the unit: 'Frequency (kHz)'. */
	public String caption(int prefixPower) {
		return unit.isEmpty() ? title : title + " (" + prefix(prefixPower) + unit + ")";
	}

	/** A value with its unit for a person, with the given number of significant digits. */
	public String words(double value, int digits) {
		int power = prefixPower(value);
		String number = Ticks.format(value / Math.pow(10, power), digits);
		return unit.isEmpty() ? number : number + " " + prefix(power) + unit;
	}

	private static String prefix(int power) {
		return switch (power) {
		case 9 -> "G";
		case 6 -> "M";
		case 3 -> "k";
		case -3 -> "m";
		case -6 -> "µ";
		case -9 -> "n";
		default -> "";
		};
	}
}
