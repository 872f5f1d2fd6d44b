// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Rationals;

/** Checks on frequencies that several kinds of requirement share. */
final class Frequencies {

	private Frequencies() {
	}

	/** Refuses what is not a frequency. */
	static void check(String what, double frequency) {
		if (!(frequency >= 0) || Double.isInfinite(frequency)) {
			throw new IllegalArgumentException(what + " is " + frequency + " Hz; it must be 0 or a positive number");
		}
	}

	/** Refuses what is not a band. */
	static void checkBand(String what, double from, double to) {
		check("the lower edge of " + what, from);
		check("the upper edge of " + what, to);
		if (from > to) {
			throw new IllegalArgumentException(what + " runs from " + from + " Hz down to " + to
					+ " Hz; exchange the edges");
		}
	}

	/** Refuses a frequency above half the sample rate. */
	static void checkBelowHalf(String what, double frequency, double sampleRate) {
		if (frequency > sampleRate / 2) {
			throw new IllegalArgumentException(what + " is " + frequency + " Hz, above half the sample rate of "
					+ sampleRate
					+ " Hz; lower it or raise the sample rate");
		}
	}

	/** The double nearest to a frequency in cycles per sample, in hertz. */
	static double hertz(BigFraction turns, double sampleRate) {
		return Rationals.nearest(turns.multiply(Rationals.exact(sampleRate)));
	}
}
