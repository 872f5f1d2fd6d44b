// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * Kaiser's formulas for a windowed design from its requirements (J. F. Kaiser, Nonrecursive digital filter design using
 * the I0-sinh window function, Proceedings of the IEEE International Symposium on Circuits and Systems, 1974). An
 * estimate, not a proof: check the design, and add a few coefficients where it misses.
 *
 * @param beta
 *            parameter of the Kaiser window
 * @param order
 *            number of coefficients minus 1, as the formula gives it: not a whole number
 */
public record KaiserEstimate(double beta, double order) {

	/**
	 * From the attenuation.
	 *
	 * @param attenuation
	 *            -20 log10 of the smallest ripple of all bands, in dB; positive
	 * @param transition
	 *            width of the narrowest transition in cycles per sample, above 0, below 0.5
	 * @throws IllegalArgumentException
	 *             when a number is out of range
	 */
	public static KaiserEstimate ofAttenuation(double attenuation, double transition) {
		if (!(attenuation > 0) || attenuation > 1000) {
			throw new IllegalArgumentException("the attenuation is " + attenuation
					+ " dB; it must be above 0 and at most 1000 dB");
		}
		if (!(transition > 0 && transition < 0.5)) {
			throw new IllegalArgumentException("the transition is " + transition
					+ " cycles per sample wide; it must be above 0 and below 0.5, half the sample rate");
		}
		// The 1974 formula goes on below 21 dB, where the window is rectangular and the transition 0.9222 / order.
		double d = attenuation > 21 ? (attenuation - 7.95) / 14.36 : 0.9222;
		return new KaiserEstimate(beta(attenuation), d / transition);
	}

	/**
	 * From the ripple.
	 *
	 * @param ripple
	 *            greatest allowed deviation of the amplitude in any band, linear, above 0 and below 1
	 * @param transition
	 *            width of the narrowest transition in cycles per sample
	 */
	public static KaiserEstimate ofRipple(double ripple, double transition) {
		if (!(ripple > 0 && ripple < 1)) {
			throw new IllegalArgumentException("the ripple is " + ripple + "; it must be above 0 and below 1");
		}
		return ofAttenuation(-20 * Math.log10(ripple), transition);
	}

	/**
	 * Beta of the Kaiser window for an attenuation in dB.
	 */
	public static double beta(double attenuation) {
		if (attenuation > 50) {
			return 0.1102 * (attenuation - 8.7);
		}
		return attenuation > 21 ? 0.5842 * Math.pow(attenuation - 21, 0.4) + 0.07886 * (attenuation - 21) : 0;
	}

	/** The window. */
	public KaiserWindow window() {
		return new KaiserWindow(beta);
	}

	/**
	 * The smallest number of coefficients that the formula promises.
	 *
	 * @throws IllegalArgumentException
	 *             when it is beyond the longest window
	 */
	public int taps() {
		if (order + 1 > Window.LONGEST) {
			throw new IllegalArgumentException("this transition needs about " + Math.round(order + 1)
					+ " coefficients; widen it or lower the sample rate (at most " + Window.LONGEST
					+ " can be designed)");
		}
		return (int) Math.ceil(order) + 1;
	}
}
