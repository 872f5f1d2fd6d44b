// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * Interval arithmetic on multiples of 2^-bits, of any size. Every operation rounds its lower end down and its upper
 * end up, so an enclosure of the operands gives an enclosure of the result; series are cut with a bound on the rest
 * added. Immutable apart from cached constants; thread-safe.
 */
public final class FixedPoint {

	private final int bits;
	private final BigInteger one;
	private volatile Interval pi;
	private volatile Interval ln2;
	private volatile Interval ln10;

	/**
	 * @param bits
	 *            bits after the binary point, at least 16
	 */
	public FixedPoint(int bits) {
		if (bits < 16) {
			throw new IllegalArgumentException("fixed-point arithmetic needs at least 16 bits, not " + bits);
		}
		this.bits = bits;
		this.one = BigInteger.ONE.shiftLeft(bits);
	}

	/** Bits after the binary point. */
	public int bits() {
		return bits;
	}

	/** The integer that stands for 1. */
	public BigInteger one() {
		return one;
	}

	/** An exact integer. */
	public Interval of(long value) {
		return exact(BigInteger.valueOf(value).shiftLeft(bits));
	}

	/** The rational, rounded outward. */
	public Interval of(BigFraction value) {
		return quotient(value.getNumerator().shiftLeft(bits), value.getDenominator());
	}

	/** A multiple of 2^-bits. */
	public Interval exact(BigInteger multiple) {
		return new Interval(multiple, multiple);
	}

	/** The exact rational that a multiple of 2^-bits is. */
	public BigFraction rational(BigInteger multiple) {
		return new BigFraction(multiple, one);
	}

	/** Product. */
	public Interval multiply(Interval a, Interval b) {
		if (a.lo().signum() >= 0 && b.lo().signum() >= 0) {
			return shiftRight(new Interval(a.lo().multiply(b.lo()), a.hi().multiply(b.hi())), bits);
		}
		if (a.lo().equals(a.hi())) {
			return shiftRight(b.multiply(a.lo()), bits);
		}
		BigInteger p = a.lo().multiply(b.lo());
		BigInteger q = a.lo().multiply(b.hi());
		BigInteger r = a.hi().multiply(b.lo());
		BigInteger s = a.hi().multiply(b.hi());
		return shiftRight(new Interval(p.min(q).min(r.min(s)), p.max(q).max(r.max(s))), bits);
	}

	/** Square: never negative. */
	public Interval square(Interval a) {
		BigInteger low = a.lo().signum() > 0 ? a.lo() : a.hi().signum() < 0 ? a.hi() : BigInteger.ZERO;
		BigInteger high = a.magnitude();
		return shiftRight(new Interval(low.multiply(low), high.multiply(high)), bits);
	}

	/**
	 * Quotient.
	 *
	 * @param b
	 *            positive
	 */
	public Interval divide(Interval a, Interval b) {
		if (!b.isPositive()) {
			throw new ArithmeticException("the divisor may be zero");
		}
		Interval low = quotient(a.lo().shiftLeft(bits), a.lo().signum() >= 0 ? b.hi() : b.lo());
		Interval high = quotient(a.hi().shiftLeft(bits), a.hi().signum() >= 0 ? b.lo() : b.hi());
		return new Interval(low.lo(), high.hi());
	}

	/** Quotient by a positive integer. */
	public Interval divide(Interval a, long divisor) {
		BigInteger d = BigInteger.valueOf(divisor);
		return new Interval(quotient(a.lo(), d).lo(), quotient(a.hi(), d).hi());
	}

	/** Square root of an interval whose numbers are not negative. */
	public Interval sqrt(Interval a) {
		BigInteger low = a.lo().shiftLeft(bits).sqrt();
		BigInteger[] high = a.hi().shiftLeft(bits).sqrtAndRemainder();
		return new Interval(low, high[1].signum() == 0 ? high[0] : high[0].add(BigInteger.ONE));
	}

	/** Division by 2^count, outward; a negative count multiplies. */
	public Interval shiftRight(Interval a, int count) {
		if (count <= 0) {
			return new Interval(a.lo().shiftLeft(-count), a.hi().shiftLeft(-count));
		}
		return new Interval(a.lo().shiftRight(count), a.hi().negate().shiftRight(count).negate());
	}

	/** The number pi, by J. Machin's formula of 1706: pi/4 = 4 atan(1/5) - atan(1/239). */
	public Interval pi() {
		if (pi == null) {
			pi = inverseArc(5, -1).multiply(BigInteger.valueOf(16)).subtract(inverseArc(239, -1)
					.multiply(BigInteger.valueOf(4)));
		}
		return pi;
	}

	/** Natural logarithm of 2: 2 atanh(1/3). */
	public Interval ln2() {
		if (ln2 == null) {
			ln2 = inverseArc(3, 1).multiply(BigInteger.TWO);
		}
		return ln2;
	}

	/** Natural logarithm of 10: 3 ln 2 + 2 atanh(1/9). */
	public Interval ln10() {
		if (ln10 == null) {
			ln10 = ln2().multiply(BigInteger.valueOf(3)).add(inverseArc(9, 1).multiply(BigInteger.TWO));
		}
		return ln10;
	}

