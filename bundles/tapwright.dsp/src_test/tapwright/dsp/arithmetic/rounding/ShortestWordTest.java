// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.GainLimit;

class ShortestWordTest {

	private static final List<Band> BANDS = List.of(new Band(0, 0.1, 1, 1), new Band(0.2, 0.5, 0, 5));

	@Test
	void theFormatHasAsManyFractionBitsAsTheLargestCoefficientAllows() {
		assertEquals(new NumberFormat(8, 8), ShortestWord.format(ExactTaps.ofDoubles(0.1, -0.49), 8));
		assertEquals(new NumberFormat(8, 7), ShortestWord.format(ExactTaps.ofDoubles(0.1, 0.5), 8));
		assertEquals(new NumberFormat(8, 8), ShortestWord.format(ExactTaps.ofDoubles(0.1, -0.5), 8));
		assertEquals(new NumberFormat(8, 3), ShortestWord.format(ExactTaps.ofDoubles(15.9), 8));
		assertEquals(new NumberFormat(8, 2), ShortestWord.format(ExactTaps.ofDoubles(15.95), 8));
		assertThrows(IllegalArgumentException.class, () -> ShortestWord.format(ExactTaps.ofDoubles(0, 0), 8));
	}

	/** The result is proven again, and nearest steps of the same word are disproven. */
	@Test
	void aShorterWordThanNearestStepsNeedIsProven() {
		ExactTaps ideal = LeastSquares.fit(BANDS, 21);
		ProofJudge judge = new ProofJudge(List.of(GainLimit.between(0, 1000, -0.5, 0.5), GainLimit.atMost(2000, 5000, -40)), 10000,
				Optional.empty(), Effort.STANDARD);
		assertTrue(judge.isMet(ideal), "before rounding");
		ShortestWord search = new ShortestWord(ideal, judge, judge::isMet, BANDS, 1, Duration.ofMillis(800));
		ShortestWord.Attempt shortest = ShortestWord.shortest(search.find(4, 24, Progress.NONE)).orElseThrow();
		assertTrue(judge.isMet(shortest.rounded().taps()));
		assertTrue(shortest.rounded().loss() <= 0);
		assertTrue(shortest.format().contains(shortest.rounded().taps()));
		assertFalse(judge.isMet(shortest.format().nearest(ideal)));
	}

	@Test
	void refusesImpossibleWordLengths() {
		ShortestWord search = new ShortestWord(ExactTaps.ofDoubles(1), taps -> 0, taps -> true, List.of(), 1, Duration.ZERO);
		assertThrows(IllegalArgumentException.class, () -> search.find(8, 4, Progress.NONE));
		assertEquals(2, ShortestWord.shortest(search.find(2, 4, Progress.NONE)).orElseThrow().format().word());
	}
}
