// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Rationals;

/** Proofs about values that are known as rationals: one comparison. */
final class Exactly {

	private Exactly() {
	}

	/** The value may not exceed the limit; an infinite limit is always kept. */
	static Proof atMost(BigFraction value, double limit, double place, String note) {
		if (Double.isInfinite(limit)) {
			return new Proof(limit > 0 ? Verdict.MET : Verdict.MISSED, place, enclose(value), limit,
					Enclosure.of(limit), note);
		}
		return proof(value, limit, Rationals.exact(limit).subtract(value), place, note);
	}

	/** The value may not be below the limit; an infinite limit is always kept. */
	static Proof atLeast(BigFraction value, double limit, double place, String note) {
		if (Double.isInfinite(limit)) {
			return new Proof(limit < 0 ? Verdict.MET : Verdict.MISSED, place, enclose(value), limit,
					Enclosure.of(-limit), note);
		}
		return proof(value, limit, value.subtract(Rationals.exact(limit)), place, note);
	}

	/** The value must lie between two limits; speaks of the one that is nearer. */
	static Proof between(BigFraction value, double min, double max, double place, String note) {
		Proof low = atLeast(value, min, place, note);
		Proof high = atMost(value, max, place, note);
		return low.margin().lo() <= high.margin().lo() ? low : high;
	}

	private static Proof proof(BigFraction value, double limit, BigFraction margin, double place, String note) {
		boolean met = margin.compareTo(BigFraction.ZERO) >= 0;
		Enclosure distance = enclose(margin);
		return new Proof(met ? Verdict.MET : Verdict.MISSED, place, enclose(value), limit, distance, note);
	}

	/** The smallest interval of doubles around a rational. */
	static Enclosure enclose(BigFraction value) {
		return new Enclosure(Rationals.below(value), Rationals.above(value));
	}

	/** The exact double nearest to a number of samples in seconds. */
	static double seconds(long samples, double sampleRate) {
		return samples / sampleRate;
	}

	/** Samples as seconds, exactly. */
	static BigFraction seconds(BigFraction samples, double sampleRate) {
		return samples.divide(Rationals.exact(sampleRate));
	}

	/** Refuses a limit that is not a number, or below zero. */
	static void checkLimit(String what, double limit) {
		if (!(limit >= 0) || Double.isInfinite(limit)) {
			throw new IllegalArgumentException(what + " is " + limit + "; it must be 0 or a positive number");
		}
	}
}
