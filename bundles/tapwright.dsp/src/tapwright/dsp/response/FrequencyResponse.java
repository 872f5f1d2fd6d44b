// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

/**
 * The frequency response H(f) = sum of h[k] exp(-2 pi i f k / rate) at some frequencies, in double precision: for
 * pictures, not for verdicts. The arrays belong to the record; do not change them.
 *
 * @param hertz
 *            frequencies
 * @param real
 *            real parts of H
 * @param imaginary
 *            imaginary parts of H
 * @param groupDelay
 *            in seconds; NaN where H is zero
 */
public record FrequencyResponse(double[] hertz, double[] real, double[] imaginary, double[] groupDelay) {

	/**
	 * Evaluates a filter.
	 *
	 * @param taps
	 *            h[0..N-1]
	 * @param sampleRate
	 *            in hertz
	 * @param hertz
	 *            where to evaluate, in any order
	 */
	public static FrequencyResponse of(double[] taps, double sampleRate, double[] hertz) {
		int count = hertz.length;
		FrequencyResponse response = new FrequencyResponse(hertz.clone(), new double[count], new double[count],
				new double[count]);
		for (int k = 0; k < count; k++) {
			response.evaluate(k, taps, sampleRate);
		}
		return response;
	}

	// Horner's rule for H and for its moments; the group delay is the real part of the quotient.
	private void evaluate(int at, double[] taps, double sampleRate) {
		double angle = -2 * Math.PI * Math.IEEEremainder(hertz[at] / sampleRate, 1);
		double cos = Math.cos(angle);
		double sin = Math.sin(angle);
		double re = 0;
		double im = 0;
		double momentRe = 0;
		double momentIm = 0;
		for (int k = taps.length - 1; k >= 0; k--) {
			double next = re * cos - im * sin + taps[k];
			im = re * sin + im * cos;
			re = next;
			next = momentRe * cos - momentIm * sin + k * taps[k];
			momentIm = momentRe * sin + momentIm * cos;
			momentRe = next;
		}
		real[at] = re;
		imaginary[at] = im;
		double power = re * re + im * im;
		groupDelay[at] = power == 0 ? Double.NaN : (momentRe * re + momentIm * im) / power / sampleRate;
	}

	/** Magnitudes as plain numbers; a new array. */
	public double[] magnitude() {
		double[] magnitude = new double[hertz.length];
		for (int k = 0; k < magnitude.length; k++) {
			magnitude[k] = Math.hypot(real[k], imaginary[k]);
		}
		return magnitude;
	}

	/** Magnitudes in dB, negative infinity for zero; a new array. */
	public double[] decibels() {
		double[] decibels = magnitude();
		for (int k = 0; k < decibels.length; k++) {
			decibels[k] = 20 * Math.log10(decibels[k]);
		}
		return decibels;
	}

	/**
	 * Phases in radians; a new array. Neighbours never differ by more than pi, so the curve is smooth where
	 * frequencies are dense enough; it starts between -pi and pi.
	 */
	public double[] phase() {
		double[] phase = new double[hertz.length];
		double turns = 0;
		for (int k = 0; k < phase.length; k++) {
			double principal = Math.atan2(imaginary[k], real[k]);
			if (k > 0) {
				turns -= Math.rint((principal + 2 * Math.PI * turns - phase[k - 1]) / (2 * Math.PI));
			}
			phase[k] = principal + 2 * Math.PI * turns;
		}
		return phase;
	}
}
