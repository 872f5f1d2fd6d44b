// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.Arrays;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.FixedPoint.CosSin;
import tapwright.dsp.exact.Interval;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * A filter split about its middle c = (N-1)/2: with v[k] = |k - c|, e^(jwc) H(w) = E(w) + j O(w), E = sum of even[k]
 * cos(v[k] w), O = sum of odd[k] sin(v[k] w), exactly, in units of {@link #scale()} times 2^{@link #sizeBits()}; in
 * these units |E| &lt;= 1 and |O| &lt;= 1. Immutable.
 */
final class SplitTaps {

	private final BigInteger[] even;
	private final BigInteger[] odd;
	private final int[] doubledIndex;
	private final int length;
	private final BigFraction scale;
	private final int sizeBits;
	private final int indexBits;
	private final boolean hasEven;
	private final boolean hasOdd;

	SplitTaps(ExactTaps taps) {
		int n = taps.length();
		int half = (n + 1) / 2;
		even = new BigInteger[half];
		odd = new BigInteger[half];
		doubledIndex = new int[half];
		BigInteger size = BigInteger.ZERO;
		for (int k = 0; k < half; k++) {
			// From the middle outward: indices before and after the middle, equal when the middle is a coefficient.
			int after = n / 2 + k;
			int before = n - 1 - after;
			BigInteger a = taps.integer(after);
			BigInteger b = taps.integer(before);
			doubledIndex[k] = after - before;
			even[k] = after == before ? a : a.add(b);
			odd[k] = b.subtract(a);
			size = size.add(a.abs()).add(after == before ? BigInteger.ZERO : b.abs());
		}
		length = n;
		scale = taps.unit();
		sizeBits = size.bitLength();
		indexBits = 32 - Integer.numberOfLeadingZeros(n - 1);
		hasEven = Arrays.stream(even).anyMatch(value -> value.signum() != 0);
		hasOdd = Arrays.stream(odd).anyMatch(value -> value.signum() != 0);
	}

	/** Number of coefficients. */
	int length() {
		return length;
	}

	/** What one step of the integers is worth. */
	BigFraction scale() {
		return scale;
	}

	/** Bits of the sum of absolute integers: |H| is at most scale 2^sizeBits. */
	int sizeBits() {
		return sizeBits;
	}

	/**
	 * The amplitude of symmetric or antisymmetric coefficients, E or O, around a frequency; see {@link #around}.
	 */
	LocalFunction amplitude(FixedPoint fix, BigFraction centre, BigFraction radius) {
		Taylor taylor = taylor(fix, centre, radius);
		return new LocalFunction(new IntervalPolynomial(fix, hasOdd ? taylor.odd : taylor.even), taylor.rest);
	}

	/**
	 * |H|^2 around a frequency as a polynomial in s, -1 &lt;= s &lt;= 1, at frequency centre + s radius.
	 *
	 * @param centre
	 *            cycles per sample
	 * @param radius
	 *            cycles per sample, not negative
	 */
	LocalFunction around(FixedPoint fix, BigFraction centre, BigFraction radius) {
		Taylor taylor = taylor(fix, centre, radius);
		// |E| and |O| are at most 1, so squares err by at most 2 rest + rest^2 each.
		BigInteger error = taylor.rest.multiply(BigInteger.valueOf(5));
		if (!hasOdd) {
			return new LocalFunction(IntervalPolynomial.square(fix, taylor.even), error);
		}
		IntervalPolynomial square = IntervalPolynomial.square(fix, taylor.odd);
		return new LocalFunction(hasEven ? square.add(IntervalPolynomial.square(fix, taylor.even)) : square, error);
	}

	// Coefficients of E and O in s, with a bound on what each leaves out.
	private record Taylor(Interval[] even, Interval[] odd, BigInteger rest) {
	}

	private Taylor taylor(FixedPoint fix, BigFraction centre, BigFraction radius) {
		// x = pi radius 2^indexBits bounds v[k] times the radius in radians; the factor x^m/m! belongs to the m-th
		// derivative.
		Interval x = fix.shiftRight(fix.multiply(fix.of(radius), fix.pi()), -indexBits);
		Interval factor = fix.exact(fix.one());
		int count = 0;
		do {
			count++;
			factor = fix.divide(fix.multiply(factor, x), count);
		} while (factor.hi().bitLength() > 2);
		BigInteger rest = factor.hi().add(BigInteger.ONE);
		Interval[] e = new Interval[count];
		Interval[] o = new Interval[count];
		sums(fix, centre, e, o);
		factor = fix.exact(fix.one());
		for (int m = 0; m < count; m++) {
			e[m] = fix.multiply(e[m], factor);
			o[m] = fix.multiply(o[m], factor);
			factor = fix.divide(fix.multiply(factor, x), m + 1);
		}
		return new Taylor(e, o, rest);
	}

	// Derivatives m of E and O at the centre, divided by 2^(indexBits m - m), in the units of this class.
	private void sums(FixedPoint fix, BigFraction centre, Interval[] e, Interval[] o) {
		int count = e.length;
		int half = even.length;
		BigInteger[] evenSum = new BigInteger[count];
		BigInteger[] oddSum = new BigInteger[count];
		BigInteger[] evenSize = new BigInteger[count];
		BigInteger[] oddSize = new BigInteger[count];
		for (BigInteger[] sum : new BigInteger[][] { evenSum, oddSum, evenSize, oddSize }) {
			Arrays.fill(sum, BigInteger.ZERO);
		}
		CosSin turn = fix.cosSin(centre);
		CosSin start = doubledIndex[0] == 0 ? new CosSin(fix.of(1), Interval.ZERO) : fix.cosSin(centre.divide(2));
		BigInteger c = start.cos().middle();
		BigInteger s = start.sin().middle();
		BigInteger turnCos = turn.cos().middle();
		BigInteger turnSin = turn.sin().middle();
		// |middle - true| of the pair (cos, sin) is at most the sum of both widths; products add 2 units of rounding
		// (see proof).
		BigInteger stepError = width(turn).add(BigInteger.TWO);
		BigInteger error = width(start);
		for (int k = 0; k < half; k++) {
			if (k > 0) {
				BigInteger next = c.multiply(turnCos).subtract(s.multiply(turnSin)).shiftRight(fix.bits());
				s = s.multiply(turnCos).add(c.multiply(turnSin)).shiftRight(fix.bits());
				c = next;
				// error (1 + stepError) + stepError, where stepError is far below 2^(-bits/2) of one.
				error = error.add(error.shiftRight(fix.bits() / 2)).add(stepError).add(BigInteger.ONE);
			}
			BigInteger index = BigInteger.valueOf(doubledIndex[k]);
			accumulate(even[k], index, error, new BigInteger[] { c, s.negate(), c.negate(), s }, evenSum, evenSize);
			accumulate(odd[k], index, error, new BigInteger[] { s, c, s.negate(), c.negate() }, oddSum, oddSize);
		}
		for (int m = 0; m < count; m++) {
			int shift = sizeBits + indexBits * m;
			e[m] = fix.shiftRight(new Interval(evenSum[m].subtract(evenSize[m]), evenSum[m].add(evenSize[m])), shift);
			o[m] = fix.shiftRight(new Interval(oddSum[m].subtract(oddSize[m]), oddSum[m].add(oddSize[m])), shift);
		}
	}

	private static BigInteger width(CosSin pair) {
		return pair.cos().hi().subtract(pair.cos().lo()).add(pair.sin().hi()).subtract(pair.sin().lo());
	}

	private static void accumulate(BigInteger tap, BigInteger index, BigInteger error, BigInteger[] derivatives,
			BigInteger[] sum,
			BigInteger[] size) {
		if (tap.signum() == 0) {
			return;
		}
		BigInteger weight = tap;
		for (int m = 0; m < sum.length && weight.signum() != 0; m++) {
			sum[m] = sum[m].add(weight.multiply(derivatives[m & 3]));
			size[m] = size[m].add(weight.abs().multiply(error));
			weight = weight.multiply(index);
		}
	}
}
