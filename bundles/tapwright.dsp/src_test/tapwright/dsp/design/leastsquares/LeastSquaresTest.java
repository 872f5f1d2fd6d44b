// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.exact.Symmetry;

/** Least squares with and without limits. */
class LeastSquaresTest {

	private static final List<Band> LOW_PASS = List.of(new Band(0, 0.1, 1, 1), new Band(0.15, 0.5, 0, 1));

	// Source: scipy.signal.firls 1.17.1, see make_least_squares_values.py.
	@Test
	void agreesWithTheReferenceLibrary() throws IOException, DesignException {
		List<String> lines;
		try (InputStream in = LeastSquaresTest.class.getResourceAsStream("least-squares-values.csv")) {
			lines = new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().filter(line -> !line.startsWith("#")).toList();
		}
		assertEquals(60, lines.size());
		for (String line : lines) {
			String[] parts = line.split(";");
			double[] edges = numbers(parts[1]);
			double[] desired = numbers(parts[2]);
			double[] weight = numbers(parts[3]);
			List<Band> bands = new ArrayList<>();
			for (int k = 0; k < weight.length; k++) {
				bands.add(new Band(edges[2 * k], edges[2 * k + 1], desired[2 * k], desired[2 * k + 1], weight[k], weight[k]));
			}
			double[] taps = new LeastSquares(Integer.parseInt(parts[0]), Symmetry.EVEN, bands).compute(Progress.NONE).taps();
			double[] expected = numbers(parts[4]);
			for (int k = 0; k < expected.length; k++) {
				assertEquals(expected[k], taps[k], 1e-9, line.substring(0, 60));
			}
		}
	}

	// Over the whole axis with weight 1, by Parseval, the best approximation is the cut Fourier series.
	@Test
	void givesTheCutFourierSeriesOverTheWholeAxis() throws DesignException {
		List<Band> bands = List.of(new Band(0, 0.125, 1, 1), new Band(0.125, 0.5, 0, 1));
		double[] odd = new LeastSquares(41, Symmetry.EVEN, bands).compute(Progress.NONE).taps();
		double[] even = new LeastSquares(40, Symmetry.EVEN, bands).compute(Progress.NONE).taps();
		for (int k = 0; k < 41; k++) {
			assertEquals(0.25 * sinc(0.25 * (k - 20)), odd[k], 1e-14);
		}
		for (int k = 0; k < 40; k++) {
			assertEquals(0.25 * sinc(0.25 * (k - 19.5)), even[k], 1e-14);
		}
	}

	// Fourier series of the differentiator 2 pi f: (-1)^k / k, and of the Hilbert transformer: 2 / (pi k) for odd k.
	@Test
	void givesTheFourierSeriesOfOddTargets() throws DesignException {
		double[] slope = new LeastSquares(21, Symmetry.ODD, List.of(new Band(0, 0.5, 0, Math.PI, 1, 1))).compute(Progress.NONE)
				.taps();
		double[] hilbert = new LeastSquares(21, Symmetry.ODD, List.of(new Band(0, 0.5, 1, 1))).compute(Progress.NONE).taps();
		for (int k = 1; k <= 10; k++) {
			assertEquals((k % 2 == 0 ? 1.0 : -1.0) / k, slope[10 + k], 1e-13);
			assertEquals(k % 2 == 0 ? 0 : -2 / (Math.PI * k), hilbert[10 + k], 1e-13);
		}
	}

	@Test
	void isALeastOfTheSquaredErrorForSlopingWeights() throws DesignException {
		Random random = new Random(5);
		for (int n : new int[] { 9, 10, 23, 24 }) {
			for (Symmetry symmetry : new Symmetry[] { Symmetry.EVEN, Symmetry.ODD }) {
				List<Band> bands = List.of(new Band(0.05, 0.2, 1, 2, 1, 3), new Band(0.25, 0.45, 0.5, 0, 4, 0.5));
				LinearPhaseBasis basis = new LinearPhaseBasis(n, symmetry);
				double[] best = basis.type().amplitude(new LeastSquares(n, symmetry, bands).compute(Progress.NONE).taps());
				double error = error(basis, best, bands);
				for (int trial = 0; trial < 20; trial++) {
					double[] other = Arrays.stream(best).map(value -> value + 1e-3 * random.nextGaussian()).toArray();
					assertTrue(error(basis, other, bands) > error * (1 - 1e-12));
				}
			}
		}
	}

	@Test
	void solvesIllConditionedProblemsByDecomposition() throws DesignException {
		double[] taps = new LeastSquares(81, Symmetry.EVEN, List.of(new Band(0, 0.1, 1, 1), new Band(0.2, 0.5, 0, 1)))
				.compute(Progress.NONE).taps();
		assertEquals(1, Arrays.stream(taps).sum(), 1e-4);
	}

