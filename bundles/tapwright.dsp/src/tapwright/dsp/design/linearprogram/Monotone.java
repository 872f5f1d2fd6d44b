// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.linearprogram;

/**
 * A stretch of frequency over which the amplitude only falls, or only rises.
 *
 * @param from
 *            lower edge in cycles per sample
 * @param to
 *            upper edge in cycles per sample
 * @param rising
 *            whether it rises
 */
public record Monotone(double from, double to, boolean rising) {

	/** Checks the edges. */
	public Monotone {
		if (!(from >= 0 && from < to && to <= 0.5)) {
			throw new IllegalArgumentException("the monotone stretch from " + from + " to " + to
					+ " (cycles per sample) must rise and lie between 0 and 0.5, half the sample rate");
		}
	}
}
