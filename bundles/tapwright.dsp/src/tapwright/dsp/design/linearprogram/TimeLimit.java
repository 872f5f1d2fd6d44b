// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.linearprogram;

/**
 * Limits on a stretch of the impulse or step response. Equal limits fix the values, for instance at zero.
 *
 * @param step
 *            whether it is the step response, otherwise the impulse response
 * @param from
 *            first sample, not negative
 * @param to
 *            last sample, below the number of coefficients
 * @param lower
 *            least value; may be minus infinity
 * @param upper
 *            greatest value; may be infinity
 */
public record TimeLimit(boolean step, int from, int to, double lower, double upper) {

	/** Checks the numbers. */
	public TimeLimit {
		if (from < 0 || to < from) {
			throw new IllegalArgumentException("a limit on samples " + from + " to " + to + "; they must rise from 0");
		}
		if (!(lower <= upper) || lower == Double.POSITIVE_INFINITY || upper == Double.NEGATIVE_INFINITY) {
			throw new IllegalArgumentException("the limit on samples " + from + " to " + to + " allows nothing: " + lower + " to "
					+ upper);
		}
	}
}
