// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.List;
import java.util.Optional;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.verify.ExactSearch.Stretch;
import tapwright.dsp.verify.ExactSearch.Worst;

/** One proof of a gain limit: searches with rising precision until the verdict is certain. */
final class GainProof {

	/** Relative gaps of the search, as powers of two. Loads are squares,
			so the last one decides distances beyond 1e-25. */
	private static final int[] GAPS = { 44, 88 };
	/** Precisions for what lies beside places where the limit is touched exactly. */
	private static final int[] TOUCH_PRECISIONS = { 128, 512, 2048 };
	private static final int SPARE_BITS = 48;
	private static final double DECIBELS_PER_BIT = 20 * Math.log10(2);

	private final List<LimitLine> lines;
	private final GainReference reference;
	private final Subject subject;
	private final ExactTaps taps;
	private final double sampleRate;
	private final Patience patience;

	GainProof(List<LimitLine> lines, GainReference reference, Subject subject, Effort effort) {
		this.lines = lines;
		this.reference = reference;
		this.subject = subject;
		this.taps = subject.taps();
		this.sampleRate = subject.sampleRate();
		this.patience = new Patience(effort);
	}

	Proof prove() {
		if (taps.isZero()) {
			return zeroFilter();
		}
		Optional<LimitLine> nothing = lines.stream().filter(LimitLine::isNothing).findFirst();
		if (nothing.isPresent()) {
			return noGainAllowed(new SplitTaps(taps), nothing.get());
		}
		QuickSearch space = QuickGain.WORK_SPACE.get();
		try {
			QuickGain quick = new QuickGain(space, lines, reference, subject);
			return quick.proof().orElseGet(() -> {
				SplitTaps split = new SplitTaps(taps);
				List<Stretch> open = quick.open();
				return search(split, new GainUnit(reference, quick.referenceStretches(), split, sampleRate, patience),
						open);
			});
		} finally {
			if (!space.isWorthKeeping()) {
				QuickGain.WORK_SPACE.remove();
			}
		}
	}

	private Proof zeroFilter() {
		LimitLine line = lines.stream().filter(any -> !any.upper()).findFirst().orElse(lines.getFirst());
		double margin = !line.upper() ? Double.NEGATIVE_INFINITY : line.isNothing() ? 0 : Double.POSITIVE_INFINITY;
		return new Proof(line.upper() ? Verdict.MET : Verdict.MISSED, line.from(),
				Enclosure.of(Double.NEGATIVE_INFINITY),
				line.at(line.from()), Enclosure.of(margin), "All coefficients are zero.");
	}

	// A band of positive width holds a place with gain: a filter has finitely many zeros.
	private Proof noGainAllowed(SplitTaps split, LimitLine line) {
		List<Stretch> stretches = reference instanceof GainReference.LargestIn in
				? new LimitLine(in.from(), in.to(), 0, 0, true, false).stretches(sampleRate, taps.length()) : List.of();
		GainUnit unit = new GainUnit(reference, stretches, split, sampleRate, patience);
		FixedPoint fix = new FixedPoint(precision(unit, GAPS[0]));
		Worst worst = searcher(fix, split, unit, GAPS[0]).worst(line.stretches(sampleRate, taps.length()), GAPS[0],
				Optional.empty());
		boolean proven = line.from() < line.to() || worst.lo().signum() > 0;
		Enclosure value = new Enclosure(GainReport.decibels(fix, worst.lo()).lo(), GainReport.decibels(fix,
				worst.hi()).hi());
		return new Proof(proven ? Verdict.MISSED : Verdict.UNPROVEN, line.hertz(worst.place(), sampleRate), value,
				Double.NEGATIVE_INFINITY, proven ? Enclosure.of(Double.NEGATIVE_INFINITY)
						: new Enclosure(Double.NEGATIVE_INFINITY, 0),
				proven ? "" : "The gain is too small to tell from zero; state an exact null instead.");
	}

