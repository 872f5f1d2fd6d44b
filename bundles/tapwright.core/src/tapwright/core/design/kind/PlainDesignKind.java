// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.model.Design;

/**
 * A method that is little more than its numbers.
 *
 * @param type
 *            model class
 * @param maker
 *            makes the method
 */
record PlainDesignKind<T extends Design>(Class<T> type, FromInput<T> maker) implements DesignKind<T> {

	/** Makes a method of a design and its numbers. */
	@FunctionalInterface
	interface FromInput<T> {

		tapwright.dsp.design.Design of(T design, DesignInput input) throws InputException;
	}

	@Override
	public tapwright.dsp.design.Design method(T design, DesignInput input) throws InputException {
		return maker.of(design, input);
	}
}
