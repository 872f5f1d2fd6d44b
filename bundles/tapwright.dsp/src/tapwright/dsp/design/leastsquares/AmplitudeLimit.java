// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

/**
 * Straight lines that the amplitude stays between over a stretch of frequency; an infinite value is no limit.
 *
 * @param from
 *            lower edge in cycles per sample
 * @param to
 *            upper edge, above {@code from}, at most 0.5
 * @param lowerFrom
 *            least amplitude at the lower edge
 * @param lowerTo
 *            least amplitude at the upper edge
 * @param upperFrom
 *            greatest amplitude at the lower edge
 * @param upperTo
 *            greatest amplitude at the upper edge
 */
public record AmplitudeLimit(double from, double to, double lowerFrom, double lowerTo, double upperFrom, double upperTo) {

	/** Checks edges and values. */
	public AmplitudeLimit {
		if (!(from >= 0 && from < to && to <= 0.5)) {
			throw new IllegalArgumentException("the limit from " + from + " to " + to
					+ " (cycles per sample) must rise and lie between 0 and 0.5, half the sample rate");
		}
		if (!(lowerFrom < upperFrom && lowerTo < upperTo) || lowerFrom == Double.POSITIVE_INFINITY
				|| upperFrom == Double.NEGATIVE_INFINITY || Double.isInfinite(lowerFrom) != Double.isInfinite(lowerTo)
				|| Double.isInfinite(upperFrom) != Double.isInfinite(upperTo)) {
			throw new IllegalArgumentException("the limit from " + from + " to " + to + " cycles per sample allows nothing: "
					+ lowerFrom + " to " + upperFrom + " and " + lowerTo + " to " + upperTo
					+ "; the lower value must lie below the upper one at both edges");
		}
	}

	/** Constant limits. */
	public AmplitudeLimit(double from, double to, double lower, double upper) {
		this(from, to, lower, lower, upper, upper);
	}
}
