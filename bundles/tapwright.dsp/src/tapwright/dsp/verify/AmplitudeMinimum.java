// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.exact.Symmetry;

/**
 * The smallest amplitude of symmetric or antisymmetric coefficients over a band, and whether it is negative.
 *
 * @param verdict
 *            met when the amplitude is nowhere negative in the band
 * @param least
 *            encloses the smallest amplitude
 * @param place
 *            where it is nearly reached, in cycles per sample
 */
record AmplitudeMinimum(Verdict verdict, Enclosure least, BigFraction place) {

	private static final ThreadLocal<QuickMinimum> WORK_SPACE = ThreadLocal.withInitial(QuickMinimum::new);
	/** Distances below 2^-GAP_BITS of the sum of absolute coefficients are not told from zero. */
	private static final int GAP_BITS = 96;
	private static final int SPARE_BITS = 40;

	/** Searches a band given in cycles per sample, its edges included. */
	static AmplitudeMinimum over(ExactTaps taps, BigFraction from, BigFraction to, Patience patience) {
		if (taps.isZero()) {
			return new AmplitudeMinimum(Verdict.MET, Enclosure.of(0), from);
		}
		QuickMinimum quick = WORK_SPACE.get();
		quick.search(taps, from, to);
		if (quick.place() != null && (quick.lo() >= 0 || quick.hi() < 0)) {
			int exponent = taps.scaled().exponent();
			return new AmplitudeMinimum(quick.hi() < 0 ? Verdict.MISSED : Verdict.MET,
					new Enclosure(scale(quick.lo(), exponent, -1), scale(quick.hi(), exponent, 1)), quick.place());
		}
		return exact(taps, new ArrayList<>(quick.open()), from, to, patience);
	}

	// Scaling is exact but where it leaves the range of doubles.
	private static double scale(double value, int exponent, int direction) {
		double scaled = Math.scalb(value, exponent);
		return direction < 0 ? Math.nextDown(scaled) : Math.nextUp(scaled);
	}

	private static AmplitudeMinimum exact(ExactTaps taps, List<BigFraction[]> stretches, BigFraction from,
			BigFraction to,
			Patience patience) {
		ZeroAtRest zeros = new ZeroAtRest(taps);
		// Beside a zero of high order the amplitude is very small.
		int gapBits = zeros.zeros.isEmpty() ? GAP_BITS : 4 * GAP_BITS;
		FixedPoint fix = new FixedPoint(gapBits + SPARE_BITS + 2 * (32 - Integer.numberOfLeadingZeros(taps.length())));
		SplitTaps split = new SplitTaps(taps);
		BigInteger gap = fix.one().shiftRight(gapBits);
		BigInteger least = null;
		BigInteger lowest = null;
		BigFraction place = from;
		boolean negative = false;
		boolean touched = false;
		List<BigFraction[]> open = stretches;
		while (!open.isEmpty()) {
			List<BigFraction[]> next = new ArrayList<>();
			for (BigFraction[] stretch : open) {
				patience.checkCancelled();
				ZeroAtRest.Outcome outcome = zeros.examine(stretch[0], stretch[1], from, to);
				negative |= outcome.negative();
				touched |= outcome.touched();
				for (BigFraction[] rest : outcome.rest()) {
					BigFraction centre = rest[0].add(rest[1]).divide(2);
					BigFraction radius = rest[1].subtract(centre);
					LocalFunction local = split.amplitude(fix, centre, radius);
					IntervalPolynomial.Largest largest = local.polynomial().negate().largest();
					Interval value = largest.value().widen(local.error()).negate();
					if (least == null || value.hi().compareTo(least) < 0) {
						least = value.hi();
						place = centre.add(radius.multiply(fix.rational(largest.point())));
					}
					boolean narrow = value.hi().subtract(value.lo()).compareTo(gap) <= 0
							|| radius.compareTo(fix.rational(BigInteger.ONE)) <= 0 || patience.isOver();
					if (narrow || value.lo().compareTo(least) >= 0) {
						lowest = lowest == null ? value.lo() : lowest.min(value.lo());
					} else {
						next.add(new BigFraction[] { rest[0], centre });
						next.add(new BigFraction[] { centre, rest[1] });
					}
				}
			}
			open = next;
		}
		if (touched) {
			least = least == null ? BigInteger.ZERO : least.min(BigInteger.ZERO);
			lowest = lowest == null ? BigInteger.ZERO : lowest.min(BigInteger.ZERO);
		}
		Verdict verdict = negative || least.signum() < 0 ? Verdict.MISSED : lowest.signum() >= 0 ? Verdict.MET
				: Verdict.UNPROVEN;
		BigFraction unit = taps.unit().multiply(ExactTaps.powerOfTwo(split.sizeBits()));
		return new AmplitudeMinimum(verdict, new Enclosure(Rationals.below(fix.rational(lowest.min(least))
				.multiply(unit)),
				Rationals.above(fix.rational(least).multiply(unit))), place);
	}

	/** What exact derivatives say about the surroundings of exact zeros at frequencies with rational cosine. */
	private static final class ZeroAtRest {

		private record Zero(BigFraction place, int below, int above, BigFraction radius) {
		}

		private record Outcome(boolean negative, boolean touched, List<BigFraction[]> rest) {
		}

		private final List<Zero> zeros = new ArrayList<>();

		ZeroAtRest(ExactTaps taps) {
			boolean sines = taps.symmetry() == Symmetry.ODD;
			int n = taps.length();
			// With an even number of coefficients the amplitude is a sum over integer multiples of half the angle.
			int halves = n % 2 == 0 ? 2 : 1;
			BigInteger[] r = new BigInteger[n];
			Arrays.fill(r, BigInteger.ZERO);
			for (int after = n / 2; after < n; after++) {
				r[halves * (2 * after - n + 1) / 2] = sines ? taps.integer(n - 1 - after) : taps.integer(after);
			}
			Touch touch = new Touch(r, sines);
			for (int twelfth : Touch.TWELFTHS) {
				if (twelfth * halves <= 6 && touch.value(twelfth).signum() == 0) {
					Touch.Near near = touch.near(twelfth);
					zeros.add(new Zero(new BigFraction(twelfth * halves, 12), near.below(), near.above(),
							near.radius().multiply(halves)));
				}
			}
		}

		Outcome examine(BigFraction lo, BigFraction hi, BigFraction from, BigFraction to) {
			List<BigFraction[]> rest = new ArrayList<>();
			boolean negative = false;
			boolean touched = false;
			BigFraction start = lo;
			for (Zero zero : zeros) {
				if (zero.place.compareTo(lo) < 0 || zero.place.compareTo(hi) > 0) {
					continue;
				}
				touched = true;
				negative |= zero.place.compareTo(from) > 0 && zero.below < 0
						|| zero.place.compareTo(to) < 0 && zero.above < 0;
				BigFraction below = zero.place.subtract(zero.radius);
				if (start.compareTo(below) < 0) {
					rest.add(new BigFraction[] { start, below });
				}
				start = zero.place.add(zero.radius);
			}
			if (start.compareTo(hi) <= 0) {
				rest.add(new BigFraction[] { start, hi });
			}
			return new Outcome(negative, touched, rest);
		}
	}
}
