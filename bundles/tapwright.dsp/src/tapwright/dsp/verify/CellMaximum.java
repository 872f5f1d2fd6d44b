// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/**
 * Bounds on the largest value of a polynomial on -1 to 1, in double precision. Rounding is not counted here except in
 * the slope's contribution; callers add it (see the package's theorem 3). Work space of one thread.
 */
final class CellMaximum {

	private static final double UNIT = 0x1p-53;
	private static final int NEWTON_STEPS = 4;

	/** Value at {@link #at}: a lower bound. */
	double lo;
	/** Upper bound. */
	double hi;
	/** A point with a value near the largest. */
	double at;

	private double value;
	private double slope;

	/** Bounds all values by three coefficients and the sizes of the others; sets {@link #lo} and {@link #hi}. */
	void coarse(double[] c, int n) {
		double tail = 0;
		for (int m = 3; m < n; m++) {
			tail += Math.abs(c[m]);
		}
		double ends = c[0] + c[2];
		double rise = Math.abs(c[1]);
		double high = ends + rise;
		double low = ends - rise;
		// The vertex of the parabola counts when it lies inside.
		if (rise < 2 * Math.abs(c[2])) {
			double vertex = c[0] - c[1] * c[1] / (4 * c[2]);
			high = Math.max(high, vertex);
			low = Math.min(low, vertex);
		}
		hi = high + tail;
		lo = low - tail;
	}

	/** Bounds the largest value of sign times the polynomial, tightly when that is concave, convex or monotone here. */
	void largest(double[] c, int n, double sign) {
		double bend = 0;
		double climb = 0;
		for (int m = n - 1; m >= 3; m--) {
			double size = m * Math.abs(c[m]);
			climb += size;
			bend += (m - 1) * size;
		}
		double curvature = 2 * sign * c[2];
		// Sums of absolute values are right within n units; the factor covers that.
		bend *= 1 + 1e-12;
		climb = (climb + 2 * Math.abs(c[2])) * (1 + 1e-12);
		if (curvature >= bend || Math.abs(c[1]) >= climb) {
			ends(c, n, sign);
		} else if (curvature < -bend) {
			concave(c, n, sign, climb + Math.abs(c[1]));
		} else {
			ends(c, n, sign);
			double end = lo;
			double endAt = at;
			at = 0;
			lo = sign * c[0];
			hi = lo + climb + Math.abs(c[1]);
			if (end > lo) {
				lo = end;
				at = endAt;
			}
		}
	}

	private void ends(double[] c, int n, double sign) {
		double even = 0;
		double odd = 0;
		for (int m = n - 1 - (n - 1) % 2; m >= 0; m -= 2) {
			even += c[m];
		}
		for (int m = n - 1 - n % 2; m >= 1; m -= 2) {
			odd += c[m];
		}
		double rise = sign * odd;
		at = rise >= 0 ? 1 : -1;
		lo = sign * even + Math.abs(rise);
		hi = lo;
	}

	// Newton's method; a concave function lies below its tangents, so any point gives a bound.
	private void concave(double[] c, int n, double sign, double size) {
		double point = clamp(-c[1] / (2 * c[2]), -1, 1);
		for (int step = 0; step < NEWTON_STEPS; step++) {
			double next = clamp(point - newton(c, n, point), -1, 1);
			if (Math.abs(next - point) < 1e-9) {
				point = next;
				break;
			}
			point = next;
		}
		evaluate(c, n, point);
		at = point;
		lo = sign * value;
		double d = sign * slope;
		double rise = Math.max(d * (1 - point), d * (-1 - point));
		hi = lo + Math.max(rise, 0) + 4 * n * UNIT * size;
	}

	private static double newton(double[] c, int n, double point) {
		double first = 0;
		double second = 0;
		for (int m = n - 1; m >= 1; m--) {
			second = second * point + first;
			first = first * point + m * c[m];
		}
		return first / second;
	}

	/** Evaluates the polynomial. */
	static double at(double[] c, int n, double point) {
		double value = c[n - 1];
		for (int m = n - 2; m >= 0; m--) {
			value = value * point + c[m];
		}
		return value;
	}

	private void evaluate(double[] c, int n, double point) {
		double v = c[n - 1];
		double d = 0;
		for (int m = n - 2; m >= 0; m--) {
			d = d * point + v;
			v = v * point + c[m];
		}
		value = v;
		slope = d;
	}

	/**
	 * The polynomial on a part of the interval.
	 *
	 * @param target
	 *            coefficients in t, -1 &lt;= t &lt;= 1, of the polynomial at centre + radius t
	 */
	static void part(double[] c, int n, double centre, double radius, double[] target) {
		System.arraycopy(c, 0, target, 0, n);
		for (int i = 0; i < n - 1; i++) {
			for (int m = n - 2; m >= i; m--) {
				target[m] += centre * target[m + 1];
			}
		}
		double power = 1;
		for (int m = 0; m < n; m++) {
			target[m] *= power;
			power *= radius;
		}
	}

	static double clamp(double value, double lo, double hi) {
		return Math.min(Math.max(value, lo), hi);
	}
}
