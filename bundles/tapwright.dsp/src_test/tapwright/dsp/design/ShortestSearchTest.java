// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CancellationException;
import java.util.function.IntPredicate;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.design.equiripple.EquirippleFamily;
import tapwright.dsp.design.window.KaiserEstimate;
import tapwright.dsp.design.window.WindowDesign;
import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.verify.Verdict;

class ShortestSearchTest {

	@Test
	void shortestEquirippleIsTheOneExhaustiveSearchFinds() throws DesignException {
		var random = new Random(5);
		for (int trial = 0; trial < 12; trial++) {
			double edge = 0.05 + 0.3 * random.nextDouble();
			double width = 0.03 + 0.1 * random.nextDouble();
			double pass = Math.pow(10, -1 - 2 * random.nextDouble());
			double stop = Math.pow(10, -1 - 3 * random.nextDouble());
			List<Band> bands = List.of(new Band(0, edge, 1, 1 / pass), new Band(edge + width, 0.5, 0, 1 / stop));
			var search = new ShortestSearch(taps -> judge(taps, bands), 500, Progress.NONE);
			ShortestFilter answer = search.search(new EquirippleFamily(Symmetry.EVEN, bands, true));
			var found = answer.found().orElseThrow();
			assertEquals(exhaustive(bands), found.taps(), bands::toString);
			assertTrue(found.provenShortest(), answer::toString);
			assertTrue(answer.trials().size() < 20);
		}
	}

	@Test
	void designFoundGivesTheSameCoefficientsAgain() throws DesignException {
		List<Band> bands = List.of(new Band(0, 0.1, 1, 50), new Band(0.14, 0.5, 0, 1000));
		var found = new ShortestSearch(taps -> judge(taps, bands), 500, Progress.NONE)
				.search(new EquirippleFamily(Symmetry.EVEN, bands, true)).found().orElseThrow();
		assertArrayEquals(found.design().compute(Progress.NONE).taps(), found.result().taps());
	}

	@Test
	void evenLengthsAreLeftOutWhereTheMethodRefusesThem() {
		List<Band> bands = List.of(new Band(0, 0.1, 0, 100), new Band(0.2, 0.5, 1, 20));
		ShortestFilter answer = new ShortestSearch(taps -> judge(taps, bands), 500, Progress.NONE)
				.search(new EquirippleFamily(Symmetry.EVEN, bands, true));
		assertEquals(1, answer.found().orElseThrow().taps() % 2);
		assertTrue(answer.found().orElseThrow().provenShortest());
	}

	@Test
	void candidatesOfSeveralMethodsStandSideBySide() {
		List<Band> bands = List.of(new Band(0, 0.1, 1, 1000), new Band(0.15, 0.5, 0, 1000));
		// A little more attenuation than needed, since the formula for beta is an approximation.
		KaiserEstimate estimate = KaiserEstimate.ofRipple(0.9e-3, 0.05);
		List<ShortestFilter> answers = new ShortestSearch(taps -> judge(taps, bands), 500, Progress.NONE)
				.searchAll(List.of(new EquirippleFamily(Symmetry.EVEN, bands, true),
				FilterFamily.of("Kaiser window", estimate.taps(),
						taps -> new WindowDesign(taps, Symmetry.EVEN, bands, estimate.window()))));
		int equiripple = answers.get(0).found().orElseThrow().taps();
		int window = answers.get(1).found().orElseThrow().taps();
		assertTrue(equiripple < window, equiripple + " and " + window);
		assertEquals(estimate.taps(), window, 4);
		assertFalse(answers.get(1).found().orElseThrow().provenShortest());
	}

	@Test
	void bracketsEveryThresholdFromEveryStart() {
		for (int threshold : new int[] { 1, 2, 3, 4, 17, 50, 63, 99, 100 }) {
			for (int start : new int[] { 1, 2, 16, 40, 61, 100 }) {
				ShortestFilter answer = search(start, n -> n >= threshold);
				assertEquals(threshold, answer.found().orElseThrow().taps(), "from " + start);
			}
		}
	}

	@Test
	void answersThatAreNotMonotoneAreFollowedAndReported() {
		ShortestFilter answer = search(40, n -> n >= 31 || n == 25);
		assertEquals(25, answer.found().orElseThrow().taps());
		assertTrue(answer.notes().toString().contains("not monotone"), answer::toString);
		assertEquals(26, search(41, n -> n >= 31 || n == 26).found().orElseThrow().taps());
	}

