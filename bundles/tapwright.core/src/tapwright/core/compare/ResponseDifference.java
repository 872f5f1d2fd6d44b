// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import tapwright.dsp.response.FrequencyResponse;
import tapwright.dsp.verify.Subject;

/**
 * Two frequency responses at the same frequencies, for pictures. The arrays belong to the record; do not change them.
 *
 * @param hertz
 *            frequencies, from zero to half of the lower sample rate
 * @param before
 *            magnitudes in dB
 * @param after
 *            magnitudes in dB
 * @param difference
 *            magnitude of the difference of the two complex responses, in dB
 * @param largest
 *            largest value of the difference among these frequencies, in dB
 * @param largestAt
 *            where that is, in hertz
 */
public record ResponseDifference(double[] hertz, double[] before, double[] after, double[] difference, double largest,
		double largestAt) {

	private static final int SAMPLES = 1025;

	static ResponseDifference of(Subject before, Subject after) {
		double end = Math.min(before.sampleRate(), after.sampleRate()) / 2;
		double[] hertz = new double[SAMPLES];
		for (int k = 0; k < SAMPLES; k++) {
			hertz[k] = end * k / (SAMPLES - 1);
		}
		FrequencyResponse old = FrequencyResponse.of(before.taps().toDoubles(), before.sampleRate(), hertz);
		FrequencyResponse young = FrequencyResponse.of(after.taps().toDoubles(), after.sampleRate(), hertz);
		double[] difference = new double[SAMPLES];
		int largest = 0;
		for (int k = 0; k < SAMPLES; k++) {
			difference[k] = 20 * Math.log10(Math.hypot(young.real()[k] - old.real()[k], young.imaginary()[k] - old.imaginary()[k]));
			largest = difference[k] > difference[largest] ? k : largest;
		}
		return new ResponseDifference(hertz, old.decibels(), young.decibels(), difference, difference[largest], hertz[largest]);
	}
}
