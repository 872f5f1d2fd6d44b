// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;
import tapwright.dsp.exact.Rationals;

/** The gain at one frequency as a plain number. */
final class GainAtFrequency {

	private static final int FIRST_BITS = 160;
	private static final int LAST_BITS = 10_240;
	private static final double NARROW = 1e-14;

	private GainAtFrequency() {
	}

	/** Encloses the gain to about fifteen digits where it is not nearly zero. */
	static Enclosure enclose(ExactTaps taps, BigFraction turns) {
		SplitTaps split = new SplitTaps(taps);
		BigFraction unit = taps.unit().multiply(ExactTaps.powerOfTwo(split.sizeBits()));
		Enclosure gain = null;
		for (int bits = FIRST_BITS; bits <= LAST_BITS && (gain == null
				|| gain.width() > NARROW * gain.hi()); bits *= 4) {
			FixedPoint fix = new FixedPoint(bits);
			Interval root = fix.sqrt(ExactSearch.square(fix, split, turns).nonNegative());
			gain = new Enclosure(Rationals.below(fix.rational(root.lo()).multiply(unit)),
					Rationals.above(fix.rational(root.hi()).multiply(unit)));
		}
		return gain;
	}
}
