// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.exact.Symmetry;

class WindowDesignTest {

	/** firwin of scipy 1.17.1; the script that made the values lies beside. */
	@Test
	void designsOfTheReferenceLibrary() throws DesignException {
		int compared = 0;
		for (WindowValues row : WindowValues.read()) {
			int taps = row.values().length;
			WindowDesign design = switch (row.name()) {
				case "lowpass" -> WindowDesign.lowPass(taps, 0.13, CommonWindow.HAMMING);
				case "highpass" -> WindowDesign.highPass(taps, 0.13, CommonWindow.HANN);
				case "bandpass" -> WindowDesign.bandPass(taps, 0.13, 0.29, new KaiserWindow(6));
				case "bandstop" -> WindowDesign.bandStop(taps, 0.13, 0.29, CommonWindow.BLACKMAN);
				default -> null;
			};
			if (design != null) {
				compared++;
				assertArrayEquals(row.values(), design.compute(Progress.NONE).taps(), 1e-15, row::toString);
			}
		}
		assertEquals(10, compared);
	}

	/** J. F. Kaiser, Nonrecursive digital filter design..., ISCAS 1974; values computed from the formulas. */
	@Test
	void kaiserFormulas() {
		assertEquals(0, KaiserEstimate.beta(18));
		assertEquals(0, KaiserEstimate.beta(21));
		assertEquals(2.1166248611409806, KaiserEstimate.beta(30), 1e-12);
		assertEquals(4.533514120981248, KaiserEstimate.beta(50), 1e-12);
		assertEquals(5.65326, KaiserEstimate.beta(60), 1e-12);
		assertEquals(7.85726, KaiserEstimate.beta(80), 1e-12);
		assertEquals(10.06126, KaiserEstimate.beta(100), 1e-12);
		KaiserEstimate estimate = KaiserEstimate.ofAttenuation(60, 0.05);
		assertEquals(72.49303621169916, estimate.order(), 1e-12);
		assertEquals(74, estimate.taps());
		assertEquals(60, -20 * Math.log10(0.001), 1e-12);
		assertEquals(estimate.order(), KaiserEstimate.ofRipple(0.001, 0.05).order(), 1e-12);
	}

	@Test
	void kaiserEstimateComesWithinOneDecibelOfItsPromise() throws DesignException {
		for (double attenuation : new double[] { 30, 45, 60, 80, 100 }) {
			KaiserEstimate estimate = KaiserEstimate.ofAttenuation(attenuation, 0.04);
			double[] h = new WindowDesign(estimate.taps(), Symmetry.EVEN,
					List.of(new Band(0, 0.18, 1, 1), new Band(0.22, 0.5, 0, 1)), estimate.window())
							.compute(Progress.NONE).taps();
			double worst = 0;
			for (double f = 0; f <= 0.5; f += 1e-4) {
				if (f <= 0.18 || f >= 0.22) {
					worst = Math.max(worst, Math.abs(amplitude(h, Symmetry.EVEN, f) - (f < 0.2 ? 1 : 0)));
				}
			}
			assertEquals(attenuation, -20 * Math.log10(worst), 1);
		}
	}

	@Test
	void idealResponseIsTheNumericalIntegralOfTheTarget() {
		List<Band> target = List.of(new Band(0, 0.11, 0.3, 1.2, 1, 1), new Band(0.11, 0.1100001, 1.2, -4, 1, 1),
				new Band(0.1100001, 0.5, -4, 2, 1, 1));
		for (Symmetry symmetry : new Symmetry[] { Symmetry.EVEN, Symmetry.ODD }) {
			for (double m : new double[] { 0, 0.5, 1, 7.5, 40 }) {
				double sum = 0;
				for (Band line : target) {
					int steps = 20000;
					for (int k = 0; k < steps; k++) {
						double f = line.from() + (line.to() - line.from()) * (k + 0.5) / steps;
						double angle = 2 * Math.PI * f * m;
						sum += 2 * line.desired(f) * (symmetry == Symmetry.EVEN ? Math.cos(angle) : Math.sin(angle))
								* (line.to() - line.from()) / steps;
					}
				}
				assertEquals(sum, IdealResponse.sample(target, symmetry, m), 1e-6);
			}
		}
	}

