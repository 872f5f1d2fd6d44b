// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import tapwright.core.InputException;
import tapwright.dsp.exact.ExactTaps;

/** Finds other filters of the same portfolio, for requirements that speak of two. */
@FunctionalInterface
public interface Partners {

	/** A filter without a portfolio has no partners. */
	Partners NONE = name -> {
		throw new InputException("partner", "'" + name + "' can only be found in a portfolio");
	};

	/**
	 * The coefficients of a filter as they ship.
	 *
	 * @throws InputException
	 *             when there is no such filter, or it has no coefficients
	 */
	ExactTaps shipped(String filter) throws InputException;
}
