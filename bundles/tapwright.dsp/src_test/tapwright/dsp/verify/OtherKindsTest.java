// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.Collections;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/** The requirement kinds other than gain limits, on filters that can be worked out by hand. */
class OtherKindsTest {

	private static final Verdict MET = Verdict.MET;
	private static final Verdict MISSED = Verdict.MISSED;

	@Test
	void symmetryIsExact() {
		assertEquals(MET, verdict(new LinearPhase(LinearPhase.Type.I), 1, 2, 1));
		assertEquals(MISSED, verdict(new LinearPhase(LinearPhase.Type.II), 1, 2, 1));
		assertEquals(MET, verdict(new LinearPhase(LinearPhase.Type.II), 1, 1));
		assertEquals(MET, verdict(new LinearPhase(LinearPhase.Type.III), 1, 0, -1));
		assertEquals(MISSED, verdict(new LinearPhase(LinearPhase.Type.III), 1, 0.5, -1));
		assertEquals(MET, verdict(new LinearPhase(LinearPhase.Type.IV), 1, -1));
		Proof proof = prove(new LinearPhase(LinearPhase.Type.ANY), 1, 2, Math.nextUp(1.0));
		assertEquals(MISSED, proof.verdict());
		assertEquals(Enclosure.of(-0x1p-52), proof.margin());
	}

	@Test
	void bulkDelayIsTheMiddleOrTheCentreOfGravity() {
		assertEquals(Enclosure.of(1), prove(new BulkDelay(0, 1), 1, 2, 1).value());
		assertEquals(MET, verdict(new BulkDelay(0, 1), 1, 2, 1));
		assertEquals(MISSED, verdict(new BulkDelay(0, Math.nextDown(1.0)), 1, 2, 1));
		// (0 * 2 - 1 + 2 * 0.5) / 1.5
		assertEquals(Enclosure.of(0), prove(new BulkDelay(0, 5), 2, -1, 0.5).value());
		assertThrows(IllegalArgumentException.class, () -> prove(new BulkDelay(0, 5), 2, -1, -1));
	}

	@Test
	void stepResponseIsSummedExactly() {
		// Steps -1, 3, 5, 4, 4: a quarter above and a quarter below.
		double[] taps = { -1, 4, 2, -1, 0 };
		assertEquals(Enclosure.of(25), prove(new StepOvershoot(25), taps).value());
		assertEquals(MET, verdict(new StepOvershoot(25), taps));
		assertEquals(MISSED, verdict(new StepOvershoot(Math.nextDown(25.0)), taps));
		assertEquals(2, prove(new StepOvershoot(25), taps).worst());
		assertEquals(MET, verdict(new StepUndershoot(25), taps));
		assertEquals(MISSED, verdict(new StepUndershoot(24), taps));
		assertEquals(Enclosure.of(3), prove(new StepSettling(10, 3), taps).value());
		assertEquals(Enclosure.of(1), prove(new StepSettling(25, 3), taps).value());
		assertEquals(MISSED, verdict(new StepSettling(24.9, 2), taps));
		// The sign of the final value does not matter.
		assertEquals(Enclosure.of(25), prove(new StepOvershoot(25), 1, -4, -2, 1).value());
		assertThrows(IllegalArgumentException.class, () -> prove(new StepOvershoot(1), 1, -1));
	}

	@Test
	void tailStartsAtItsTime() {
		double[] taps = { 0, 8, -4, 2, -1 };
		assertEquals(Enclosure.of(50), prove(new ImpulseTail(2, 50), taps).value());
		assertEquals(Enclosure.of(25), prove(new ImpulseTail(2.1, 50), taps).value());
		assertEquals(MET, verdict(new ImpulseTail(5, 0), taps));
		assertEquals(MISSED, verdict(new ImpulseTail(4, 12), taps));
	}

	@Test
	void nullsAreDecidedInTheCyclotomicField() {
		for (int n = 2; n < 40; n++) {
			Subject average = new Subject(ExactTaps.ofIntegers(Collections.nCopies(n, BigInteger.ONE),
					new BigFraction(1, n)), n);
			for (int k = 1; 2 * k <= n; k++) {
				assertEquals(MET, new Null(k).prove(average, Effort.STANDARD).verdict());
				assertEquals(MISSED, new Null(Math.nextDown((double) k)).prove(average, Effort.STANDARD).verdict());
			}
			assertEquals(MISSED, new Null(0).prove(average, Effort.STANDARD).verdict());
		}
		Proof proof = new Null(0.25).prove(new Subject(ExactTaps.ofDoubles(1, 0x1p-60, 1), 1), Effort.STANDARD);
		assertEquals(MISSED, proof.verdict());
		assertTrue(proof.value().contains(0x1p-60));
	}

