// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

/**
 * One product of a filter's sum: a coefficient times a sample, or times the sum or difference of two samples.
 *
 * @param tap
 *            index of the coefficient
 * @param delay
 *            age of the sample in input samples, 0 for the newest
 * @param mirror
 *            age of the second sample, or -1 when there is none
 * @param sign
 *            1 when the second sample is added, -1 when it is subtracted, 0 when there is none
 */
public record Term(int tap, int delay, int mirror, int sign) {

	/** A coefficient times one sample. */
	public Term(int tap, int delay) {
		this(tap, delay, -1, 0);
	}

	/** Whether two samples share the coefficient. */
	public boolean isFolded() {
		return sign != 0;
	}
}
