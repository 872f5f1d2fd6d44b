// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.exact.Rationals;

/**
 * The reciprocal of a limit's square, 10^(-L/10) over the square of the gain that 0 dB stands for, as a local
 * function: constant, exponential in s or a power of frequency.
 */
final class InverseLimit {

	private static final int MANY_TERMS = 200;

	private final FixedPoint fix;
	private final LimitLine line;
	private final Interval logUnit;
	private final BigFraction from;
	private final BigFraction to;
	private final Interval constant;

	/**
	 * @param logUnit
	 *            natural logarithm of the square of the gain that 0 dB stands for
	 */
	InverseLimit(FixedPoint fix, LimitLine line, Interval logUnit, double sampleRate) {
		this.fix = fix;
		this.line = line;
		this.logUnit = logUnit;
		this.from = LimitLine.turns(line.from(), sampleRate);
		this.to = LimitLine.turns(line.to(), sampleRate);
		// Nothing to compare with: levels are then relative to 0 dB.
		this.constant = line.isNothing() ? inverse(BigFraction.ZERO) : line.isConstant() ? inverse(db(line.fromDb()))
				: null;
	}

	private Interval inverse(BigFraction db) {
		return fix.exp(fix.multiply(fix.of(db.divide(10)), fix.ln10()).add(logUnit).negate());
	}

	private static BigFraction db(double value) {
		return Rationals.exact(value);
	}

	/** The function around a frequency; empty when the stretch is too wide for a series. */
	Optional<LocalFunction> around(BigFraction centre, BigFraction radius) {
		if (constant != null) {
			return Optional.of(new LocalFunction(new IntervalPolynomial(fix, constant), BigInteger.ZERO));
		}
		BigFraction rise = db(line.toDb()).subtract(db(line.fromDb())).divide(10);
		return line.logarithmic() ? power(rise, centre, radius) : exponential(rise, centre, radius);
	}

	private Optional<LocalFunction> exponential(BigFraction rise, BigFraction centre, BigFraction radius) {
		BigFraction width = to.subtract(from);
		BigFraction level = db(line.fromDb()).divide(10).add(rise.multiply(centre.subtract(from)).divide(width));
		Interval rate = fix.multiply(fix.of(rise.multiply(radius).divide(width)), fix.ln10()).negate();
		Interval start = inverse(level.multiply(10));
		if (rate.magnitude().compareTo(fix.one().shiftLeft(3)) > 0) {
			return Optional.empty();
		}
		List<Interval> terms = new ArrayList<>();
		Interval term = start;
		// From the 16th term on each is at most half the one before.
		for (int m = 1; m <= 16 || term.magnitude().bitLength() > 2; m++) {
			terms.add(term);
			term = fix.divide(fix.multiply(term, rate), m);
		}
		return Optional.of(new LocalFunction(new IntervalPolynomial(fix, terms.toArray(Interval[]::new)),
				term.magnitude().shiftLeft(1)));
	}

	// (1 + s radius / centre)^-exponent by the binomial series.
	private Optional<LocalFunction> power(BigFraction rise, BigFraction centre, BigFraction radius) {
		BigFraction ratio = radius.divide(centre);
		if (ratio.compareTo(BigFraction.ONE_HALF) > 0) {
			return Optional.empty();
		}
		Interval exponent = fix.divide(fix.multiply(fix.of(rise), fix.ln10()), fix.ln(fix.of(to.divide(from))));
		Interval start = inverse(db(line.fromDb()));
		if (centre.compareTo(from) > 0) {
			start = fix.multiply(start, fix.exp(fix.multiply(exponent, fix.ln(fix.of(centre.divide(from)))).negate()));
		}
		Interval step = fix.of(ratio);
		List<Interval> terms = new ArrayList<>();
		Interval term = start;
		for (int m = 0;; m++) {
			// |exponent| + m over m + 1 does not rise beyond max(1, this): with the ratio below 3/4, the rest is
			// below 4 terms.
			BigInteger growth = exponent.magnitude().add(fix.of(m).hi()).multiply(step.hi()).shiftRight(fix.bits())
					.shiftLeft(2);
			boolean shrinks = growth.compareTo(fix.of(3L * (m + 1)).lo()) < 0;
			if (shrinks && term.magnitude().bitLength() <= 2) {
				return Optional.of(new LocalFunction(new IntervalPolynomial(fix, terms.toArray(Interval[]::new)),
						term.magnitude().shiftLeft(2)));
			}
			if (m > MANY_TERMS + fix.bits()) {
				return Optional.empty();
			}
			terms.add(term);
			Interval factor = exponent.add(fix.of(m)).negate();
			term = fix.divide(fix.multiply(fix.multiply(term, factor), step), m + 1);
		}
	}
}