	@Test
	void exactGainsAreDecidedEvenWhenTheyAreIrrational() {
		assertEquals(MET, new ExactGain(0, 1).prove(average(3), Effort.STANDARD).verdict());
		assertEquals(MISSED, new ExactGain(0, Math.nextUp(1.0)).prove(average(3), Effort.STANDARD).verdict());
		// |1 + j| is the square root of 2: no double.
		Proof root = new ExactGain(0.25, Math.sqrt(2)).prove(new Subject(ExactTaps.ofDoubles(1, 1), 1),
				Effort.STANDARD);
		assertEquals(MISSED, root.verdict());
		assertEquals(Math.sqrt(2), root.value().middle(), 1e-15);
		// |1 + e^(-j pi/3)|^2 = 3, |1 - 1/2 + ...|: 3 + 4j style triples give rational gains.
		assertEquals(MET, new ExactGain(0.25, 5).prove(new Subject(ExactTaps.ofDoubles(3, 4), 1), Effort.STANDARD)
				.verdict());
	}

	@Test
	void amplitudeThatOnlyTouchesZeroIsNotNegative() {
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 0.25, 0.5, 0.25));
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 0.5, 0.5));
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 1, 4, 6, 4, 1));
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 1, 2, 3, 2, 1));
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 1, -2, 3, -2, 1));
		assertEquals(MISSED, verdict(new NonNegativeAmplitude(), 1, 1, 1));
		assertEquals(MISSED, verdict(new NonNegativeAmplitude(), 0.25, Math.nextDown(0.5), 0.25));
		assertEquals(MET, verdict(new NonNegativeAmplitude(), 0.25, Math.nextUp(0.5), 0.25));
		assertEquals(MISSED, verdict(new NonNegativeAmplitude(), 1, 2, 3));
	}

	// Re(sum n h[n] e^(-jwn) / sum h[n] e^(-jwn)), evaluated with mpmath.
	@ParameterizedTest
	@CsvSource({ "0, 0", "0.125, -0.5686165142176733163723939", "0.25, -0.1538461538461538461538462",
			"0.5, 0.5714285714285714285714286" })
	void groupDelayAtOneFrequencyIsTheRatio(double frequency, double samples) {
		Proof proof = prove(new GroupDelay(frequency, frequency, -1, 1), 2, -1, 0.5);
		assertEquals(MET, proof.verdict());
		assertEquals(samples, proof.value().middle(), 1e-9);
		assertEquals(MISSED, verdict(new GroupDelay(frequency, frequency, samples + 1e-9, 1), 2, -1, 0.5));
		assertEquals(MET, verdict(new GroupDelay(frequency, frequency, samples - 1e-9, 1), 2, -1, 0.5));
	}

	@Test
	void groupDelayEnclosesEverySampleOfTheCurve() {
		Random random = new Random(11);
		for (int round = 0; round < 12; round++) {
			int n = 2 + random.nextInt(20);
			double[] taps = new double[n];
			for (int k = 0; k < n; k++) {
				taps[k] = Math.pow(0.7, k) * random.nextGaussian();
			}
			Proof variation = prove(new GroupDelayVariation(0.05, 0.4, 1), taps);
			Proof longest = prove(new GroupDelay(0.05, 0.4, Double.NEGATIVE_INFINITY, 1), taps);
			Proof shortest = prove(new GroupDelay(0.05, 0.4, -1, Double.POSITIVE_INFINITY), taps);
			double most = Double.NEGATIVE_INFINITY;
			double least = Double.POSITIVE_INFINITY;
			for (int k = 0; k <= 4000; k++) {
				double delay = delay(taps, 0.05 + 0.35 * k / 4000);
				most = Math.max(most, delay);
				least = Math.min(least, delay);
			}
			double scale = n + Math.abs(most) + Math.abs(least);
			assertTrue(most <= longest.value().hi() + 1e-9 * scale, longest + " against " + most);
			assertEquals(most, longest.value().lo(), 1e-2 * scale);
			assertTrue(least >= shortest.value().lo() - 1e-9 * scale, shortest + " against " + least);
			assertEquals(longest.value().hi() - shortest.value().lo(), variation.value().hi(), 1e-8 * scale);
		}
	}

	@Test
	void complementaryPairAddsToOneExactly() {
		// cos^2 and sin^2 of half the angle.
		ExactTaps high = ExactTaps.ofDoubles(0.5, -0.5);
		assertEquals(MET, verdict(new PowerComplementary(high, 0), 0.5, 0.5));
		assertEquals(MISSED, verdict(new PowerComplementary(ExactTaps.ofDoubles(0.5, -0.49), 0.01), 0.5, 0.5));
	}

	@Test
	void wordsAndCostsAreCounted() {
		assertEquals(Enclosure.of(3), prove(new CoefficientWord(8), 2, -4, 6).value());
		assertEquals(Enclosure.of(2), prove(new CoefficientWord(8), 1, 0, -1).value());
		assertEquals(MET, verdict(new CostLimit(CostLimit.Resource.TAPS, 3), 1, 2, 3));
		assertEquals(MISSED, verdict(new CostLimit(CostLimit.Resource.TAPS, 2), 1, 2, 3));
		assertEquals(Enclosure.of(3000), new CostLimit(CostLimit.Resource.MULTIPLIES_PER_SECOND, 1e6)
				.prove(new Subject(ExactTaps.ofDoubles(1, 2, 3), 1000), Effort.STANDARD).value());
	}

	@Test
	void clockToleranceWidensBands() {
		Subject average = average(8);
		double edge = 0.12;
		double level = GainLimit.atLeast(0, edge, -100).prove(average, Effort.STANDARD).value().lo() - 1e-6;
		GainLimit limit = GainLimit.atLeast(0, edge, level);
		assertEquals(MET, limit.prove(average, Effort.STANDARD).verdict());
		assertEquals(MET, new ClockTolerance(limit, 0.001).prove(average, Effort.STANDARD).verdict());
		assertEquals(MISSED, new ClockTolerance(limit, 10).prove(average, Effort.STANDARD).verdict());
		assertEquals(MISSED, new ClockTolerance(new Null(0.25), 1).prove(average, Effort.STANDARD).verdict());
		assertEquals(MET, new ClockTolerance(new BulkDelay(3.49, 3.51), 1000).prove(average, Effort.STANDARD)
				.verdict());
		assertEquals(MISSED, new ClockTolerance(new BulkDelay(3.499, 3.501), 1000).prove(average, Effort.STANDARD)
				.verdict());
	}

	@Test
	void slopingLimitsUnderAClockToleranceAgreeWithManyClocks() {
		Random random = new Random(5);
		double[] taps = HardCases.kaiserSinc(21, 0.15, 5);
		for (int round = 0; round < 40; round++) {
			boolean upper = random.nextBoolean();
			double a = random.nextDouble() * 40 - 60;
			double b = random.nextDouble() * 40 - 60;
			double none = upper ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
			GainLimit limit = new GainLimit(java.util.List.of(
					new GainLimit.Breakpoint(0.2, upper ? none : a, upper ? a : none),
					new GainLimit.Breakpoint(0.45, upper ? none : b, upper ? b : none)), random.nextBoolean(),
							GainReference.ABSOLUTE);
			Proof all = new ClockTolerance(limit, 50_000).prove(new Subject(ExactTaps.ofDoubles(taps), 1),
					Effort.STANDARD);
			double worst = Double.POSITIVE_INFINITY;
			for (int k = -100; k <= 100; k++) {
				Proof one = limit.prove(new Subject(ExactTaps.ofDoubles(taps), 1 + 0.05 * k / 100), Effort.STANDARD);
				worst = Math.min(worst, one.margin().hi());
			}
			assertTrue(all.margin().lo() <= worst, all + " against " + worst);
			assertTrue(all.margin().hi() == Double.NEGATIVE_INFINITY || worst < all.margin().hi() + 0.5, all
					+ " against " + worst);
		}
	}

	private static double delay(double[] taps, double frequency) {
		double re = 0;
		double im = 0;
		double momentRe = 0;
		double momentIm = 0;
		for (int k = 0; k < taps.length; k++) {
			double cos = Math.cos(2 * Math.PI * frequency * k);
			double sin = -Math.sin(2 * Math.PI * frequency * k);
			re += taps[k] * cos;
			im += taps[k] * sin;
			momentRe += k * taps[k] * cos;
			momentIm += k * taps[k] * sin;
		}
		return (momentRe * re + momentIm * im) / (re * re + im * im);
	}

	private static Verdict verdict(Requirement requirement, double... taps) {
		return prove(requirement, taps).verdict();
	}

	private static Proof prove(Requirement requirement, double... taps) {
		return requirement.prove(new Subject(ExactTaps.ofDoubles(taps), 1), Effort.STANDARD);
	}

	private static Subject average(int n) {
		return new Subject(ExactTaps.ofIntegers(Collections.nCopies(n, BigInteger.ONE), new BigFraction(1, n)), 1);
	}
}