	private Proof search(SplitTaps split, GainUnit unit, List<Stretch> stretches) {
		Proof proof = null;
		for (int gap : GAPS) {
			FixedPoint fix = new FixedPoint(precision(unit, gap));
			Worst worst = searcher(fix, split, unit, gap).worst(stretches, gap, Optional.empty());
			proof = GainReport.of(fix, verdict(fix, worst), worst, sampleRate, "");
			if (proof.verdict() != Verdict.UNPROVEN || patience.wasOver()) {
				break;
			}
			if (gap == GAPS[0]) {
				Optional<Touching> touching = Touching.find(lines, reference, taps, sampleRate);
				if (touching.isPresent()) {
					return besideTouching(split, unit, touching.get(), touching.get().untouched(stretches));
				}
			}
		}
		List<Stretch> others = stretches.stream().filter(stretch -> !isMetByDefinition(stretch.line())).toList();
		if (proof.verdict() == Verdict.UNPROVEN && others.size() < stretches.size()) {
			return metByDefinition(split, unit, proof, others);
		}
		return GainReport.explained(proof, patience);
	}

	// No gain within the reference band is above the largest one there.
	private boolean isMetByDefinition(LimitLine line) {
		return reference instanceof GainReference.LargestIn in && line.upper() && in.from() <= line.from()
				&& line.to() <= in.to()
				&& Math.min(line.fromDb(), line.toDb()) >= 0;
	}

	private Proof metByDefinition(SplitTaps split, GainUnit unit, Proof touching, List<Stretch> others) {
		Proof met = new Proof(Verdict.MET, touching.worst(), touching.value(), touching.limit(),
				new Enclosure(0, Math.max(0, touching.margin().hi())), "The limit is the reference itself.");
		if (others.isEmpty()) {
			return met;
		}
		Proof rest = search(split, unit, others);
		return rest.verdict() == Verdict.MET ? met : rest;
	}

	private Proof besideTouching(SplitTaps split, GainUnit unit, Touching touching, List<Stretch> stretches) {
		Proof proof = null;
		for (int bits : TOUCH_PRECISIONS) {
			FixedPoint fix = new FixedPoint(precision(unit, bits));
			Worst worst = searcher(fix, split, unit, bits).worst(stretches, bits, Optional.of(touching.attained(fix)));
			Verdict verdict = touching.isBroken() ? Verdict.MISSED : verdict(fix, worst);
			boolean atTouch = worst.lo().equals(fix.one());
			proof = GainReport.of(fix, verdict, atTouch ? touching.worst(fix, worst.hi(), verdict) : worst, sampleRate,
					"The limit is touched exactly.");
			if (verdict != Verdict.UNPROVEN || patience.wasOver()) {
				break;
			}
		}
		return GainReport.explained(proof, patience);
	}

	private static Verdict verdict(FixedPoint fix, Worst worst) {
		return worst.hi() != null && worst.hi().compareTo(fix.one()) <= 0 ? Verdict.MET
				: worst.lo().compareTo(fix.one()) > 0 ? Verdict.MISSED : Verdict.UNPROVEN;
	}

	private ExactSearch searcher(FixedPoint fix, SplitTaps split, GainUnit unit, int gap) {
		Interval logUnit = unit.logarithm(fix, gap + 2);
		return new ExactSearch(fix, split, sampleRate, logUnit, patience);
	}

	// Loads that are far from 1 need more bits to be seen well.
	private int precision(GainUnit unit, int gap) {
		double largest = unit.depth();
		for (LimitLine line : lines) {
			for (double db : new double[] { line.fromDb(), line.toDb() }) {
				double level = line.isNothing() ? 0 : db / DECIBELS_PER_BIT;
				largest = Math.max(largest, Math.abs(level + unit.log2()));
			}
		}
		return gap + SPARE_BITS + 2 * (int) Math.ceil(largest) + 2 * (32 - Integer.numberOfLeadingZeros(taps.length()));
	}
}