	/** Cosine and sine of an angle stated in turns of 2 pi. */
	public CosSin cosSin(BigFraction turns) {
		BigFraction rest = turns.subtract(new BigFraction(floor(turns)));
		BigInteger eighth = floor(rest.multiply(8).add(BigFraction.ONE)).shiftRight(1).and(BigInteger.valueOf(3));
		// Quarter turns are exact; what remains lies within an eighth of a turn of zero.
		int quarter = eighth.intValue();
		BigFraction small = rest.subtract(new BigFraction(floor(rest.multiply(8).add(BigFraction.ONE)).shiftRight(1))
				.divide(4));
		Interval angle = multiply(of(small.multiply(2)), pi());
		Interval cosine = series(angle, 0);
		Interval sine = series(angle, 1);
		return switch (quarter) {
			case 0 -> new CosSin(cosine, sine);
			case 1 -> new CosSin(sine.negate(), cosine);
			case 2 -> new CosSin(cosine.negate(), sine.negate());
			default -> new CosSin(sine, cosine.negate());
		};
	}

	/** A cosine and the sine of the same angle. */
	public record CosSin(Interval cos, Interval sin) {
	}

	/** The exponential function. */
	public Interval exp(Interval x) {
		return new Interval(expEnd(exact(x.lo())).lo(), expEnd(exact(x.hi())).hi());
	}

	/** Ten to the given power. */
	public Interval pow10(BigFraction exponent) {
		return exp(multiply(of(exponent), ln10()));
	}

	/** Natural logarithm of an interval of positive numbers. */
	public Interval ln(Interval x) {
		if (!x.isPositive()) {
			throw new ArithmeticException("logarithm of a number that may be zero");
		}
		return new Interval(lnEnd(x.lo()).lo(), lnEnd(x.hi()).hi());
	}

	/** The interval with double ends, rounded outward. */
	public Enclosure toDoubles(Interval a) {
		return new Enclosure(Rationals.below(rational(a.lo())), Rationals.above(rational(a.hi())));
	}

	// sum of x^(2i+first) (-1)^i / (2i+first)!; with |x| <= 1 the rest is below the first omitted term.
	private Interval series(Interval x, int first) {
		Interval square = square(x);
		Interval term = first == 0 ? exact(one) : x;
		Interval sum = term;
		for (int i = first;; i += 2) {
			term = divide(multiply(term, square), (long) (i + 1) * (i + 2)).negate();
			if (term.magnitude().bitLength() <= 1) {
				return sum.widen(BigInteger.TWO);
			}
			sum = sum.add(term);
		}
	}

	// atan(1/n) for sign -1, atanh(1/n) for sign 1: sum of sign^i / ((2i+1) n^(2i+1)), n >= 3.
	private Interval inverseArc(int n, int sign) {
		BigInteger square = BigInteger.valueOf((long) n * n);
		Interval power = divide(exact(one), n);
		Interval sum = power;
		for (int i = 1;; i++) {
			power = new Interval(power.lo().divide(square), quotient(power.hi(), square).hi());
			if (power.hi().bitLength() <= 1) {
				// The rest is at most power (1 + 1/9 + 1/81 + ...) < 2 power, and power is at most one unit.
				return sum.widen(BigInteger.TWO);
			}
			Interval term = divide(power, 2 * i + 1);
			sum = sign < 0 && i % 2 != 0 ? sum.subtract(term) : sum.add(term);
		}
	}

	private Interval expEnd(Interval x) {
		BigInteger n = x.lo().divide(ln2().lo());
		Interval rest = x.subtract(ln2().multiply(n));
		// |rest| < 0.7 + n 2^-bits: each term is less than 0.8 of the one before, the rest of the series below four
		// terms.
		Interval term = exact(one);
		Interval sum = term;
		for (int i = 1; term.magnitude().bitLength() > 1; i++) {
			term = divide(multiply(term, rest), i);
			sum = sum.add(term);
		}
		return shiftRight(sum.widen(BigInteger.valueOf(4)), -n.intValueExact()).nonNegative();
	}

	private Interval lnEnd(BigInteger x) {
		int exponent = x.bitLength() - bits;
		// m = x 2^-exponent lies in [1/2, 1); ln m = -2 atanh((1-m)/(1+m)) with an argument of at most 1/3.
		Interval m = shiftRight(exact(x), exponent);
		Interval y = divide(exact(one).subtract(m), exact(one).add(m));
		Interval square = square(y);
		Interval power = y;
		Interval sum = y;
		for (int i = 1; power.magnitude().bitLength() > 1; i++) {
			power = multiply(power, square);
			sum = sum.add(divide(power, 2 * i + 1));
		}
		return sum.widen(BigInteger.TWO).multiply(BigInteger.TWO).negate().add(ln2()
				.multiply(BigInteger.valueOf(exponent)));
	}

	private static Interval quotient(BigInteger numerator, BigInteger divisor) {
		BigInteger[] parts = numerator.divideAndRemainder(divisor);
		int sign = parts[1].signum();
		return new Interval(sign < 0 ? parts[0].subtract(BigInteger.ONE) : parts[0],
				sign > 0 ? parts[0].add(BigInteger.ONE) : parts[0]);
	}

	/** The largest integer that is not above the rational. */
	public static BigInteger floor(BigFraction value) {
		return quotient(value.getNumerator(), value.getDenominator()).lo();
	}
}
