// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.exact.Rationals;

/** Decibels of exact power ratios. */
final class Decibels {

	private static final int BITS = 320;

	private Decibels() {
	}

	/** Encloses ten times the decimal logarithm; negative infinity for zero. */
	static Enclosure ofPower(BigFraction ratio) {
		if (ratio.getNumerator().signum() == 0) {
			return Enclosure.of(Double.NEGATIVE_INFINITY);
		}
		if (ratio.equals(BigFraction.ONE)) {
			return Enclosure.of(0);
		}
		FixedPoint fix = new FixedPoint(BITS);
		return fix.toDoubles(fix.divide(logarithm(fix, ratio).multiply(BigInteger.TEN), fix.ln10()));
	}

	/** The sign of 10^(db/10) less the ratio; zero also when they agree to ninety digits. */
	static int compareLimit(double db, BigFraction ratio) {
		FixedPoint fix = new FixedPoint(BITS);
		Interval limit = fix.multiply(fix.of(Rationals.exact(db).divide(10)), fix.ln10());
		Interval difference = limit.subtract(logarithm(fix, ratio));
		return difference.isPositive() ? 1 : difference.isNegative() ? -1 : 0;
	}

	private static Interval logarithm(FixedPoint fix, BigFraction ratio) {
		return fix.ln(fix.exact(ratio.getNumerator().shiftLeft(BITS)))
				.subtract(fix.ln(fix.exact(ratio.getDenominator().shiftLeft(BITS))));
	}
}
