// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntFunction;

import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;

/**
 * The least of x'Hx/2 - b'x subject to rows r'x >= d and r'x = d, by the dual active-set method (D. Goldfarb and A. Idnani,
 * A numerically stable dual method for solving strictly convex quadratic programs, Mathematical Programming 27, 1983). Its
 * value rises with every step, so no active set comes twice and it ends; a limit on steps guards against rounding. Rows
 * may be added after a solution, which goes on from there. For one thread.
 */
public final class QuadraticProgram {

	/** A row whose part outside the active rows is smaller than this, relatively, depends on them. */
	private static final double DEPENDENT = 1e-11;

	private final int n;
	private final double[] x;
	/** Columns of the inverse transposed factor of H, rotated so that the first span the active rows; j[column][row]. */
	private final double[][] j;
	/** Upper triangle of the active rows in that basis; r[column][row]. */
	private final double[][] r;
	private final List<double[]> rows = new ArrayList<>();
	private final List<Double> bounds = new ArrayList<>();
	private final List<Boolean> equalities = new ArrayList<>();
	private final int[] active;
	private final double[] multiplier;
	private int size;

	/**
	 * A program without rows, solved.
	 *
	 * @param inverseColumns
	 *            columns of the transposed inverse of the Cholesky factor of H; taken over, not copied
	 * @param b
	 *            the linear part
	 */
	public QuadraticProgram(double[][] inverseColumns, double[] b) {
		n = b.length;
		j = inverseColumns;
		r = new double[n][n];
		active = new int[n];
		multiplier = new double[n];
		x = new double[n];
		for (double[] column : j) {
			add(x, column, dot(column, b));
		}
	}

	/** The present solution; do not change it. */
	public double[] x() {
		return x;
	}

	/** Adds r'x >= d. Takes effect with the next {@link #solve}. */
	public void atLeast(double[] row, double d) {
		addRow(row, d, false);
	}

	/** Adds r'x = d. Add all of these before the first {@link #solve}. */
	public void equal(double[] row, double d) {
		addRow(row, d, true);
	}

	private void addRow(double[] row, double d, boolean equality) {
		double norm = Math.sqrt(dot(row, row));
		double scale = norm == 0 ? 1 : 1 / norm;
		rows.add(Arrays.stream(row).map(value -> value * scale).toArray());
		bounds.add(d * scale);
		equalities.add(equality);
	}

	/** Sum of multiplier times bound over the active rows. */
	public double boundValue() {
		double sum = 0;
		for (int k = 0; k < size; k++) {
			sum += multiplier[k] * bounds.get(active[k]);
		}
		return sum;
	}

	/** Sum of multiplier times row over the active rows; multipliers of rows that may be exceeded are not negative. */
	public double[] rowSum() {
		double[] sum = new double[n];
		for (int k = 0; k < size; k++) {
			add(sum, rows.get(active[k]), multiplier[k]);
		}
		return sum;
	}

	/**
	 * Moves {@link #x} to the solution over all rows.
	 *
	 * @param tolerance
	 *            violations of rows of length 1 up to this are let pass
	 * @param infeasible
	 *            makes the words for a person from the index of a row that contradicts the others
	 * @throws DesignException
	 *             when rows contradict each other or rounding errors prevail
	 */
	public void solve(double tolerance, IntFunction<String> infeasible, Progress progress) throws DesignException {
		int steps = 200 + 40 * (n + rows.size());
		for (int p = 0; p < rows.size(); p++) {
			if (equalities.get(p) && !isActive(p)) {
				enter(p, tolerance, infeasible);
			}
		}
		for (int p = worst(tolerance); p >= 0; p = worst(tolerance)) {
			progress.checkCancelled();
			if (--steps < 0) {
				throw new DesignException("rounding errors keep the limits from being solved; ask for fewer coefficients or looser"
						+ " limits");
			}
			enter(p, tolerance, infeasible);
		}
	}

	private boolean isActive(int p) {
		for (int k = 0; k < size; k++) {
			if (active[k] == p) {
				return true;
			}
		}
		return false;
	}

	private int worst(double tolerance) {
		double least = -tolerance;
		int worst = -1;
		for (int p = 0; p < rows.size(); p++) {
			double slack = equalities.get(p) ? 0 : dot(rows.get(p), x) - bounds.get(p);
			if (slack < least && !isActive(p)) {
				least = slack;
				worst = p;
			}
		}
		return worst;
	}

