// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.InputException;

/**
 * An exact number with what it measures, in base units.
 *
 * @param value
 *            in base units: Hz, s, dB, %, ppm, bit
 * @param dimension
 *            what it measures
 */
public record Quantity(BigFraction value, Dimension dimension) {

	/** A plain number. */
	static Quantity plain(BigFraction value) {
		return new Quantity(value, Dimension.NONE);
	}

	Quantity plus(Quantity other) throws InputException {
		return new Quantity(value.add(other.value), common(other, "add"));
	}

	Quantity minus(Quantity other) throws InputException {
		return new Quantity(value.subtract(other.value), common(other, "subtract"));
	}

	Quantity times(Quantity other) {
		return new Quantity(value.multiply(other.value), dimension.times(other.dimension));
	}

	Quantity over(Quantity other) throws InputException {
		if (other.value.equals(BigFraction.ZERO)) {
			throw new InputException("", "division by zero");
		}
		return new Quantity(value.divide(other.value), dimension.over(other.dimension));
	}

	Quantity negate() {
		return new Quantity(value.negate(), dimension);
	}

	Quantity lesser(Quantity other) throws InputException {
		common(other, "compare");
		return value.compareTo(other.value) <= 0 ? this : other;
	}

	Quantity greater(Quantity other) throws InputException {
		common(other, "compare");
		return value.compareTo(other.value) >= 0 ? this : other;
	}

	private Dimension common(Quantity other, String verb) throws InputException {
		if (!dimension.equals(other.dimension)) {
			throw new InputException("", "cannot " + verb + " " + Units.symbol(dimension) + " and "
					+ Units.symbol(other.dimension) + "; write the unit behind the number");
		}
		return dimension;
	}
}
