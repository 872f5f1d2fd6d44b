// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

/** The step response, in double precision. */
public final class StepCurve {

	private StepCurve() {
	}

	/** Running sums of the coefficients: what a filter answers to 0, 0, 1, 1, 1,
			... from the first 1 on; a new array. */
	public static double[] of(double[] taps) {
		double[] step = taps.clone();
		for (int k = 1; k < step.length; k++) {
			step[k] += step[k - 1];
		}
		return step;
	}
}
