// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import tapwright.dsp.exact.ExactTaps;

/** One step of a signal path, with exact numbers. */
public sealed interface Step {

	/**
	 * A filter.
	 *
	 * @param name
	 *            of the filter
	 * @param taps
	 *            its coefficients as they ship
	 */
	record Filtering(String name, ExactTaps taps) implements Step {
	}

	/**
	 * Keeps one sample of every so many.
	 *
	 * @param factor
	 *            at least 1
	 */
	record Lowering(int factor) implements Step {

		/** Checks the factor. */
		public Lowering {
			check(factor);
		}
	}

	/**
	 * Inserts zeros.
	 *
	 * @param factor
	 *            how many samples one becomes, at least 1
	 */
	record Raising(int factor) implements Step {

		/** Checks the factor. */
		public Raising {
			check(factor);
		}
	}

	private static void check(int factor) {
		if (factor < 1) {
			throw new IllegalArgumentException("the rate factor is " + factor + "; it must be at least 1");
		}
	}
}
