// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

class WindowTest {

	private static final List<Window> ALL = List.of(CommonWindow.RECTANGULAR, CommonWindow.BARTLETT, CommonWindow.HANN,
			CommonWindow.HAMMING, CommonWindow.HAMMING_EXACT, CommonWindow.BLACKMAN, CommonWindow.BLACKMAN_EXACT,
			CommonWindow.BLACKMAN_HARRIS, CommonWindow.NUTTALL, CommonWindow.FLAT_TOP, new GaussianWindow(2.5),
					new TukeyWindow(0.5),
			new KaiserWindow(8), new DolphChebyshevWindow(60), new SlepianWindow(3));

	/**
	 * Printed in F. J. Harris, On the use of windows..., Proc. IEEE 66(1), 1978, Table I; more digits computed with
	 * numpy 2.
	 */
	@Test
	void figuresOfTheClassicWindowTable() {
		assertFigures(CommonWindow.RECTANGULAR, 1.0, 1.0, 3.9223941341458946, -13.261446942402086);
		assertFigures(CommonWindow.BARTLETT, 0.5, 1.3333358764648438, 1.824188355012165, -26.52272677660011);
		assertFigures(CommonWindow.HANN, 0.5, 1.5, 1.4236228084274356, -31.46739593029078);
		// The table prints 1.78 dB scalloping loss for this window; its definition gives 1.751 dB.
		assertFigures(CommonWindow.HAMMING, 0.54, 1.3628257887517146, 1.7514317822407943, -42.67424539388507);
		assertFigures(CommonWindow.BLACKMAN, 0.42, 1.726757369614512, 1.0988788310193716, -58.10884368817952);
		assertFigures(CommonWindow.BLACKMAN_EXACT, 0.42659071367153917, 1.6936989496768255, 1.1500459056561336,
				-68.23195278001826);
		assertFigures(CommonWindow.BLACKMAN_HARRIS, 0.35875, 2.0043529382170475, 0.8255722316625009,
				-92.00981773415583);
		assertFigures(new KaiserWindow(2.0 * Math.PI), 0.48919349877179163, 1.4963424399996006, 1.4527116460358236,
				-45.852469125243765);
		assertFigures(new KaiserWindow(2.5 * Math.PI), 0.4396307514308874, 1.6519206738842571, 1.2010123416303768,
				-57.558493732945315);
		assertFigures(new KaiserWindow(3.0 * Math.PI), 0.4025479951143379, 1.7952351526009327, 1.022642869244663,
				-69.61847753191022);
		assertFigures(new KaiserWindow(3.5 * Math.PI), 0.3734773588311182, 1.9284476231522767, 0.8900296632273613,
				-81.92233497654763);
	}

	/** Definition by I0, 20 digits with mpmath. */
	@Test
	void kaiserSamples() {
		double[] window = new KaiserWindow(8).symmetric(11);
		double[] expected = { 0.0023388305127333264257, 0.053310549587693972323, 0.22677684133642733605,
				0.5365334610606300105,
				0.85980208177296700948, 1.0 };
		for (int k = 0; k < expected.length; k++) {
			assertEquals(expected[k], window[k], 1e-15);
		}
	}

	/** C. L. Dolph, A current distribution for broadside arrays..., Proc. IRE 34(6), 1946; computed with scipy. */
	@Test
	void dolphChebyshevSamplesAndSideLobes() {
		assertDolph(50, 0.07372739078019958, 0.04759726999379355, 0.062241113823867995, 0.07926229364510308);
		assertDolph(60, 0.024120900185677505, 0.02157115627139078, 0.030764493771734774, 0.04214140420650702);
		assertDolph(80, 0.0028566406422302596, 0.004308812744976046, 0.0074060858113548745, 0.011813870740566128);
		assertDolph(100, 0.00037926080856188127, 0.0008619200806069152, 0.0017954234640917557, 0.0033395550431685205);
	}

	/** Values of scipy 1.17.1; the script that made them lies beside. */
	@Test
	void windowsOfTheReferenceLibrary() {
		int compared = 0;
		for (WindowValues row : WindowValues.read()) {
			Window window = switch (row.name()) {
				case "gaussian" -> new GaussianWindow(row.parameter());
				case "tukey" -> new TukeyWindow(row.parameter());
				case "kaiser" -> new KaiserWindow(row.parameter());
				case "chebyshev" -> new DolphChebyshevWindow(row.parameter());
				case "slepian" -> new SlepianWindow(row.parameter());
				case "lowpass", "highpass", "bandpass", "bandstop" -> null;
				default -> CommonWindow.valueOf(row.name());
			};
			if (window != null) {
				compared++;
				double tolerance = switch (row.name()) {
					case "slepian", "chebyshev" -> 1e-11;
					case "kaiser" -> 1e-14;
					default -> 2e-15;
				};
				assertArrayEquals(row.values(), window.symmetric(row.values().length), tolerance, row::toString);
			}
		}
		assertTrue(compared > 100);
	}

	@Test
	void symmetricWindowsAreExactlySymmetricAndPeriodicOnesLackTheLastSample() {
		for (Window window : ALL) {
			for (int length : new int[] { 7, 8, 33 }) {
				double[] symmetric = window.symmetric(length);
				for (int k = 0; k < length; k++) {
					assertEquals(symmetric[k], symmetric[length - 1 - k], window::toString);
				}
				double[] periodic = window.periodic(length - 1);
				assertEquals(length - 1, periodic.length);
				for (int k = 0; k < length - 1; k++) {
					assertEquals(symmetric[k], periodic[k], window::toString);
				}
			}
			assertArrayEquals(new double[] { 1 }, window.symmetric(1));
		}
	}

