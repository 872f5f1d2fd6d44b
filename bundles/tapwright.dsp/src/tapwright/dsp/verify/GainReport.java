// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.verify.ExactSearch.Worst;

/** Puts the outcome of a gain proof into numbers and words that agree with its verdict. */
final class GainReport {

	private GainReport() {
	}

	/** The proof that an enclosed load amounts to. */
	static Proof of(FixedPoint fix, Verdict verdict, Worst worst, double sampleRate, String note) {
		Enclosure margin = new Enclosure(worst.hi() == null ? Double.NEGATIVE_INFINITY : -decibels(fix, worst.hi())
				.hi(),
				-decibels(fix, worst.lo()).lo());
		return of(verdict, worst.line(), worst.line().hertz(worst.place(), sampleRate), margin, note);
	}

	/** The proof that an enclosed margin amounts to. */
	static Proof of(Verdict verdict, LimitLine line, double place, Enclosure margin, String note) {
		Enclosure sure = switch (verdict) {
			case MET -> new Enclosure(Math.max(margin.lo(), 0), Math.max(margin.hi(), 0));
			case MISSED -> new Enclosure(Math.min(margin.lo(), -Double.MIN_VALUE), Math.min(margin.hi(),
					-Double.MIN_VALUE));
			case UNPROVEN -> margin;
		};
		double limit = line.at(place);
		// The limit between breakpoints is rounded, at most by a few units in the last place of the limits at the ends.
		double slack = line.isConstant() ? 0 : 16 * Math.ulp(Math.max(Math.abs(line.fromDb()), Math.abs(line.toDb())));
		Enclosure distance = line.upper() ? sure.negate() : sure;
		double low = limit + distance.lo() - slack;
		double high = limit + distance.hi() + slack;
		boolean exact = low == high && distance.lo() == 0;
		return new Proof(verdict, place, exact ? Enclosure.of(limit) : new Enclosure(Math.nextDown(low),
				Double.isInfinite(high) ? high : Math.nextUp(high)), limit,
				sure, note);
	}

	/** Adds to an undecided proof why it is undecided. */
	static Proof explained(Proof proof, Patience patience) {
		if (proof.verdict() != Verdict.UNPROVEN) {
			return proof;
		}
		String why = patience.wasOver() ? "The time limit of the proof ended before it was decided."
				: "The worst gain is closer to the limit than one part in 1e25.";
		return new Proof(proof.verdict(), proof.worst(), proof.value(), proof.limit(), proof.margin(), why);
	}

	/** Ten times the decimal logarithm of a power ratio in units of the arithmetic. */
	static Enclosure decibels(FixedPoint fix, BigInteger load) {
		if (load.signum() == 0) {
			return Enclosure.of(Double.NEGATIVE_INFINITY);
		}
		return load.equals(fix.one()) ? Enclosure.of(0)
				: fix.toDoubles(fix.divide(fix.ln(fix.exact(load)).multiply(BigInteger.TEN), fix.ln10()));
	}
}