	private void enter(int p, double tolerance, IntFunction<String> infeasible) throws DesignException {
		if (equalities.get(p) && dot(rows.get(p), x) > bounds.get(p)) {
			// An equality may be turned round; so a violation is always from below.
			rows.set(p, Arrays.stream(rows.get(p)).map(value -> -value).toArray());
			bounds.set(p, -bounds.get(p));
		}
		double[] row = rows.get(p);
		double own = 0;
		while (true) {
			double slack = dot(row, x) - bounds.get(p);
			double[] d = new double[n];
			double all = 0;
			double free = 0;
			for (int k = 0; k < n; k++) {
				d[k] = dot(j[k], row);
				all += d[k] * d[k];
				free += k >= size ? d[k] * d[k] : 0;
			}
			boolean dependent = free <= DEPENDENT * DEPENDENT * all;
			double[] change = solveTriangle(d);
			double dual = Double.POSITIVE_INFINITY;
			int leaving = -1;
			for (int k = 0; k < size; k++) {
				if (!equalities.get(active[k]) && change[k] > 0 && multiplier[k] / change[k] < dual) {
					dual = multiplier[k] / change[k];
					leaving = k;
				}
			}
			double primal = dependent ? Double.POSITIVE_INFINITY : -slack / free;
			double step = Math.min(dual, primal);
			if (Double.isInfinite(step) || Double.isNaN(step)) {
				if (equalities.get(p) && Math.abs(slack) <= Math.max(tolerance, 1e-12)) {
					return; // says what others say already
				}
				throw new DesignException(infeasible.apply(p));
			}
			for (int k = 0; k < size; k++) {
				multiplier[k] -= step * change[k];
			}
			own += step;
			if (!dependent) {
				for (int k = size; k < n; k++) {
					add(x, j[k], step * d[k]);
				}
			}
			if (step == primal) {
				append(p, own, d);
				return;
			}
			drop(leaving);
		}
	}

	private double[] solveTriangle(double[] d) {
		double[] u = Arrays.copyOf(d, size);
		for (int k = size - 1; k >= 0; k--) {
			u[k] /= r[k][k];
			for (int i = 0; i < k; i++) {
				u[i] -= r[k][i] * u[k];
			}
		}
		return u;
	}

	private void append(int p, double own, double[] d) {
		for (int k = n - 1; k > size; k--) {
			if (d[k] != 0) {
				double length = Math.hypot(d[k - 1], d[k]);
				rotate(j[k - 1], j[k], d[k - 1] / length, d[k] / length);
				d[k - 1] = length;
				d[k] = 0;
			}
		}
		System.arraycopy(d, 0, r[size], 0, size + 1);
		active[size] = p;
		multiplier[size++] = own;
	}

	private void drop(int leaving) {
		for (int k = leaving; k + 1 < size; k++) {
			active[k] = active[k + 1];
			multiplier[k] = multiplier[k + 1];
			System.arraycopy(r[k + 1], 0, r[k], 0, k + 2);
		}
		size--;
		for (int k = leaving; k < size; k++) {
			double length = Math.hypot(r[k][k], r[k][k + 1]);
			double c = r[k][k] / length;
			double s = r[k][k + 1] / length;
			for (int column = k; column < size; column++) {
				double upper = r[column][k];
				double lower = r[column][k + 1];
				r[column][k] = c * upper + s * lower;
				r[column][k + 1] = c * lower - s * upper;
			}
			rotate(j[k], j[k + 1], c, s);
		}
	}

	private static void rotate(double[] one, double[] other, double c, double s) {
		for (int i = 0; i < one.length; i++) {
			double a = one[i];
			double b = other[i];
			one[i] = c * a + s * b;
			other[i] = c * b - s * a;
		}
	}

	private static void add(double[] to, double[] column, double factor) {
		for (int i = 0; i < to.length; i++) {
			to[i] += factor * column[i];
		}
	}

	private static double dot(double[] a, double[] b) {
		double sum = 0;
		for (int i = 0; i < a.length; i++) {
			sum += a[i] * b[i];
		}
		return sum;
	}
}
