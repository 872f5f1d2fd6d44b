// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Objects;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * The coefficients are exactly symmetric or antisymmetric, so that the phase is exactly linear. The proof's value is
 * the largest difference from the nearer symmetry, its place the index of a coefficient.
 *
 * @param type
 *            which of the four types is asked for
 */
public record LinearPhase(Type type) implements Requirement {

	/** The four types of linear phase, numbered as usual in the trade. */
	public enum Type {
		/** Any of the four. */
		ANY,
		/** Odd length, symmetric. */
		I,
		/** Even length, symmetric. */
		II,
		/** Odd length, antisymmetric. */
		III,
		/** Even length, antisymmetric. */
		IV
	}

	/** Checks the type. */
	public LinearPhase {
		Objects.requireNonNull(type);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		ExactTaps taps = subject.taps();
		boolean oddLength = taps.length() % 2 != 0;
		boolean wantsOdd = type == Type.I || type == Type.III;
		if (type != Type.ANY && oddLength != wantsOdd) {
			return new Proof(Verdict.MISSED, Double.NaN, new Enclosure(0, Double.POSITIVE_INFINITY), 0,
					new Enclosure(Double.NEGATIVE_INFINITY, -Double.MIN_VALUE),
					"Type " + type + " needs an " + (wantsOdd ? "odd" : "even") + " number of coefficients.");
		}
		Proof even = difference(taps, Symmetry.EVEN);
		Proof odd = difference(taps, Symmetry.ODD);
		return switch (type) {
			case I, II -> even;
			case III, IV -> odd;
			case ANY -> even.margin().lo() >= odd.margin().lo() ? even : odd;
		};
	}

	private static Proof difference(ExactTaps taps, Symmetry symmetry) {
		BigFraction worst = BigFraction.ZERO;
		int place = 0;
		for (int k = 0, mirror = taps.length() - 1; k <= mirror; k++, mirror--) {
			BigFraction other = symmetry == Symmetry.EVEN ? taps.tap(mirror) : taps.tap(mirror).negate();
			BigFraction difference = taps.tap(k).subtract(other).abs();
			if (difference.compareTo(worst) > 0) {
				worst = difference;
				place = k;
			}
		}
		return Exactly.atMost(worst, 0, place, "");
	}
}
