// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/** Curves and zeros of filters that can be worked out by hand. */
class ResponseTest {

	@Test
	void averageOfFourHasItsClosedForm() {
		double[] taps = { 0.25, 0.25, 0.25, 0.25 };
		double[] hertz = { 0, 5, 10, 12.5, 30 };
		FrequencyResponse response = FrequencyResponse.of(taps, 100, hertz);
		double[] magnitude = response.magnitude();
		for (int k = 1; k < hertz.length; k++) {
			double f = hertz[k] / 100;
			assertEquals(Math.abs(Math.sin(4 * Math.PI * f) / (4 * Math.sin(Math.PI * f))), magnitude[k], 1e-15);
			assertEquals(0.015, response.groupDelay()[k], 1e-12);
		}
		assertEquals(0, response.decibels()[0]);
	}

	@Test
	void phaseIsUnwrapped() {
		double[] hertz = new double[200];
		for (int k = 0; k < hertz.length; k++) {
			hertz[k] = 0.5 * k / hertz.length;
		}
		double[] phase = FrequencyResponse.of(new double[] { 0, 0, 0, 0, 0, 0, 0, 1 }, 1, hertz).phase();
		for (int k = 0; k < hertz.length; k++) {
			assertEquals(-2 * Math.PI * hertz[k] * 7, phase[k], 1e-12);
		}
	}

	// Re(sum n h[n] e^(-jwn) / sum h[n] e^(-jwn)), evaluated with mpmath.
	@Test
	void groupDelayIsTheRatioOfMoments() {
		double[] delay = FrequencyResponse.of(new double[] { 2, -1, 0.5 }, 1, new double[] { 0, 0.125, 0.25, 0.5 })
				.groupDelay();
		assertArrayEquals(new double[] { 0, -0.5686165142176733163723939, -0.1538461538461538461538462,
				0.5714285714285714285714286 },
				delay, 1e-14);
	}

	@Test
	void stepIsTheRunningSum() {
		assertArrayEquals(new double[] { 1, 3, 2 }, StepCurve.of(new double[] { 1, 2, -1 }));
	}

	@Test
	void zerosOfAnAverageAreRootsOfUnity() {
		double[] taps = new double[64];
		java.util.Arrays.fill(taps, 1);
		List<Complex> zeros = Zeros.of(taps);
		assertEquals(63, zeros.size());
		for (int k = 1; k < 64; k++) {
			Complex root = new Complex(Math.cos(2 * Math.PI * k / 64), Math.sin(2 * Math.PI * k / 64));
			assertTrue(zeros.stream().anyMatch(zero -> zero.subtract(root).abs() < 1e-13), "root " + k);
		}
	}

	@Test
	void zerosAreFoundAgain() {
		Random random = new Random(4);
		double[] taps = { 2 };
		double[] radii = { 0.1, 0.9, 1, 1.3, 5, 40 };
		for (double radius : radii) {
			double cos = 2 * random.nextDouble() - 1;
			double[] next = new double[taps.length + 2];
			for (int k = 0; k < taps.length; k++) {
				next[k] += taps[k];
				next[k + 1] -= 2 * radius * cos * taps[k];
				next[k + 2] += radius * radius * taps[k];
			}
			taps = next;
		}
		List<Complex> zeros = Zeros.of(taps);
		assertEquals(12, zeros.size());
		for (double radius : radii) {
			assertEquals(2, zeros.stream().filter(zero -> Math.abs(zero.abs() - radius) < 1e-9 * radius).count(),
					"radius " + radius);
		}
		assertEquals(List.of(Complex.ZERO, Complex.ZERO), Zeros.of(new double[] { 0, 1, 0, 0 }));
		assertEquals(List.of(), Zeros.of(new double[] { 0, 0 }));
	}
}
