// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.verify.ExactSearch.Stretch;

/** The attempt to prove a gain limit in double precision,
		which succeeds unless the worst gain is very near the limit. */
final class QuickGain {

	static final ThreadLocal<QuickSearch> WORK_SPACE = ThreadLocal.withInitial(QuickSearch::new);

	/** Enclosures wider than this ratio of gains, a millionth of a decibel, are worth an exact search. */
	private static final double WIDE = 1 + 1.1e-7;
	/** A gain this far below a lower limit is as good as zero. */
	private static final double HOPELESS = 1e9;
	private static final double LOG10_OF_2 = StrictMath.log10(2);
	private static final double LARGEST_FACTOR = 1e140;

	private final QuickSearch search;
	private final List<LimitLine> lines;
	private final GainReference reference;
	private final Subject subject;
	private final double[] factors;
	private boolean possible = true;
	private int exponent;
	private double doubt;
	private List<Stretch> referenceStretches = List.of();
	private double slack;

	/** Prepares a search; not a limit of negative infinity among the lines. */
	QuickGain(QuickSearch search, List<LimitLine> lines, GainReference reference, Subject subject) {
		this.search = search;
		this.lines = lines;
		this.reference = reference;
		this.subject = subject;
		this.factors = new double[lines.size()];
	}

	/** The proof, when double precision is enough for the verdict and for a tight enclosure. */
	Optional<Proof> proof() {
		search.load(subject);
		double unit = unit();
		double limitDoubt = 0;
		for (int k = 0; k < factors.length; k++) {
			LimitLine line = lines.get(k);
			double level = -line.fromDb() / 20;
			if (line.isConstant()) {
				// The power errs by one unit in the last place, the exponent by a few units of its terms.
				double shift = exponent * LOG10_OF_2;
				limitDoubt = Math.max(limitDoubt, (4 + 8 * (Math.abs(level) + Math.abs(shift))) * 0x1p-53);
				factors[k] = StrictMath.pow(10, level + shift) * unit;
			} else {
				limitDoubt = Math.max(limitDoubt, LocalSlope.doubt(line));
				factors[k] = Math.scalb(unit, exponent);
				possible &= isComfortable(StrictMath.pow(10, level))
						&& isComfortable(StrictMath.pow(10, -line.toDb() / 20));
			}
			possible &= isComfortable(factors[k]);
		}
		if (!possible) {
			return Optional.empty();
		}
		search.search(lines, factors);
		slack = 1 + 2 * (doubt + limitDoubt) + 0x1p-49;
		double lo = search.lo() / slack;
		double hi = search.hi() * slack;
		boolean decided = hi <= 1 || lo > 1;
		boolean tight = hi <= lo * WIDE || lo > HOPELESS;
		if (!decided || !tight) {
			return Optional.empty();
		}
		Enclosure margin = new Enclosure(-up(hi), lo == 0 ? Double.POSITIVE_INFINITY : -down(lo));
		return Optional.of(GainReport.of(hi <= 1 ? Verdict.MET : Verdict.MISSED, search.line(), search.place(),
				margin, ""));
	}

	/** Where the largest gain of a reference band may be, after {@link #proof()}; empty for other references. */
	List<Stretch> referenceStretches() {
		return referenceStretches;
	}

	/** What an exact search has to look at after {@link #proof()} gave none. */
	List<Stretch> open() {
		if (possible) {
			return search.open(lines, factors, slack * slack);
		}
		List<Stretch> stretches = new ArrayList<>();
		for (LimitLine line : lines) {
			stretches.addAll(line.stretches(subject.sampleRate(), subject.taps().length()));
		}
		return stretches;
	}

	// Squares and products of two such factors stay far from the ends of the range of doubles.
	private static boolean isComfortable(double factor) {
		return factor > 1 / LARGEST_FACTOR && factor < LARGEST_FACTOR;
	}

	// What a scaled gain of 1 is worth, relative to what 0 dB stands for, but for a power of two.
	private double unit() {
		switch (reference) {
			case GainReference.Absolute absolute -> {
				exponent = subject.taps().scaled().exponent();
				return 1;
			}
			case GainReference.AtFrequency at -> {
				return inverse(search.gainAt(at.frequency()));
			}
			case GainReference.LargestIn in -> {
				List<LimitLine> band = List.of(new LimitLine(in.from(), in.to(), 0, 0, true, false));
				double[] plain = { 1 };
				search.search(band, plain);
				Enclosure largest = new Enclosure(search.lo(), search.hi());
				referenceStretches = search.open(band, plain, 1 + 0x1p-40);
				return inverse(largest);
			}
		}
	}

	private double inverse(Enclosure gain) {
		possible = gain.lo() > 0 && gain.hi() <= gain.lo() * WIDE;
		doubt = (gain.hi() - gain.lo()) / gain.lo() + 0x1p-50;
		return 2 / (gain.lo() + gain.hi());
	}

	// Decibels of a ratio of gains, a logarithm within one unit in the last place.
	private static double up(double ratio) {
		double db = 20 * StrictMath.log10(ratio);
		return Double.isInfinite(db) ? db : db + 4 * Math.ulp(db);
	}

	private static double down(double ratio) {
		double db = 20 * StrictMath.log10(ratio);
		return Double.isInfinite(db) ? db : db - 4 * Math.ulp(db);
	}
}
