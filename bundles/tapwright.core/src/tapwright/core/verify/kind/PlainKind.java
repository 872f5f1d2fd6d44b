// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.Partners;
import tapwright.core.verify.RequirementKind;
import tapwright.model.Requirement;

/**
 * A kind that is little more than its numbers.
 *
 * @param type
 *            model class
 * @param valueUnit
 *            unit of limit, value and margin
 * @param placeUnit
 *            unit of the worst place; empty when there is none
 * @param claim
 *            makes the statement
 * @param words
 *            says it
 */
record PlainKind<T extends Requirement>(Class<T> type, String valueUnit, String placeUnit,
		FromNumbers<T, tapwright.dsp.verify.Requirement> claim, FromNumbers<T, String> words) implements RequirementKind<T> {

	/** Makes something of a requirement and its numbers. */
	@FunctionalInterface
	interface FromNumbers<T, R> {

		R of(T requirement, Numbers numbers) throws InputException;
	}

	@Override
	public tapwright.dsp.verify.Requirement statement(T requirement, Numbers numbers, Partners partners)
			throws InputException {
		return claim.of(requirement, numbers);
	}

	@Override
	public String describe(T requirement, Numbers numbers) throws InputException {
		return words.of(requirement, numbers);
	}
}
