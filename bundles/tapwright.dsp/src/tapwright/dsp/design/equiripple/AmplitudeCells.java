// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;

/**
 * The amplitude of a linear-phase filter as one polynomial per cell of frequency. Cell j of M/2 + 1 lies around f = j/M; with
 * f = (j + s/2)/M the amplitude is sum of T[m][j] s^m for -1 <= s <= 1, up to {@link #error()}. The Taylor coefficients at all centres
 * come from transforms of the weighted filter coefficients.
 * <p>
 * The error has three parts: the first derivative that is left out, at most sum |a| theta^K / K! with theta = pi v / M; the
 * transform's; and the rounding of the weighted coefficients.
 */
final class AmplitudeCells {

	/** Number of Taylor coefficients of a cell. */
	static final int ORDERS = 12;

	private static final double U = 0x1p-53;

	private final int cells;
	private final double[][] taylor;
	private final double error;

	/**
	 * Cells of the filter whose exact coefficients are the given doubles.
	 *
	 * @param taps
	 *            h[0..N-1], exactly symmetric as the type says
	 */
	AmplitudeCells(LinearPhaseType type, double[] taps) {
		double[] a = type.amplitude(taps);
		cells = Integer.highestOneBit(Math.max(8 * (taps.length / 2), 8) * 2 - 1);
		taylor = new double[ORDERS][];
		Transform transform = new Transform(cells);
		double[][] weighted = weighted(a, type.firstHarmonic());
		double[][] turn = turn(type.firstHarmonic() == 0.5 ? Math.PI / cells : 0);
		double total = 0;
		for (int m = 0; m < ORDERS; m += 4) {
			total += fill(type, transform, turn, weighted, m);
		}
		for (int m = 0; m < ORDERS; m++) {
			total += (4 * m + 4) * U * norm(weighted[m]);
		}
		// One more theta and a division give the term that is left out; 1/8 pi bounds theta.
		double rest = 0;
		for (int k = 0; k < a.length; k++) {
			rest += Math.abs(weighted[ORDERS - 1][k]) * Math.PI * (type.firstHarmonic() + k) / cells / ORDERS;
		}
		error = (total + rest) * (1 + 1e-9);
	}

	/** Twice the number of cells between 0 and half the sample rate: centres are multiples of 1/M. */
	int perCycle() {
		return cells;
	}

	/** Taylor coefficient m of cell j. */
	double taylor(int m, int j) {
		return taylor[m][j];
	}

	/** The polynomials are nowhere off by more than this. */
	double error() {
		return error;
	}

	// Cosines and sines of j times the angle, for every cell j.
	private double[][] turn(double angle) {
		double[][] turn = new double[2][cells / 2 + 1];
		for (int j = 0; j <= cells / 2; j++) {
			turn[0][j] = Math.cos(angle * j);
			turn[1][j] = Math.sin(angle * j);
		}
		return turn;
	}

	// Row m: a[k] (pi v[k] / M)^m / m!
	private double[][] weighted(double[] a, double first) {
		double[][] rows = new double[ORDERS][a.length];
		rows[0] = a;
		for (int m = 1; m < ORDERS; m++) {
			for (int k = 0; k < a.length; k++) {
				rows[m][k] = rows[m - 1][k] * (Math.PI * (first + k) / cells) / m;
			}
		}
		return rows;
	}

	/**
	 * Four orders by one transform: two real sequences are packed in its real and imaginary part, and each gives the sum of cosines
	 * for one order and the sum of sines for the next. The second pair is scaled up by a power of two so that the rounding errors of
	 * the first do not swamp it.
	 *
	 * @return bound of the error over the four terms
	 */
	private double fill(LinearPhaseType type, Transform transform, double[][] turn, double[][] weighted, int m) {
		boolean sines = type.symmetry() == Symmetry.ODD;
		double[] re = new double[cells];
		double[] im = new double[cells];
		double ratio = norm(weighted[m]) / norm(weighted[m + 2]);
		double scale = ratio > 0 && ratio < 0x1p500 ? Math.scalb(1.0, Math.getExponent(ratio)) : 1;
		pack(type, weighted, m, 1, re);
		pack(type, weighted, m + 2, scale, im);
		double total = norm(re) + norm(im);
		transform.forward(re, im);
		for (int order = m; order < m + 4; order++) {
			taylor[order] = new double[cells / 2 + 1];
		}
		for (int j = 0; j <= cells / 2; j++) {
			int mirror = j == 0 ? 0 : cells - j;
			double cosHalf = turn[0][j];
			double sinHalf = turn[1][j];
			double xr = (re[j] + re[mirror]) / 2;
			double xi = (im[j] - im[mirror]) / 2;
			double yr = (im[j] + im[mirror]) / 2 / scale;
			double yi = (re[mirror] - re[j]) / 2 / scale;
			double cos0 = xr * cosHalf - xi * sinHalf;
			double sin0 = -(xr * sinHalf + xi * cosHalf);
			double cos2 = yr * cosHalf - yi * sinHalf;
			double sin2 = -(yr * sinHalf + yi * cosHalf);
			taylor[m][j] = sines ? sin0 : cos0;
			taylor[m + 1][j] = sines ? cos0 : -sin0;
			taylor[m + 2][j] = sines ? -sin2 : -cos2;
			taylor[m + 3][j] = sines ? -cos2 : sin2;
		}
		// Both parts of a complex value together are off by at most sqrt 2 times its error; unpacking and turning add less than 16u.
		return Math.sqrt(2) * (transform.error() + 16 * U) * total * (1 + 1 / scale) * (1 + 1e-9);
	}

	// Cosines g0 and sines g1 of v w: (g0 + g1)/2 at index v and (g0 - g1)/2 at -v; half-integer v are turned by w/2 afterwards.
	private void pack(LinearPhaseType type, double[][] weighted, int m, double scale, double[] into) {
		boolean sines = type.symmetry() == Symmetry.ODD;
		double[] g0 = weighted[sines ? m + 1 : m];
		double[] g1 = weighted[sines ? m : m + 1];
		int up = (int) Math.ceil(type.firstHarmonic());
		int down = (int) Math.floor(type.firstHarmonic());
		for (int k = 0; k < g0.length; k++) {
			if (k + up == 0) {
				into[0] = scale * g0[0];
			} else {
				into[k + up] += scale * (g0[k] + g1[k]) / 2;
				into[(cells - k - down) % cells] += scale * (g0[k] - g1[k]) / 2;
			}
		}
	}

	private static double norm(double[] values) {
		double sum = 0;
		for (double value : values) {
			sum += Math.abs(value);
		}
		return sum;
	}
}
