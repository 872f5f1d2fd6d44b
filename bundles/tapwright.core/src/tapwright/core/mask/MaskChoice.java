// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import java.util.Map;

import tapwright.core.InputException;
import tapwright.core.quantity.Words;

/**
 * A number that a mask leaves open.
 *
 * @param name
 *            for a person, and the key of its value
 * @param unit
 *            symbol
 * @param usual
 *            value when nothing else is chosen
 */
public record MaskChoice(String name, String unit, double usual) {

	double positive(Map<String, Double> values) throws InputException {
		double value = values.getOrDefault(name, usual);
		if (!(value > 0) || Double.isInfinite(value)) {
			throw new InputException(name, Words.of(value, unit) + " must be a positive number");
		}
		return value;
	}
}
