// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.model.Requirement;

/**
 * Connects one requirement class of the model with its proof and its words. Stateless.
 *
 * @param <T>
 *            the model class
 */
public interface RequirementKind<T extends Requirement> {

	/** The model class. */
	Class<T> type();

	/**
	 * The statement to prove.
	 *
	 * @param partners
	 *            for kinds that speak of two filters
	 * @throws InputException
	 *             when a number is missing or makes no sense; names the feature
	 */
	tapwright.dsp.verify.Requirement statement(T requirement, Numbers numbers, Partners partners) throws InputException;

	/** The statement in a few words, with numbers: 'gain from 8 to 24 kHz at most -80 dB'. */
	String describe(T requirement, Numbers numbers) throws InputException;

	/** Unit of limit, value and margin. */
	String valueUnit();

	/** Unit of the worst place; empty when the kind has no place. */
	String placeUnit();
}
