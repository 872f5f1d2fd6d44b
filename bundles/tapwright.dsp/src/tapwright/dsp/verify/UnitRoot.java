// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * Decides exactly whether a polynomial with integer coefficients vanishes at e^(2 pi j f) for rational f = p/q in
 * lowest terms.
 * <p>
 * It does when the cyclotomic polynomial of order q divides it, whose degree is Euler's function phi(q), at least
 * sqrt(q/2). So a nonzero polynomial of degree below phi(q) does not vanish. Otherwise the polynomial, reduced modulo
 * x^q - 1, is multiplied by 1 - x^(q/r) for every prime r that divides q. These factors vanish at exactly the q-th
 * roots of unity that are not primitive, so the product is zero modulo x^q - 1 when and only when the polynomial
 * vanishes at the primitive ones, of which e^(2 pi j f) is one.
 */
final class UnitRoot {

	private UnitRoot() {
	}

	/** Whether the polynomial with these coefficients, lowest power first, vanishes. */
	static boolean isRoot(BigInteger[] coefficients, BigFraction turns) {
		BigInteger order = turns.getDenominator();
		int n = coefficients.length;
		if (order.compareTo(BigInteger.TWO.multiply(BigInteger.valueOf(n).pow(2))) > 0) {
			return isZero(coefficients);
		}
		int q = order.intValueExact();
		List<Integer> primes = primes(q);
		long totient = q;
		for (int prime : primes) {
			totient = totient / prime * (prime - 1);
		}
		if (totient >= n) {
			return isZero(coefficients);
		}
		BigInteger[] folded = new BigInteger[q];
		Arrays.fill(folded, BigInteger.ZERO);
		for (int k = 0; k < n; k++) {
			folded[k % q] = folded[k % q].add(coefficients[k]);
		}
		for (int prime : primes) {
			folded = product(folded, q / prime);
		}
		return isZero(folded);
	}

	private static List<Integer> primes(int q) {
		List<Integer> primes = new ArrayList<>();
		int rest = q;
		for (int prime = 2; (long) prime * prime <= rest; prime++) {
			if (rest % prime == 0) {
				primes.add(prime);
			}
			while (rest % prime == 0) {
				rest /= prime;
			}
		}
		if (rest > 1) {
			primes.add(rest);
		}
		return primes;
	}

	private static BigInteger[] product(BigInteger[] p, int shift) {
		BigInteger[] result = new BigInteger[p.length];
		for (int k = 0; k < p.length; k++) {
			result[k] = p[k].subtract(p[Math.floorMod(k - shift, p.length)]);
		}
		return result;
	}

	private static boolean isZero(BigInteger[] values) {
		for (BigInteger value : values) {
			if (value.signum() != 0) {
				return false;
			}
		}
		return true;
	}
}
