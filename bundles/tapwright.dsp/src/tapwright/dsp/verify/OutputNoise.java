// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Noise;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/**
 * The expected noise power that rounding adds at the output, by the model of {@link Noise}, stays below a limit. The
 * proof's unit is dB relative to a square wave of full scale of the output format; it has no place.
 *
 * @param max
 *            highest power in dB, a finite number
 */
public record OutputNoise(double max) implements Requirement {

	/** Checks the limit. */
	public OutputNoise {
		if (!Double.isFinite(max)) {
			throw new IllegalArgumentException("the highest noise power is " + max + " dB; it must be a finite number");
		}
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		Arithmetic arithmetic = subject.arithmetic().orElseThrow(() -> new IllegalArgumentException(
				"rounding noise depends on structure and formats, but no arithmetic is stated; state it"));
		NumberFormat output = arithmetic.output().orElseThrow(() -> new IllegalArgumentException(
				"noise is stated relative to full scale of the output, but no output format is stated; state it"));
		BigFraction fullScale = output.step().multiply(ExactTaps.powerOfTwo(output.signed() ? output.word() - 1
				: output.word()));
		BigFraction ratio = Noise.of(subject.taps(), arithmetic).power().divide(fullScale.pow(2));
		if (ratio.getNumerator().signum() == 0) {
			return new Proof(Verdict.MET, Double.NaN, Enclosure.of(Double.NEGATIVE_INFINITY), max,
					Enclosure.of(Double.POSITIVE_INFINITY), "Nothing is rounded.");
		}
		Enclosure value = Decibels.ofPower(ratio);
		int sign = Decibels.compareLimit(max, ratio);
		Enclosure distance = new Enclosure(Math.nextDown(max - value.hi()), Math.nextUp(max - value.lo()));
		return switch (sign) {
			case 1 -> new Proof(Verdict.MET, Double.NaN, value, max, new Enclosure(Math.max(0, distance.lo()),
					distance.hi()), "");
			case -1 -> new Proof(Verdict.MISSED, Double.NaN, value, max,
					new Enclosure(distance.lo(), Math.min(distance.hi(), -Double.MIN_VALUE)), "");
			default -> new Proof(Verdict.UNPROVEN, Double.NaN, value, max, distance,
					"The noise power agrees with the limit to ninety digits.");
		};
	}
}
