// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Objects;

import tapwright.dsp.exact.Enclosure;

/**
 * A statement holds at every sample clock that is off by up to some parts per million.
 * <p>
 * Statements over frequency bands are turned into one statement at the nominal clock that holds exactly when the original holds at
 * every clock: a frequency in hertz, seen at all clocks, is a stretch of frequencies per sample. The edges of such a stretch are
 * rounded outward to prove it, inward to disprove it. Other statements depend on the clock, if at all, through one value that rises or falls
 * with it, so they are proven at both ends of the range.
 *
 * @param statement
 *            what must hold; not itself under a tolerance
 * @param ppm
 *            largest deviation of the clock in parts per million, from 0 to 500,000
 */
public record ClockTolerance(Requirement statement, double ppm) implements Requirement {

	private static final double LARGEST = 500_000;
	private static final double MILLION = 1e6;
	/** More than the rounding errors of a scaled frequency, in relative terms. */
	private static final double ROUNDING = 0x1p-50;

	/** Checks the tolerance. */
	public ClockTolerance {
		Objects.requireNonNull(statement);
		if (statement instanceof ClockTolerance) {
			throw new IllegalArgumentException("a clock tolerance of a clock tolerance; add the two instead");
		}
		if (!(ppm >= 0 && ppm <= LARGEST)) {
			throw new IllegalArgumentException("a clock tolerance of " + ppm + " ppm; it must be from 0 to " + LARGEST);
		}
	}

	/** What every clock in the range does to a frequency. */
	record Stretcher(double sampleRate, double ppm, boolean outward) {

		/** Lower end, per nominal sample, of what a frequency becomes. */
		double low(double hertz) {
			return Math.min(hertz / (1 + ppm / MILLION) * (outward ? 1 - ROUNDING : 1 + ROUNDING), sampleRate / 2);
		}

		/** Upper end, per nominal sample, of what a frequency becomes; beyond half the sample rate there is nothing new. */
		double high(double hertz) {
			return Math.min(hertz / (1 - ppm / MILLION) * (outward ? 1 + ROUNDING : 1 - ROUNDING), sampleRate / 2);
		}
	}

	/** A statement over frequency that knows what it means at all clocks. */
	interface Stretchable {

		/** Proof at the nominal clock of the statement for stretched frequencies. */
		Proof prove(Subject subject, Effort effort, Stretcher stretcher);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		if (ppm == 0) {
			return statement.prove(subject, effort);
		}
		if (statement instanceof Stretchable stretchable) {
			Proof outer = stretchable.prove(subject, effort, new Stretcher(subject.sampleRate(), ppm, true));
			if (outer.verdict() == Verdict.MET) {
				return outer;
			}
			Proof inner = stretchable.prove(subject, effort, new Stretcher(subject.sampleRate(), ppm, false));
			return inner.verdict() == Verdict.MISSED ? inner : unproven(outer, "The worst gain lies within rounding of a band edge.");
		}
		Proof slow = statement.prove(at(subject, 1 - ppm / MILLION), effort);
		Proof fast = statement.prove(at(subject, 1 + ppm / MILLION), effort);
		Proof worse = Proofs.worse(slow, fast);
		if (worse.verdict() == Verdict.MET && !isMonotone()) {
			return unproven(worse, "Proven at both ends of the clock's range, but not between them.");
		}
		return worse;
	}

	private boolean isMonotone() {
		return switch (statement) {
			case GroupDelay delay -> false;
			case GroupDelayVariation variation -> false;
			case Null zero -> false;
			case ExactGain gain -> false;
			default -> true;
		};
	}

	private static Subject at(Subject subject, double factor) {
		return new Subject(subject.taps(), subject.sampleRate() * factor, subject.arithmetic());
	}

	private static Proof unproven(Proof proof, String why) {
		return new Proof(Verdict.UNPROVEN, proof.worst(), proof.value(), proof.limit(),
				new Enclosure(proof.margin().lo(), proof.margin().hi()), why);
	}
}
