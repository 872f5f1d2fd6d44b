// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.exact.Symmetry;

class NumberFormatTest {

	private static final NumberFormat Q15 = new NumberFormat(16, 15);

	/** Two's complement arithmetic. */
	@Test
	void sixteenBitsWithFifteenAfterThePointReachFromMinusOneToOneStepBelowOne() {
		assertEquals(BigFraction.MINUS_ONE, Q15.minValue());
		assertEquals(new BigFraction(32767, 32768), Q15.maxValue());
		assertEquals(new BigFraction(1, 32768), Q15.step());
	}

	/** Two's complement arithmetic. */
	@Test
	void unsignedWordsReachFromZero() {
		NumberFormat bytes = new NumberFormat(8, 0, false);
		assertEquals(BigInteger.ZERO, bytes.min());
		assertEquals(BigInteger.valueOf(255), bytes.max());
		assertEquals(BigInteger.valueOf(4), bytes.fit(BigInteger.valueOf(260), Overflow.WRAP));
		assertEquals(BigInteger.valueOf(255), bytes.fit(BigInteger.valueOf(-1), Overflow.WRAP));
		assertEquals(BigInteger.ZERO, bytes.fit(BigInteger.valueOf(-1), Overflow.SATURATE));
	}

	/** Reference: the narrowing conversion to short of the Java Language Specification, 5.1.3. */
	@Test
	void wrappingToSixteenBitsIsTheNarrowingConversion() {
		Random random = new Random(1);
		NumberFormat shorts = new NumberFormat(16, 0);
		for (int n = 0; n < 1000; n++) {
			long value = random.nextLong() >> random.nextInt(64);
			assertEquals(BigInteger.valueOf((short) value), shorts.fit(BigInteger.valueOf(value), Overflow.WRAP));
		}
	}

	/** Reference: java.math.BigDecimal, whose HALF_UP is our half away; half up is the floor of the value plus one half. */
	@ParameterizedTest
	@EnumSource(Rounding.class)
	void roundsAsBigDecimalDoes(Rounding rounding) {
		for (int eighths = -40; eighths <= 40; eighths++) {
			BigDecimal value = BigDecimal.valueOf(eighths).divide(BigDecimal.valueOf(8));
			BigDecimal expected = switch (rounding) {
			case TOWARD_ZERO -> value.setScale(0, RoundingMode.DOWN);
			case FLOOR -> value.setScale(0, RoundingMode.FLOOR);
			case HALF_UP -> value.add(new BigDecimal("0.5")).setScale(0, RoundingMode.FLOOR);
			case HALF_EVEN -> value.setScale(0, RoundingMode.HALF_EVEN);
			case HALF_AWAY -> value.setScale(0, RoundingMode.HALF_UP);
			};
			assertEquals(expected.toBigInteger(), rounding.divide(BigInteger.valueOf(eighths), BigInteger.valueOf(8)));
		}
		assertEquals(BigInteger.valueOf(-1), rounding.divide(BigInteger.valueOf(-3), BigInteger.valueOf(3)));
	}

	/** Basic operators mult and mult_r of ITU-T G.191, their semantics recalled from memory. */
	@ParameterizedTest
	@CsvSource({ "16384, 16384, FLOOR, 8192", "3, 16384, FLOOR, 1", "3, 16384, HALF_UP, 2", "-3, 16384, FLOOR, -2",
			"-3, 16384, HALF_UP, -1", "-32768, -32768, FLOOR, 32767" })
	void fractionalProductsEqualTheBasicOperators(long a, long b, Rounding rounding, long expected) {
		BigFraction product = new BigFraction(a * b, 1L << 30);
		assertEquals(BigInteger.valueOf(expected), Q15.quantize(product, rounding, Overflow.SATURATE));
	}

	@Test
	void stepsMayBeLargerThanOneOrMuchSmaller() {
		NumberFormat thousands = new NumberFormat(8, -10);
		assertEquals(BigInteger.valueOf(3), thousands.quantize(new BigFraction(3 * 1024 + 511), Rounding.HALF_UP, Overflow.WRAP));
		NumberFormat tiny = new NumberFormat(8, 40);
		assertEquals(BigInteger.valueOf(5),
				tiny.quantize(ExactTaps.powerOfTwo(-40).multiply(5), Rounding.TOWARD_ZERO, Overflow.WRAP));
	}

	@Test
	void nearestCoefficientsKeepOddSymmetryAtTheEndOfTheRange() {
		ExactTaps rounded = Q15.nearest(ExactTaps.ofDoubles(-1, 0.3, -0.3, 1));
		assertEquals(Symmetry.ODD, rounded.symmetry());
		assertEquals(BigInteger.valueOf(-32767), rounded.integer(0));
		assertTrue(Q15.contains(rounded));
		assertFalse(Q15.contains(ExactTaps.ofDoubles(1)));
		assertFalse(Q15.contains(ExactTaps.ofDoubles(0x1p-16)));
	}

	@Test
	void refusesImpossibleSizes() {
		assertThrows(IllegalArgumentException.class, () -> new NumberFormat(0, 0));
		assertThrows(IllegalArgumentException.class, () -> new NumberFormat(129, 0));
		assertThrows(IllegalArgumentException.class, () -> new NumberFormat(16, 1001));
	}

	/** Reference: the conversions of the Java platform, which follow IEEE 754. */
	@Test
	void floatingFormatsRoundAsThePlatformDoes() {
		Random random = new Random(2);
		for (int n = 0; n < 2000; n++) {
			double value = (random.nextDouble() - 0.5) * Math.scalb(1, random.nextInt(40) - 30);
			BigFraction exact = Rationals.exact(value);
			float single = (float) value;
			assertEquals(Rationals.exact(single),
					FloatFormat.SINGLE.represent(exact, Rounding.HALF_EVEN, Overflow.SATURATE));
			float half = Float.float16ToFloat(Float.floatToFloat16(single));
			assertEquals(Rationals.exact(half),
					FloatFormat.HALF.represent(Rationals.exact(single), Rounding.HALF_EVEN, Overflow.SATURATE));
		}
		assertEquals(new BigFraction(65504), FloatFormat.HALF.maxValue());
		assertEquals(Rationals.exact(Float.MAX_VALUE), FloatFormat.SINGLE.maxValue());
		assertEquals(Rationals.exact(Float.MIN_VALUE), FloatFormat.SINGLE.step(BigFraction.ZERO));
	}

	@Test
	void coefficientsThatAreSinglesStayAsTheyAre() {
		ExactTaps taps = ExactTaps.ofDoubles(0.1f, -0.25f, 0, 3e-20f);
		assertEquals(taps, FloatFormat.SINGLE.nearest(taps));
		assertArrayEquals(new double[] { 0.1f, 0.2f }, FloatFormat.SINGLE.nearest(ExactTaps.ofDoubles(0.1, 0.2)).toDoubles());
	}
}
