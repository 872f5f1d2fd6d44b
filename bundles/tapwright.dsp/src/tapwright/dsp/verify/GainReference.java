// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/** What 0 dB means in a gain limit. */
public sealed interface GainReference {

	/** A gain of exactly 1. */
	Absolute ABSOLUTE = new Absolute();

	/** 0 dB is a gain of exactly 1. */
	record Absolute() implements GainReference {
	}

	/**
	 * 0 dB is the filter's own gain at a frequency.
	 *
	 * @param frequency
	 *            hertz, not negative
	 */
	record AtFrequency(double frequency) implements GainReference {

		/** Checks the frequency. */
		public AtFrequency {
			Frequencies.check("the reference frequency", frequency);
		}
	}

	/**
	 * 0 dB is the filter's own largest gain in a band.
	 *
	 * @param from
	 *            lower edge in hertz
	 * @param to
	 *            upper edge in hertz, not below {@code from}
	 */
	record LargestIn(double from, double to) implements GainReference {

		/** Checks the edges. */
		public LargestIn {
			Frequencies.checkBand("the reference band", from, to);
		}
	}
}
