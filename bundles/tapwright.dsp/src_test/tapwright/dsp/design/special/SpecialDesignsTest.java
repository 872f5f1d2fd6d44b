// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.exact.Symmetry;

/** Minimum phase, half-band filters and combs. */
class SpecialDesignsTest {

	// I. Daubechies, Orthonormal bases of compactly supported wavelets, Communications on Pure and Applied Mathematics 41, 1988:
	// the four coefficients (1+r, 3+r, 3-r, 1-r)/(4 sqrt 2), r = sqrt 3, have the autocorrelation (-1, 0, 9, 16, 9, 0, -1)/16. Its
	// zeros at half the sample rate are double, so the lift shows as its square root.
	@Test
	void findsTheFourCoefficientsOfDaubechies() throws DesignException {
		double[] taps = new MinimumPhase(new double[] { -1 / 16., 0, 9 / 16., 1, 9 / 16., 0, -1 / 16. }).compute(Progress.NONE).taps();
		double r = Math.sqrt(3);
		double[] expected = { 1 + r, 3 + r, 3 - r, 1 - r };
		for (int k = 0; k < 4; k++) {
			assertEquals(expected[k] / (4 * Math.sqrt(2)), taps[k], 1e-3);
		}
	}

	@Test
	void factorsKnownProductsExactly() throws DesignException {
		double[] h = { 1, -0.9, 0.5, -0.1 };
		double[] product = new double[7];
		for (int i = 0; i < 4; i++) {
			for (int k = 0; k < 4; k++) {
				product[3 + i - k] += h[i] * h[k];
			}
		}
		for (int k = 0; k < 3; k++) {
			product[6 - k] = product[k];
		}
		assertArrayEquals(h, new MinimumPhase(product).compute(Progress.NONE).taps(), 1e-11);
	}

	@Test
	void keepsDeepStopBands() throws DesignException {
		// The squared gain in the stop-band is about 1e-11.
		double[] linear = new Equiripple(115, Symmetry.EVEN, List.of(new Band(0, 0.1, 1, 1), new Band(0.2, 0.5, 0, 1e5)))
				.compute(Progress.NONE).taps();
		double[] h = new MinimumPhase(linear).compute(Progress.NONE).taps();
		assertEquals(58, h.length);
		assertTrue(MinimumPhase.isMinimumPhase(h));
		double largest = 0;
		for (int i = 0; i <= 3000; i++) {
			largest = Math.max(largest, gain(h, 0.2 + i * 1e-4));
		}
		assertTrue(largest < 5e-6, "about 106 dB and not " + largest);
		double ripple = 0;
		for (int i = 0; i <= 3000; i++) {
			ripple = Math.max(ripple, gain(linear, 0.2 + i * 1e-4));
		}
		assertTrue(largest <= 1.05 * Math.sqrt(2 * ripple + 1e-11), largest + " against " + Math.sqrt(2 * ripple));
	}

	@Test
	void refusesPrototypesThatCannotBeSquares() {
		assertThrows(IllegalArgumentException.class, () -> new MinimumPhase(new double[] { 1, 2 }));
		assertThrows(IllegalArgumentException.class, () -> new MinimumPhase(new double[] { 1, 2, 3 }));
		assertThrows(IllegalArgumentException.class, () -> new MinimumPhase(new double[] { 1, Double.NaN, 1 }));
		assertThrows(DesignException.class, () -> new MinimumPhase(new double[] { 1, 0, 1 }).compute(Progress.NONE));
		assertFalse(MinimumPhase.isMinimumPhase(new double[] { 1, 2 }));
	}

	@Test
	void halfBandZerosAreExact() throws DesignException {
		double[] h = new HalfBand(31, 0.2, false).compute(Progress.NONE).taps();
		assertEquals(0.5, h[15], 0);
		for (int k = 1; k < 31; k += 2) {
			assertTrue(k == 15 || h[k] == 0);
		}
		double pass = 0;
		double stop = 0;
		for (int i = 0; i <= 2000; i++) {
			pass = Math.max(pass, Math.abs(gain(h, i * 1e-4) - 1));
			stop = Math.max(stop, gain(h, 0.5 - i * 1e-4));
		}
		assertEquals(pass, stop, 1e-9);
		assertTrue(stop < 0.01);
	}

	// scipy.signal.remez on a dense grid gives 0.0027077627810 for the 31-tap Hilbert transformer from 0.05 to 0.45, and 0.0042142499946
	// as its first coefficient.
	@Test
	void turnsTheHalfBandFilterIntoAHilbertTransformer() throws DesignException {
		double[] h = new HalfBand(31, 0.2, true).compute(Progress.NONE).taps();
		double worst = 0;
		for (int i = 0; i <= 4000; i++) {
			worst = Math.max(worst, Math.abs(gain(h, 0.05 + i * 1e-4) - 1));
		}
		assertEquals(0.0027077627810, worst, 1e-6);
		assertEquals(0.0042142499946, Math.abs(h[0]), 1e-5);
		for (int k = 0; k < 31; k++) {
			assertEquals(-h[30 - k], h[k], 0);
		}
	}

	@Test
	void combsAreZeroAtTheMultiples() {
		double[] h = new Comb(8, true).compute(Progress.NONE).taps();
		assertEquals(0, gain(h, 0.25), 1e-15);
		assertEquals(1, gain(h, 1 / 16.), 1e-15);
		assertEquals(1, gain(new Comb(8, false).compute(Progress.NONE).taps(), 0.125), 1e-15);
		assertThrows(IllegalArgumentException.class, () -> new Comb(0, true));
		assertThrows(IllegalArgumentException.class, () -> new HalfBand(30, 0.2, false));
		assertThrows(IllegalArgumentException.class, () -> new HalfBand(31, 0.25, false));
	}

	// E. B. Hogenauer (1981), Table I: four sections at a quarter of the decimated rate droop by 3.65 dB when the rate is large.
	@Test
	void makesUpForTheDroopOfADecimator() throws DesignException {
		CicCompensator design = new CicCompensator(31, 4, 1024, 0.25, 0.4, 1);
		assertEquals(-3.64839033585, 20 * Math.log10(design.gain(0.25)), 1e-4);
		double[] h = design.compute(Progress.NONE).taps();
		double worst = 0;
		for (int i = 0; i <= 2500; i++) {
			worst = Math.max(worst, Math.abs(gain(h, i * 1e-4) * design.gain(i * 1e-4) - 1));
		}
		assertTrue(worst < 0.01, "largest error of the product: " + worst);
	}

	@Test
	void complementsAddUpToADelay() throws DesignException {
		HalfBand low = new HalfBand(31, 0.2, false);
		double[] h = low.compute(Progress.NONE).taps();
		double[] g = new Complement(low).compute(Progress.NONE).taps();
		for (int k = 0; k < 31; k++) {
			assertEquals(k == 15 ? 1 : 0, h[k] + g[k], 0);
		}
		assertThrows(DesignException.class, () -> new Complement(new Binomial(3)).compute(Progress.NONE));
		assertThrows(IllegalArgumentException.class, () -> new CicCompensator(31, 0, 8, 0.2, 0.3, 1));
		assertThrows(IllegalArgumentException.class, () -> new CicCompensator(31, 4, 8, 0.3, 0.2, 1));
	}

	private static double gain(double[] h, double f) {
		double re = 0;
		double im = 0;
		for (int k = 0; k < h.length; k++) {
			re += h[k] * Math.cos(2 * Math.PI * f * k);
			im += h[k] * Math.sin(2 * Math.PI * f * k);
		}
		return Math.hypot(re, im);
	}
}
