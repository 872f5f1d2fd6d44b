// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;

/** Counts follow from drawing the structure and counting its parts. */
class CostTest {

	private static final ExactTaps SEVEN = ExactTaps.ofDoubles(1, 2, 3, 4, 3, 2, 1);
	private static final ExactTaps HALF_BAND = ExactTaps.ofDoubles(-1, 0, 9, 16, 9, 0, -1);

	@Test
	void directNeedsOneMultiplierPerCoefficient() {
		Cost cost = Cost.of(SEVEN, Arithmetic.exact(Structure.DIRECT, 1));
		assertEquals(7, cost.multiplies());
		assertEquals(6, cost.adds());
		assertEquals(7, cost.coefficientWords());
		assertEquals(6, cost.delayWords());
		assertEquals(6, cost.adderDepth());
		assertEquals(new BigFraction(3), cost.groupDelay().orElseThrow());
		assertEquals(7 * 48000.0, cost.multipliesPerSecond(48000));
	}

	@Test
	void foldingHalvesTheMultipliersAndKeepsTheAdders() {
		Cost odd = Cost.of(SEVEN, Arithmetic.exact(Structure.FOLDED, 1));
		assertEquals(4, odd.multiplies());
		assertEquals(6, odd.adds());
		assertEquals(4, odd.coefficientWords());
		Cost even = Cost.of(ExactTaps.ofDoubles(1, 2, -2, -1), Arithmetic.exact(Structure.FOLDED, 1));
		assertEquals(2, even.multiplies());
		assertEquals(3, even.adds());
		assertEquals(1, Cost.of(ExactTaps.ofDoubles(1, 0, -1), Arithmetic.exact(Structure.FOLDED, 1)).multiplies());
	}

	@Test
	void transposedHasOneAdderBetweenRegisters() {
		Cost cost = Cost.of(SEVEN, Arithmetic.exact(Structure.TRANSPOSED, 1));
		assertEquals(7, cost.multiplies());
		assertEquals(1, cost.adderDepth());
	}

	@Test
	void halfBandSkipsItsZeros() {
		Cost cost = Cost.of(HALF_BAND, Arithmetic.exact(Structure.HALF_BAND, 1));
		assertEquals(3, cost.multiplies());
		assertEquals(4, cost.adds());
		assertEquals(1.5 * 8000, Cost.of(HALF_BAND, Arithmetic.exact(Structure.HALF_BAND, 2)).multipliesPerSecond(8000));
	}

	@Test
	void polyphaseDecimatorWorksOncePerOutput() {
		Cost cost = Cost.of(SEVEN, Arithmetic.exact(Structure.POLYPHASE_DECIMATOR, 4));
		assertEquals(7, cost.multiplies());
		assertEquals(7 * 1000.0, cost.multipliesPerSecond(4000));
		assertEquals(4, cost.inputs());
	}

	@Test
	void polyphaseInterpolatorKeepsOneLthOfTheSamples() {
		Cost cost = Cost.of(SEVEN, Arithmetic.exact(Structure.POLYPHASE_INTERPOLATOR, 3));
		assertEquals(7, cost.multiplies());
		assertEquals(4, cost.adds());
		assertEquals(2, cost.delayWords());
		assertEquals(new BigFraction(7, 3), cost.multipliesPerOutput());
	}

	@Test
	void cascadeCountsEveryStageAtItsOwnRate() {
		Cost decimator = Cost.of(SEVEN, Arithmetic.exact(Structure.POLYPHASE_DECIMATOR, 4));
		Cost direct = Cost.of(SEVEN, Arithmetic.exact(Structure.DIRECT, 1));
		Cost interpolator = Cost.of(SEVEN, Arithmetic.exact(Structure.POLYPHASE_INTERPOLATOR, 3));
		assertEquals(new Cost(4, 1, 14, 12, 14, 12, 6, Optional.empty()), Cost.cascade(List.of(decimator, direct)));
		Cost rational = Cost.cascade(List.of(interpolator, decimator));
		assertEquals(4, rational.inputs());
		assertEquals(3, rational.outputs());
		assertEquals(4 * 7 + 3 * 7, rational.multiplies());
		assertEquals(new BigFraction(6), Cost.cascade(List.of(direct, direct)).groupDelay().orElseThrow());
	}

	@Test
	void refusesCoefficientsThatTheStructureCannotRun() {
		ExactTaps lopsided = ExactTaps.ofDoubles(1, 2, 4);
		assertThrows(IllegalArgumentException.class, () -> Cost.of(lopsided, Arithmetic.exact(Structure.FOLDED, 1)));
		assertThrows(IllegalArgumentException.class, () -> Cost.of(SEVEN, Arithmetic.exact(Structure.HALF_BAND, 1)));
		assertThrows(IllegalArgumentException.class, () -> Arithmetic.exact(Structure.DIRECT, 2));
		assertThrows(IllegalArgumentException.class, () -> Arithmetic.exact(Structure.POLYPHASE_DECIMATOR, 0));
	}
}
