// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;

import org.junit.jupiter.api.Test;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;

/** Overflow and noise requirements on a sum of four equal coefficients that can be worked out by hand. */
class ArithmeticKindsTest {

	@Test
	void fourFullScaleSamplesNeedTwoMoreBits() {
		assertEquals(Verdict.MET, new NoOverflow(NoOverflow.Input.ANY).prove(sum(10, 10), Effort.STANDARD).verdict());
		Proof missed = new NoOverflow(NoOverflow.Input.ANY).prove(sum(9, 9), Effort.STANDARD);
		assertEquals(Verdict.MISSED, missed.verdict());
		assertTrue(missed.margin().hi() < 0 && missed.margin().lo() >= -20 * Math.log10(2) - 0.1);
		Proof sinusoids = new NoOverflow(NoOverflow.Input.SINUSOID).prove(sum(9, 9), Effort.STANDARD);
		assertTrue(sinusoids.verdict() != Verdict.MET);
		assertThrows(IllegalArgumentException.class, () -> new NoOverflow(NoOverflow.Input.ANY)
				.prove(new Subject(ExactTaps.ofDoubles(1), 1), Effort.STANDARD));
	}

	@Test
	void nothingIsRoundedWhenTheOutputKeepsAllBits() {
		Proof proof = new OutputNoise(-1000).prove(sum(10, 10), Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(Double.POSITIVE_INFINITY, proof.margin().hi());
	}

	// One rounding of many bits to a step q adds q^2/12: -10 log10(12 * 4^(bits-1)) dB relative to full scale.
	@Test
	void oneRoundingAddsATwelfthOfItsSquaredStep() {
		Arithmetic arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(new NumberFormat(24, 23)),
				Optional.of(new NumberFormat(24, 23)), Optional.empty(), Optional.of(new NumberFormat(60, 46)),
				Optional.of(new NumberFormat(8, 7)), Rounding.HALF_EVEN, Overflow.SATURATE);
		Subject subject = new Subject(ExactTaps.ofDoubles(0.25 + 0x1p-23, 0.5 + 0x1p-22), 1, Optional.of(arithmetic));
		double expected = -10 * Math.log10(12 * Math.pow(4, 7));
		Proof proof = new OutputNoise(expected + 0.01).prove(subject, Effort.STANDARD);
		assertEquals(Verdict.MET, proof.verdict());
		assertEquals(expected, proof.value().middle(), 0.001);
		assertEquals(Verdict.MISSED, new OutputNoise(expected - 0.01).prove(subject, Effort.STANDARD).verdict());
	}

	private static Subject sum(int accumulator, int output) {
		Arithmetic arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(new NumberFormat(8, 0)),
				Optional.of(new NumberFormat(8, 0)), Optional.empty(), Optional.of(new NumberFormat(accumulator, 0)),
				Optional.of(new NumberFormat(output, 0)), Rounding.HALF_EVEN, Overflow.SATURATE);
		return new Subject(ExactTaps.ofDoubles(1, 1, 1, 1), 1, Optional.of(arithmetic));
	}
}