	@Test
	void shortestOddFilterOfTwoCoefficientsIsFound() {
		List<Band> bands = List.of(new Band(0.4, 0.5, 1, 3));
		var found = new ShortestSearch(taps -> taps.length >= 2 ? Verdict.MET : Verdict.MISSED, 100, Progress.NONE)
				.search(new EquirippleFamily(Symmetry.ODD, bands, true)).found().orElseThrow();
		assertEquals(2, found.taps());
	}

	@Test
	void lengthsThatAMethodRefusesAreNotTakenForProvenImpossible() {
		FilterFamily threes = FilterFamily.of("threes", 30, n -> {
			if (n % 3 != 0) {
				throw new IllegalArgumentException("only multiples of three");
			}
			return p -> new DesignResult(new double[n]);
		});
		var found = new ShortestSearch(taps -> taps.length >= 12 ? Verdict.MET : Verdict.MISSED, 100, Progress.NONE)
				.search(threes).found().orElseThrow();
		assertFalse(found.provenShortest());
		assertEquals(0, found.taps() % 3);
	}

	@Test
	void aSearchWithoutAnAnswerEndsAndSaysSo() {
		ShortestFilter answer = search(40, n -> false);
		assertTrue(answer.found().isEmpty());
		assertTrue(answer.notes().toString().contains("No length up to 100"));
		assertTrue(answer.trials().size() < 40);
	}

	@Test
	void cancellingEndsTheSearch() {
		Progress cancelled = new Progress() {
			@Override
			public boolean isCancelled() {
				return true;
			}
		};
		var search = new ShortestSearch(taps -> Verdict.MET, 100, cancelled);
		assertThrows(CancellationException.class, () -> search.search(FilterFamily.of("any", 9, n -> p ->
				new DesignResult(1))));
	}

	@Test
	void progressNamesTheLengths() {
		List<String> messages = new ArrayList<>();
		Progress progress = new Progress() {
			@Override
			public void report(String message, double fraction) {
				messages.add(message);
			}
		};
		new ShortestSearch(taps -> Verdict.MET, 100, progress)
				.search(FilterFamily.of("any", 9, n -> p -> new DesignResult(1)));
		assertEquals("any: trying 9 coefficients", messages.get(0));
	}

	/** J. F. Kaiser 1974; O. Herrmann and others, BSTJ 52(6), 1973, and M. Bellanger, constants from memory. */
	@Test
	void lengthEstimates() {
		assertEquals(51.68493150684932, LengthEstimate.kaiser(.01, .001, .05), 1e-9);
		assertEquals(51.24760949999999, LengthEstimate.herrmann(.01, .001, .05), 1e-9);
		assertEquals(53.333333333333336, LengthEstimate.bellanger(.01, .001, .05), 1e-9);
		assertEquals(51, LengthEstimate.forBands(List.of(new Band(0, .1, 1, 100), new Band(.15, .5, 0, 1000))));
		assertThrows(IllegalArgumentException.class, () -> LengthEstimate.kaiser(.01, .001, 0));
		assertThrows(IllegalArgumentException.class, () -> LengthEstimate.herrmann(Double.NaN, .001, .1));
	}

	// The number of coefficients stands in for the filter.
	private static ShortestFilter search(int start, IntPredicate meets) {
		return new ShortestSearch(taps -> meets.test(taps.length) ? Verdict.MET : Verdict.MISSED, 100, Progress.NONE)
				.search(FilterFamily.of("any", start, n -> p -> new DesignResult(new double[n])));
	}

	private static int exhaustive(List<Band> bands) throws DesignException {
		for (int taps = 1;; taps++) {
			if (new Equiripple(taps, Symmetry.EVEN, bands).solve(Progress.NONE).upperBound() <= 1) {
				return taps;
			}
		}
	}

	// A dense grid stands in for the proof: the margin of an equiripple filter of whole length is far larger than its
	// error.
	private static Verdict judge(double[] taps, List<Band> bands) {
		for (Band band : bands) {
			for (int i = 0; i <= 3000; i++) {
				double f = Math.min(band.from() + (band.to() - band.from()) * i / 3000, band.to());
				double a = 0;
				for (int k = 0; k < taps.length; k++) {
					a += taps[k] * Math.cos(2 * Math.PI * f * ((taps.length - 1) / 2.0 - k));
				}
				if (band.weight(f) * Math.abs(a - band.desired(f)) > 1) {
					return Verdict.MISSED;
				}
			}
		}
		return Verdict.MET;
	}
}
