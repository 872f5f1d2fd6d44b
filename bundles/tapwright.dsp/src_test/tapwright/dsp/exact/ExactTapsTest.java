// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** Coefficients as the rationals that they are. */
class ExactTapsTest {

	@Test
	void doublesAreTakenExactly() {
		double[] values = { 0.1, -Double.MIN_VALUE, Double.MAX_VALUE, 0, 3, Math.PI, -1e-300 };
		ExactTaps taps = ExactTaps.ofDoubles(values);
		for (int k = 0; k < values.length; k++) {
			BigFraction tap = taps.tap(k);
			BigDecimal exact = new BigDecimal(values[k]);
			assertEquals(0, exact.multiply(new BigDecimal(tap.getDenominator()))
					.compareTo(new BigDecimal(tap.getNumerator())));
		}
		assertArrayEquals(values, taps.toDoubles());
	}

	@Test
	void scaledDoublesAreWithinTheirBound() {
		List<BigInteger> integers = List.of(new BigInteger("123456789012345678901234567890"), BigInteger.ONE,
				BigInteger.ZERO,
				new BigInteger("-99999999999999999999"));
		for (BigFraction unit : List.of(BigFraction.ONE, new BigFraction(1, 3), ExactTaps.powerOfTwo(-2000),
				ExactTaps.powerOfTwo(1500))) {
			checkScaled(ExactTaps.ofIntegers(integers, unit));
		}
		checkScaled(ExactTaps.ofDoubles(1e-310, 3e-308, 0));
		checkScaled(ExactTaps.ofDoubles(1e300, 1e-300, -1e-320));
		checkScaled(ExactTaps.ofDoubles(0.25, -0.5));
	}

	private static void checkScaled(ExactTaps taps) {
		ExactTaps.Scaled scaled = taps.scaled();
		double largest = 0;
		for (int k = 0; k < taps.length(); k++) {
			double value = scaled.values()[k];
			largest = Math.max(largest, Math.abs(value));
			BigFraction exact = taps.tap(k).multiply(ExactTaps.powerOfTwo(-scaled.exponent()));
			BigFraction error = Rationals.exact(value).subtract(exact).abs();
			BigFraction bound = exact.abs().multiply(ExactTaps.powerOfTwo(-53)).add(ExactTaps.powerOfTwo(-1074));
			assertTrue(error.compareTo(bound) <= 0, taps + " coefficient " + k);
		}
		assertTrue(largest > 0x1p-62 && largest < 0x1p62, "largest " + largest);
	}

	@Test
	void symmetryIsSeenExactly() {
		assertEquals(Symmetry.EVEN, ExactTaps.ofDoubles(1, 2, 1).symmetry());
		assertEquals(Symmetry.ODD, ExactTaps.ofDoubles(1, 0, -1).symmetry());
		assertEquals(Symmetry.NONE, ExactTaps.ofDoubles(1, 0x1p-1074, -1).symmetry());
		assertEquals(Symmetry.NONE, ExactTaps.ofDoubles(1, 2, Math.nextUp(1.0)).symmetry());
		assertEquals(Symmetry.ODD, ExactTaps.ofIntegers(List.of(BigInteger.TWO, BigInteger.TWO.negate()),
				BigFraction.ONE).symmetry());
	}

	@Test
	void cascadeIsTheExactConvolution() {
		ExactTaps average = ExactTaps.ofIntegers(List.of(BigInteger.ONE, BigInteger.ONE), BigFraction.ONE_HALF);
		assertEquals(ExactTaps.ofDoubles(0.25, 0.5, 0.25), average.convolve(average));
		assertEquals(ExactTaps.ofDoubles(0.5, 0, 0.5), average.upsample(2));
		assertTrue(ExactTaps.ofDoubles(0, -0.0).isZero());
	}

	@Test
	void whatIsNoNumberIsRefused() {
		assertThrows(IllegalArgumentException.class, ExactTaps::ofDoubles);
		assertThrows(IllegalArgumentException.class, () -> ExactTaps.ofDoubles(1, Double.NaN));
		assertThrows(IllegalArgumentException.class, () -> ExactTaps.ofDoubles(Double.POSITIVE_INFINITY));
		assertThrows(IllegalArgumentException.class, () -> ExactTaps.ofIntegers(List.of(BigInteger.ONE),
				BigFraction.ZERO));
	}
}
