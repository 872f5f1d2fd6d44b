// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;

import org.apache.commons.math3.fraction.BigFraction;

/** Exact conversions between rationals and doubles. */
public final class Rationals {

	private Rationals() {
	}

	/**
	 * The double nearest to numerator / denominator, ties to even; infinite when it is beyond the largest double.
	 *
	 * @param denominator
	 *            positive
	 */
	public static double nearest(BigInteger numerator, BigInteger denominator) {
		if (numerator.signum() == 0) {
			return 0;
		}
		// 64 quotient bits and a sticky bit leave the one rounding to BigDecimal.doubleValue, which is correctly
		// rounded.
		BigInteger magnitude = numerator.abs();
		int shift = 66 - (magnitude.bitLength() - denominator.bitLength());
		BigInteger scaled = shift >= 0 ? magnitude.shiftLeft(shift) : magnitude;
		BigInteger divisor = shift >= 0 ? denominator : denominator.shiftLeft(-shift);
		BigInteger[] quotient = scaled.divideAndRemainder(divisor);
		BigInteger sticky = quotient[0].shiftLeft(1);
		if (quotient[1].signum() != 0) {
			sticky = sticky.setBit(0);
		}
		int exponent = -shift - 1;
		BigDecimal exact = exponent >= 0 ? new BigDecimal(sticky.shiftLeft(exponent))
				: new BigDecimal(sticky).divide(new BigDecimal(BigInteger.ONE.shiftLeft(-exponent)));
		double value = exact.doubleValue();
		return numerator.signum() < 0 ? -value : value;
	}

	/** The double nearest to the rational, ties to even. */
	public static double nearest(BigFraction value) {
		return nearest(value.getNumerator(), value.getDenominator());
	}

	/** The largest double that is not above the rational. */
	public static double below(BigFraction value) {
		double near = nearest(value);
		return Double.isInfinite(near) ? near > 0 ? Double.MAX_VALUE : near
				: exact(near).compareTo(value) <= 0 ? near : Math.nextDown(near);
	}

	/** The smallest double that is not below the rational. */
	public static double above(BigFraction value) {
		// Adding zero turns -0.0 into 0.0.
		return -below(value.negate()) + 0.0;
	}

	/**
	 * The finite double as the rational that it is.
	 *
	 * @throws IllegalArgumentException
	 *             when the value is NaN or infinite
	 */
	public static BigFraction exact(double value) {
		ExactTaps one = ExactTaps.ofDoubles(value);
		return one.tap(0);
	}

	/** The rational as a decimal with the given number of significant digits, rounded half even. */
	public static BigDecimal decimal(BigFraction value, int digits) {
		return new BigDecimal(value.getNumerator()).divide(new BigDecimal(value.getDenominator()),
				new MathContext(digits, RoundingMode.HALF_EVEN));
	}
}
