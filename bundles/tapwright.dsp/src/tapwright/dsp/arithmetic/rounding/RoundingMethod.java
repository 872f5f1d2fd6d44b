// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

/** Ways to round coefficients, from the cheapest to the most thorough. */
public enum RoundingMethod {
	/** Each coefficient to the nearest step. */
	NEAREST,
	/** Each coefficient to the nearest step after scaling all of them by the best of many gains within 3 dB. */
	GAIN,
	/** Each coefficient takes along the rounding error of the one before. */
	ERROR_FEEDBACK,
	/** Steps of single coefficients and pairs of them (each with its mirror) as long as the judge finds them better. */
	PAIRS,
	/** Steps along a reduced lattice basis from many starting points; needs bands and symmetric coefficients. */
	LATTICE,
	/** Like lattice, then all roundings that could be better, which proves the optimum of small problems. */
	EXHAUSTIVE;

	/**
	 * Rounds coefficients. Every method begins with the nearest steps, so that none is worse.
	 *
	 * @return the best that was found in the given time
	 * @throws IllegalArgumentException
	 *             when the method needs bands or symmetry and there is none
	 * @throws java.util.concurrent.CancellationException
	 *             when the search's progress was cancelled
	 */
	public Rounded round(RoundingTask task, Search search) {
		Best best = new Best(task, search);
		switch (this) {
		case NEAREST -> {
			// Where every search begins.
		}
		case GAIN -> SimpleRounding.gains(task, best);
		case ERROR_FEEDBACK -> SimpleRounding.errorFeedback(task, best);
		case PAIRS -> new PairSearch(task, best).run();
		case LATTICE -> new LatticeSearch(task, best).run(false);
		case EXHAUSTIVE -> new LatticeSearch(task, best).run(true);
		}
		return best.rounded();
	}
}
