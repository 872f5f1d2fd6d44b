// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

class NoiseTest {

	/** Widrow 1956 for discrete numbers: (q_out^2 - q_in^2) / 12 from 2^-30 to 2^-15, evaluated in 30 digits. */
	@Test
	void requantisingAddsATwelfthOfTheDifferenceOfTheSquaredSteps() {
		Noise noise = Noise.uniform(BigInteger.ONE.shiftLeft(15), Rounding.FLOOR);
		double variance = Rationals.nearest(noise.variance()) * 0x1p-30;
		assertEquals(7.761021447900973e-11, variance, 1e-25);
		assertEquals(-0.5 * (1 - 0x1p-15), Rationals.nearest(noise.mean()), 1e-16);
	}

	/** The textbook 6.02 b + 1.76 dB of a full-scale sine over rounding noise, from fine steps. */
	@Test
	void signalToNoiseRatioOfAFullScaleSine() {
		double[] expected = { 49.92571189679381, 98.0905112030308, 146.2553105092678 };
		int[] words = { 8, 16, 24 };
		for (int n = 0; n < words.length; n++) {
			Noise noise = Noise.uniform(BigInteger.ONE.shiftLeft(60), Rounding.HALF_EVEN);
			double fullScale = Math.scalb(1.0, words[n] - 1);
			assertEquals(expected[n], -10 * Math.log10(2) - noise.decibels(new BigFraction((long) fullScale)), 1e-9);
		}
	}

	/** Reference: all places in two steps on both sides of zero, one by one. */
	@ParameterizedTest
	@EnumSource(Rounding.class)
	void expectationIsTheAverageOverAllPlaces(Rounding rounding) {
		for (int parts : new int[] { 2, 3, 4, 7, 8, 35 }) {
			BigFraction mean = BigFraction.ZERO;
			BigFraction power = BigFraction.ZERO;
			BigFraction bound = BigFraction.ZERO;
			int count = 4 * parts;
			for (int place = -2 * parts; place < 2 * parts; place++) {
				BigFraction error = error(place, parts, rounding);
				mean = mean.add(error.divide(count));
				power = power.add(error.multiply(error).divide(count));
				bound = bound.compareTo(error.abs()) < 0 ? error.abs() : bound;
			}
			Noise noise = Noise.uniform(BigInteger.valueOf(parts), rounding);
			assertEquals(power, noise.power(), rounding + " " + parts);
			assertEquals(mean, noise.mean());
			assertEquals(bound, noise.bound());
		}
	}

	private static BigFraction error(int place, int parts, Rounding rounding) {
		BigInteger rounded = rounding.divide(BigInteger.valueOf(place), BigInteger.valueOf(parts));
		return new BigFraction(rounded).subtract(new BigFraction(place, parts));
	}

	/** Bit-true outputs against exact ones: never beyond the bound, and with the expected power for busy inputs. */
	@ParameterizedTest
	@EnumSource(Rounding.class)
	void simulatedErrorsKeepToTheBoundAndTheExpectation(Rounding rounding) {
		NumberFormat q15 = new NumberFormat(16, 15);
		ExactTaps taps = q15.nearest(ExactTaps.ofDoubles(new Random(8).doubles(9, -0.2, 0.2).toArray()));
		for (Optional<NumberFormat> product : List.of(Optional.<NumberFormat>empty(), Optional.of(new NumberFormat(24, 18)))) {
			Arithmetic rounded = arithmetic(q15, product, Optional.of(new NumberFormat(20, 15)), rounding);
			Arithmetic exact = arithmetic(q15, Optional.empty(), Optional.empty(), rounding);
			long[] samples = new Random(9).longs(200_000, -32768, 32768).toArray();
			BitTrue exactFilter = new BitTrue(taps, exact);
			long[] outputs = new BitTrue(taps, rounded).filter(samples);
			long[] truth = exactFilter.filter(samples);
			double step = Rationals.nearest(exactFilter.outputStep());
			Noise noise = Noise.of(taps, rounded);
			double mean = 0;
			double power = 0;
			double worst = 0;
			for (int n = 0; n < outputs.length; n++) {
				double error = outputs[n] * 0x1p-15 - truth[n] * step;
				mean += error / outputs.length;
				power += error * error / outputs.length;
				worst = Math.max(worst, Math.abs(error));
			}
			assertTrue(worst <= Rationals.nearest(noise.bound()));
			// Truncated products err against the sign of the output, which the model leaves out.
			if (rounding != Rounding.TOWARD_ZERO || product.isEmpty()) {
				assertEquals(1, power / Rationals.nearest(noise.power()), 0.03);
				assertEquals(Rationals.nearest(noise.mean()), mean, 0.02 * 0x1p-15);
			}
		}
	}

