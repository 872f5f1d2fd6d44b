// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.complex.Complex;

/**
 * The zeros of the transfer function sum of h[k] z^-k, in double precision.
 * <p>
 * Method: simultaneous iteration of L. W. Ehrlich, A modified Newton method for polynomials, Communications of the
 * ACM 10(2), 1967, and O. Aberth, Iteration methods for finding all zeros of a polynomial simultaneously, Mathematics
 * of Computation 27, 1973. No zero is divided out, so errors do not pile up. It starts on circles that the convex
 * hull of the logarithms of the coefficients gives (D. A. Bini, Numerical computation of polynomial zeros by means of
 * Aberth's method, Numerical Algorithms 13, 1996).
 */
public final class Zeros {

	private static final int MOST_ROUNDS = 300;
	private static final double SMALL_STEP = 1e-15;

	private Zeros() {
	}

	/**
	 * Finds all zeros in the z plane but those at infinity: N-1 of them when the first coefficient is not zero.
	 *
	 * @param taps
	 *            h[0..N-1]
	 * @return zeros at the origin first; empty when no coefficient but one differs from zero, or none
	 */
	public static List<Complex> of(double[] taps) {
		int first = 0;
		int last = taps.length - 1;
		while (first < last && taps[first] == 0) {
			first++;
		}
		while (last > first && taps[last] == 0) {
			last--;
		}
		List<Complex> zeros = new ArrayList<>();
		if (taps[first] == 0) {
			return zeros;
		}
		// h[first] z^n + ... + h[last], and a factor z^-k for every coefficient of zero at the end.
		double[] p = new double[last - first + 1];
		for (int k = 0; k < p.length; k++) {
			p[k] = taps[last - k];
		}
		for (int k = last; k < taps.length - 1; k++) {
			zeros.add(Complex.ZERO);
		}
		zeros.addAll(iterate(p));
		return zeros;
	}

	private static List<Complex> iterate(double[] p) {
		int n = p.length - 1;
		Complex[] z = starts(p);
		boolean[] done = new boolean[n];
		int open = n;
		for (int round = 0; round < MOST_ROUNDS && open > 0; round++) {
			for (int i = 0; i < n; i++) {
				if (done[i]) {
					continue;
				}
				Complex newton = newton(p, z[i]);
				Complex sum = Complex.ZERO;
				for (int k = 0; k < n; k++) {
					if (k != i) {
						Complex distance = z[i].subtract(z[k]);
						sum = sum.add(distance.equals(Complex.ZERO) ? Complex.ZERO : distance.reciprocal());
					}
				}
				Complex step = newton.divide(Complex.ONE.subtract(newton.multiply(sum)));
				if (step.isNaN() || step.abs() <= SMALL_STEP * z[i].abs()) {
					done[i] = true;
					open--;
				} else {
					z[i] = z[i].subtract(step);
				}
			}
		}
		return List.of(z);
	}

	// p(z)/p'(z); outside the unit circle by the reversed polynomial, which does not overflow.
	private static Complex newton(double[] p, Complex z) {
		int n = p.length - 1;
		if (z.abs() <= 1) {
			Complex value = Complex.ZERO;
			Complex slope = Complex.ZERO;
			for (int k = n; k >= 0; k--) {
				slope = slope.multiply(z).add(value);
				value = value.multiply(z).add(p[k]);
			}
			return value.equals(Complex.ZERO) ? Complex.ZERO : value.divide(slope);
		}
		Complex inverse = z.reciprocal();
		Complex value = Complex.ZERO;
		Complex slope = Complex.ZERO;
		for (int k = 0; k <= n; k++) {
			slope = slope.multiply(inverse).add(value);
			value = value.multiply(inverse).add(p[k]);
		}
		// With q the reversed polynomial, p'/p = (n - q'(1/z) / (z q(1/z))) / z.
		if (value.equals(Complex.ZERO)) {
			return Complex.ZERO;
		}
		return z.divide(new Complex(n).subtract(slope.multiply(inverse).divide(value)));
	}

	private static Complex[] starts(double[] p) {
		int n = p.length - 1;
		List<Integer> hull = new ArrayList<>();
		for (int k = 0; k <= n; k++) {
			if (p[k] == 0) {
				continue;
			}
			while (hull.size() > 1 && isBelow(p, hull.get(hull.size() - 2), hull.getLast(), k)) {
				hull.removeLast();
			}
			hull.add(k);
		}
		Complex[] z = new Complex[n];
		for (int edge = 1; edge < hull.size(); edge++) {
			int from = hull.get(edge - 1);
			int to = hull.get(edge);
			double radius = Math.exp((logarithm(p, from) - logarithm(p, to)) / (to - from));
			for (int k = from; k < to; k++) {
				double angle = 2 * Math.PI * (k - from) / (to - from) + 2 * Math.PI * edge / n + 0.7;
				z[k] = new Complex(radius * Math.cos(angle), radius * Math.sin(angle));
			}
		}
		return z;
	}

	// Whether the middle point lies on or below the line between its neighbours.
	private static boolean isBelow(double[] p, int a, int b, int c) {
		double slope = (logarithm(p, c) - logarithm(p, a)) / (c - a);
		return logarithm(p, b) <= logarithm(p, a) + slope * (b - a);
	}

	private static double logarithm(double[] p, int k) {
		return Math.log(Math.abs(p[k]));
	}
}
