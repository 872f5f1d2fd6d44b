// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.linearprogram;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.leastsquares.AmplitudeLimit;
import tapwright.dsp.design.leastsquares.LinearPhaseBasis;
import tapwright.dsp.design.leastsquares.PointCondition;
import tapwright.dsp.exact.Symmetry;

/** Linear programs with and without further limits. */
class LinearProgramTest {

	private static final List<Band> LOW_PASS = List.of(new Band(0, 0.1, 1, 1), new Band(0.15, 0.5, 0, 1));

	private static LinearProgram design(int taps, List<Band> bands, List<AmplitudeLimit> limits, List<Monotone> monotone,
			List<PointCondition> conditions, TimeLimit... time) {
		return new LinearProgram(taps, Symmetry.EVEN, bands, limits, monotone, conditions, List.of(time));
	}

	// The 24-tap low-pass of J. H. McClellan, T. W. Parks and L. R. Rabiner, A computer program for designing optimum FIR linear
	// phase digital filters, 1973, prints a grid-limited 0.01243; the continuous optimum is 0.01248 (scipy.signal.remez, dense).
	@Test
	void findsTheMinimaxErrorWithABoundThatMeetsIt() throws DesignException {
		LinearProgramSolution solution = design(24, List.of(new Band(0, 0.08, 1, 1), new Band(0.16, 0.5, 0, 1)), List.of(), List.of(),
				List.of()).solve(Progress.NONE);
		assertEquals(0.01248, solution.error(), 1e-5);
		assertTrue(solution.lower() <= solution.error() + 1e-12);
		assertEquals(solution.error(), solution.lower(), 1e-6);
	}

	@Test
	void keepsTheStepResponseFromOvershooting() throws DesignException {
		double[] free = design(31, LOW_PASS, List.of(), List.of(), List.of()).compute(Progress.NONE).taps();
		assertTrue(overshoot(free) > 0.03, "the limit must bind");
		LinearProgramSolution held = design(31, LOW_PASS, List.of(), List.of(), List.of(PointCondition.gain(0, 1)),
				new TimeLimit(true, 0, 30, Double.NEGATIVE_INFINITY, 1.01)).solve(Progress.NONE);
		assertTrue(overshoot(held.taps()) <= 0.01);
		assertEquals(1, Arrays.stream(held.taps()).sum(), 1e-12);
	}

	@Test
	void givesNonNegativeCoefficientsAndExactZeros() throws DesignException {
		double[] taps = design(31, List.of(new Band(0, 0.05, 1, 1), new Band(0.2, 0.5, 0, 1)), List.of(), List.of(), List.of(),
				new TimeLimit(false, 0, 30, 0, Double.POSITIVE_INFINITY), new TimeLimit(false, 11, 11, 0, 0)).compute(Progress.NONE)
				.taps();
		for (double tap : taps) {
			assertTrue(tap >= -1e-15);
		}
		assertEquals(0, taps[11], 1e-15);
		assertEquals(0, taps[19], 1e-15);
	}

	@Test
	void keepsThePassBandMonotoneAndTheTransitionLow() throws DesignException {
		List<AmplitudeLimit> cap = List.of(new AmplitudeLimit(0.1, 0.15, -1.01, 1.01));
		double[] taps = design(41, LOW_PASS, cap, List.of(new Monotone(0, 0.1, false)), List.of()).compute(Progress.NONE).taps();
		LinearPhaseBasis basis = new LinearPhaseBasis(41, Symmetry.EVEN);
		double[] a = basis.type().amplitude(taps);
		for (int i = 0; i <= 1000; i++) {
			assertTrue(dot(basis.row(i * 1e-4, 1), a) <= 1e-8);
			assertTrue(Math.abs(dot(basis.row(0.1 + i * 5e-5, 0), a)) <= 1.01);
		}
	}

	@Test
	void saysThatLimitsAreImpossible() {
		LinearProgram design = design(11, LOW_PASS, List.of(new AmplitudeLimit(0, 0.1, 0.999, 1.001), new AmplitudeLimit(0.12, 0.5,
				-1e-4, 1e-4)), List.of(), List.of());
		assertTrue(assertThrows(DesignException.class, () -> design.compute(Progress.NONE)).getMessage().contains("keeps all limits"));
	}

	@Test
	void refusesWhatCannotBe() {
		assertThrows(IllegalArgumentException.class, () -> design(1_000_000, LOW_PASS, List.of(), List.of(), List.of()));
		assertThrows(IllegalArgumentException.class, () -> design(0, LOW_PASS, List.of(), List.of(), List.of()));
		assertThrows(IllegalArgumentException.class, () -> design(11, LOW_PASS, List.of(), List.of(), List.of(),
				new TimeLimit(true, 0, 11, 0, 1)));
		assertThrows(IllegalArgumentException.class, () -> new TimeLimit(true, 0, 3, 1, Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> new Monotone(0.3, 0.2, true));
	}

	private static double overshoot(double[] taps) {
		double sum = 0;
		double most = 0;
		for (double tap : taps) {
			sum += tap;
			most = Math.max(most, sum);
		}
		return most - 1;
	}

	private static double dot(double[] row, double[] a) {
		double sum = 0;
		for (int k = 0; k < row.length; k++) {
			sum += row[k] * a[k];
		}
		return sum;
	}
}
