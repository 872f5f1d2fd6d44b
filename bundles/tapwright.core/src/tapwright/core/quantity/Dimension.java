// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

/**
 * What kind of thing a number measures, as exponents of base units. Logarithmic and relative units are kinds of their own: they
 * do not mix with plain numbers by accident.
 *
 * @param second
 *            exponent of the second; hertz is -1
 * @param decibel
 *            exponent of the decibel
 * @param percent
 *            exponent of per cent
 * @param ppm
 *            exponent of parts per million
 * @param bit
 *            exponent of the bit
 */
public record Dimension(int second, int decibel, int percent, int ppm, int bit) {

	/** A plain number. */
	public static final Dimension NONE = new Dimension(0, 0, 0, 0, 0);

	Dimension times(Dimension other) {
		return new Dimension(second + other.second, decibel + other.decibel, percent + other.percent, ppm + other.ppm,
				bit + other.bit);
	}

	Dimension over(Dimension other) {
		return new Dimension(second - other.second, decibel - other.decibel, percent - other.percent, ppm - other.ppm,
				bit - other.bit);
	}
}
