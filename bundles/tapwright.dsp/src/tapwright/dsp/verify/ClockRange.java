// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/**
 * All sample clocks near a nominal one, and what frequencies become, per nominal sample, when the clock is any of
 * them. Results are rounded so that a statement made from them is stronger (outward) or weaker than the exact one.
 *
 * @param nominal
 *            nominal sample rate in hertz
 * @param deviation
 *            largest relative deviation, 0 to 0.5
 * @param outward
 *            whether statements become stronger by rounding
 */
record ClockRange(double nominal, double deviation, boolean outward) {

	/** More than the rounding errors of a scaled frequency, in relative terms. */
	private static final double ROUNDING = 0x1p-50;

	/** A requirement that knows one statement at the nominal clock which holds exactly when it holds at all clocks. */
	interface Aware {

		/** Proof of that statement; empty when this requirement has none. */
		java.util.Optional<Proof> prove(Subject subject, Effort effort, ClockRange clocks);
	}

	/** Lowest frequency that a frequency becomes: at the fastest clock. */
	double lowest(double hertz) {
		return Math.min(hertz / (1 + deviation) * (1 - rounding()), nominal / 2);
	}

	/** Highest frequency that a frequency becomes,
			at the slowest clock; beyond half the sample rate there is nothing new. */
	double highest(double hertz) {
		return Math.min(hertz / (1 - deviation) * (1 + rounding()), nominal / 2);
	}

	/** The slowest clock in hertz. */
	double slowest() {
		return nominal * (1 - deviation) * (1 - rounding());
	}

	/** The fastest clock in hertz. */
	double fastest() {
		return nominal * (1 + deviation) * (1 + rounding());
	}

	private double rounding() {
		return outward ? ROUNDING : -ROUNDING;
	}
}
