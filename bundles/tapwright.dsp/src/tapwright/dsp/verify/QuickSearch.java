// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.verify.ExactSearch.Stretch;

/**
 * Brackets the largest load of a filter in double precision: gain over an upper limit, or a lower limit over the
 * gain. Work space of one thread. Every bound accounts for the errors of its own arithmetic (see the package's
 * theorems 2 and 3).
 */
final class QuickSearch {

	private static final double GAP = 1e-10;
	private static final int DEEPEST = 14;
	private static final int LONGEST = 3 * TaylorCells.TERMS;
	/** Rounding of polynomial arithmetic over the sum of absolute coefficients, by theorem 3. */
	private static final double ROUNDING = 2e-14;
	private static final double SQUARE_ROUNDING = 6e-14;

	private final TaylorCells cells;
	private final double errorFactor;
	private final CellMaximum maximum = new CellMaximum();
	private final LocalSlope slope = new LocalSlope();
	private final double[] whole = new double[LONGEST];
	private final double[][] parts = new double[DEEPEST + 2][LONGEST];
	private double sampleRate;

	private double best;
	private double highest;
	private LimitLine bestLine;
	private double bestPlace;
	private List<Stretch> open;

	// What is being searched.
	private LimitLine line;
	private double gain;
	private int cell;
	private int terms;
	private double rounding;
	private double wholeSize;
	// The same for a part, where a sloping limit is multiplied in.
	private int localTerms;
	private double localRounding;
	private double localError;
	private boolean sharp;
	// Of the present line: certain signs of the amplitude seen so far, and the place of its smallest gain.
	private boolean seenPositive;
	private boolean seenNegative;
	private double lineLoad;
	private double linePlace;
	private double innerLo;
	private double innerHi;

	/** Work space. */
	QuickSearch() {
		this(1);
	}

	/** Work space whose error bounds are multiplied by a factor: below 1 they are wrong, so that tests can see it. */
	QuickSearch(double errorFactor) {
		this.errorFactor = errorFactor;
		this.cells = new TaylorCells(errorFactor);
	}

	/** Largest load found at a real place, 0 when there is none. */
	double lo() {
		return best;
	}

	/** Upper bound on the load anywhere. */
	double hi() {
		return Math.max(best, highest);
	}

	/** Limit at the place of {@link #lo()}. */
	LimitLine line() {
		return bestLine;
	}

	/** The place of {@link #lo()} in hertz. */
	double place() {
		return bestPlace;
	}

	boolean isWorthKeeping() {
		return cells.isWorthKeeping();
	}

	/** Takes a filter; see {@link TaylorCells#load}. */
	void load(Subject subject) {
		sampleRate = subject.sampleRate();
		cells.load(subject.taps().scaled().values(), subject.taps().symmetry());
	}

	/** Encloses the scaled gain at one frequency. */
	Enclosure gainAt(double hertz) {
		int size = cells.size();
		double place = hertz / sampleRate * size;
		int nearest = (int) Math.rint(place);
		double s = 2 * (place - nearest);
		int n = cells.polynomial(nearest, whole);
		double total = cells.isSquared() ? cells.squareSize() : size(whole, n);
		// The place is off by less than 2^-51 of the number of cells; no slope exceeds n times the total.
		double doubt = total * ((cells.isSquared() ? SQUARE_ROUNDING : ROUNDING) + n * size * 0x1p-51);
		double value = CellMaximum.at(whole, n, s);
		double low = cells.isSquared() ? Math.sqrt(Math.max(0, value - doubt)) : Math.abs(value) - doubt;
		double high = cells.isSquared() ? Math.sqrt(Math.max(0, value + doubt)) : Math.abs(value) + doubt;
		return new Enclosure(Math.max(0, low * (1 - 0x1p-50) - cells.error()), high * (1 + 0x1p-50) + cells.error());
	}

	/**
	 * Searches all lines.
	 *
	 * @param gains
	 *            for each line the factor that makes a scaled gain a ratio to the limit
	 */
	void search(List<LimitLine> lines, double[] gains) {
		best = 0;
		highest = 0;
		bestLine = lines.getFirst();
		bestPlace = bestLine.from();
		open = null;
		sweep(lines, gains);
	}

