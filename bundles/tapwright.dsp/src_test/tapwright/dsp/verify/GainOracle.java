// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * The largest and smallest |H|^2 of integer coefficients over a band, slowly and independently of the product: |H|^2
 * is a polynomial in x = cos w with integer coefficients, whose stationary points are isolated by C. Sturm's theorem
 * (1829) in exact arithmetic and narrowed by bisection.
 */
final class GainOracle {

	private static final int EDGE_BITS = 260;
	private static final int ROOT_BITS = 150;

	private final BigInteger[] square;
	private final List<BigInteger[]> chain = new ArrayList<>();

	/** Dyadic number. */
	private record Dyadic(BigInteger value, int bits) {

		Dyadic middle(Dyadic other) {
			int common = Math.max(bits, other.bits);
			return new Dyadic(at(common).add(other.at(common)), common + 1);
		}

		private BigInteger at(int wanted) {
			return value.shiftLeft(wanted - bits);
		}

		int compareTo(Dyadic other) {
			int common = Math.max(bits, other.bits);
			return at(common).compareTo(other.at(common));
		}
	}

	/** Extreme values of |H|^2. */
	record Extremes(BigDecimal least, BigDecimal most) {
	}

	GainOracle(BigInteger... taps) {
		square = square(taps);
		BigInteger[] p = derivative(square);
		if (p.length > 0) {
			BigInteger[] q = derivative(p);
			chain.add(p);
			while (q.length > 0) {
				chain.add(q);
				BigInteger[] rest = remainder(p, q);
				p = q;
				q = rest;
			}
		}
	}

	/** Extremes over a band given by edges in cycles per sample. */
	Extremes extremes(BigDecimal from, BigDecimal to) {
		Dyadic left = cosine(to);
		Dyadic right = cosine(from);
		List<Dyadic> places = new ArrayList<>(List.of(left, right));
		if (!chain.isEmpty() && left.compareTo(right) < 0) {
			isolate(left, right, changes(left) - changes(right), places);
		}
		BigDecimal least = null;
		BigDecimal most = null;
		for (Dyadic place : places) {
			BigDecimal value = value(square, place);
			least = least == null || value.compareTo(least) < 0 ? value : least;
			most = most == null || value.compareTo(most) > 0 ? value : most;
		}
		return new Extremes(least.max(BigDecimal.ZERO), most.max(BigDecimal.ZERO));
	}

	private static Dyadic cosine(BigDecimal turns) {
		BigDecimal cos = OracleMath.cos(turns.multiply(BigDecimal.TWO).multiply(OracleMath.PI, OracleMath.DIGITS));
		return new Dyadic(cos.multiply(new BigDecimal(BigInteger.ONE.shiftLeft(EDGE_BITS))).toBigInteger(), EDGE_BITS);
	}

	// The number of distinct roots in (left, right] is given.
	private void isolate(Dyadic left, Dyadic right, int roots, List<Dyadic> places) {
		if (roots == 0) {
			return;
		}
		Dyadic middle = left.middle(right);
		if (roots == 1 && sign(chain.get(0), left) * sign(chain.get(0), right) < 0) {
			places.add(narrow(left, right));
		} else if (middle.bits - EDGE_BITS > ROOT_BITS) {
			places.add(middle);
		} else {
			int below = changes(left) - changes(middle);
			isolate(left, middle, below, places);
			isolate(middle, right, roots - below, places);
		}
	}

	private Dyadic narrow(Dyadic left, Dyadic right) {
		int sign = sign(chain.get(0), left);
		Dyadic a = left;
		Dyadic b = right;
		for (int k = 0; k < ROOT_BITS; k++) {
			Dyadic middle = a.middle(b);
			if (sign(chain.get(0), middle) == sign) {
				a = middle;
			} else {
				b = middle;
			}
		}
		return a;
	}

	private int changes(Dyadic x) {
		int changes = 0;
		int last = 0;
		for (BigInteger[] p : chain) {
			int sign = sign(p, x);
			changes += sign != 0 && last != 0 && sign != last ? 1 : 0;
			last = sign != 0 ? sign : last;
		}
		return changes;
	}

