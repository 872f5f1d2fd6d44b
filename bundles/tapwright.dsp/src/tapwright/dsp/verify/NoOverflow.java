// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NodeRange;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.OverflowBounds;
import tapwright.dsp.arithmetic.SineBounds;
import tapwright.dsp.exact.Enclosure;

/**
 * No node of the structure leaves its format in a way that spoils the output. The proof's value is the largest node
 * relative to what it can hold, in dB, rounding inside left aside; its place is the number of the term after which
 * the worst sum overflows, if any does.
 *
 * @param input
 *            the signals that it must hold for
 */
public record NoOverflow(Input input) implements Requirement {

	/** Kinds of input signal. */
	public enum Input {
		/** Every signal that the input format can hold. */
		ANY,
		/** Every sinusoid that the input format can hold, constants included. */
		SINUSOID
	}

	/** Checks the kind. */
	public NoOverflow {
		Objects.requireNonNull(input);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		Arithmetic arithmetic = subject.arithmetic().orElseThrow(() -> new IllegalArgumentException(
				"overflow depends on structure and formats, but no arithmetic is stated; state it"));
		OverflowBounds bounds = new OverflowBounds(subject.taps(), arithmetic);
		Optional<BigFraction> room = bounds.largestGain();
		Enclosure margin = room.map(gain -> Decibels.ofPower(gain.multiply(gain)))
				.orElse(Enclosure.of(Double.POSITIVE_INFINITY));
		List<NodeRange> overflows = bounds.overflows();
		double place = overflows.isEmpty() ? Double.NaN : overflows.getFirst().index();
		if (overflows.isEmpty() && bounds.isFree()) {
			return proof(Verdict.MET, place, new Enclosure(Math.max(0, margin.lo()), Math.max(0, margin.hi())), "");
		}
		if (input == Input.SINUSOID) {
			BigInteger amplitude = arithmetic.input().map(NumberFormat::max).orElse(BigInteger.ZERO);
			return SineBounds.isFree(subject.taps(), arithmetic, amplitude)
					? proof(Verdict.MET, place, new Enclosure(0, Double.POSITIVE_INFINITY),
							"Some other inputs overflow.")
					: proof(Verdict.UNPROVEN, place, new Enclosure(margin.lo(), Double.POSITIVE_INFINITY),
							"Some input overflows; no bound shows that sinusoids do not.");
		}
		return proof(Verdict.MISSED, place, new Enclosure(Math.min(margin.lo(), -Double.MIN_VALUE),
				Math.min(margin.hi(), -Double.MIN_VALUE)), "");
	}

	private static Proof proof(Verdict verdict, double place, Enclosure margin, String note) {
		return new Proof(verdict, place, margin.negate(), 0, margin, note);
	}
}
