// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

import tapwright.dsp.verify.OracleMath;

/** Enclosures against decimal arithmetic by other methods. */
class FixedPointTest {

	private static final int[] PRECISIONS = { 20, 64, 200 };

	private final Random random = new Random(3);

	@Test
	void constantsAreEnclosed() {
		for (int bits : PRECISIONS) {
			FixedPoint fix = new FixedPoint(bits);
			check(fix, fix.pi(), OracleMath.PI, 2000);
			BigDecimal log2 = OracleMath.log10(BigDecimal.TWO);
			check(fix, fix.divide(fix.ln2(), fix.ln10()), log2, 2000);
		}
	}

	@Test
	void cosinesAndSinesOfRationalTurnsAreEnclosed() {
		for (int bits : PRECISIONS) {
			FixedPoint fix = new FixedPoint(bits);
			for (int k = 0; k < 200; k++) {
				int denominator = 1 + random.nextInt(1000);
				BigFraction turns = new BigFraction(random.nextInt(3 * denominator), denominator);
				BigDecimal angle = new BigDecimal(turns.getNumerator()).multiply(BigDecimal.TWO).multiply(OracleMath.PI)
						.divide(new BigDecimal(turns.getDenominator()), OracleMath.DIGITS);
				FixedPoint.CosSin pair = fix.cosSin(turns);
				check(fix, pair.cos(), OracleMath.cos(angle), 2000);
				BigDecimal quarter = OracleMath.PI.divide(BigDecimal.TWO, OracleMath.DIGITS);
				check(fix, pair.sin(), OracleMath.cos(angle.subtract(quarter)), 2000);
			}
		}
	}

	@Test
	void powersOfTenAndLogarithmsAreInverse() {
		for (int bits : PRECISIONS) {
			FixedPoint fix = new FixedPoint(bits);
			for (int k = 0; k < 100; k++) {
				BigFraction exponent = new BigFraction(random.nextInt(4001) - 2000, 1 + random.nextInt(900));
				if (Math.abs(exponent.doubleValue()) > bits / 8.0) {
					continue;
				}
				Interval power = fix.pow10(exponent);
				Interval back = fix.divide(fix.ln(power), fix.ln10());
				BigInteger exact = fix.of(exponent).lo();
				assertTrue(back.lo().compareTo(exact) <= 0 && back.hi().compareTo(exact) >= 0, exponent + " at "
						+ bits);
				BigDecimal middle = decimal(fix, power.middle());
				check(fix, back, OracleMath.log10(middle), 1L << Math.min(60, 16 + (int) Math.max(0,
						-3.4 * exponent.doubleValue())));
			}
		}
	}

	@Test
	void rootsAndQuotientsRoundOutward() {
		FixedPoint fix = new FixedPoint(64);
		Interval root = fix.sqrt(fix.of(2));
		assertEquals(BigInteger.ONE, root.hi().subtract(root.lo()));
		assertEquals(fix.of(3), fix.sqrt(fix.of(9)));
		Interval third = fix.divide(fix.of(-1), fix.of(3));
		assertTrue(third.lo().multiply(BigInteger.valueOf(3)).compareTo(fix.one().negate()) < 0);
		assertTrue(third.hi().multiply(BigInteger.valueOf(3)).compareTo(fix.one().negate()) > 0);
		assertThrows(ArithmeticException.class, () -> fix.divide(fix.of(1), fix.of(-1).hull(fix.of(1))));
		assertThrows(ArithmeticException.class, () -> fix.ln(Interval.ZERO));
	}

	private static void check(FixedPoint fix, Interval enclosure, BigDecimal truth, long widest) {
		BigDecimal doubt = new BigDecimal("1e-75");
		assertTrue(decimal(fix, enclosure.lo()).compareTo(truth.add(doubt)) <= 0, "low end " + fix.bits());
		assertTrue(decimal(fix, enclosure.hi()).compareTo(truth.subtract(doubt)) >= 0, "high end " + fix.bits());
		assertTrue(enclosure.hi().subtract(enclosure.lo()).compareTo(BigInteger.valueOf(widest)) <= 0,
				"width " + enclosure.hi().subtract(enclosure.lo()) + " at " + fix.bits());
	}

	private static BigDecimal decimal(FixedPoint fix, BigInteger multiple) {
		return new BigDecimal(multiple).divide(new BigDecimal(fix.one()));
	}
}