	private static int sign(BigInteger[] p, Dyadic x) {
		return scaled(p, x).signum();
	}

	private static BigDecimal value(BigInteger[] p, Dyadic x) {
		return new BigDecimal(scaled(p, x)).divide(new BigDecimal(BigInteger.ONE.shiftLeft(x.bits * (p.length - 1))),
				OracleMath.DIGITS);
	}

	// p(x) times 2^(bits * degree), exactly.
	private static BigInteger scaled(BigInteger[] p, Dyadic x) {
		BigInteger value = p[p.length - 1];
		for (int k = p.length - 2, shift = x.bits; k >= 0; k--, shift += x.bits) {
			value = value.multiply(x.value).add(p[k].shiftLeft(shift));
		}
		return value;
	}

	private static BigInteger[] square(BigInteger[] taps) {
		int n = taps.length;
		BigInteger[] sum = zeros(n);
		BigInteger[] before = zeros(n);
		BigInteger[] present = zeros(n);
		present[0] = BigInteger.ONE;
		for (int k = 0; k < n; k++) {
			BigInteger r = BigInteger.ZERO;
			for (int i = 0; i + k < n; i++) {
				r = r.add(taps[i].multiply(taps[i + k]));
			}
			for (int i = 0; i < n; i++) {
				sum[i] = sum[i].add(present[i].multiply(r).multiply(k == 0 ? BigInteger.ONE : BigInteger.TWO));
			}
			// Chebyshev polynomials: T[k+1] = 2 x T[k] - T[k-1], and T[1] = x.
			BigInteger[] next = zeros(n);
			for (int i = 0; i < n; i++) {
				BigInteger shifted = i > 0 ? present[i - 1] : BigInteger.ZERO;
				next[i] = k == 0 ? shifted : shifted.multiply(BigInteger.TWO).subtract(before[i]);
			}
			before = present;
			present = next;
		}
		return trimmed(sum, n);
	}

	private static BigInteger[] derivative(BigInteger[] p) {
		BigInteger[] d = zeros(Math.max(p.length - 1, 0));
		for (int k = 0; k < d.length; k++) {
			d[k] = p[k + 1].multiply(BigInteger.valueOf(k + 1));
		}
		return primitive(d);
	}

	// Minus the remainder of p by q times a positive number.
	private static BigInteger[] remainder(BigInteger[] p, BigInteger[] q) {
		BigInteger[] rest = p.clone();
		BigInteger lead = q[q.length - 1];
		for (int top = p.length - 1; top >= q.length - 1; top--) {
			BigInteger factor = rest[top];
			for (int k = 0; k <= top; k++) {
				rest[k] = rest[k].multiply(lead.abs());
			}
			for (int k = 0; k < q.length; k++) {
				int at = top - q.length + 1 + k;
				rest[at] = rest[at].subtract(factor.multiply(q[k]).multiply(BigInteger.valueOf(lead.signum())));
			}
		}
		for (int k = 0; k < rest.length; k++) {
			rest[k] = rest[k].negate();
		}
		return primitive(trimmed(rest, q.length - 1));
	}

	private static BigInteger[] primitive(BigInteger[] p) {
		BigInteger common = BigInteger.ZERO;
		for (BigInteger c : p) {
			common = common.gcd(c);
		}
		if (common.signum() == 0) {
			return new BigInteger[0];
		}
		BigInteger[] reduced = p.clone();
		for (int k = 0; k < p.length; k++) {
			reduced[k] = p[k].divide(common);
		}
		return trimmed(reduced, reduced.length);
	}

	private static BigInteger[] trimmed(BigInteger[] p, int length) {
		int n = length;
		while (n > 1 && p[n - 1].signum() == 0) {
			n--;
		}
		return java.util.Arrays.copyOf(p, n);
	}

	private static BigInteger[] zeros(int n) {
		BigInteger[] zeros = new BigInteger[n];
		java.util.Arrays.fill(zeros, BigInteger.ZERO);
		return zeros;
	}
}
