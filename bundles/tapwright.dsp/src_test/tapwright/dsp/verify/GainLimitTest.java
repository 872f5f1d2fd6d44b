// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.time.Duration;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.GainLimit.Breakpoint;

/** Gain limits against closed forms and facts. */
class GainLimitTest {

	private static final double NONE = Double.NEGATIVE_INFINITY;

	@Test
	void averageOfThreeHasExactlyUnitGainAtZeroFrequency() {
		Proof proof = GainLimit.atMost(0, 0.5, 0).prove(average(3), Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(0, proof.worst());
		assertEquals(Enclosure.of(0), proof.margin());
		assertEquals(Verdict.MET, GainLimit.atLeast(0, 0, 0).prove(average(3), Effort.STANDARD).verdict());
		assertEquals(Verdict.MISSED, GainLimit.atLeast(0, 1e-9, 0).prove(average(3), Effort.STANDARD).verdict());
		assertEquals(Verdict.MISSED, GainLimit.atMost(0, 0.5, -1e-15).prove(average(3), Effort.STANDARD).verdict());
	}

	@Test
	void averageOfThreeRoundedToDoublesIsBelowUnitGain() {
		Subject rounded = new Subject(ExactTaps.ofDoubles(1 / 3.0, 1 / 3.0, 1 / 3.0), 1);
		assertEquals(Verdict.MISSED, GainLimit.atLeast(0, 0, 0).prove(rounded, Effort.STANDARD).verdict());
		Proof proof = GainLimit.atMost(0, 0, 0).prove(rounded, Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		// 1 - 2^-54 below one: 20 log10(1 - 2^-54) = -4.8216...e-16 dB.
		assertEquals(20 * Math.log1p(-0x1p-54) / Math.log(10), proof.value().middle(), 1e-22);
	}

	// Common practice, no source: the sum of three equal samples has a gain of 3, that is 9.5424 dB.
	@Test
	void sumOfThreeHasNineAndAHalfDecibels() {
		Subject sum = new Subject(ExactTaps.ofIntegers(Collections.nCopies(3, BigInteger.ONE), BigFraction.ONE), 48000);
		Proof proof = GainLimit.atMost(0, 24000, 0).prove(sum, Effort.STANDARD);
		assertEquals(Verdict.MISSED, proof.verdict());
		assertEquals(9.5424, proof.value().middle(), 5e-5);
		assertTrue(proof.value().contains(9.542425094393248));
	}

	// Closed form sin(pi f N) / (N sin(pi f)), evaluated with mpmath.
	@ParameterizedTest
	@CsvSource({ "4, 0.36613976359938499463, -11.303337684950061167",
			"8, 0.17974875028826504333, -12.797347818635084244",
			"16, 0.089510862870714772087, -13.14683055926419725",
					"64, 0.022350204815548405913, -13.254321125725801238" })
	void firstSideLobeOfAnAverageIsTheClosedForm(int n, double place, double decibels) {
		Proof proof = GainLimit.atMost(1.0 / n, 0.5, -10).prove(average(n), Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(place, proof.worst(), 1e-9);
		assertTrue(proof.value().contains(decibels), proof.toString());
		assertTrue(proof.value().width() < 1e-11);
	}

	// E. B. Hogenauer, An economical class of digital filters for decimation and interpolation, IEEE Transactions on
	// Acoustics, Speech, and Signal Processing 29(2), 1981, tables I and II: large rate change, bandwidth times
	// differential delay 1/4.
	@ParameterizedTest
	@CsvSource({ "1, 0.91, 10.5", "2, 1.82, 20.9", "3, 2.74, 31.4", "4, 3.65, 41.8", "5, 4.56, 52.3", "6, 5.47, 62.7" })
	void integratorsAndCombsAttenuateAsTabulated(int sections, double pass, double alias) {
		int rate = 256;
		ExactTaps taps = average(rate).taps();
		ExactTaps cascade = taps;
		for (int k = 1; k < sections; k++) {
			cascade = cascade.convolve(taps);
		}
		Subject subject = new Subject(cascade, rate);
		assertEquals(-pass, GainLimit.atLeast(0, 0.25, -10).prove(subject, Effort.STANDARD).value().middle(), 0.006);
		assertEquals(-alias, GainLimit.atMost(0.75, 1.25, 0).prove(subject, Effort.STANDARD).value().middle(), 0.06);
		assertEquals(alias, new AliasRejection(rate, 0.25, 5).prove(subject, Effort.STANDARD).value().middle(), 0.06);
	}

	@Test
	void maximallyFlatFilterTouchesItsLimitToHighOrder() {
		ExactTaps taps = ExactTaps.ofDoubles(1);
		for (int k = 0; k < 6; k++) {
			taps = taps.convolve(ExactTaps.ofDoubles(0.25, 0.5, 0.25));
		}
		assertEquals(Verdict.MET, GainLimit.atMost(0, 0.5, 0).prove(new Subject(taps, 1), Effort.STANDARD).verdict());
		// (-1, 0, 9, 16, 9, 0, -1) / 32 is flat at 0 and rises nowhere above 1.
		ExactTaps flat = ExactTaps.ofDoubles(-1 / 32.0, 0, 9 / 32.0, 0.5, 9 / 32.0, 0, -1 / 32.0);
		assertEquals(Verdict.MET, GainLimit.between(0, 0.1, -0.3, 0).prove(new Subject(flat, 1), Effort.STANDARD)
				.verdict());
	}

	@Test
	void limitTouchedInsideABandIsMet() {
		// Gain cos^2(2w) + 0: largest value 1 at 0, 1/4 and 1/2.
		ExactTaps taps = ExactTaps.ofDoubles(0.25, 0, 0, 0, 0.5, 0, 0, 0, 0.25);
		Proof proof = GainLimit.atMost(0.2, 0.3, 0).prove(new Subject(taps, 1), Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(0.25, proof.worst());
		assertEquals(Verdict.MISSED, GainLimit.atLeast(0.2, 0.3, 0).prove(new Subject(taps, 1), Effort.STANDARD)
				.verdict());
	}

	@Test
	void pureDelayHasExactlyUnitGainEverywhere() {
		Subject delay = new Subject(ExactTaps.ofDoubles(0, 0, 1, 0), 8000);
		assertEquals(Verdict.MET, GainLimit.between(0, 4000, 0, 0).prove(delay, Effort.STANDARD).verdict());
		assertEquals(Verdict.MISSED, GainLimit.atLeast(0, 4000, 1e-20).prove(delay, Effort.STANDARD).verdict());
	}

	@Test
	void gainCanBeForbiddenAltogether() {
		GainLimit nothing = GainLimit.atMost(0.1, 0.2, NONE);
		assertEquals(Verdict.MISSED, nothing.prove(average(3), Effort.STANDARD).verdict());
		assertEquals(Verdict.MET, nothing.prove(new Subject(ExactTaps.ofDoubles(0, 0), 1), Effort.STANDARD).verdict());
	}

	@Test
	void zeroOfTheResponseMissesEveryLowerLimit() {
		Proof proof = GainLimit.atLeast(0.3, 0.4, -3000).prove(average(3), Effort.STANDARD);
		assertEquals(Verdict.MISSED, proof.verdict());
		assertEquals(Double.NEGATIVE_INFINITY, proof.value().lo());
		assertEquals(1 / 3.0, proof.worst(), 1e-3);
	}

	@Test
	void limitsRelativeToTheOwnGainDoNotSeeScale() {
		double[] taps = HardCases.kaiserSinc(41, 0.15, 6);
		double[] huge = IntStream.range(0, taps.length).mapToDouble(k -> taps[k] * 0x1p900).toArray();
		GainLimit limit = new GainLimit(List.of(new Breakpoint(0, -0.1, 0.1), new Breakpoint(0.1, -0.1, 0.1)), false,
				new GainReference.AtFrequency(0));
		Proof plain = limit.prove(new Subject(ExactTaps.ofDoubles(taps), 1), Effort.STANDARD);
		Proof scaled = limit.prove(new Subject(ExactTaps.ofDoubles(huge), 1), Effort.STANDARD);
		assertEquals(Verdict.MET, plain.verdict());
		assertEquals(plain.verdict(), scaled.verdict());
		assertEquals(plain.value().middle(), scaled.value().middle(), 1e-9);
		GainLimit own = GainLimit.atMost(0, 0.1, 0).relativeTo(new GainReference.LargestIn(0, 0.5));
		assertEquals(Verdict.MET, own.prove(new Subject(ExactTaps.ofDoubles(taps), 1), Effort.STANDARD).verdict());
	}

	@Test
	void lineOfLimitsBendsAtItsBreakpoints() {
		// A pure delay has 0 dB everywhere: the upper line comes down to 0.5 dB at 100 Hz, straight in dB over log
		// frequency.
		GainLimit limit = new GainLimit(List.of(new Breakpoint(1, NONE, 4), new Breakpoint(100, NONE, 0.5),
				new Breakpoint(100, NONE, 3), new Breakpoint(1000, NONE, 1)), true, GainReference.ABSOLUTE);
		Proof proof = limit.prove(new Subject(ExactTaps.ofDoubles(1, 0), 2000), Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(100, proof.worst(), 1e-9);
		assertEquals(0.5, proof.margin().middle(), 1e-9);
	}

	@Test
	void timeLimitLeavesAnHonestAnswer() {
		Effort none = new Effort(Progress.NONE, Duration.ZERO);
		double[] taps = HardCases.kaiserSinc(200, 0.15, 6);
		Proof proof = GainLimit.atMost(0.3, 0.5, -380).prove(new Subject(ExactTaps.ofDoubles(taps), 1), none);
		Proof certain = GainLimit.atMost(0.3, 0.5, 0).prove(new Subject(ExactTaps.ofDoubles(taps), 1), none);
		assertEquals(Verdict.MISSED, proof.verdict());
		assertEquals(Verdict.MET, certain.verdict());
	}

	@Test
	void nonsenseIsRefusedWithAReason() {
		assertThrows(IllegalArgumentException.class, () -> GainLimit.atMost(2, 1, 0));
		assertThrows(IllegalArgumentException.class, () -> GainLimit.atMost(-1, 1, 0));
		assertThrows(IllegalArgumentException.class, () -> GainLimit.between(0, 1, 1, 0));
		assertThrows(IllegalArgumentException.class, () -> GainLimit.between(0, 1, NONE, Double.POSITIVE_INFINITY));
		assertThrows(IllegalArgumentException.class, () -> GainLimit.atMost(0, 1, Double.NaN));
		String message = assertThrows(IllegalArgumentException.class,
				() -> GainLimit.atMost(0, 501, 0).prove(new Subject(ExactTaps.ofDoubles(1), 1000), Effort.STANDARD))
						.getMessage();
		assertTrue(message.contains("501") && message.contains("1000"), message);
	}

	@Test
	void proofsAreTheSameOnEveryThread() {
		List<Subject> subjects = IntStream.range(10, 60)
				.mapToObj(n -> new Subject(ExactTaps.ofDoubles(HardCases.kaiserSinc(n, 0.2, 5)), 1)).toList();
		GainLimit limit = GainLimit.between(0, 0.1, -0.1, 0.1);
		List<Proof> alone = subjects.stream().map(subject -> limit.prove(subject, Effort.STANDARD)).toList();
		List<Proof> together = subjects.parallelStream().map(subject -> limit.prove(subject, Effort.STANDARD)).toList();
		assertEquals(alone, together);
	}

	private static Subject average(int n) {
		return new Subject(ExactTaps.ofIntegers(Collections.nCopies(n, BigInteger.ONE), new BigFraction(1, n)), 1);
	}
}