	/**
	 * The stretches that may hold the worst place, after a search.
	 *
	 * @param slack
	 *            how wrong a ratio of two gains can be, as a factor
	 */
	List<Stretch> open(List<LimitLine> lines, double[] gains, double slack) {
		open = new ArrayList<>();
		best /= slack;
		sweep(lines, gains);
		return open;
	}

	private void sweep(List<LimitLine> lines, double[] gains) {
		for (int k = 0; k < gains.length; k++) {
			line = lines.get(k);
			gain = gains[k];
			seenPositive = false;
			seenNegative = false;
			lineLoad = 0;
			linePlace = line.from();
			if (line.from() == line.to()) {
				oneFrequency();
				continue;
			}
			int size = cells.size();
			double from = line.from() / sampleRate * size;
			double to = line.to() / sampleRate * size;
			// Twice the rounding of a place in cells, so closed bands are covered and inner points are inside.
			double doubt = size * 0x1p-51;
			int last = (int) Math.min(size / 2, Math.floor(to + 0.5 + doubt));
			for (cell = (int) Math.max(0, Math.ceil(from - 0.5 - doubt)); cell <= last; cell++) {
				double lo = 2 * (from - cell) - doubt;
				double hi = 2 * (to - cell) + doubt;
				innerLo = Math.max(-1, lo + 2 * doubt);
				innerHi = Math.min(1, hi - 2 * doubt);
				terms = cells.polynomial(cell, whole);
				wholeSize = cells.isSquared() ? cells.squareSize() : size(whole, terms);
				rounding = errorFactor * (cells.isSquared() ? SQUARE_ROUNDING : ROUNDING) * wholeSize;
				if (lo <= -1 && hi >= 1 && line.isConstant()) {
					localTerms = terms;
					localRounding = rounding;
					localError = cells.error();
					visit(whole, 0, 1, 0);
				} else {
					visitPart(Math.max(lo, -1), Math.min(hi, 1), 0);
				}
			}
		}
	}

	private void oneFrequency() {
		Enclosure scaled = gainAt(line.from());
		double low = scaled.lo() * gain;
		double high = scaled.hi() * gain;
		double load = line.upper() ? low : 1 / high;
		double bound = line.upper() ? high : 1 / low;
		if (load > best && open == null) {
			best = load;
			bestLine = line;
			bestPlace = line.from();
		}
		if (bound > best) {
			highest = Math.max(highest, bound);
			if (open != null) {
				BigFraction place = LimitLine.turns(line.from(), sampleRate);
				open.add(new Stretch(line, place, place));
			}
		}
	}

	private void visitPart(double lo, double hi, int depth) {
		double centre = (lo + hi) / 2;
		double radius = Math.max(hi - centre, centre - lo);
		CellMaximum.part(whole, terms, centre, radius, parts[depth]);
		localTerms = terms;
		localRounding = rounding;
		localError = cells.error();
		if (!line.isConstant()) {
			int width = 2 * cells.size();
			slope.make(line, sampleRate, (2 * cell + centre) / width, radius / width, cells.isSquared());
			if (slope.isTooWide() && depth < DEEPEST) {
				visitPart(lo, centre, depth + 1);
				visitPart(centre, hi, depth + 1);
				return;
			}
			localTerms = slope.multiply(parts[depth], terms);
			localRounding = rounding * slope.size() + wholeSize * (slope.remainder() + 100 * 0x1p-53 * slope.size());
			localError *= cells.isSquared() ? Math.sqrt(slope.size()) : slope.size();
		}
		visit(parts[depth], centre, radius, depth);
	}

	private void visit(double[] c, double centre, double radius, int depth) {
		maximum.coarse(c, localTerms);
		double high = maximum.hi + localRounding;
		double low = maximum.lo - localRounding;
		if (line.upper()) {
			boolean above = over(high) > best;
			boolean below = !cells.isSquared() && over(-low) > best;
			sharp = true;
			double bound = Math.max(above ? refine(c, 1, centre, radius) : 0, below ? refine(c, -1, centre, radius)
					: 0);
			if (above || below) {
				settle(bound, centre, radius, depth);
			}
			return;
		}
		double sign = cells.isSquared() || low + high > 0 ? 1 : -1;
		double least = sign > 0 ? low : -high;
		if (!cells.isSquared() && innerLo <= Math.min(1, centre + radius) && innerHi >= Math.max(-1, centre - radius)) {
			seeSigns(low > localError, -high > localError);
		}
		if (under(least) > best) {
			sharp = true;
			settle(refine(c, -sign, centre, radius), centre, radius, depth);
		}
	}

