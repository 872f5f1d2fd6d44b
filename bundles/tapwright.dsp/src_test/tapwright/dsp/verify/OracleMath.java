// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Decimal arithmetic for judging proofs, by other methods than the product's: pi by the arithmetic-geometric mean (C.
 * F. Gauss, A.-M. Legendre; R. Brent 1976), the cosine by its series and repeated doubling, logarithms after repeated
 * square roots.
 */
public final class OracleMath {

	/** Working precision. */
	public static final MathContext DIGITS = new MathContext(90, RoundingMode.HALF_EVEN);
	/** The number pi. */
	public static final BigDecimal PI = pi();
	private static final BigDecimal LN10 = ln(BigDecimal.TEN);
	private static final int HALVINGS = 20;

	private OracleMath() {
	}

	/** Cosine of an angle in radians. */
	public static BigDecimal cos(BigDecimal angle) {
		BigDecimal small = angle.divide(BigDecimal.TWO.pow(HALVINGS), DIGITS);
		BigDecimal square = small.multiply(small, DIGITS);
		BigDecimal term = BigDecimal.ONE;
		BigDecimal sum = BigDecimal.ONE;
		for (int k = 2; term.signum() != 0 && term.precision() - term.scale() > -110; k += 2) {
			term = term.multiply(square, DIGITS).divide(BigDecimal.valueOf((long) k * (k - 1)), DIGITS).negate();
			sum = sum.add(term, DIGITS);
		}
		for (int k = 0; k < HALVINGS; k++) {
			sum = sum.multiply(sum, DIGITS).multiply(BigDecimal.TWO).subtract(BigDecimal.ONE, DIGITS);
		}
		return sum;
	}

	/** Decimal logarithm of a positive number. */
	public static BigDecimal log10(BigDecimal x) {
		int digits = x.precision() - x.scale();
		return ln(x.scaleByPowerOfTen(-digits)).divide(LN10, DIGITS).add(BigDecimal.valueOf(digits), DIGITS);
	}

	private static BigDecimal ln(BigDecimal x) {
		int roots = 30;
		BigDecimal near = x;
		for (int k = 0; k < roots; k++) {
			near = near.sqrt(new MathContext(110));
		}
		MathContext wide = new MathContext(110);
		BigDecimal y = near.subtract(BigDecimal.ONE).divide(near.add(BigDecimal.ONE), wide);
		BigDecimal square = y.multiply(y, wide);
		BigDecimal power = y;
		BigDecimal sum = y;
		for (int k = 3; k < 20; k += 2) {
			power = power.multiply(square, wide);
			sum = sum.add(power.divide(BigDecimal.valueOf(k), wide), wide);
		}
		return sum.multiply(BigDecimal.TWO.pow(roots + 1), wide);
	}

	private static BigDecimal pi() {
		MathContext wide = new MathContext(110);
		BigDecimal a = BigDecimal.ONE;
		BigDecimal b = BigDecimal.ONE.divide(BigDecimal.TWO.sqrt(wide), wide);
		BigDecimal t = new BigDecimal("0.25");
		BigDecimal p = BigDecimal.ONE;
		for (int k = 0; k < 8; k++) {
			BigDecimal next = a.add(b).divide(BigDecimal.TWO, wide);
			b = a.multiply(b, wide).sqrt(wide);
			BigDecimal step = a.subtract(next);
			t = t.subtract(p.multiply(step.multiply(step, wide), wide), wide);
			p = p.multiply(BigDecimal.TWO);
			a = next;
		}
		BigDecimal sum = a.add(b);
		return sum.multiply(sum, wide).divide(t.multiply(BigDecimal.valueOf(4)), wide);
	}
}
