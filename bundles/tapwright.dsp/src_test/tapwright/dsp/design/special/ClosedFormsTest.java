// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

class ClosedFormsTest {

	// A. Savitzky and M. J. E. Golay, Analytical Chemistry 36(8), 1964, tables, with the corrections of J. Steinier, Y. Termonia and
	// J. Deltour, 1972: weights from the oldest to the newest sample, and their norm.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "5 | 2 | 0 | -3 12 17 12 -3 | 35", "7 | 2 | 0 | -2 3 6 7 6 3 -2 | 21",
			"9 | 2 | 0 | -21 14 39 54 59 54 39 14 -21 | 231", "11 | 2 | 0 | -36 9 44 69 84 89 84 69 44 9 -36 | 429",
			"7 | 4 | 0 | 5 -30 75 131 75 -30 5 | 231", "5 | 2 | 1 | -2 -1 0 1 2 | 10", "7 | 2 | 1 | -3 -2 -1 0 1 2 3 | 28",
			"5 | 4 | 1 | 1 -8 0 8 -1 | 12", "7 | 4 | 1 | 22 -67 -58 0 58 67 -22 | 252", "5 | 2 | 2 | 2 -1 -2 -1 2 | 7",
			"7 | 2 | 2 | 5 0 -3 -4 -3 0 5 | 42" })
	void agreesWithTheTablesOfSavitzkyAndGolay(int points, int degree, int derivative, String weights, int norm) {
		List<BigInteger> oldestFirst = integers(weights);
		assertEquals(ExactTaps.ofIntegers(oldestFirst.reversed(), new BigFraction(1, norm)),
				new SavitzkyGolay(points, degree, derivative).exact(Progress.NONE));
	}

	@ParameterizedTest
	@CsvSource({ "5, 2, 0, 2", "7, 3, 1, -3", "9, 4, 2, 1", "25, 6, 3, 12" })
	void reproducesPolynomialsUpToItsDegreeAtAnyPosition(int points, int degree, int derivative, int position) {
		ExactTaps taps = new SavitzkyGolay(points, degree, derivative, position).exact(Progress.NONE);
		for (int power = 0; power <= degree; power++) {
			BigFraction sum = BigFraction.ZERO;
			for (int k = 0; k < points; k++) {
				sum = sum.add(taps.tap(k).multiply(BigInteger.valueOf(points / 2 - k).pow(power)));
			}
			BigInteger expected = power < derivative ? BigInteger.ZERO : BigInteger.valueOf(position).pow(power - derivative);
			for (int k = 0; k < derivative && power >= derivative; k++) {
				expected = expected.multiply(BigInteger.valueOf(power - k));
			}
			assertEquals(new BigFraction(expected), sum, "power " + power);
		}
	}

	// T. I. Laakso et al., Splitting the unit delay, IEEE Signal Processing Magazine 13(1), 1996: Lagrange interpolation by its formula.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "1 | 0.5 | 1 1 | 2", "3 | 1.5 | -1 9 9 -1 | 16", "5 | 2.5 | 3 -25 150 150 -25 3 | 256",
			"2 | 0.25 | 21 14 -3 | 32" })
	void interpolatesWithLagrangesCoefficients(int order, double delay, String integers, int denominator) {
		assertEquals(ExactTaps.ofIntegers(integers(integers), new BigFraction(1, denominator)),
				new LagrangeDelay(order, delay).exact(Progress.NONE));
	}

	// O. Herrmann, IEEE Transactions on Circuit Theory 18(3), 1971: equal orders of contact give half-band filters.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "2 | -1 0 9 16 9 0 -1 | 32", "3 | 3 0 -25 0 150 256 150 0 -25 0 3 | 512", "1 | 1 2 1 | 4" })
	void agreesWithTheMaximallyFlatHalfBandFilters(int order, String integers, int denominator) {
		assertEquals(ExactTaps.ofIntegers(integers(integers), new BigFraction(1, denominator)),
				new MaximallyFlat(order, order).exact(Progress.NONE));
	}

	// I. Daubechies, Communications on Pure and Applied Mathematics 41, 1988: the autocorrelation of her filter with four coefficients
	// (1+r, 3+r, 3-r, 1-r)/(4 sqrt 2), r = sqrt 3, is twice the maximally flat half-band filter of seven.
	@Test
	void isTheAutocorrelationOfDaubechiesFilter() {
		double r = Math.sqrt(3);
		double[] h = { (1 + r) / (4 * Math.sqrt(2)), (3 + r) / (4 * Math.sqrt(2)), (3 - r) / (4 * Math.sqrt(2)),
				(1 - r) / (4 * Math.sqrt(2)) };
		double[] flat = new MaximallyFlat(2, 2).exact(Progress.NONE).toDoubles();
		for (int lag = -3; lag <= 3; lag++) {
			double sum = 0;
			for (int k = Math.max(0, -lag); k < Math.min(4, 4 - lag); k++) {
				sum += h[k] * h[k + lag];
			}
			assertEquals(2 * flat[lag + 3], sum, 1e-15);
		}
	}

	// Closed form (1 + 2 cos w) / 3: null at a third of the sample rate.
	@Test
	void averagesWithEqualCoefficients() {
		assertEquals(ExactTaps.ofIntegers(Collections.nCopies(3, BigInteger.ONE), new BigFraction(1, 3)),
				new MovingAverage(3, 1).exact(Progress.NONE));
		assertEquals(ExactTaps.ofIntegers(integers("1 2 3 2 1"), new BigFraction(1, 9)), new MovingAverage(3, 2).exact(Progress.NONE));
	}

	// E. B. Hogenauer, IEEE Transactions on Acoustics, Speech, and Signal Processing 29(2), 1981, table I: pass-band attenuation at a
	// quarter of the low rate for a large rate change, printed to two decimals.
	@ParameterizedTest
	@CsvSource({ "1, 0.91", "2, 1.82", "3, 2.74", "4, 3.65", "5, 4.56", "6, 5.47" })
	void droopsLikeHogenauersTable(int sections, double attenuation) {
		int rate = 128;
		double[] taps = new MovingAverage(rate, sections).exact(Progress.NONE).toDoubles();
		double f = 0.25 / rate;
		double middle = (taps.length - 1) / 2.0;
		double gain = 0;
		for (int k = 0; k < taps.length; k++) {
			gain += taps[k] * Math.cos(2 * Math.PI * f * (k - middle));
		}
		assertEquals(attenuation, -20 * Math.log10(gain), 0.0055);
	}

	@Test
	void countsBinomialCoefficients() {
		assertEquals(ExactTaps.ofIntegers(integers("1 4 6 4 1"), new BigFraction(1, 16)), new Binomial(4).exact(Progress.NONE));
		assertEquals(Symmetry.EVEN, new Binomial(301).exact(Progress.NONE).symmetry());
	}

	// Closed form at high precision (50 digits): roll-offs of 3GPP TS 25.104, clause 6.8.1 (0.22), and ETSI EN 302 307, clause 5.6 (0.35).
	@ParameterizedTest
	@CsvSource({ "0.22, 1.060112699841735791, 0.93861464786142496815, 0.62512215721477030418, -0.057323524246515840945, -0.17926027699950431344",
			"0.35, 1.0956338406573069402, 0.95712598011001984469, 0.60777361805933450853, -0.084690265919322876452, -0.13516411656015982748" })
	void samplesTheRootRaisedCosine(double rollOff, double at0, double atQuarter, double atHalf, double at1, double at3Halves) {
		double[] taps = new RaisedCosine(rollOff, 4, 8, true, RaisedCosine.Gain.CLOSED_FORM).compute(Progress.NONE).taps();
		assertEquals(33, taps.length);
		assertEquals(at0, taps[16], 1e-15);
		assertEquals(atQuarter, taps[17], 1e-15);
		assertEquals(atHalf, taps[14], 1e-15);
		assertEquals(at1, taps[20], 1e-15);
		assertEquals(at3Halves, taps[22], 1e-15);
	}

	// The limit at t = 1/(4 b) is b / sqrt 2 ((1 + 2/pi) sin(pi/(4b)) + (1 - 2/pi) cos(pi/(4b))): J. G. Proakis and M. Salehi (recalled).
	@ParameterizedTest
	@CsvSource({ "0.25, 4", "0.5, 2", "0.125, 8", "1, 4" })
	void isExactAtTheSingularPointsOfTheRoot(double rollOff, int perSymbol) {
		double[] taps = new RaisedCosine(rollOff, perSymbol, 6, true, RaisedCosine.Gain.CLOSED_FORM).compute(Progress.NONE).taps();
		int singular = (int) Math.round(perSymbol / (4 * rollOff));
		double angle = Math.PI / (4 * rollOff);
		double limit = rollOff / Math.sqrt(2) * ((1 + 2 / Math.PI) * Math.sin(angle) + (1 - 2 / Math.PI) * Math.cos(angle));
		assertEquals(limit, taps[taps.length / 2 + singular], 1e-15);
	}

	@Test
	void staysSmoothAcrossTheSingularPoints() {
		// A roll-off a little beside the singular one must give nearly the same coefficient.
		for (boolean root : new boolean[] { false, true }) {
			for (double off : new double[] { 1e-3, 1e-4, 2e-5, 1e-6, 1e-9 }) {
				double[] exact = new RaisedCosine(0.25, 8, 8, root, RaisedCosine.Gain.CLOSED_FORM).compute(Progress.NONE).taps();
				double[] near = new RaisedCosine(0.25 * (1 + off), 8, 8, root, RaisedCosine.Gain.CLOSED_FORM).compute(Progress.NONE)
						.taps();
				for (int k = 0; k < exact.length; k++) {
					assertEquals(exact[k], near[k], 2 * off);
				}
			}
		}
	}

	@Test
	void hasNoInterferenceBetweenSymbols() {
		double[] taps = new RaisedCosine(0.3, 8, 10, false, RaisedCosine.Gain.CLOSED_FORM).compute(Progress.NONE).taps();
		for (int symbol = 1; symbol <= 5; symbol++) {
			assertEquals(0, taps[40 + 8 * symbol], 0);
		}
		assertEquals(1, taps[40], 0);
	}

	@Test
	void scalesAsAsked() {
		double[] unity = new RaisedCosine(0.35, 4, 8, true, RaisedCosine.Gain.UNITY_AT_ZERO).compute(Progress.NONE).taps();
		assertEquals(1, Arrays.stream(unity).sum(), 1e-14);
		double[] energy = new RaisedCosine(0.35, 4, 8, true, RaisedCosine.Gain.UNIT_ENERGY).compute(Progress.NONE).taps();
		assertEquals(1, Arrays.stream(energy).map(tap -> tap * tap).sum(), 1e-14);
	}

	@Test
	void refusesWhatMakesNoSense() {
		assertThrows(IllegalArgumentException.class, () -> new SavitzkyGolay(4, 2, 0));
		assertThrows(IllegalArgumentException.class, () -> new SavitzkyGolay(5, 5, 0));
		assertThrows(IllegalArgumentException.class, () -> new SavitzkyGolay(5, 2, 3));
		assertThrows(IllegalArgumentException.class, () -> new SavitzkyGolay(5, 2, 0, 3));
		assertThrows(IllegalArgumentException.class, () -> new LagrangeDelay(3, Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> new LagrangeDelay(3, 4));
		assertThrows(IllegalArgumentException.class, () -> new MovingAverage(0, 1));
		assertThrows(IllegalArgumentException.class, () -> new MovingAverage(1_000_000, 1));
		assertThrows(IllegalArgumentException.class, () -> new Binomial(-1));
		assertThrows(IllegalArgumentException.class, () -> new MaximallyFlat(0, 3));
		assertThrows(IllegalArgumentException.class, () -> new RaisedCosine(1.1, 4, 8, true, RaisedCosine.Gain.CLOSED_FORM));
		assertThrows(IllegalArgumentException.class, () -> new RaisedCosine(0.3, 0, 8, true, RaisedCosine.Gain.CLOSED_FORM));
	}

	private static List<BigInteger> integers(String text) {
		return new ArrayList<>(Arrays.stream(text.split(" ")).map(BigInteger::new).toList());
	}
}
