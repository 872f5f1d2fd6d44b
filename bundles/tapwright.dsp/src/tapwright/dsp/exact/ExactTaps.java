// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * The coefficients h[0..N-1] of a finite impulse response as exact rationals: integers times one common positive
 * unit. This is what every proof speaks of. Immutable and thread-safe; integers are made from doubles only when they
 * are asked for, since most proofs end without them.
 */
public final class ExactTaps {

	private static final int MANTISSA_BITS = 52;

	/** Doubles of this range of exponents leave room for sums and products in either direction. */
	private static final int COMFORTABLE_EXPONENT = 60;

	private final int length;
	/** The coefficients when they were doubles, otherwise null. */
	private final double[] doubles;
	private volatile Integers integers;
	private volatile Scaled scaled;

	private record Integers(BigInteger[] values, BigFraction unit) {
	}

	/**
	 * Doubles near the coefficients.
	 *
	 * @param values
	 *            coefficient k over 2^exponent, off by at most 2^-53 of itself plus 2^-1074; the largest absolute
	 *            value lies between 2^-61 and 2^61 unless all are zero; do not change the array
	 * @param exponent
	 *            of the common factor
	 */
	public record Scaled(double[] values, int exponent) {
	}

	private ExactTaps(double[] doubles) {
		this.length = checkLength(doubles.length);
		this.doubles = doubles;
	}

	private ExactTaps(BigInteger[] integers, BigFraction unit) {
		this.length = checkLength(integers.length);
		this.doubles = null;
		this.integers = new Integers(integers, unit);
	}

	private static int checkLength(int length) {
		if (length == 0) {
			throw new IllegalArgumentException("a filter needs at least one coefficient");
		}
		return length;
	}

	/**
	 * Takes each double as the rational that it is.
	 *
	 * @throws IllegalArgumentException
	 *             when there is no coefficient, or one is NaN or infinite
	 */
	public static ExactTaps ofDoubles(double... taps) {
		for (int k = 0; k < taps.length; k++) {
			if (!Double.isFinite(taps[k])) {
				throw new IllegalArgumentException("coefficient " + k + " is " + taps[k]
						+ "; it must be a finite number");
			}
		}
		return new ExactTaps(taps.clone());
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
			throw new IllegalArgumentException("the scale of integer coefficients is " + unit
					+ "; it must be positive");
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
		return length;
	}

	/** The integer that times {@link #unit()} gives coefficient k. */
	public BigInteger integer(int k) {
		return integers().values[k];
	}

	/** What one step of the integers is worth. */
	public BigFraction unit() {
		return integers().unit;
	}

	/** Coefficient k, exactly. */
	public BigFraction tap(int k) {
		return unit().multiply(integer(k));
	}

	/** The coefficients rounded to nearest doubles; a new array. */
	public double[] toDoubles() {
		if (doubles != null) {
			return doubles.clone();
		}
		double[] taps = new double[length];
		for (int k = 0; k < length; k++) {
			taps[k] = Rationals.nearest(integer(k).multiply(unit().getNumerator()), unit().getDenominator());
		}
		return taps;
	}

	/** Doubles near the coefficients, scaled so that nothing overflows. */
	public Scaled scaled() {
		Scaled result = scaled;
		if (result == null) {
			result = doubles != null ? scaledDoubles() : scaledIntegers();
			scaled = result;
		}
		return result;
	}

	private Scaled scaledDoubles() {
		double largest = 0;
		for (double tap : doubles) {
			largest = Math.max(largest, Math.abs(tap));
		}
		int exponent = largest == 0 ? 0 : Math.getExponent(largest);
		if (Math.abs(exponent) <= COMFORTABLE_EXPONENT) {
			return new Scaled(doubles, 0);
		}
		// In two steps: a single factor of 2^1074 would overflow.
		return new Scaled(Arrays.stream(doubles).map(tap -> Math.scalb(Math.scalb(tap, -exponent / 2), -exponent
				+ exponent / 2))
				.toArray(), exponent);
	}