	@Test
	void longDesignApproachesAMultiBandTargetWithSlopesAndGaps() throws DesignException {
		List<Band> bands = List.of(new Band(0.02, 0.1, 0, 1, 1, 1), new Band(0.15, 0.2, 0.5, 1),
				new Band(0.25, 0.45, 2, 0, 1, 1));
		for (int taps : new int[] { 400, 401 }) {
			for (Symmetry symmetry : new Symmetry[] { Symmetry.EVEN, Symmetry.ODD }) {
				double[] h = new WindowDesign(taps, symmetry, bands, WindowDesign.Gaps.LINE, new KaiserWindow(6),
						OptionalDouble.empty()).compute(Progress.NONE).taps();
				for (Band band : bands) {
					double f = 0.3 * band.from() + 0.7 * band.to();
					assertEquals(band.desired(f), amplitude(h, symmetry, f), 2e-4);
				}
				assertEquals(0.75, amplitude(h, symmetry, 0.125), 2e-4);
			}
		}
	}

	@Test
	void energyOfTheCoefficientsIsTheEnergyOfTheResponse() throws DesignException {
		// Parseval: the mean of |H|^2 over a DFT grid finer than the filter is the sum of h^2.
		for (int taps : new int[] { 40, 41 }) {
			for (Symmetry symmetry : new Symmetry[] { Symmetry.EVEN, Symmetry.ODD }) {
				double[] h = new WindowDesign(taps, symmetry,
						List.of(new Band(0, 0.1, 0, 1), new Band(0.15, 0.3, 1, 1), new Band(0.4, 0.5, 0, 1)),
								CommonWindow.HANN)
						.compute(Progress.NONE).taps();
				double energy = 0;
				for (double tap : h) {
					energy += tap * tap;
				}
				double mean = 0;
				for (int k = 0; k < 128; k++) {
					double a = amplitude(h, symmetry, k / 128.0);
					mean += a * a / 128;
				}
				assertEquals(energy, mean, 1e-14);
			}
		}
	}

	@Test
	void coefficientsAreExactlySymmetricAndScaledToUnity() throws DesignException {
		double[] even = WindowDesign.bandPass(64, 0.1, 0.2, CommonWindow.BLACKMAN).compute(Progress.NONE).taps();
		double[] odd = new WindowDesign(65, Symmetry.ODD, List.of(new Band(0.1, 0.2, 1, 1)), CommonWindow.BLACKMAN)
				.compute(Progress.NONE).taps();
		for (int k = 0; k < 64; k++) {
			assertEquals(even[k], even[63 - k]);
			assertEquals(0, odd[k] + odd[64 - k]);
		}
		assertEquals(1, amplitude(even, Symmetry.EVEN, 0.15), 1e-15);
	}

	@Test
	void impossibleRequestsAreRefusedInWords() {
		assertMessage("type II", () -> WindowDesign.highPass(64, 0.2, CommonWindow.HANN));
		assertMessage("between 0 and 0.5", () -> WindowDesign.lowPass(63, 0, CommonWindow.HANN));
		assertMessage("between 0 and 0.5", () -> WindowDesign.lowPass(63, Double.NaN, CommonWindow.HANN));
		assertMessage("1000000", () -> WindowDesign.lowPass(1_000_000, 0.1, CommonWindow.HANN));
		assertMessage("ask for 1", () -> WindowDesign.lowPass(0, 0.1, CommonWindow.HANN));
		assertMessage("overlap", () -> new WindowDesign(9, Symmetry.EVEN, List.of(new Band(0, 0.2, 1, 1),
				new Band(0.1, 0.5, 0, 1)),
				CommonWindow.HANN));
		assertMessage("at least one band", () -> new WindowDesign(9, Symmetry.EVEN, List.of(), CommonWindow.HANN));
		assertMessage("transition", () -> KaiserEstimate.ofAttenuation(60, 0));
		assertMessage("coefficients", () -> KaiserEstimate.ofAttenuation(60, 1e-9).taps());
		assertMessage("attenuation", () -> KaiserEstimate.ofAttenuation(Double.NaN, 0.1));
	}

	private static void assertMessage(String part, org.junit.jupiter.api.function.Executable call) {
		var refusal = assertThrows(IllegalArgumentException.class, call);
		assertTrue(refusal.getMessage().contains(part), refusal::getMessage);
	}

	private static double amplitude(double[] h, Symmetry symmetry, double f) {
		double sum = 0;
		for (int k = 0; k < h.length; k++) {
			double angle = 2 * Math.PI * f * ((h.length - 1) / 2.0 - k);
			sum += h[k] * (symmetry == Symmetry.ODD ? Math.sin(angle) : Math.cos(angle));
		}
		return sum;
	}
}
