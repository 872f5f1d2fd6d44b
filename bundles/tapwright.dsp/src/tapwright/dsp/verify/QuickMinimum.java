// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/** Brackets the smallest amplitude of symmetric coefficients over a band in doubles. Work space of one thread. */
final class QuickMinimum {

	private static final int DEEPEST = 14;
	/** Enough for a bracket, as part of the sum of absolute coefficients. */
	private static final double GAP = 1e-13;
	private static final double ROUNDING = 2e-14;

	private final TaylorCells cells = new TaylorCells();
	private final CellMaximum maximum = new CellMaximum();
	private final double[] whole = new double[TaylorCells.TERMS];
	private final double[][] parts = new double[DEEPEST + 2][TaylorCells.TERMS];
	private int cell;
	private double rounding;
	private double gap;
	private double innerLo;
	private double innerHi;
	private double least;
	private double lowest;
	private BigFraction from;
	private BigFraction to;
	private BigFraction place;
	private List<BigFraction[]> open;

	/** Certain to be reached: an upper bound on the minimum, in scaled units. */
	double hi() {
		return least;
	}

	/** Lower bound on the minimum, in scaled units. */
	double lo() {
		return Math.min(least, lowest);
	}

	/** Where {@link #hi()} is reached, in cycles per sample; null when no place is certain to be in the band. */
	BigFraction place() {
		return place;
	}

	/** Stretches of frequency, as pairs of ends in cycles per sample, that hold the minimum. */
	List<BigFraction[]> open() {
		return open;
	}

	/** Searches a band in cycles per sample. */
	void search(ExactTaps taps, BigFraction from, BigFraction to) {
		this.from = from;
		this.to = to;
		cells.load(taps.scaled().values(), taps.symmetry());
		least = Double.POSITIVE_INFINITY;
		place = null;
		gap = GAP * cells.sum();
		open = null;
		sweep();
		open = new ArrayList<>();
		lowest = Double.POSITIVE_INFINITY;
		sweep();
		open.replaceAll(pair -> new BigFraction[] { max(pair[0], from), min(pair[1], to) });
		open.removeIf(pair -> pair[0].compareTo(pair[1]) > 0);
	}

	private void sweep() {
		int size = cells.size();
		double start = Rationals.nearest(from) * size;
		double end = Rationals.nearest(to) * size;
		double doubt = size * 0x1p-51;
		int last = (int) Math.min(size / 2, Math.floor(end + 0.5 + doubt));
		for (cell = (int) Math.max(0, Math.ceil(start - 0.5 - doubt)); cell <= last; cell++) {
			double lo = 2 * (start - cell) - doubt;
			double hi = 2 * (end - cell) + doubt;
			innerLo = Math.max(-1, lo + 2 * doubt);
			innerHi = Math.min(1, hi - 2 * doubt);
			cells.polynomial(cell, whole);
			double size1 = 0;
			for (double c : whole) {
				size1 += Math.abs(c);
			}
			rounding = ROUNDING * size1 + cells.error();
			visit(Math.max(lo, -1), Math.min(hi, 1), 0);
		}
	}

	private void visit(double lo, double hi, int depth) {
		double centre = (lo + hi) / 2;
		double radius = Math.max(hi - centre, centre - lo);
		double[] c = parts[depth];
		CellMaximum.part(whole, TaylorCells.TERMS, centre, radius, c);
		maximum.coarse(c, TaylorCells.TERMS);
		if (maximum.lo - rounding >= least) {
			return;
		}
		maximum.largest(c, TaylorCells.TERMS, -1);
		double bound = -maximum.hi - rounding;
		double excess = maximum.hi - maximum.lo;
		double s = CellMaximum.clamp(centre + radius * maximum.at, innerLo, innerHi);
		if (open == null && innerLo <= innerHi) {
			double value = CellMaximum.at(whole, TaylorCells.TERMS, s) + rounding;
			if (value < least) {
				least = value;
				place = s == innerLo && s > -1 ? from : s == innerHi && s < 1 ? to
						: Rationals.exact(s).add(2 * cell).divide(2 * cells.size());
			}
		}
		if (bound < least - gap && excess > 2 * rounding && depth < DEEPEST) {
			visit(lo, centre, depth + 1);
			visit(centre, hi, depth + 1);
		} else if (open != null) {
			lowest = Math.min(lowest, bound);
			open.add(new BigFraction[] { Rationals.exact(centre - radius).add(2 * cell).divide(2 * cells.size()),
					Rationals.exact(centre + radius).add(2 * cell).divide(2 * cells.size()) });
		}
	}

	private static BigFraction max(BigFraction a, BigFraction b) {
		return a.compareTo(b) >= 0 ? a : b;
	}

	private static BigFraction min(BigFraction a, BigFraction b) {
		return a.compareTo(b) <= 0 ? a : b;
	}
}
