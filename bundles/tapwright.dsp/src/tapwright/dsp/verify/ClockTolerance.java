// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Objects;
import java.util.Optional;

/**
 * A statement holds at every sample clock that is off by up to some parts per million.
 * <p>
 * A frequency in hertz, seen at all clocks, is a stretch of frequencies per sample. So gain limits and alias
 * rejection become one statement at the nominal clock, with edges rounded outward to prove it and inward to disprove
 * it. Other statements depend on the clock, if at all, through one value that rises or falls with it, and are proven
 * at both ends of the range; where that is not enough the answer is unproven.
 *
 * @param statement
 *            what must hold; not itself under a tolerance
 * @param ppm
 *            largest deviation of the clock in parts per million, from 0 to 500,000
 */
public record ClockTolerance(Requirement statement, double ppm) implements Requirement {

	private static final double LARGEST = 500_000;
	private static final double MILLION = 1e6;

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

	@Override
	public Proof prove(Subject subject, Effort effort) {
		if (ppm == 0) {
			return statement.prove(subject, effort);
		}
		ClockRange outer = new ClockRange(subject.sampleRate(), ppm / MILLION, true);
		ClockRange inner = new ClockRange(subject.sampleRate(), ppm / MILLION, false);
		Optional<Proof> all = statement instanceof ClockRange.Aware aware ? aware.prove(subject, effort, outer)
				: Optional.empty();
		if (all.isPresent() && all.get().verdict() == Verdict.MET) {
			return all.get();
		}
		if (all.isPresent()) {
			Proof weaker = ((ClockRange.Aware) statement).prove(subject, effort, inner).orElseThrow();
			return weaker.verdict() == Verdict.MISSED ? weaker
					: unproven(all.get(), "The worst place lies within rounding of a band edge.");
		}
		Proof atOuterEnds = atEnds(subject, effort, outer);
		if (atOuterEnds.verdict() == Verdict.MET && endsDecide()) {
			return atOuterEnds;
		}
		Proof atEnds = atEnds(subject, effort, inner);
		return atEnds.verdict() == Verdict.MISSED ? atEnds
				: unproven(atOuterEnds, "It holds at both ends of the clock's range; between them it is not proven.");
	}

	private Proof atEnds(Subject subject, Effort effort, ClockRange range) {
		return Proofs.worse(statement.prove(at(subject, range.slowest()), effort),
				statement.prove(at(subject, range.fastest()), effort));
	}

	private static Subject at(Subject subject, double sampleRate) {
		return new Subject(subject.taps(), sampleRate, subject.arithmetic());
	}

	// Whether the statement can only change its truth once when the clock rises.
	private boolean endsDecide() {
		return !(statement instanceof GainLimit || statement instanceof GroupDelay
				|| statement instanceof GroupDelayVariation
				|| statement instanceof Null || statement instanceof ExactGain);
	}

	private static Proof unproven(Proof proof, String why) {
		return new Proof(Verdict.UNPROVEN, proof.worst(), proof.value(), proof.limit(), proof.margin(), why);
	}
}
