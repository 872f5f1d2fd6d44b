// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Rationals;

/**
 * The group delay stays within limits over a band. The proof's unit is seconds, its place a frequency in hertz. Where
 * the gain is exactly zero the delay counts as its limit from the sides.
 *
 * @param from
 *            lower band edge in hertz
 * @param to
 *            upper band edge in hertz
 * @param min
 *            shortest delay in seconds, negative infinity for none
 * @param max
 *            longest delay in seconds, infinity for none
 */
public record GroupDelay(double from, double to, double min, double max) implements Requirement, ClockRange.Aware {

	/** Checks the numbers. */
	public GroupDelay {
		Frequencies.checkBand("the band", from, to);
		if (!(min <= max) || min == Double.POSITIVE_INFINITY || max == Double.NEGATIVE_INFINITY) {
			throw new IllegalArgumentException("the delay limits " + min + " and " + max
					+ " s leave nothing between them");
		}
		if (Double.isInfinite(min) && Double.isInfinite(max)) {
			throw new IllegalArgumentException("the requirement limits nothing; state a shortest or a longest delay");
		}
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		Frequencies.checkBelowHalf("the upper band edge", to, subject.sampleRate());
		double rate = subject.sampleRate();
		Patience patience = new Patience(effort);
		DelayCurve curve = new DelayCurve(subject.taps(), LimitLine.turns(from, rate), LimitLine.turns(to, rate),
				patience);
		if (curve.isConstant()) {
			return Exactly.between(Exactly.seconds(curve.middle(), rate), min, max, from,
					"The coefficients are symmetric.");
		}
		Proof high = Double.isInfinite(max) ? null : oneSide(curve, rate, max, 1, patience);
		Proof low = Double.isInfinite(min) ? null : oneSide(curve, rate, -min, -1, patience);
		if (low != null) {
			low = new Proof(low.verdict(), low.worst(), low.value().negate(), min, low.margin(), low.note());
		}
		return high == null ? low : low == null ? high : Proofs.worse(high, low);
	}

	// Sufficient, not necessary: the widest band, and the limits in samples that are the strictest of any clock.
	@Override
	public Optional<Proof> prove(Subject subject, Effort effort, ClockRange clocks) {
		double shortest = min / clocks.nominal() * (min > 0 ? clocks.fastest() : clocks.slowest());
		double longest = max / clocks.nominal() * (max > 0 ? clocks.slowest() : clocks.fastest());
		if (!clocks.outward() || shortest > longest) {
			return Optional.empty();
		}
		Proof proof = new GroupDelay(clocks.lowest(from), clocks.highest(to), shortest, longest).prove(subject, effort);
		return proof.verdict() != Verdict.MET ? Optional.empty()
				: Optional.of(new Proof(Verdict.MET, proof.worst(), proof.value(), proof.limit(), proof.margin(),
						"The limit is the strictest of all clocks, in seconds of the nominal one."));
	}

	// The largest delay, or the largest negative delay, against its limit.
	private static Proof oneSide(DelayCurve curve, double rate, double limit, int side, Patience patience) {
		BigFraction samples = Rationals.exact(limit).multiply(Rationals.exact(rate));
		AmplitudeMinimum direct = curve.below(samples, side);
		DelayCurve.Extreme extreme = curve.largest(10, side);
		Verdict verdict = direct.verdict();
		Enclosure value = Delays.seconds(extreme, rate);
		double place = Frequencies.hertz(extreme.place(), rate);
		BigFraction highest = extreme.hi() == null ? null : samples.subtract(extreme.hi());
		Enclosure margin = Delays.margin(samples.subtract(extreme.lo()), highest, rate, verdict);
		String note = verdict != Verdict.UNPROVEN ? "" : patience.wasOver()
				? "The time limit of the proof ended before it was decided."
				: "The worst delay is too close to the limit to be told from it.";
		return new Proof(verdict, place, value, limit, margin, note);
	}
}
