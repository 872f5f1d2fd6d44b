// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.EnumSource.Mode;

import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.Band;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

class RoundingMethodTest {

	private static final Duration PLENTY = Duration.ofMinutes(2);
	private static final List<Band> LOWPASS = List.of(new Band(0, 0.12, 1, 1), new Band(0.25, 0.5, 0, 1));

	/** Reference: the optima of {@link PublishedProblems}. */
	@ParameterizedTest
	@EnumSource(PublishedProblems.class)
	void latticeSearchReachesThePublishedOptimaWithinATenthOfAPercent(PublishedProblems problem) {
		double enough = problem.optimum() * 1.001;
		RoundingTask task = problem.task();
		Rounded rounded = RoundingMethod.LATTICE.round(task,
				new Search(1, PLENTY, Progress.NONE, found -> found.loss() <= enough));
		assertTrue(rounded.loss() <= enough, () -> "found " + rounded.loss());
		assertTrue(task.format().contains(rounded.taps()));
		assertEquals(Symmetry.EVEN, rounded.taps().symmetry());
	}

	/** Reference: the solution and its certified error found by HiGHS, see {@link PublishedProblems}. */
	@Test
	void peakErrorOfAKnownSolutionIsEnclosed() {
		ExactTaps taps = PublishedProblems.C35_8.taps(74, 5, 38, -7, -8, -1, -7, 6, 4, -1, 1, -3, -1, 2, 0, 1, 0, -1);
		Enclosure peak = new PeakError(PublishedProblems.C35_8.bands()).of(taps);
		assertEquals(0.017870836, peak.lo(), 5e-9);
		assertEquals(0.017870836, peak.hi(), 5e-9);
		assertTrue(peak.lo() <= peak.hi());
	}

	/** Reference: all roundings within two steps of the nearest, tried one by one. */
	@Test
	void exhaustiveSearchFindsTheOptimumOfASmallProblem() {
		NumberFormat format = new NumberFormat(6, 5);
		ExactTaps ideal = LeastSquares.fit(LOWPASS, 9);
		double least = leastOfAll(format.nearest(ideal), Judge.peakError(LOWPASS));
		Rounded rounded = RoundingMethod.EXHAUSTIVE.round(new RoundingTask(ideal, format, LOWPASS), Search.within(PLENTY));
		assertTrue(rounded.optimal());
		assertEquals(least, rounded.loss(), 1e-6 * least);
	}

	private static double leastOfAll(ExactTaps nearest, Judge judge) {
		double least = Double.MAX_VALUE;
		for (int code = 0; code < 5 * 5 * 5 * 5 * 5; code++) {
			List<BigInteger> integers = new ArrayList<>();
			for (int k = 0, rest = code; k < 9; k++) {
				int step = k < 5 ? rest % 5 - 2 : 0;
				rest /= 5;
				integers.add(k < 5 ? nearest.integer(k).add(BigInteger.valueOf(step)) : integers.get(8 - k));
			}
			ExactTaps taps = ExactTaps.ofIntegers(integers, nearest.unit());
			// A few frequencies refuse most candidates before the judge is asked.
			if (Math.abs(amplitude(taps, 0) - 1) < least && Math.abs(amplitude(taps, 0.5)) < least
					&& Math.abs(amplitude(taps, 0.12) - 1) < least && Math.abs(amplitude(taps, 0.25)) < least) {
				least = Math.min(least, judge.loss(taps));
			}
		}
		return least;
	}

	private static double amplitude(ExactTaps taps, double f) {
		double sum = 0;
		double[] h = taps.toDoubles();
		for (int k = 0; k < h.length; k++) {
			sum += h[k] * Math.cos(2 * Math.PI * f * (k - h.length / 2));
		}
		return sum;
	}

	@ParameterizedTest
	@EnumSource(value = RoundingMethod.class, mode = Mode.EXCLUDE, names = "EXHAUSTIVE")
	void noMethodIsWorseThanNearestAndAllKeepFormatAndSymmetry(RoundingMethod method) {
		NumberFormat format = new NumberFormat(8, 7);
		for (int length : new int[] { 8, 11 }) {
			ExactTaps ideal = length == 8 ? ExactTaps.ofDoubles(-0.04, 0.02, 0.18, 0.33, 0.33, 0.18, 0.02, -0.04)
					: LeastSquares.fit(LOWPASS, length);
			RoundingTask task = new RoundingTask(ideal, format, LOWPASS);
			Rounded rounded = method.round(task, Search.within(Duration.ofMillis(200)));
			assertTrue(rounded.loss() <= Judge.peakError(LOWPASS).loss(format.nearest(ideal)));
			assertTrue(format.contains(rounded.taps()));
			assertEquals(Symmetry.EVEN, rounded.taps().symmetry());
			assertEquals(task.judge().loss(rounded.taps()), rounded.loss());
		}
	}

