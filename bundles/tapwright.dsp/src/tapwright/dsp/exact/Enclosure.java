// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

/**
 * A closed interval that is known to contain a true value. Ends may be infinite.
 *
 * @param lo
 *            lower end, not NaN
 * @param hi
 *            upper end, not NaN, not below {@code lo}
 */
public record Enclosure(double lo, double hi) {

	/** Checks that the interval is not empty. */
	public Enclosure {
		if (!(lo <= hi)) {
			throw new IllegalArgumentException("empty enclosure [" + lo + ", " + hi + "]");
		}
	}

	/** The interval that holds just one number. */
	public static Enclosure of(double value) {
		return new Enclosure(value, value);
	}

	/** Whether the interval contains the number. */
	public boolean contains(double value) {
		return lo <= value && value <= hi;
	}

	/** The negated interval. */
	public Enclosure negate() {
		return new Enclosure(-hi, -lo);
	}

	/** Distance between the ends, rounded. */
	public double width() {
		return hi - lo;
	}

	/** A number near the middle that lies inside. */
	public double middle() {
		double middle = lo / 2 + hi / 2;
		return Double.isNaN(middle) ? lo : Math.min(Math.max(middle, lo), hi);
	}
}