	@Test
	void slepianConcentratesMoreEnergyThanKaiserAtTheSameBandwidth() {
		double[] slepian = new SlepianWindow(2).symmetric(64);
		double[] kaiser = new KaiserWindow(2 * Math.PI).symmetric(64);
		double optimum = concentration(slepian, 2.0 / 64);
		assertTrue(optimum > concentration(kaiser, 2.0 / 64));
		// D. Slepian, BSTJ 57(5), 1978: the eigenvalue; scipy 1.17.1 dpss(64, 2, return_ratios=True) gives this one.
		assertEquals(0.9999436955939398, optimum, 1e-10);
	}

	@Test
	void slepianWindowOfThousandsOfSamplesStaysPositive() {
		double[] window = new SlepianWindow(4).symmetric(4001);
		for (double sample : window) {
			assertTrue(sample > 0);
		}
		assertEquals(1, window[2000]);
	}

	@Test
	void besselFunctionAgreesWithTheIntegralRepresentation() {
		// I0(x) = mean of exp(x cos t): the trapezoidal rule converges geometrically.
		for (double x : new double[] { 0, 1, 8, 30 }) {
			double sum = 0;
			for (int k = 0; k < 400; k++) {
				sum += Math.exp(x * Math.cos(2 * Math.PI * k / 400));
			}
			assertEquals(sum / 400, BesselI0.of(x), 1e-14 * BesselI0.of(x));
		}
		assertTrue(Double.isFinite(BesselI0.of(BesselI0.LARGEST)));
	}

	@Test
	void meaninglessParametersAreRefusedInWords() {
		assertThrows(IllegalArgumentException.class, () -> new KaiserWindow(-1));
		assertThrows(IllegalArgumentException.class, () -> new KaiserWindow(Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> new TukeyWindow(1.5));
		assertThrows(IllegalArgumentException.class, () -> new GaussianWindow(0));
		assertThrows(IllegalArgumentException.class, () -> new DolphChebyshevWindow(0));
		assertThrows(IllegalArgumentException.class, () -> new SlepianWindow(Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> new SlepianWindow(8).symmetric(16));
		var tooLong = assertThrows(IllegalArgumentException.class, () -> CommonWindow.HANN.symmetric(1_000_000));
		assertTrue(tooLong.getMessage().contains("1000000"));
		assertThrows(IllegalArgumentException.class, () -> CommonWindow.HANN.symmetric(0));
	}

	private static void assertDolph(double attenuation, double... first) {
		double[] window = new DolphChebyshevWindow(attenuation).symmetric(65);
		for (int k = 0; k < first.length; k++) {
			assertEquals(first[k], window[k], 1e-9);
		}
		assertEquals(-attenuation, peakSideLobe(window, 1 << 14), 1e-4);
	}

	private static void assertFigures(Window window, double gain, double bandwidth, double scalloping,
			double sideLobe) {
		double[] w = window.periodic(1024);
		double sum = 0;
		double energy = 0;
		double re = 0;
		double im = 0;
		for (int k = 0; k < w.length; k++) {
			sum += w[k];
			energy += w[k] * w[k];
			re += w[k] * Math.cos(Math.PI * k / 1024);
			im += w[k] * Math.sin(Math.PI * k / 1024);
		}
		assertEquals(gain, sum / 1024, 1e-9);
		assertEquals(bandwidth, 1024 * energy / (sum * sum), 1e-9);
		assertEquals(scalloping, -20 * Math.log10(Math.hypot(re, im) / sum), 1e-9);
		// The expected values were searched on a grid of 1/256 bin: so is this.
		assertEquals(sideLobe, peakSideLobe(w, 256 * 1024), 1e-6);
	}

	// Highest side lobe in dB on a grid of 1/points cycles per sample; the first rise after the main lobe begins it.
	private static double peakSideLobe(double[] w, int points) {
		double sum = 0;
		for (double sample : w) {
			sum += sample;
		}
		double before = 1;
		double peak = 0;
		boolean outside = false;
		// No side lobe of these windows beyond the 16th bin is the highest, but for the Dolph-Chebyshev window, where
		// all are.
		int last = Math.min(points / 2, 16 * points / w.length);
		for (int k = 1; k <= last; k++) {
			double re = 0;
			double im = 0;
			double angle = 2 * Math.PI * k / points;
			for (int n = 0; n < w.length; n++) {
				re += w[n] * Math.cos(angle * n);
				im += w[n] * Math.sin(angle * n);
			}
			double magnitude = Math.hypot(re, im) / sum;
			outside |= magnitude > before;
			if (outside) {
				peak = Math.max(peak, magnitude);
			}
			before = magnitude;
		}
		return 20 * Math.log10(peak);
	}

	private static double concentration(double[] w, double bandwidth) {
		double inside = 0;
		double total = 0;
		for (int i = 0; i < w.length; i++) {
			total += w[i] * w[i];
			for (int k = 0; k < w.length; k++) {
				inside += w[i] * w[k] * (i == k ? 2 * bandwidth
						: Math.sin(2 * Math.PI * bandwidth * (i - k)) / (Math.PI * (i - k)));
			}
		}
		return inside / total;
	}
}
