// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.function.IntFunction;

import tapwright.dsp.Progress;

/** Designs by one method that differ only in their number of coefficients. Used by one search at a time. */
public interface FilterFamily {

	/** Name of the method, for a person. */
	String name();

	/** Where to start looking. */
	int estimate();

	/**
	 * The design with this many coefficients, to be tried; it may build on what earlier trials found.
	 *
	 * @throws IllegalArgumentException
	 *             when there is none with this many coefficients; says why
	 */
	Design trial(int taps);

	/**
	 * The design with this many coefficients, which depends on nothing else.
	 *
	 * @throws IllegalArgumentException
	 *             when there is none with this many coefficients; says why
	 */
	default Design design(int taps) {
		return trial(taps);
	}

	/**
	 * Whether it is proven that no filter with this many coefficients meets the requirements, nor a shorter one whose
	 * number of coefficients is even or odd alike, whatever the method.
	 */
	default boolean excludes(int taps, Progress progress) {
		return false;
	}

	/** A family without special knowledge. */
	static FilterFamily of(String name, int estimate, IntFunction<Design> design) {
		return new FilterFamily() {

			@Override
			public String name() {
				return name;
			}

			@Override
			public int estimate() {
				return estimate;
			}

			@Override
			public Design trial(int taps) {
				return design.apply(taps);
			}
		};
	}
}
