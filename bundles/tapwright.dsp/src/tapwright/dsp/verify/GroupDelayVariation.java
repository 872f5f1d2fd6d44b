// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Rationals;

/**
 * Largest less smallest group delay over a band stays within a limit. The proof's unit is seconds, its place the
 * frequency in hertz of the largest delay.
 *
 * @param from
 *            lower band edge in hertz
 * @param to
 *            upper band edge in hertz
 * @param max
 *            largest variation in seconds, not negative
 */
public record GroupDelayVariation(double from, double to, double max) implements Requirement {

	private static final int[] STEPS = { 10, 26 };

	/** Checks the numbers. */
	public GroupDelayVariation {
		Frequencies.checkBand("the band", from, to);
		Exactly.checkLimit("the largest variation of the group delay", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		double rate = subject.sampleRate();
		Frequencies.checkBelowHalf("the upper band edge", to, rate);
		Patience patience = new Patience(effort);
		DelayCurve curve = new DelayCurve(subject.taps(), LimitLine.turns(from, rate), LimitLine.turns(to, rate),
				patience);
		if (curve.isConstant()) {
			return Exactly.atMost(BigFraction.ZERO, max, from, "The coefficients are symmetric.");
		}
		BigFraction limit = Rationals.exact(max).multiply(Rationals.exact(rate));
		Proof proof = null;
		for (int step : STEPS) {
			DelayCurve.Extreme high = curve.largest(step, 1);
			DelayCurve.Extreme low = curve.largest(step, -1);
			BigFraction least = high.lo().add(low.lo());
			BigFraction most = high.hi() == null || low.hi() == null ? null : high.hi().add(low.hi());
			Verdict verdict = most != null && most.compareTo(limit) <= 0 ? Verdict.MET
					: least.compareTo(limit) > 0 ? Verdict.MISSED : Verdict.UNPROVEN;
			proof = new Proof(verdict, Frequencies.hertz(high.place(), rate),
					Delays.seconds(new DelayCurve.Extreme(least, most, high.place()), rate), max,
					Delays.margin(limit.subtract(least), most == null ? null : limit.subtract(most), rate, verdict),
					verdict != Verdict.UNPROVEN ? ""
							: patience.wasOver() ? "The time limit of the proof ended before it was decided."
									: "The variation is too close to the limit to be told from it.");
			if (verdict != Verdict.UNPROVEN) {
				break;
			}
		}
		return proof;
	}
}
