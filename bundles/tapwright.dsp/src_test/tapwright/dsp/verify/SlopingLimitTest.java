// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;

/** Sloping limits against a fine grid with local refinement in plain double precision. */
class SlopingLimitTest {

	private static final int ROUNDS = Boolean.getBoolean("tapwright.thorough") ? 5_000 : 100;
	private static final int GRID = 2000;
	/** What plain evaluation leaves of a decibel for gains above -80 dB. */
	private static final double TOLERANCE = 1e-9;

	@Test
	void marginsAreThoseOfAFineSearch() {
		Random random = new Random(42);
		int judged = 0;
		for (int round = 0; round < ROUNDS; round++) {
			int n = 1 + random.nextInt(30);
			double[] taps = new double[n];
			boolean symmetric = random.nextBoolean();
			for (int k = 0; k < n; k++) {
				taps[k] = symmetric && k > (n - 1) / 2 ? taps[n - 1 - k] : random.nextGaussian();
			}
			boolean upper = random.nextInt(3) > 0;
			boolean logarithmic = random.nextBoolean();
			double from = logarithmic ? Math.pow(10, -4 * random.nextDouble()) * 0.4 : 0.4 * random.nextDouble();
			double to = from + (0.5 - from) * random.nextDouble();
			double a = 80 * random.nextDouble() - 60;
			double b = 80 * random.nextDouble() - 60;
			double truth = margin(taps, from, to, a, b, upper, logarithmic);
			// Move the line so that the true margin is very small, on either side.
			double target = (random.nextBoolean() ? 1 : -1) * Math.pow(10, -3 - 5 * random.nextDouble());
			double shift = upper ? target - truth : truth - target;
			if (!(truth > -1000) || Math.abs(shift) > 150) {
				continue;
			}
			judged++;
			double none = upper ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
			GainLimit limit = new GainLimit(List.of(
					new GainLimit.Breakpoint(from, upper ? none : a + shift, upper ? a + shift : none),
					new GainLimit.Breakpoint(to, upper ? none : b + shift, upper ? b + shift : none)), logarithmic,
					GainReference.ABSOLUTE);
			double exact = margin(taps, from, to, a + shift, b + shift, upper, logarithmic);
			Proof proof = limit.prove(new Subject(ExactTaps.ofDoubles(taps), 1), Effort.STANDARD);
			assertTrue(proof.margin().lo() <= exact + TOLERANCE && exact - TOLERANCE <= proof.margin().hi(),
					limit + " grid " + exact + " " + proof);
			assertTrue(Math.abs(exact) < TOLERANCE || proof.verdict() == (exact > 0 ? Verdict.MET : Verdict.MISSED),
					limit + " grid " + exact + " " + proof);
			assertTrue(proof.margin().width() < 1e-6, proof.toString());
		}
		assertTrue(judged > ROUNDS / 4, "judged only " + judged);
	}

	// Smallest margin: grid, then golden section around every local minimum of it.
	private static double margin(double[] taps, double from, double to, double a, double b, boolean upper,
			boolean logarithmic) {
		double[] margins = new double[GRID + 1];
		for (int k = 0; k <= GRID; k++) {
			margins[k] = margin(taps, at(from, to, k / (double) GRID, logarithmic), from, to, a, b, upper, logarithmic);
		}
		double best = Math.min(margins[0], margins[GRID]);
		for (int k = 1; k < GRID; k++) {
			if (margins[k] <= margins[k - 1] && margins[k] <= margins[k + 1]) {
				best = Math.min(best, golden(taps, k, from, to, a, b, upper, logarithmic));
			}
		}
		return Math.min(best, Math.min(golden(taps, 0, from, to, a, b, upper, logarithmic),
				golden(taps, GRID, from, to, a, b, upper, logarithmic)));
	}

	private static double golden(double[] taps, int place, double from, double to, double a, double b, boolean upper,
			boolean logarithmic) {
		double best = Double.POSITIVE_INFINITY;
		double lo = Math.max(0, (place - 1) / (double) GRID);
		double hi = Math.min(1, (place + 1) / (double) GRID);
		for (int step = 0; step < 70; step++) {
			double x = lo + 0.382 * (hi - lo);
			double y = hi - 0.382 * (hi - lo);
			double atX = margin(taps, at(from, to, x, logarithmic), from, to, a, b, upper, logarithmic);
			double atY = margin(taps, at(from, to, y, logarithmic), from, to, a, b, upper, logarithmic);
			best = Math.min(best, Math.min(atX, atY));
			if (atX < atY) {
				hi = y;
			} else {
				lo = x;
			}
		}
		return best;
	}

	private static double at(double from, double to, double part, boolean logarithmic) {
		double place = logarithmic ? from * Math.pow(to / from, part) : from + (to - from) * part;
		return Math.min(Math.max(place, from), to);
	}

	private static double margin(double[] taps, double f, double from, double to, double a, double b, boolean upper,
			boolean logarithmic) {
		double part = logarithmic ? Math.log(f / from) / Math.log(to / from) : (f - from) / (to - from);
		double limit = a + (b - a) * part;
		double re = 0;
		double im = 0;
		for (int k = 0; k < taps.length; k++) {
			re += taps[k] * Math.cos(2 * Math.PI * f * k);
			im -= taps[k] * Math.sin(2 * Math.PI * f * k);
		}
		double gain = 20 * Math.log10(Math.hypot(re, im));
		return upper ? limit - gain : gain - limit;
	}
}