	@Test
	void latticeSearchHandlesOddSymmetry() {
		List<Band> differentiator = List.of(new Band(0.01, 0.4, 0.01 * 2 * Math.PI, 0.4 * 2 * Math.PI, 1, 1));
		ExactTaps ideal = ExactTaps.ofDoubles(-0.1, 0.2, -0.4, 0.9, 0, -0.9, 0.4, -0.2, 0.1);
		NumberFormat format = new NumberFormat(10, 8);
		Rounded rounded = RoundingMethod.EXHAUSTIVE.round(new RoundingTask(ideal, format, differentiator), Search.within(PLENTY));
		assertEquals(Symmetry.ODD, rounded.taps().symmetry());
		assertTrue(rounded.optimal());
		assertTrue(rounded.loss() < Judge.peakError(differentiator).loss(format.nearest(ideal)));
	}

	@Test
	void pairsWorkWithoutSymmetryOrBands() {
		ExactTaps ideal = ExactTaps.ofDoubles(0.3, 0.37, 0.26, 0.11);
		// The coefficients should add up to one: a step elsewhere makes up for what rounding loses.
		Judge unity = taps -> Math.abs(Arrays.stream(taps.toDoubles()).sum() - 1);
		Rounded rounded = RoundingMethod.PAIRS.round(new RoundingTask(ideal, new NumberFormat(6, 4), unity, List.of()),
				Search.within(PLENTY));
		assertEquals(0, rounded.loss());
	}

	@Test
	void theSameSeedGivesTheSameResult() {
		RoundingTask task = PublishedProblems.C35_8.task();
		Search search = new Search(7, PLENTY, Progress.NONE, found -> found.loss() < 0.018);
		assertEquals(RoundingMethod.LATTICE.round(task, search), RoundingMethod.LATTICE.round(task, search));
	}

	@Test
	void improvementsAreReportedAndTheSearchCanBeCancelled() {
		List<Double> losses = new ArrayList<>();
		Progress cancelled = new Progress() {
			@Override
			public boolean isCancelled() {
				return losses.size() > 1;
			}
		};
		assertThrows(CancellationException.class, () -> RoundingMethod.EXHAUSTIVE.round(PublishedProblems.D45_9.task(),
				new Search(1, PLENTY, cancelled, found -> !losses.add(found.loss()))));
		assertEquals(2, losses.size());
		assertTrue(losses.get(1) < losses.get(0));
	}

	@Test
	void latticeNeedsBandsAndSymmetry() {
		NumberFormat format = new NumberFormat(8, 7);
		Judge any = taps -> 0;
		assertThrows(IllegalArgumentException.class, () -> RoundingMethod.LATTICE.round(
				new RoundingTask(ExactTaps.ofDoubles(0.1, 0.2), format, any, LOWPASS), Search.within(PLENTY)));
		assertThrows(IllegalArgumentException.class, () -> RoundingMethod.LATTICE.round(
				new RoundingTask(ExactTaps.ofDoubles(0.1, 0.1), format, any, List.of()), Search.within(PLENTY)));
	}

	@Test
	void theShortestWordIsShorterThanTheShortestOfNearestSteps() {
		ExactTaps ideal = LeastSquares.fit(LOWPASS, 15);
		Judge judge = Judge.peakError(LOWPASS);
		double limit = judge.loss(ideal) * 1.25;
		ShortestWord search = new ShortestWord(ideal, judge, taps -> judge.loss(taps) <= limit, LOWPASS, 1, PLENTY);
		List<ShortestWord.Attempt> attempts = new ShortestWord(ideal, judge, search.proven(), LOWPASS, 1,
				Duration.ofMillis(800)).find(2, 24, Progress.NONE);
		ShortestWord.Attempt shortest = ShortestWord.shortest(attempts).orElseThrow();
		assertTrue(judge.loss(shortest.rounded().taps()) <= limit);
		NumberFormat format = shortest.format();
		assertFalse(judge.loss(format.nearest(ideal)) <= limit, "a word of " + format.word() + " bits needs more than nearest steps");
		assertEquals(format, ShortestWord.format(ideal, format.word()));
	}
}