	@Test
	void exactArithmeticHasNoNoise() {
		NumberFormat q15 = new NumberFormat(16, 15);
		ExactTaps halves = ExactTaps.ofDoubles(0.5, 0.5);
		assertEquals(Noise.NONE, Noise.of(halves, arithmetic(q15, Optional.empty(), Optional.empty(), Rounding.FLOOR)));
		assertEquals(Noise.NONE,
				Noise.of(halves, arithmetic(q15, Optional.empty(), Optional.of(new NumberFormat(18, 16)), Rounding.FLOOR)));
		assertEquals(new BigFraction(1, 65536), Noise.of(halves,
				arithmetic(q15, Optional.empty(), Optional.of(new NumberFormat(17, 15)), Rounding.FLOOR)).bound());
	}

	@Test
	void wordLengthsForANoiseLimitAreTheShortest() {
		NumberFormat q15 = new NumberFormat(16, 15);
		ExactTaps taps = q15.nearest(ExactTaps.ofDoubles(0.11, 0.27, 0.31, 0.27, 0.11));
		Arithmetic given = arithmetic(q15, Optional.of(new NumberFormat(16, 15)), Optional.of(new NumberFormat(16, 15)),
				Rounding.HALF_EVEN);
		Arithmetic found = WordLengths.forNoise(taps, given, -90, BigFraction.ONE).orElseThrow();
		assertTrue(Noise.of(taps, found).decibels(BigFraction.ONE) <= -90);
		NumberFormat output = found.output().orElseThrow();
		// 2^-2f / 12 <= 10^-9 needs f = 14 at least.
		assertEquals(new NumberFormat(15, 14), output);
		NumberFormat product = found.product().orElseThrow();
		Arithmetic shorter = arithmetic(q15, Optional.of(new NumberFormat(product.word() - 1, product.fraction() - 1)),
				Optional.of(output), Rounding.HALF_EVEN);
		assertTrue(Noise.of(taps, shorter).decibels(BigFraction.ONE) > -90);
	}

	@Test
	void cascadeRoundsBetweenItsStages() {
		NumberFormat wide = new NumberFormat(16, 8);
		NumberFormat whole = new NumberFormat(8, 0);
		ExactTaps half = ExactTaps.ofDoubles(0.5);
		Cascade cascade = new Cascade(List.of(
				new Cascade.Stage(half, arithmetic(wide, Optional.empty(), Optional.empty(), Rounding.FLOOR)),
				new Cascade.Stage(half, arithmetic(whole, Optional.empty(), Optional.empty(), Rounding.HALF_UP))));
		// 3 halves are 1.5, which becomes 2, then 1; 600 is 300 after the first stage and saturates to 127.
		BigInteger[] outputs = cascade.filter(BigInteger.valueOf(3 * 256), BigInteger.valueOf(-3 * 256));
		assertEquals(BigFraction.ONE, cascade.outputStep().multiply(outputs[0]));
		assertEquals(new BigFraction(-1, 2), cascade.outputStep().multiply(outputs[1]));
	}

	@Test
	void tradeCurveComputesEachPointOnceAndKeepsIt() {
		List<Integer> computed = new ArrayList<>();
		TradeCurve<Integer> curve = new TradeCurve<>(number -> {
			computed.add(number);
			return number * number;
		});
		assertEquals(List.of(16, 25, 36, 49, 64, 81),
				List.copyOf(curve.compute(4, 9, Progress.NONE, (number, result) -> assertEquals(number * number, result)).values()));
		assertEquals(4, computed.get(0));
		curve.compute(4, 10, Progress.NONE, (number, result) -> { });
		assertEquals(7, computed.size());
		assertArrayEquals(new int[] { 4, 5, 6, 7, 8, 9, 10 }, computed.stream().mapToInt(Integer::intValue).sorted().toArray());
	}

	private static Arithmetic arithmetic(NumberFormat input, Optional<NumberFormat> product, Optional<NumberFormat> output,
			Rounding rounding) {
		return new Arithmetic(Structure.DIRECT, Optional.empty(), Optional.of(input), product, Optional.empty(), output, rounding,
				Overflow.SATURATE);
	}
}
