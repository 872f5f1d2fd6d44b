// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.Arrays;

import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;

/**
 * A real polynomial in s, -1 &lt;= s &lt;= 1, whose coefficients are known to lie in intervals. Immutable.
 *
 * @param fix
 *            arithmetic of the coefficients
 * @param coefficients
 *            of s^0, s^1, ...; at least one
 */
record IntervalPolynomial(FixedPoint fix, Interval... coefficients) {

	/** The square of a polynomial. */
	static IntervalPolynomial square(FixedPoint fix, Interval[] c) {
		IntervalPolynomial factor = new IntervalPolynomial(fix, c);
		return factor.multiply(factor);
	}

	IntervalPolynomial multiply(IntervalPolynomial other) {
		Interval[] a = coefficients;
		Interval[] b = other.coefficients;
		Interval[] product = new Interval[a.length + b.length - 1];
		Arrays.fill(product, Interval.ZERO);
		for (int i = 0; i < a.length; i++) {
			for (int k = 0; k < b.length; k++) {
				product[i + k] = product[i + k].add(i == k && a == b ? fix.square(a[i]) : fix.multiply(a[i], b[k]));
			}
		}
		return new IntervalPolynomial(fix, product);
	}

	IntervalPolynomial add(IntervalPolynomial other) {
		Interval[] sum = new Interval[Math.max(coefficients.length, other.coefficients.length)];
		for (int i = 0; i < sum.length; i++) {
			sum[i] = coefficient(i).add(other.coefficient(i));
		}
		return new IntervalPolynomial(fix, sum);
	}

	IntervalPolynomial negate() {
		Interval[] negative = coefficients.clone();
		for (int i = 0; i < negative.length; i++) {
			negative[i] = negative[i].negate();
		}
		return new IntervalPolynomial(fix, negative);
	}

	Interval coefficient(int i) {
		return i < coefficients.length ? coefficients[i] : Interval.ZERO;
	}

	/** Value at a point given in units of the arithmetic. */
	Interval at(BigInteger s) {
		Interval point = fix.exact(s);
		Interval value = coefficients[coefficients.length - 1];
		for (int i = coefficients.length - 2; i >= 0; i--) {
			value = fix.multiply(point, value).add(coefficients[i]);
		}
		return value;
	}

	/** The derivative by s. */
	IntervalPolynomial derivative() {
		Interval[] slope = new Interval[Math.max(1, coefficients.length - 1)];
		slope[0] = coefficient(1);
		for (int i = 1; i < slope.length; i++) {
			slope[i] = coefficients[i + 1].multiply(BigInteger.valueOf(i + 1));
		}
		return new IntervalPolynomial(fix, slope);
	}

	/** Bound on the absolute value of what coefficients from index {@code first} on contribute. */
	BigInteger tail(int first) {
		BigInteger sum = BigInteger.ZERO;
		for (int i = first; i < coefficients.length; i++) {
			sum = sum.add(coefficients[i].magnitude());
		}
		return sum;
	}

	/** Encloses all values on -1 to 1, coarsely. */
	Interval range() {
		return coefficients[0].widen(tail(1));
	}

	/**
	 * Where the polynomial is largest on -1 to 1.
	 *
	 * @param point
	 *            s, in units of the arithmetic, of a place with a value near the largest
	 * @param value
	 *            encloses the largest value
	 */
	record Largest(BigInteger point, Interval value) {
	}

	/** Encloses the largest value; tightly when the polynomial is concave, convex or monotone here. */
	Largest largest() {
		IntervalPolynomial slope = derivative();
		Interval slopes = slope.range();
		Interval bends = slope.derivative().range();
		BigInteger end = fix.one();
		if (slopes.isPositive() || slopes.isNegative() || bends.isPositive()) {
			Interval left = at(end.negate());
			Interval right = at(end);
			boolean rightIsMore = right.middle().compareTo(left.middle()) > 0;
			return new Largest(rightIsMore ? end : end.negate(),
					new Interval(left.lo().max(right.lo()), left.hi().max(right.hi())));
		}
		BigInteger point = bends.isNegative() ? stationary(slope) : BigInteger.ZERO;
		Interval value = at(point);
		if (bends.isNegative()) {
			// A concave function lies below its tangents.
			Interval tangent = slope.at(point);
			Interval toLeft = fix.multiply(tangent, fix.exact(end.negate().subtract(point)));
			Interval toRight = fix.multiply(tangent, fix.exact(end.subtract(point)));
			return new Largest(point, new Interval(value.lo(),
					value.hi().add(toLeft.hi().max(toRight.hi()).max(BigInteger.ZERO))));
		}
		BigInteger high = range().hi().max(value.hi());
		return new Largest(point, new Interval(value.lo(), high));
	}

	// Newton's method on the middles, kept within -1 to 1; only a guess, so nothing depends on its errors.
	private BigInteger stationary(IntervalPolynomial slope) {
		IntervalPolynomial bend = slope.derivative();
		BigInteger end = fix.one();
		BigInteger point = BigInteger.ZERO;
		for (int step = 0; step < 60; step++) {
			BigInteger divisor = bend.at(point).middle();
			if (divisor.signum() == 0) {
				return point;
			}
			BigInteger next = point.subtract(slope.at(point).middle().shiftLeft(fix.bits()).divide(divisor)).min(end)
					.max(end.negate());
			if (next.subtract(point).bitLength() <= 2) {
				return next;
			}
			point = next;
		}
		return point;
	}
}
