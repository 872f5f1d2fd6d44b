// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

/**
 * A stretch of frequency with a straight line of desired amplitude and one of weight.
 *
 * @param from
 *            lower edge in cycles per sample, 0 to 0.5
 * @param to
 *            upper edge in cycles per sample, above {@code from}, at most 0.5
 * @param desiredFrom
 *            desired amplitude at the lower edge, linear
 * @param desiredTo
 *            desired amplitude at the upper edge, linear
 * @param weightFrom
 *            weight of the error at the lower edge, positive
 * @param weightTo
 *            weight of the error at the upper edge, positive
 */
public record Band(double from, double to, double desiredFrom, double desiredTo, double weightFrom, double weightTo) {

	/** Checks edges, values and weights. */
	public Band {
		if (!(from >= 0 && from < to && to <= 0.5)) {
			throw new IllegalArgumentException("band edges " + from + " and " + to
					+ " (cycles per sample) must rise and lie between 0 and 0.5, half the sample rate");
		}
		if (!Double.isFinite(desiredFrom) || !Double.isFinite(desiredTo)) {
			throw new IllegalArgumentException("the desired amplitude in the band from " + from + " to " + to
					+ " is not a finite number");
		}
		if (!(weightFrom > 0 && weightTo > 0 && Double.isFinite(weightFrom) && Double.isFinite(weightTo))) {
			throw new IllegalArgumentException("the weight in the band from " + from + " to " + to + " must be positive");
		}
	}

	/** Constant desired amplitude and weight. */
	public Band(double from, double to, double desired, double weight) {
		this(from, to, desired, desired, weight, weight);
	}

	/** Desired amplitude at a frequency inside the band. */
	public double desired(double frequency) {
		return line(desiredFrom, desiredTo, frequency);
	}

	/** Weight at a frequency inside the band. */
	public double weight(double frequency) {
		return line(weightFrom, weightTo, frequency);
	}

	private double line(double atFrom, double atTo, double frequency) {
		return atFrom + (atTo - atFrom) * ((frequency - from) / (to - from));
	}
}
