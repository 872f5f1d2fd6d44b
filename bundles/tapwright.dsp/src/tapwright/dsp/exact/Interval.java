// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import java.math.BigInteger;

/**
 * A closed interval of multiples of a power of two; which power, its {@link FixedPoint} knows. It always contains the
 * true value that it stands for.
 *
 * @param lo
 *            lower end
 * @param hi
 *            upper end, not below {@code lo}
 */
public record Interval(BigInteger lo, BigInteger hi) {

	/** Zero. */
	public static final Interval ZERO = new Interval(BigInteger.ZERO, BigInteger.ZERO);

	/** Checks that the interval is not empty. */
	public Interval {
		if (lo.compareTo(hi) > 0) {
			throw new IllegalArgumentException("empty interval");
		}
	}

	/** Sum. */
	public Interval add(Interval other) {
		return new Interval(lo.add(other.lo), hi.add(other.hi));
	}

	/** Difference. */
	public Interval subtract(Interval other) {
		return new Interval(lo.subtract(other.hi), hi.subtract(other.lo));
	}

	/** Negative. */
	public Interval negate() {
		return new Interval(hi.negate(), lo.negate());
	}

	/** Product with an exact integer. */
	public Interval multiply(BigInteger factor) {
		BigInteger a = lo.multiply(factor);
		BigInteger b = hi.multiply(factor);
		return factor.signum() >= 0 ? new Interval(a, b) : new Interval(b, a);
	}

	/** Everything within a distance of this interval. */
	public Interval widen(BigInteger distance) {
		return new Interval(lo.subtract(distance), hi.add(distance));
	}

	/** Smallest interval that contains both. */
	public Interval hull(Interval other) {
		return new Interval(lo.min(other.lo), hi.max(other.hi));
	}

	/** Numbers of the interval that are not negative. The interval must contain one. */
	public Interval nonNegative() {
		return lo.signum() >= 0 ? this : new Interval(BigInteger.ZERO, hi);
	}

	/** A number near the middle. */
	public BigInteger middle() {
		return lo.add(hi).shiftRight(1);
	}

	/** Largest absolute value in the interval. */
	public BigInteger magnitude() {
		return lo.abs().max(hi.abs());
	}

	/** Whether every number of the interval is positive. */
	public boolean isPositive() {
		return lo.signum() > 0;
	}

	/** Whether every number of the interval is negative. */
	public boolean isNegative() {
		return hi.signum() < 0;
	}
}
