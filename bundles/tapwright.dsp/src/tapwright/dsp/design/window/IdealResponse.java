// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import java.util.List;

import tapwright.dsp.design.Band;
import tapwright.dsp.exact.Symmetry;

/** Inverse transform of a piecewise-linear amplitude, in closed form. */
final class IdealResponse {

	private IdealResponse() {
	}

	/**
	 * The value of the ideal impulse response.
	 *
	 * @param target
	 *            straight lines of amplitude; zero elsewhere
	 * @param symmetry
	 *            even: 2 integral of A(f) cos(2 pi f m); odd: 2 integral of A(f) sin(2 pi f m)
	 * @param m
	 *            distance before the middle in samples, a multiple of 1/2; not negative
	 */
	static double sample(List<Band> target, Symmetry symmetry, double m) {
		double sum = 0;
		for (Band line : target) {
			sum += m == 0 ? symmetry == Symmetry.ODD ? 0 : area(line) : transform(line, symmetry, m);
		}
		return 2 * sum;
	}

	private static double area(Band line) {
		return (line.to() - line.from()) * (line.desiredFrom() + line.desiredTo()) / 2;
	}

	// Integration by parts over the middle of the line and its half width: both terms keep their accuracy for short
	// lines.
	private static double transform(Band line, Symmetry symmetry, double m) {
		double middle = (line.from() + line.to()) / 2;
		double half = (line.to() - line.from()) / 2;
		double mean = (line.desiredFrom() + line.desiredTo()) / 2;
		double rise = (line.desiredTo() - line.desiredFrom()) / 2;
		double v = 2 * Math.PI * m;
		double cos = Math.cos(v * middle);
		double sin = Math.sin(v * middle);
		// Even part: mean * 2 half sinc(v half); odd part: rise * integral of (t/half) sin(v t).
		double flat = mean * 2 * half * sinc(v * half);
		double slope = rise * 2 * half * sincSlope(v * half);
		return symmetry == Symmetry.ODD ? flat * sin + slope * cos : flat * cos - slope * sin;
	}

	private static double sinc(double x) {
		return x == 0 ? 1 : Math.sin(x) / x;
	}

	// Integral of t sin(x t) over 0..1, (sin x - x cos x) / x^2, which cancels for small x.
	private static double sincSlope(double x) {
		if (Math.abs(x) < 0.25) {
			double y = x * x;
			return x / 3 * (1 - y / 10 * (1 - y / 28 * (1 - y / 54 * (1 - y / 88 * (1 - y / 130)))));
		}
		return (Math.sin(x) - x * Math.cos(x)) / (x * x);
	}
}
