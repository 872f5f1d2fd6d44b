// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import tapwright.dsp.verify.Subject;

/**
 * A filter's frequency response at some places, in double precision: for pictures, not for verdicts. Any thread.
 *
 * @param hertz
 *            places
 * @param real
 *            real parts
 * @param imaginary
 *            imaginary parts
 * @param delay
 *            group delay in seconds; NaN where the gain is zero
 */
record Samples(double[] hertz, double[] real, double[] imaginary, double[] delay) {

	/** Evaluates the response. */
	static Samples of(Subject subject, double[] hertz) {
		double[] taps = subject.taps().toDoubles();
		var samples = new Samples(hertz, new double[hertz.length], new double[hertz.length], new double[hertz.length]);
		for (int k = 0; k < hertz.length; k++) {
			samples.evaluate(k, taps, subject.sampleRate());
		}
		return samples;
	}

	// Sums h[n] and n h[n] times e^(-jwn) by Horner's rule; the ratio of the sums gives the group delay.
	private void evaluate(int k, double[] taps, double rate) {
		double angle = -2 * Math.PI * hertz[k] / rate;
		double cos = Math.cos(angle);
		double sin = Math.sin(angle);
		double re = 0;
		double im = 0;
		double slopeRe = 0;
		double slopeIm = 0;
		for (int n = taps.length - 1; n >= 0; n--) {
			double turned = re * cos - im * sin;
			im = re * sin + im * cos;
			re = turned + taps[n];
			double slopeTurned = slopeRe * cos - slopeIm * sin;
			slopeIm = slopeRe * sin + slopeIm * cos;
			slopeRe = slopeTurned + n * taps[n];
		}
		real[k] = re;
		imaginary[k] = im;
		double power = re * re + im * im;
		delay[k] = power == 0 ? Double.NaN : (slopeRe * re + slopeIm * im) / power / rate;
	}

	/** Magnitude at a place by index, a plain number. */
	double magnitude(int k) {
		return Math.hypot(real[k], imaginary[k]);
	}

	/** Evenly spread places, or evenly spread in their logarithm. */
	static double[] places(double from, double to, int count, boolean logarithmic) {
		double[] places = new double[count];
		for (int k = 0; k < count; k++) {
			double share = (double) k / (count - 1);
			places[k] = logarithmic ? from * Math.pow(to / from, share) : from + share * (to - from);
		}
		places[count - 1] = to;
		return places;
	}
}
