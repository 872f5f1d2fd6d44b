// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.verify.ExactSearch.Stretch;
import tapwright.dsp.verify.ExactSearch.Worst;

/** The square of the gain that 0 dB stands for, in the units of split coefficients. Not all zero. */
final class GainUnit {

	private static final int FIRST_BITS = 128;
	private static final int LAST_BITS = 4096;

	private final GainReference reference;
	private final List<Stretch> stretches;
	private final SplitTaps taps;
	private final double sampleRate;
	private final Patience patience;
	private final double log2;

	/**
	 * @param stretches
	 *            where the largest gain of a reference band may be
	 */
	GainUnit(GainReference reference, List<Stretch> stretches, SplitTaps taps, double sampleRate, Patience patience) {
		this.stretches = stretches;
		this.reference = reference;
		this.taps = taps;
		this.sampleRate = sampleRate;
		this.patience = patience;
		this.log2 = reference instanceof GainReference.Absolute
				? log2(taps.scale().getDenominator(), taps.scale().getNumerator()) - taps.sizeBits() : ownLog2();
	}

	/** Logarithm to base 2 of the gain (not its square), roughly. */
	double log2() {
		return log2;
	}

	/** How many bits of a gain's fraction lie above what 0 dB stands for, when that is the filter's own gain. */
	double depth() {
		return reference instanceof GainReference.Absolute ? 0 : Math.abs(log2);
	}

	/** Natural logarithm of the square. */
	Interval logarithm(FixedPoint fix, int gapBits) {
		if (reference instanceof GainReference.Absolute) {
			BigFraction scale = taps.scale();
			return fix.ln(integer(fix, scale.getNumerator())).subtract(fix.ln(integer(fix, scale.getDenominator())))
					.add(fix.ln2().multiply(BigInteger.valueOf(taps.sizeBits()))).multiply(BigInteger.TWO).negate();
		}
		return fix.ln(own(fix, gapBits));
	}

	// Precision rises until the filter's own gain is seen to be positive.
	private double ownLog2() {
		for (int bits = FIRST_BITS; bits <= LAST_BITS; bits *= 2) {
			Interval square = own(new FixedPoint(bits), 4);
			if (square.isPositive()) {
				return (square.lo().bitLength() - bits) / 2.0;
			}
		}
		throw new IllegalArgumentException("the gain that the limit refers to is zero, or too small to compare with; "
				+ "choose another reference");
	}

	private Interval own(FixedPoint fix, int gapBits) {
		return switch (reference) {
			case GainReference.Absolute absolute -> throw new AssertionError();
			case GainReference.AtFrequency at -> ExactSearch.square(fix, taps, LimitLine.turns(at.frequency(),
					sampleRate));
			case GainReference.LargestIn in -> {
				Worst worst = new ExactSearch(fix, taps, sampleRate, Interval.ZERO, patience).worst(stretches, gapBits,
						Optional.empty());
				yield new Interval(worst.lo(), worst.hi());
			}
		};
	}

	private static Interval integer(FixedPoint fix, BigInteger value) {
		return fix.exact(value.shiftLeft(fix.bits()));
	}

	private static int log2(BigInteger numerator, BigInteger denominator) {
		return numerator.bitLength() - denominator.bitLength();
	}
}