	@Test
	void holdsConditionsExactly() throws DesignException {
		List<PointCondition> conditions = new ArrayList<>(PointCondition.flat(0, 6));
		conditions.add(PointCondition.gain(0, 1));
		conditions.addAll(PointCondition.zero(0.25, 2));
		LinearPhaseBasis basis = new LinearPhaseBasis(31, Symmetry.EVEN);
		double[] a = basis.type().amplitude(new LeastSquares(31, Symmetry.EVEN, LOW_PASS, conditions).compute(Progress.NONE).taps());
		assertEquals(1, dot(basis.row(0, 0), a), 1e-13);
		for (int order : new int[] { 2, 4, 6 }) {
			assertEquals(0, dot(basis.row(0, order), a), 1e-13);
		}
		assertEquals(0, dot(basis.row(0.25, 0), a), 1e-13);
		assertEquals(0, dot(basis.row(0.25, 1), a), 1e-13);
	}

	@Test
	void staysWithinLimitsAtTheLeastCost() throws DesignException {
		List<Band> bands = List.of(new Band(0, 0.125, 1, 1), new Band(0.125, 0.5, 0, 1));
		List<AmplitudeLimit> limits = List.of(new AmplitudeLimit(0, 0.105, 0.98, 1.02), new AmplitudeLimit(0.145, 0.5, -0.01, 0.01));
		LinearPhaseBasis basis = new LinearPhaseBasis(61, Symmetry.EVEN);
		double[] free = basis.type().amplitude(new LeastSquares(61, Symmetry.EVEN, bands).compute(Progress.NONE).taps());
		double[] held = basis.type().amplitude(
				new ConstrainedLeastSquares(61, Symmetry.EVEN, bands, limits, List.of()).compute(Progress.NONE).taps());
		double worstFree = 0;
		for (int i = 0; i <= 5000; i++) {
			double f = i / 1e4;
			double value = dot(basis.row(f, 0), held);
			if (f <= 0.105) {
				assertEquals(1, value, 0.02, "at " + f);
			} else if (f >= 0.145) {
				assertEquals(0, value, 0.01, "at " + f);
				worstFree = Math.max(worstFree, Math.abs(dot(basis.row(f, 0), free)));
			}
		}
		assertTrue(worstFree > 0.011, "the limits must bind for this test to say anything: " + worstFree);
		assertTrue(error(basis, held, bands) < 1.5 * error(basis, free, bands));
	}

	@Test
	void saysThatLimitsAreImpossible() {
		List<AmplitudeLimit> limits = List.of(new AmplitudeLimit(0, 0.1, 0.999, 1.001), new AmplitudeLimit(0.12, 0.5, -1e-4, 1e-4));
		String message = assertThrows(DesignException.class,
				() -> new ConstrainedLeastSquares(21, Symmetry.EVEN, LOW_PASS, limits, List.of()).compute(Progress.NONE)).getMessage();
		assertTrue(message.contains("no filter of 21 coefficients"), message);
	}

	@Test
	void saysThatConditionsContradict() {
		List<PointCondition> twice = List.of(PointCondition.gain(0, 1), PointCondition.gain(0, 2));
		assertThrows(DesignException.class, () -> new LeastSquares(21, Symmetry.EVEN, LOW_PASS, twice).compute(Progress.NONE));
	}

	@Test
	void refusesWhatCannotBe() {
		assertThrows(IllegalArgumentException.class, () -> new LeastSquares(0, Symmetry.EVEN, LOW_PASS));
		assertThrows(IllegalArgumentException.class, () -> new LeastSquares(1_000_000, Symmetry.EVEN, LOW_PASS));
		assertThrows(IllegalArgumentException.class, () -> new LeastSquares(21, Symmetry.NONE, LOW_PASS));
		assertThrows(IllegalArgumentException.class, () -> new LeastSquares(21, Symmetry.EVEN, List.of()));
		assertThrows(IllegalArgumentException.class, () -> new AmplitudeLimit(0, 0.1, 1, 0.5));
		assertThrows(IllegalArgumentException.class, () -> new AmplitudeLimit(0.1, 0.1, 0, 1));
		assertThrows(IllegalArgumentException.class, () -> PointCondition.gain(Double.NaN, 1));
	}

	private static double sinc(double x) {
		return x == 0 ? 1 : Math.sin(Math.PI * x) / (Math.PI * x);
	}

	private static double error(LinearPhaseBasis basis, double[] a, List<Band> bands) {
		double sum = 0;
		for (Band band : bands) {
			for (int i = 0; i < 2000; i++) {
				double f = band.from() + (band.to() - band.from()) * (i + 0.5) / 2000;
				double e = dot(basis.row(f, 0), a) - band.desired(f);
				sum += band.weight(f) * e * e * (band.to() - band.from()) / 2000;
			}
		}
		return sum;
	}

	private static double dot(double[] row, double[] a) {
		double sum = 0;
		for (int k = 0; k < row.length; k++) {
			sum += row[k] * a[k];
		}
		return sum;
	}

	private static double[] numbers(String text) {
		return Arrays.stream(text.split(" ")).mapToDouble(Double::parseDouble).toArray();
	}
}
