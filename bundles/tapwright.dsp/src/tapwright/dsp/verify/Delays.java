// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.Rationals;

/** Enclosures in seconds of what was found in samples. */
final class Delays {

	private Delays() {
	}

	static Enclosure seconds(DelayCurve.Extreme extreme, double rate) {
		return new Enclosure(Rationals.below(Exactly.seconds(extreme.lo(), rate)),
				extreme.hi() == null ? Double.POSITIVE_INFINITY : Rationals.above(Exactly.seconds(extreme.hi(), rate)));
	}

	/** A margin in samples between two bounds, the lower one null when there is none; agrees with the verdict. */
	static Enclosure margin(BigFraction most, BigFraction least, double rate, Verdict verdict) {
		double lo = least == null ? Double.NEGATIVE_INFINITY : Rationals.below(Exactly.seconds(least, rate));
		double hi = Rationals.above(Exactly.seconds(most, rate));
		return switch (verdict) {
			case MET -> new Enclosure(Math.max(lo, 0), Math.max(hi, 0));
			case MISSED -> new Enclosure(Math.min(lo, -Double.MIN_VALUE), Math.min(hi, -Double.MIN_VALUE));
			case UNPROVEN -> new Enclosure(lo, hi);
		};
	}
}