	private Scaled scaledIntegers() {
		BigFraction unit = unit();
		BigInteger largest = BigInteger.ZERO;
		for (BigInteger integer : integers.values) {
			largest = largest.max(integer.abs());
		}
		int exponent = largest.signum() == 0 ? 0
				: largest.bitLength() + unit.getNumerator().bitLength() - unit.getDenominator().bitLength();
		BigInteger factor = unit.getNumerator().shiftLeft(Math.max(-exponent, 0));
		BigInteger divisor = unit.getDenominator().shiftLeft(Math.max(exponent, 0));
		double[] values = new double[length];
		boolean quick = divisor.bitCount() == 1 && factor.bitCount() == 1 && largest.bitLength() <= MANTISSA_BITS;
		int shift = factor.bitLength() - divisor.bitLength();
		for (int k = 0; k < length; k++) {
			BigInteger integer = integers.values[k];
			values[k] = quick ? Math.scalb((double) integer.longValue(), shift)
					: Rationals.nearest(integer.multiply(factor), divisor);
		}
		return new Scaled(values, exponent);
	}

	/** Whether every coefficient is zero. */
	public boolean isZero() {
		for (int k = 0; k < length; k++) {
			if (doubles != null ? doubles[k] != 0 : integer(k).signum() != 0) {
				return false;
			}
		}
		return true;
	}

	/** The exact symmetry; a set of zeros counts as even. */
	public Symmetry symmetry() {
		boolean even = true;
		boolean odd = true;
		for (int k = 0, mirror = length - 1; k <= mirror && (even || odd); k++, mirror--) {
			if (doubles != null) {
				even &= doubles[k] == doubles[mirror];
				odd &= doubles[k] == -doubles[mirror];
			} else {
				even &= integer(k).equals(integer(mirror));
				odd &= integer(k).equals(integer(mirror).negate());
			}
		}
		return even ? Symmetry.EVEN : odd ? Symmetry.ODD : Symmetry.NONE;
	}

	/** The cascade of two filters: exact convolution. */
	public ExactTaps convolve(ExactTaps other) {
		BigInteger[] product = new BigInteger[length + other.length - 1];
		Arrays.fill(product, BigInteger.ZERO);
		for (int i = 0; i < length; i++) {
			for (int k = 0; k < other.length; k++) {
				product[i + k] = product[i + k].add(integer(i).multiply(other.integer(k)));
			}
		}
		return new ExactTaps(product, unit().multiply(other.unit()));
	}

	/** Inserts {@code factor - 1} zeros between coefficients: the filter seen at {@code factor} times its rate. */
	public ExactTaps upsample(int factor) {
		if (factor < 1) {
			throw new IllegalArgumentException("the rate factor is " + factor + "; it must be at least 1");
		}
		BigInteger[] spread = new BigInteger[(length - 1) * factor + 1];
		Arrays.fill(spread, BigInteger.ZERO);
		for (int k = 0; k < length; k++) {
			spread[k * factor] = integer(k);
		}
		return new ExactTaps(spread, unit());
	}

	@Override
	public boolean equals(Object other) {
		if (!(other instanceof ExactTaps taps) || taps.length() != length()) {
			return false;
		}
		for (int k = 0; k < length; k++) {
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
		return Arrays.toString(integers().values) + " * " + unit();
	}

	private Integers integers() {
		Integers result = integers;
		if (result == null) {
			int exponent = Integer.MAX_VALUE;
			for (double tap : doubles) {
				if (tap != 0) {
					exponent = Math.min(exponent, lowestExponent(tap));
				}
			}
			int unitExponent = exponent == Integer.MAX_VALUE ? 0 : exponent;
			result = new Integers(Arrays.stream(doubles).mapToObj(tap -> significand(tap)
					.shiftLeft(tap == 0 ? 0 : lowestExponent(tap) - unitExponent)).toArray(BigInteger[]::new),
					powerOfTwo(unitExponent));
			integers = result;
		}
		return result;
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
