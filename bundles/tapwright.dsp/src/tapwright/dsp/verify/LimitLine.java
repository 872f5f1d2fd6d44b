// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.verify.ExactSearch.Stretch;

/**
 * One straight piece of one limit: the gain in decibels that may not be exceeded, or must be reached, from one
 * frequency to another, both included.
 *
 * @param from
 *            lower frequency in hertz
 * @param to
 *            upper frequency in hertz, not below {@code from}
 * @param fromDb
 *            limit at the lower frequency; finite, or negative infinity at both ends for an upper limit
 * @param toDb
 *            limit at the upper frequency
 * @param upper
 *            whether gains above the limit miss it, otherwise gains below
 * @param logarithmic
 *            whether the line is straight over the logarithm of frequency
 */
record LimitLine(double from, double to, double fromDb, double toDb, boolean upper, boolean logarithmic) {

	/** More than the rounding errors of a scaled frequency, in relative terms. */
	private static final double TINY = 0x1p-50;

	boolean isConstant() {
		return fromDb == toDb;
	}

	boolean isNothing() {
		return fromDb == Double.NEGATIVE_INFINITY;
	}

	/** The limit at a frequency, rounded. */
	double at(double frequency) {
		if (isConstant() || frequency <= from) {
			return fromDb;
		}
		if (frequency >= to) {
			return toDb;
		}
		double part = logarithmic ? Math.log(frequency / from) / Math.log(to / from) : (frequency - from) / (to - from);
		return fromDb + (toDb - fromDb) * part;
	}

	/** A frequency in cycles per sample, exactly. */
	static BigFraction turns(double hertz, double sampleRate) {
		return Rationals.exact(hertz).divide(Rationals.exact(sampleRate));
	}

	/** The double nearest to a frequency, kept between the ends. */
	double hertz(BigFraction turns, double sampleRate) {
		double near = Rationals.nearest(turns.multiply(Rationals.exact(sampleRate)));
		return Math.min(Math.max(near, from), to);
	}

	/** The whole line in stretches of at most an eighth of what the fastest cosine of a filter takes for one period. */
	List<Stretch> stretches(double sampleRate, int length) {
		BigFraction lo = turns(from, sampleRate);
		BigFraction width = turns(to, sampleRate).subtract(lo);
		int count = from == to ? 1 : FixedPoint.floor(width.multiply(8 * length)).intValueExact() + 1;
		BigFraction step = width.divide(count);
		return IntStream.range(0, count)
				.mapToObj(k -> new Stretch(this, lo.add(step.multiply(k)), lo.add(step.multiply(k + 1)))).toList();
	}

	/**
	 * Lines that hold at the nominal clock exactly when this one holds at all clocks, but for rounding to the side
	 * that the range says. A limit that gets stricter with rising frequency is met by the slowest clock's place, and
	 * the other way round.
	 */
	List<LimitLine> stretched(ClockRange clocks) {
		if (isConstant()) {
			double low = clocks.lowest(from);
			double high = clocks.highest(to);
			return low <= high ? List.of(new LimitLine(low, high, fromDb, toDb, upper, logarithmic)) : List.of();
		}
		boolean eases = upper == toDb > fromDb;
		List<LimitLine> lines = new ArrayList<>();
		if (eases) {
			// The place at the slowest clock counts, after a flat start.
			add(lines, clocks, clocks.lowest(from), clocks.highest(from), fromDb, fromDb);
			add(lines, clocks, clocks.highest(from), to / (1 - clocks.deviation()) * (clocks.outward() ? 1 + TINY : 1
					- TINY), fromDb, toDb);
		} else {
			add(lines, clocks, clocks.lowest(from), clocks.lowest(to), fromDb, toDb);
			add(lines, clocks, clocks.lowest(to), clocks.highest(to), toDb, toDb);
		}
		return lines;
	}

	// Cuts at half the sample rate; the level there is rounded to the side that the range says.
	private void add(List<LimitLine> lines, ClockRange clocks, double low, double high, double lowDb, double highDb) {
		double end = clocks.nominal() / 2;
		if (low > high || low > end) {
			return;
		}
		LimitLine line = new LimitLine(low, high, lowDb, highDb, upper, logarithmic);
		if (high <= end) {
			lines.add(line);
		} else {
			double slack = 64 * Math.ulp(Math.max(Math.abs(lowDb), Math.abs(highDb)));
			double cut = line.at(end) + (upper == clocks.outward() ? -slack : slack);
			lines.add(new LimitLine(low, end, lowDb, cut, upper, logarithmic));
		}
	}
}
