// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.exact.Symmetry;

/**
 * The group delay over a band, in samples, bracketed by sums of cosines with exact coefficients.
 * <p>
 * With c = (N-1)/2 and g[k] = 2 (k-c) h[k] the group delay is c + Q / (2P), where P = |H|^2 and Q = Re(G conj(H)).
 * Both are sums of cosines whose coefficients are correlations of h and g, so the delay is at most T where 2 (T-c) P
 * - Q is nowhere negative. The largest delay is found by W. Dinkelbach's method for ratios (Management Science 13(7),
 * 1967): the place where this difference is smallest gives a better T, until the difference for a T slightly above is
 * proven to have no negative value. For symmetric coefficients the delay is c everywhere.
 */
final class DelayCurve {

	private static final int PATIENCE = 40;
	private static final int BITS = 400;
	private static final int FINEST_STEP = 26;

	/**
	 * An enclosed extreme value in samples.
	 *
	 * @param lo
	 *            lower bound
	 * @param hi
	 *            upper bound, null when none was found
	 * @param place
	 *            in cycles per sample, where the bound on the inner side is reached
	 */
	record Extreme(BigFraction lo, BigFraction hi, BigFraction place) {
	}

	private final ExactTaps taps;
	private final BigFraction from;
	private final BigFraction to;
	private final Patience patience;
	private final BigInteger[] power;
	private final BigInteger[] moment;
	private final BigFraction middle;

	DelayCurve(ExactTaps taps, BigFraction from, BigFraction to, Patience patience) {
		this.taps = taps;
		this.from = from;
		this.to = to;
		this.patience = patience;
		int n = taps.length();
		middle = new BigFraction(n - 1, 2);
		power = new BigInteger[n];
		moment = new BigInteger[n];
		if (isConstant()) {
			return;
		}
		Arrays.fill(power, BigInteger.ZERO);
		Arrays.fill(moment, BigInteger.ZERO);
		for (int i = 0; i < n; i++) {
			for (int k = 0; k <= i; k++) {
				BigInteger product = taps.integer(i).multiply(taps.integer(k));
				// Half of g[i] h[k] + g[k] h[i], since both stand for one cosine.
				power[i - k] = power[i - k].add(product);
				moment[i - k] = moment[i - k].add(product.multiply(BigInteger.valueOf(i + k - n + 1)));
			}
		}
	}

	/** Whether the delay is the same at all frequencies. */
	boolean isConstant() {
		return taps.symmetry() != Symmetry.NONE;
	}

	/** Half the number of coefficients less one: the delay when it is constant. */
	BigFraction middle() {
		return middle;
	}

	/** Whether the delay is proven to be at most this many samples (or at least, for the negative side). */
	AmplitudeMinimum below(BigFraction samples, int side) {
		return AmplitudeMinimum.over(difference(samples, side), from, to, patience);
	}

	/**
	 * Encloses the largest delay.
	 *
	 * @param step
	 *            relative width of the enclosure as a negative power of ten, up to 26
	 * @param side
	 *            1, or -1 for the largest negative delay
	 */
	Extreme largest(int step, int side) {
		if (isConstant()) {
			BigFraction delay = side < 0 ? middle.negate() : middle;
			return new Extreme(delay, delay, from);
		}
		BigFraction place = from.add(to).divide(2);
		BigFraction best = at(place, side);
		int digits = Math.min(step, FINEST_STEP);
		for (int round = 1; !patience.isOver(); round++) {
			BigFraction above = best.add(tolerance(digits));
			AmplitudeMinimum minimum = below(above, side);
			if (minimum.verdict() == Verdict.MET) {
				return new Extreme(best, above, place);
			}
			BigFraction next = at(minimum.place(), side);
			if (next.compareTo(best) > 0) {
				best = next;
				place = minimum.place();
			} else if (digits == 1) {
				break;
			}
			// No progress: the difference is too close to zero to be told from it.
			digits = round % PATIENCE == 0 || next.compareTo(best) < 0 ? Math.max(1, digits - 1) : digits;
		}
		return new Extreme(best, null, place);
	}

	// Relative to the length of the filter.
	private BigFraction tolerance(int digits) {
		return new BigFraction(BigInteger.valueOf(taps.length()), BigInteger.TEN.pow(digits));
	}

	/** A lower bound, within the precision of the arithmetic, on side times the delay at a place. */
	BigFraction at(BigFraction place, int side) {
		FixedPoint fix = new FixedPoint(BITS);
		ExactTaps p = sum(power, BigInteger.TWO);
		ExactTaps q = sum(moment, BigInteger.valueOf(side));
		Interval above = value(fix, q, place);
		Interval below = value(fix, p, place);
		if (!below.isPositive()) {
			throw new IllegalArgumentException("the gain is zero at " + place.doubleValue()
					+ " cycles per sample, where the group delay has no value; choose another band");
		}
		BigFraction quotient = fix.rational(fix.divide(above, below).lo());
		return side < 0 ? quotient.subtract(middle) : quotient.add(middle);
	}

	private static Interval value(FixedPoint fix, ExactTaps cosines, BigFraction place) {
		SplitTaps split = new SplitTaps(cosines);
		LocalFunction local = split.amplitude(fix, place, BigFraction.ZERO);
		Interval value = local.polynomial().at(BigInteger.ZERO).widen(local.error());
		return fix.shiftRight(value, -split.sizeBits());
	}

	// 2 (T-c) P - Q, or 2 (T+c) P + Q for the negative side, with all denominators multiplied out.
	private ExactTaps difference(BigFraction samples, int side) {
		BigFraction factor = (side < 0 ? samples.add(middle) : samples.subtract(middle)).multiply(2);
		BigInteger[] sum = new BigInteger[power.length];
		for (int k = 0; k < sum.length; k++) {
			BigInteger part = moment[k].multiply(factor.getDenominator()).multiply(BigInteger.valueOf(side));
			sum[k] = power[k].multiply(factor.getNumerator()).subtract(part);
		}
		return sum(sum, BigInteger.ONE);
	}

	// Symmetric coefficients whose amplitude is r[0] + sum of 2 r[k] cos(kw).
	private static ExactTaps sum(BigInteger[] r, BigInteger factor) {
		int n = r.length;
		List<BigInteger> symmetric = new ArrayList<>();
		for (int k = 1 - n; k < n; k++) {
			symmetric.add(r[Math.abs(k)].multiply(factor));
		}
		return ExactTaps.ofIntegers(symmetric, BigFraction.ONE);
	}
}
