// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * The coefficients h[0..N-1] of a finite impulse response as exact rationals: integers times one common positive unit. This is
 * what every proof speaks of. Immutable.
 */
public final class ExactTaps {

	private static final int MANTISSA_BITS = 52;

	private final BigInteger[] integers;
	private final BigFraction unit;

	private ExactTaps(BigInteger[] integers, BigFraction unit) {
		if (integers.length == 0) {
			throw new IllegalArgumentException("a filter needs at least one coefficient");
		}
		this.integers = integers;
		this.unit = unit;
	}

	/**
	 * Takes each double as the rational that it is.
	 *
	 * @throws IllegalArgumentException
	 *             when there is no coefficient, or one is NaN or infinite
	 */
	public static ExactTaps ofDoubles(double... taps) {
		int exponent = Integer.MAX_VALUE;
		for (int k = 0; k < taps.length; k++) {
			if (!Double.isFinite(taps[k])) {
				throw new IllegalArgumentException("coefficient " + k + " is " + taps[k] + "; it must be a finite number");
			}
			if (taps[k] != 0) {
				exponent = Math.min(exponent, lowestExponent(taps[k]));
			}
		}
		int unitExponent = exponent == Integer.MAX_VALUE ? 0 : exponent;
		BigInteger[] integers = Arrays.stream(taps).mapToObj(tap -> significand(tap).shiftLeft(
				tap == 0 ? 0 : lowestExponent(tap) - unitExponent)).toArray(BigInteger[]::new);
		return new ExactTaps(integers, powerOfTwo(unitExponent));
	}

	/**
	 * Integers times an exact unit.
	 *
	 * @param unit
	 *            what one step of the integers is worth; positive
	 * @throws IllegalArgumentException
	 *             when there is no coefficient or the unit is not positive
	 */
	public static ExactTaps ofIntegers(List<BigInteger> integers, BigFraction unit) {
		if (unit.compareTo(BigFraction.ZERO) <= 0) {
			throw new IllegalArgumentException("the scale of integer coefficients is " + unit + "; it must be positive");
		}
		return new ExactTaps(integers.toArray(BigInteger[]::new), unit);
	}

	/** Two to the given power, exactly. */
	public static BigFraction powerOfTwo(int exponent) {
		return exponent >= 0 ? new BigFraction(BigInteger.ONE.shiftLeft(exponent))
				: new BigFraction(BigInteger.ONE, BigInteger.ONE.shiftLeft(-exponent));
	}

	/** Number of coefficients N, at least 1. */
	public int length() {
		return integers.length;
	}

	/** The integer that times {@link #unit()} gives coefficient k. */
	public BigInteger integer(int k) {
		return integers[k];
	}

	/** What one step of the integers is worth. */
	public BigFraction unit() {
		return unit;
	}

	/** Coefficient k, exactly. */
	public BigFraction tap(int k) {
		return unit.multiply(integers[k]);
	}

	/** The coefficients rounded to nearest doubles; a new array. */
	public double[] toDoubles() {
		double[] taps = new double[integers.length];
		for (int k = 0; k < taps.length; k++) {
			taps[k] = Rationals.nearest(integers[k].multiply(unit.getNumerator()), unit.getDenominator());
		}
		return taps;
	}

	/** The exact symmetry; a set of zeros counts as even. */
	public Symmetry symmetry() {
		boolean even = true;
		boolean odd = true;
		for (int k = 0, mirror = integers.length - 1; k <= mirror; k++, mirror--) {
			even &= integers[k].equals(integers[mirror]);
			odd &= integers[k].equals(integers[mirror].negate());
		}
		return even ? Symmetry.EVEN : odd ? Symmetry.ODD : Symmetry.NONE;
	}

	/** The cascade of two filters: exact convolution. */
	public ExactTaps convolve(ExactTaps other) {
		BigInteger[] product = new BigInteger[integers.length + other.integers.length - 1];
		Arrays.fill(product, BigInteger.ZERO);
		for (int i = 0; i < integers.length; i++) {
			for (int k = 0; k < other.integers.length; k++) {
				product[i + k] = product[i + k].add(integers[i].multiply(other.integers[k]));
			}
		}
		return new ExactTaps(product, unit.multiply(other.unit));
	}

	/** Inserts {@code factor - 1} zeros between coefficients: the filter seen at {@code factor} times its rate. */
	public ExactTaps upsample(int factor) {
		if (factor < 1) {
			throw new IllegalArgumentException("the rate factor is " + factor + "; it must be at least 1");
		}
		BigInteger[] spread = new BigInteger[(integers.length - 1) * factor + 1];
		Arrays.fill(spread, BigInteger.ZERO);
		for (int k = 0; k < integers.length; k++) {
			spread[k * factor] = integers[k];
		}
		return new ExactTaps(spread, unit);
	}

	@Override
	public boolean equals(Object other) {
		if (!(other instanceof ExactTaps taps) || taps.length() != length()) {
			return false;
		}
		for (int k = 0; k < integers.length; k++) {
			if (!tap(k).equals(taps.tap(k))) {
				return false;
			}
		}
		return true;
	}

	@Override
	public int hashCode() {
		return Arrays.hashCode(toDoubles());
	}

	@Override
	public String toString() {
		return Arrays.toString(integers) + " * " + unit;
	}

	// Exponent of the last bit of a nonzero finite double's significand.
	private static int lowestExponent(double value) {
		return Math.max(Math.getExponent(value), Double.MIN_EXPONENT) - MANTISSA_BITS;
	}

	private static BigInteger significand(double value) {
		long bits = Double.doubleToRawLongBits(value);
		long fraction = bits & ((1L << MANTISSA_BITS) - 1);
		long magnitude = Math.getExponent(value) < Double.MIN_EXPONENT ? fraction : fraction | 1L << MANTISSA_BITS;
		return BigInteger.valueOf(bits < 0 ? -magnitude : magnitude);
	}
}
