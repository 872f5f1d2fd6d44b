// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.time.Duration;
import java.util.Objects;
import java.util.function.Predicate;

import tapwright.dsp.Progress;

/**
 * How long and how a rounding is looked for.
 *
 * @param seed
 *            of all random choices; the same seed gives the same candidates in the same order
 * @param limit
 *            after this time the best rounding so far is returned
 * @param progress
 *            can cancel the search
 * @param enough
 *            is told of every improvement as it is found, on the searching thread; the search ends when it answers true
 */
public record Search(long seed, Duration limit, Progress progress, Predicate<Rounded> enough) {

	/** Checks the limit. */
	public Search {
		Objects.requireNonNull(progress);
		Objects.requireNonNull(enough);
		if (limit.isNegative()) {
			throw new IllegalArgumentException("the time limit is negative");
		}
	}

	/** A search that ends with its time. */
	public static Search within(Duration limit) {
		return new Search(1, limit, Progress.NONE, rounded -> false);
	}
}
