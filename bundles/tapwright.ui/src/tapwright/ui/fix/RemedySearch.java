// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.fix;

import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.remedy.DesignAgain;
import tapwright.core.remedy.Remedies;
import tapwright.core.remedy.Remedy;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.model.Filter;

/** Ways to find remedies of a problem. Any thread that owns the filter. */
enum RemedySearch {

	/** Changes that meet the missed requirement. */
	MEET("Find changes that are proven to meet it...") {
		@Override
		List<Remedy> find(Filter filter, Expression.Names parameters, String requirement, Progress progress) {
			return Remedies.of(filter, parameters, requirement, progress);
		}
	},
	/** New coefficients of a stale design. */
	DESIGN_AGAIN("Run the design again...") {
		@Override
		List<Remedy> find(Filter filter, Expression.Names parameters, String requirement, Progress progress)
				throws InputException, DesignException {
			return DesignAgain.of(filter, parameters, progress).stream().toList();
		}
	};

	private final String label;

	RemedySearch(String label) {
		this.label = label;
	}

	String label() {
		return label;
	}

	/**
	 * Searches.
	 *
	 * @param requirement
	 *            id of the requirement that the problem concerns; empty when it concerns none
	 * @throws InputException
	 *             when a number makes no sense
	 * @throws DesignException
	 *             when a design yields nothing
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	abstract List<Remedy> find(Filter filter, Expression.Names parameters, String requirement, Progress progress)
			throws InputException, DesignException;
}
