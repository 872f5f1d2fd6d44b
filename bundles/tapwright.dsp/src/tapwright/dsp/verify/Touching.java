// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.verify.ExactSearch.Stretch;
import tapwright.dsp.verify.ExactSearch.Worst;

/** The places where a filter is exactly at a limit, and what it does beside them. At least one. */
final class Touching {

	/** A whole number of these decibels is a rational gain, and no other number of decibels is. */
	private static final int RATIONAL_DB = 20;

	private record Place(LimitLine line, BigFraction place, Touch.Near near) {
	}

	private final List<Place> kept = new ArrayList<>();
	private final List<Place> broken = new ArrayList<>();
	private final double sampleRate;

	private Touching(double sampleRate) {
		this.sampleRate = sampleRate;
	}

	/** Looks at the frequencies with rational cosine. */
	static Optional<Touching> find(List<LimitLine> lines, GainReference reference, ExactTaps taps, double sampleRate) {
		List<LimitLine> rational = lines.stream().filter(line -> line.isConstant()
				&& line.fromDb() % RATIONAL_DB == 0).toList();
		Touching touching = new Touching(sampleRate);
		if (!rational.isEmpty() && !(reference instanceof GainReference.LargestIn)) {
			Touch touch = Touch.squareOf(taps);
			touching.unit(touch, reference, taps).ifPresent(unit -> rational.forEach(line -> touching.examine(touch,
					line, unit)));
		}
		return touching.kept.isEmpty() && touching.broken.isEmpty() ? Optional.empty() : Optional.of(touching);
	}

	// Square of the gain that 0 dB stands for, over the squared unit of the coefficients, when that is rational.
	private Optional<BigFraction> unit(Touch touch, GainReference reference, ExactTaps taps) {
		if (!(reference instanceof GainReference.AtFrequency at)) {
			return Optional.of(taps.unit().pow(-2));
		}
		BigFraction twelfths = LimitLine.turns(at.frequency(), sampleRate).multiply(12);
		for (int twelfth : Touch.TWELFTHS) {
			if (twelfths.equals(new BigFraction(twelfth))) {
				return Optional.of(new BigFraction(touch.value(twelfth)));
			}
		}
		return Optional.empty();
	}

	private void examine(Touch touch, LimitLine line, BigFraction unit) {
		BigFraction from = LimitLine.turns(line.from(), sampleRate);
		BigFraction to = LimitLine.turns(line.to(), sampleRate);
		BigFraction square = new BigFraction(100).pow((int) (line.fromDb() / RATIONAL_DB)).multiply(unit);
		for (int twelfth : Touch.TWELFTHS) {
			BigFraction place = new BigFraction(twelfth, 12);
			if (place.compareTo(from) >= 0 && place.compareTo(to) <= 0
					&& square.equals(new BigFraction(touch.value(twelfth)))) {
				Touch.Near near = touch.near(twelfth);
				int bad = line.upper() ? 1 : -1;
				boolean below = place.compareTo(from) > 0 && near.below() == bad;
				boolean above = place.compareTo(to) < 0 && near.above() == bad;
				if (below || above) {
					BigFraction step = min(near.radius(), above ? to.subtract(place) : place.subtract(from)).divide(2);
					broken.add(new Place(line, above ? place.add(step) : place.subtract(step), near));
				} else {
					kept.add(new Place(line, place, near));
				}
			}
		}
	}

	/** Whether the limit is proven to be missed beside a place. */
	boolean isBroken() {
		return !broken.isEmpty();
	}

	/** The load of 1 at a touched place. */
	Worst attained(FixedPoint fix) {
		return worst(fix, fix.one(), Verdict.MET);
	}

	/** A place with the load of 1, or a place that breaks the limit by less than the load tells. */
	Worst worst(FixedPoint fix, BigInteger highest, Verdict verdict) {
		Place place = isBroken() ? broken.getFirst() : kept.getFirst();
		return new Worst(fix.one(), verdict == Verdict.MET ? fix.one() : highest, place.line, place.place);
	}

	/** What remains to be searched. */
	List<Stretch> untouched(List<Stretch> stretches) {
		List<Stretch> rest = stretches;
		for (Place touched : kept) {
			List<Stretch> next = new ArrayList<>();
			for (Stretch stretch : rest) {
				if (!stretch.line().equals(touched.line)) {
					next.add(stretch);
				} else if (touched.near.radius() != null) {
					outside(stretch, touched.place.subtract(touched.near.radius()),
							touched.place.add(touched.near.radius()), next);
				}
			}
			rest = next;
		}
		return rest;
	}

	private static void outside(Stretch stretch, BigFraction below, BigFraction above, List<Stretch> parts) {
		if (stretch.lo().compareTo(below) < 0) {
			parts.add(new Stretch(stretch.line(), stretch.lo(), min(stretch.hi(), below)));
		}
		if (stretch.hi().compareTo(above) > 0) {
			BigFraction lo = stretch.lo().compareTo(above) >= 0 ? stretch.lo() : above;
			parts.add(new Stretch(stretch.line(), lo, stretch.hi()));
		}
	}

	private static BigFraction min(BigFraction a, BigFraction b) {
		return a.compareTo(b) <= 0 ? a : b;
	}
}
