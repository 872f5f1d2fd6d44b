// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Rationals;

/**
 * When one sample in so many is kept, what folds into the kept band is attenuated by at least this much: the gain is
 * at most -min dB within {@code to} of every multiple of the new sample rate but 0. The proof's value is the
 * rejection in dB, its place a frequency in hertz before the rate change.
 *
 * @param factor
 *            how many samples become one, at least 2
 * @param to
 *            upper edge of the kept band in hertz, not negative
 * @param min
 *            smallest rejection in dB
 */
public record AliasRejection(int factor, double to, double min) implements Requirement, ClockRange.Aware {

	/** Checks the numbers. */
	public AliasRejection {
		if (factor < 2) {
			throw new IllegalArgumentException("a rate change by " + factor
					+ " folds nothing; the factor must be at least 2");
		}
		Frequencies.check("the upper edge of the kept band", to);
		if (!Double.isFinite(min)) {
			throw new IllegalArgumentException("the smallest rejection is " + min + " dB; it must be a finite number");
		}
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		double rate = subject.sampleRate();
		Frequencies.checkBelowHalf("the upper edge of the kept band", to, rate / factor);
		Proof proof = new GainProof(lines(rate, true), GainReference.ABSOLUTE, subject, effort).prove();
		if (proof.verdict() == Verdict.MISSED && !edgesAreDoubles(rate)) {
			// Edges were rounded outward; a miss counts when it is found between edges rounded inward.
			Proof inner = new GainProof(lines(rate, false), GainReference.ABSOLUTE, subject, effort).prove();
			proof = inner.verdict() == Verdict.MISSED ? inner
					: new Proof(Verdict.UNPROVEN, proof.worst(), proof.value(), proof.limit(), proof.margin(),
							"The worst gain lies within rounding of a band edge.");
		}
		return new Proof(proof.verdict(), proof.worst(), proof.value().negate(), min, proof.margin(), proof.note());
	}

	// Multiples of the new rate move with the clock, so only the reach of the bands changes.
	@Override
	public Optional<Proof> prove(Subject subject, Effort effort, ClockRange clocks) {
		return Optional.of(new AliasRejection(factor, Math.min(clocks.highest(to), subject.sampleRate() / factor / 2),
				min)
				.prove(subject, effort));
	}

	private boolean edgesAreDoubles(double rate) {
		return edges(rate).stream().allMatch(edge -> Rationals.below(edge) == Rationals.above(edge));
	}

	private List<LimitLine> lines(double rate, boolean outward) {
		List<LimitLine> lines = new ArrayList<>();
		List<BigFraction> edges = edges(rate);
		for (int k = 0; k < edges.size(); k += 2) {
			double low = outward ? Rationals.below(edges.get(k)) : Rationals.above(edges.get(k));
			double high = outward ? Rationals.above(edges.get(k + 1)) : Rationals.below(edges.get(k + 1));
			if (low <= high) {
				lines.add(new LimitLine(low, Math.min(high, rate / 2), -min, -min, true, false));
			}
		}
		return lines;
	}

	// Lower and upper edges of all bands that fold into the kept one, up to half the sample rate.
	private List<BigFraction> edges(double rate) {
		BigFraction half = Rationals.exact(rate).divide(2);
		BigFraction step = Rationals.exact(rate).divide(factor);
		BigFraction reach = Rationals.exact(to);
		List<BigFraction> edges = new ArrayList<>();
		for (int k = 1; step.multiply(k).subtract(reach).compareTo(half) <= 0; k++) {
			BigFraction high = step.multiply(k).add(reach);
			edges.add(step.multiply(k).subtract(reach));
			edges.add(high.compareTo(half) > 0 ? half : high);
		}
		return edges;
	}
}
