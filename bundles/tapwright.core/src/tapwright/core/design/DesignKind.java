// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import tapwright.core.InputException;
import tapwright.model.Design;

/**
 * Connects one design class of the model with its method. Stateless.
 *
 * @param <T>
 *            the model class
 */
public interface DesignKind<T extends Design> {

	/** The model class. */
	Class<T> type();

	/**
	 * The method with all its numbers; its text form tells everything that the coefficients depend on.
	 *
	 * @throws InputException
	 *             when a number is missing or makes no sense; names the feature
	 */
	tapwright.dsp.design.Design method(T design, DesignInput input) throws InputException;
}