	// An amplitude that is positive at one place and negative at another is zero between them.
	private void seeSigns(boolean positive, boolean negative) {
		seenPositive |= positive;
		seenNegative |= negative;
		if (seenPositive && seenNegative && open == null) {
			best = Double.POSITIVE_INFINITY;
			bestLine = line;
			bestPlace = linePlace;
		}
	}

	private void settle(double bound, double centre, double radius, int depth) {
		if (bound <= best * (1 + GAP) && open == null || bound <= best) {
			highest = Math.max(highest, bound);
		} else if (depth < DEEPEST && !sharp) {
			visitPart(centre - radius, centre, depth + 1);
			visitPart(centre, centre + radius, depth + 1);
		} else {
			highest = Math.max(highest, bound);
			if (open != null) {
				add(centre - radius, centre + radius);
			}
		}
	}

	// Upper bound on the load of a part; raises the best load by what is certain at one point.
	private double refine(double[] c, double sign, double centre, double radius) {
		maximum.largest(c, localTerms, sign);
		sharp &= isSharp();
		double high = maximum.hi + localRounding;
		double at = maximum.at;
		double s = centre + radius * at;
		double value = maximum.lo;
		boolean inside = innerLo <= innerHi;
		if (inside && (s < innerLo || s > innerHi)) {
			s = CellMaximum.clamp(s, innerLo, innerHi);
			value = sign * CellMaximum.at(c, localTerms, (s - centre) / radius);
		}
		if (line.upper()) {
			if (inside) {
				raise(certainlyOver(value - localRounding), s);
			}
			return over(high);
		}
		if (inside) {
			raise(certainlyUnder(value), s);
		}
		return under(-high);
	}

	// Whether splitting would not help since errors are as large as what could be gained.
	private boolean isSharp() {
		double width = maximum.hi - maximum.lo;
		return width <= 2 * localRounding || (cells.isSquared()
				? Math.sqrt(Math.max(0, maximum.hi)) - Math.sqrt(Math.max(0, maximum.lo)) <= 2 * localError
				: width <= 2 * localError);
	}

	private void raise(double load, double s) {
		if (load <= lineLoad || open != null) {
			return;
		}
		lineLoad = load;
		linePlace = s == innerLo && s > -1 ? line.from() : s == innerHi && s < 1 ? line.to()
					: CellMaximum.clamp((cell + s / 2) / cells.size() * sampleRate, line.from(), line.to());
		if (load > best) {
			best = load;
			bestLine = line;
			bestPlace = linePlace;
		}
	}

	// Load of an upper limit where the polynomial is at most this.
	private double over(double value) {
		return (magnitude(value) + localError) * gain;
	}

	private double certainlyOver(double value) {
		return (magnitude(value) - localError) * gain;
	}

	// Load of a lower limit where the polynomial is at least this, in sign that makes it positive.
	private double under(double value) {
		double least = (magnitude(value) - localError) * gain;
		return least > 0 ? 1 / least : Double.POSITIVE_INFINITY;
	}

	// Load of a lower limit at a point where the polynomial, up to sign and localRounding, is this.
	private double certainlyUnder(double value) {
		double most = cells.isSquared() ? Math.sqrt(Math.max(0, localRounding - value)) : Math.abs(value)
				+ localRounding;
		return 1 / ((most + localError) * gain);
	}

	private double magnitude(double value) {
		return cells.isSquared() ? Math.sqrt(Math.max(value, 0)) : value;
	}

	private static double size(double[] c, int n) {
		double sum = 0;
		for (int m = 0; m < n; m++) {
			sum += Math.abs(c[m]);
		}
		return sum;
	}

	private void add(double lo, double hi) {
		int size = cells.size();
		BigFraction from = LimitLine.turns(line.from(), sampleRate);
		BigFraction to = LimitLine.turns(line.to(), sampleRate);
		BigFraction start = place(lo, size);
		BigFraction end = place(hi, size);
		start = start.compareTo(from) < 0 ? from : start;
		end = end.compareTo(to) > 0 ? to : end;
		if (start.compareTo(end) <= 0) {
			open.add(new Stretch(line, start, end));
		}
	}

	private BigFraction place(double s, int size) {
		return Rationals.exact(s).add(2 * cell).divide(2 * size);
	}
}
