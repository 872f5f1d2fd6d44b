// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

/**
 * A function of s, -1 &lt;= s &lt;= 1, as a polynomial with an error bound.
 *
 * @param polynomial
 *            nearly the function
 * @param error
 *            bound on the absolute difference, in units of the polynomial's arithmetic
 */
record LocalFunction(IntervalPolynomial polynomial, BigInteger error) {

	/** The product of two functions. */
	LocalFunction multiply(LocalFunction other) {
		var fix = polynomial.fix();
		BigInteger size = polynomial.tail(0).add(error);
		BigInteger otherSize = other.polynomial.tail(0);
		BigInteger sum = size.multiply(other.error).add(otherSize.multiply(error)).shiftRight(fix.bits())
				.add(BigInteger.ONE);
		return new LocalFunction(polynomial.multiply(other.polynomial), sum);
	}
}
