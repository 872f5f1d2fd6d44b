// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

class LinearPhaseTypeTest {

	@Test
	void amplitudeOfTheCoefficientsIsTheFactorTimesTheSumOfCosines() {
		var random = new Random(2);
		for (LinearPhaseType type : LinearPhaseType.values()) {
			for (int unknowns : new int[] { 1, 2, 3, 8 }) {
				double[] p = random.doubles(unknowns, -1, 1).toArray();
				double[] h = type.taps(p);
				assertEquals(type, LinearPhaseType.of(h.length, type.symmetry()));
				assertEquals(unknowns, type.unknowns(h.length));
				assertEquals(type.symmetry(), ExactTaps.ofDoubles(h).symmetry());
				for (double f = 0; f <= 0.5; f += 0.03125) {
					double sum = 0;
					for (int k = 0; k < unknowns; k++) {
						sum += p[k] * Math.cos(2 * Math.PI * f * k);
					}
					assertEquals(type.factor(f) * sum, response(h, type.symmetry(), f), 1e-14);
					assertEquals(response(h, type.symmetry(), f), amplitude(type, h, f), 1e-14);
				}
			}
		}
	}

	@Test
	void factorVanishesExactlyAtForcedZeros() {
		for (LinearPhaseType type : LinearPhaseType.values()) {
			assertEquals(type.zeroAtZero(), type.factor(0) == 0);
			assertEquals(type.zeroAtHalf(), type.factor(0.5) == 0);
		}
	}

	@Test
	void whatLeavesNothingToDesignIsRefused() {
		assertThrows(IllegalArgumentException.class, () -> LinearPhaseType.of(0, Symmetry.EVEN));
		assertThrows(IllegalArgumentException.class, () -> LinearPhaseType.of(-3, Symmetry.EVEN));
		assertThrows(IllegalArgumentException.class, () -> LinearPhaseType.of(1, Symmetry.ODD));
		assertThrows(IllegalArgumentException.class, () -> LinearPhaseType.of(9, Symmetry.NONE));
	}

	// Real or imaginary part of the response with the delay taken away, straight from its definition.
	private static double response(double[] h, Symmetry symmetry, double f) {
		double a = 0;
		for (int k = 0; k < h.length; k++) {
			double angle = 2 * Math.PI * f * ((h.length - 1) / 2.0 - k);
			a += h[k] * (symmetry == Symmetry.ODD ? Math.sin(angle) : Math.cos(angle));
		}
		return a;
	}

	private static double amplitude(LinearPhaseType type, double[] h, double f) {
		double[] a = type.amplitude(h);
		double sum = 0;
		for (int k = 0; k < a.length; k++) {
			double angle = 2 * Math.PI * f * (type.firstHarmonic() + k);
			sum += a[k] * (type.symmetry() == Symmetry.ODD ? Math.sin(angle) : Math.cos(angle));
		}
		return sum;
	}
}
