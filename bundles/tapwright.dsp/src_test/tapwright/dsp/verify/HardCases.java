// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** Random filters and bands that are hard on a verifier. */
final class HardCases {

	/** A filter with a band in cycles per sample. */
	record Case(String kind, ExactTaps taps, double from, double to) {
	}

	private final Random random;

	HardCases(long seed) {
		random = new Random(seed);
	}

	Case next() {
		int n = 1 + random.nextInt(24);
		double from = random.nextInt(4) == 0 ? 0 : random.nextDouble() / 2;
		double to = random.nextInt(4) == 0 ? 0.5 : from + (0.5 - from) * Math.pow(random.nextDouble(), 3);
		int kind = random.nextInt(9);
		return switch (kind) {
			case 0 -> of("random", symmetric(gaussian(n), random.nextInt(3) - 1), from, to);
			case 1 -> integers(n, from, to);
			case 2 -> of("deep stop band", kaiserSinc(8 + random.nextInt(17), 0.1 + 0.1 * random.nextDouble(), 20),
					0.3 + 0.1 * random.nextDouble(), 0.5);
			case 3 -> of("double extremum", flat(random.nextInt(10) + 1), 0, to);
			case 4 -> of("narrow band", symmetric(gaussian(n), random.nextInt(3) - 1), from,
					Math.min(0.5, from + 1e-9 * random.nextInt(1000)));
			case 5 -> of("denormal", scaled(symmetric(gaussian(n), 1), -1060), from, to);
			case 6 -> of("large and small", spread(gaussian(1 + n % 8), 500), from, to);
			case 7 -> of("low pass", kaiserSinc(8 + random.nextInt(17), 0.2, 4), 0, 0.1 * random.nextDouble());
			default -> of("one frequency", symmetric(gaussian(n), random.nextInt(2)), from, from);
		};
	}

	private Case of(String kind, double[] taps, double from, double to) {
		return new Case(kind, ExactTaps.ofDoubles(taps), from, to);
	}

	private Case integers(int n, double from, double to) {
		int bits = 1 + random.nextInt(15);
		List<BigInteger> taps = IntStream.range(0, n).mapToObj(k -> BigInteger.valueOf(random.nextInt(1 << bits)
				- (1 << bits - 1)))
				.toList();
		BigFraction unit = new BigFraction(1 + random.nextInt(5), 1 + random.nextInt(1000));
		return new Case("integers", ExactTaps.ofIntegers(taps, unit), from, to);
	}

	private double[] gaussian(int n) {
		return IntStream.range(0, n).mapToDouble(k -> random.nextGaussian()).toArray();
	}

	private static double[] symmetric(double[] taps, int sign) {
		for (int k = 0, m = taps.length - 1; k <= m && sign != 0; k++, m--) {
			taps[m] = k == m && sign < 0 ? 0 : sign * taps[k];
		}
		return taps;
	}

	private static double[] scaled(double[] taps, int exponent) {
		for (int k = 0; k < taps.length; k++) {
			taps[k] = Math.scalb(taps[k], exponent);
		}
		return taps;
	}

	private double[] spread(double[] taps, int exponents) {
		for (int k = 0; k < taps.length; k++) {
			taps[k] = Math.scalb(taps[k], random.nextInt(2 * exponents) - exponents);
		}
		return taps;
	}

	// (1/4, 1/2, 1/4) with itself, time after time: all derivatives vanish at half the sample rate.
	private static double[] flat(int times) {
		double[] taps = { 1 };
		for (int t = 0; t < times; t++) {
			double[] next = new double[taps.length + 2];
			for (int k = 0; k < taps.length; k++) {
				next[k] += taps[k] / 4;
				next[k + 1] += taps[k] / 2;
				next[k + 2] += taps[k] / 4;
			}
			taps = next;
		}
		return taps;
	}

	/** An ideal low-pass filter cut off by the window of J. F. Kaiser. */
	static double[] kaiserSinc(int n, double cutoff, double beta) {
		double[] taps = new double[n];
		double middle = (n - 1) / 2.0;
		for (int k = 0; k <= (n - 1) / 2; k++) {
			double x = k - middle;
			double t = middle == 0 ? 0 : x / middle;
			double ideal = x == 0 ? 2 * cutoff : Math.sin(2 * Math.PI * cutoff * x) / (Math.PI * x);
			taps[k] = ideal * bessel(beta * Math.sqrt(Math.max(0, 1 - t * t))) / bessel(beta);
			taps[n - 1 - k] = taps[k];
		}
		return taps;
	}

	private static double bessel(double x) {
		double sum = 1;
		double term = 1;
		for (int k = 1; k < 80; k++) {
			term *= x / 2 / k * (x / 2 / k);
			sum += term;
		}
		return sum;
	}
}
