// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.List;

import tapwright.dsp.design.Band;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.verify.TaylorCells;

/**
 * Proven statements on the weighted error W (A - D) of exact coefficients in bands. In a cell the error is a polynomial
 * in s, the product of straight lines and the amplitude's. Its range over a part of the cell is bounded by the range of
 * its first three terms plus the magnitudes of the others; parts where this is too coarse are halved, which makes the
 * rest eight times smaller.
 */
final class WeightedError {

	private static final double U = 0x1p-53;
	private static final int TERMS = TaylorCells.TERMS + 1;
	private static final int HALVINGS = 40;
	/** After so many parts the bound is left as coarse as it is; this takes some tenths of a second. */
	private static final int MOST_PARTS = 1_000_000;

	private final TaylorCells cells = new TaylorCells();
	private final List<Band> bands;
	private final double[] amplitude = new double[TaylorCells.TERMS];

	/**
	 * For the filter whose coefficients are exactly these doubles.
	 *
	 * @param taps
	 *            exactly symmetric as told
	 */
	WeightedError(Symmetry symmetry, double[] taps, List<Band> bands) {
		cells.load(taps, symmetry);
		this.bands = bands;
	}

	/**
	 * Encloses the largest magnitude of the weighted error over all bands.
	 *
	 * @param tolerance
	 *            relative width that is aimed at; rounding errors can leave a wider one
	 */
	Enclosure largest(double tolerance) {
		Search search = new Search(tolerance);
		double[] e = new double[TERMS];
		for (Band band : bands) {
			int first = cellOf(band.from());
			int last = cellOf(band.to());
			for (int j = first; j <= last; j++) {
				search.slack = load(band, j, e);
				double from = j == first ? within(band.from(), j) : -1;
				double to = j == last ? within(band.to(), j) : 1;
				search.cell(e, from, to, 0);
			}
		}
		return new Enclosure(Math.max(search.reached, 0), Math.max(search.bound, search.reached));
	}

	/**
	 * The smallest magnitude of the weighted error at the given points, 0 when it cannot be proven that its sign
	 * changes from each point to the next.
	 *
	 * @param frequency
	 *            rising
	 * @param band
	 *            the band of each point
	 */
	double leastAlternating(double[] frequency, int[] band) {
		double[] e = new double[TERMS];
		double least = Double.POSITIVE_INFINITY;
		double before = 0;
		for (int i = 0; i < frequency.length; i++) {
			int j = cellOf(frequency[i]);
			double slack = load(bands.get(band[i]), j, e);
			double value = value(e, within(frequency[i], j));
			double proven = Math.abs(value) - slack;
			if (!(proven > 0) || i > 0 && value * before >= 0 || i > 0 && frequency[i] <= frequency[i - 1]) {
				return 0;
			}
			least = Math.min(least, proven);
			before = Math.signum(value);
		}
		return least;
	}

	/** About the largest magnitude of the amplitude between two frequencies, from the centres of cells; not a proof. */
	double peakBetween(double from, double to) {
		double peak = 0;
		for (int j = cellOf(from); j <= cellOf(to); j++) {
			cells.polynomial(j, amplitude);
			peak = Math.max(peak, Math.abs(amplitude[0]));
		}
		return peak;
	}

	private int cellOf(double frequency) {
		return (int) Math.rint(frequency * cells.size());
	}

	// Exact: M is a power of two, and the difference of the product and its nearest whole number is a double.
	private double within(double frequency, int j) {
		return 2 * (frequency * cells.size() - j);
	}

	/**
	 * The error polynomial of one cell.
	 *
	 * @return how far the polynomial and its later evaluation can be off
	 */
	private double load(Band band, int j, double[] e) {
		double centre = (double) j / cells.size();
		double stretch = 0.5 / cells.size() / (band.to() - band.from());
		double d0 = band.desired(centre);
		double d1 = (band.desiredTo() - band.desiredFrom()) * stretch;
		double w0 = band.weight(centre);
		double w1 = (band.weightTo() - band.weightFrom()) * stretch;
		cells.polynomial(j, amplitude);
		double before = 0;
		double size = Math.abs(d0) + Math.abs(d1);
		for (int m = 0; m < TERMS; m++) {
			double p = m < TaylorCells.TERMS ? amplitude[m] : 0;
			size += Math.scalb(Math.abs(p), m);
			p -= m == 0 ? d0 : m == 1 ? d1 : 0;
			e[m] = w0 * p + w1 * before;
			before = p;
		}
		// Lines beyond a narrow band's ends are computed from large slopes; 1 + stretch covers that. 64u per unit of
		// size covers the products and at most two additions per term in shifting a polynomial of 13 terms to a part of
		// its cell.
		double weight = Math.abs(w0) + Math.abs(w1) + 16 * U * (1 + stretch) * (band.weightFrom() + band.weightTo());
		double lines = Math.abs(band.desiredFrom()) + Math.abs(band.desiredTo());
		return weight * (cells.error() + 128 * U * size + 16 * U * (1 + stretch) * lines) * (1 + 1e-9)
				+ 16 * U * (1 + stretch) * (band.weightFrom() + band.weightTo()) * size;
	}

	private static double value(double[] e, double s) {
		double value = 0;
		for (int m = TERMS - 1; m >= 0; m--) {
			value = value * s + e[m];
		}
		return value;
	}

	/** Branch and bound for the largest magnitude; each part is a shifted copy of its cell's polynomial. */
	private static final class Search {

		private final double tolerance;
		private final double[][] parts = new double[HALVINGS + 1][TERMS];
		private double slack;
		private int visits;
		/** No error is larger. */
		private double bound;
		/** Some error is at least as large. */
		private double reached;

		Search(double tolerance) {
			this.tolerance = tolerance;
		}

		void cell(double[] e, double from, double to, int depth) {
			double[] p = parts[depth];
			shift(e, from / 2 + to / 2, to / 2 - from / 2, p);
			double rest = 0;
			for (int m = TERMS - 1; m >= 3; m--) {
				rest += Math.abs(p[m]);
			}
			double left = p[0] - p[1] + p[2];
			double right = p[0] + p[1] + p[2];
			double range = Math.max(Math.abs(left), Math.abs(right));
			double at = range == Math.abs(left) ? -1 : 1;
			double vertex = -p[1] / (2 * p[2]);
			if (Math.abs(vertex) < 1) {
				double top = Math.abs(p[0] + p[1] / 2 * vertex);
				if (top > range) {
					range = top;
					at = vertex;
				}
			}
			double above = range + rest + slack;
			visits++;
			if (above <= bound) {
				return;
			}
			if (!(above < Double.POSITIVE_INFINITY)) {
				bound = Double.POSITIVE_INFINITY;
				return;
			}
			reached = Math.max(reached, Math.abs(value(p, at)) - slack);
			if (above <= reached * (1 + tolerance) || rest <= slack / 4 || depth == HALVINGS || visits > MOST_PARTS) {
				bound = above;
				return;
			}
			double middle = from / 2 + to / 2;
			cell(e, from, middle, depth + 1);
			cell(e, middle, to, depth + 1);
		}

		// p(t) = e(middle + half t)
		private static void shift(double[] e, double middle, double half, double[] p) {
			System.arraycopy(e, 0, p, 0, TERMS);
			if (middle != 0) {
				for (int k = 0; k < TERMS - 1; k++) {
					for (int m = TERMS - 2; m >= k; m--) {
						p[m] += middle * p[m + 1];
					}
				}
			}
			if (half != 1) {
				double power = 1;
				for (int m = 1; m < TERMS; m++) {
					power *= half;
					p[m] *= power;
				}
			}
		}
	}
}
