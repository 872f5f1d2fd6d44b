// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignResult;

/**
 * Pulse of a data transmission, sampled and cut: the raised cosine, which is zero at all other symbols, or its square root, which gives
 * the raised cosine when sender and receiver both have it. Source of the closed forms: J. G. Proakis and M. Salehi, Digital Communications,
 * 5th edition, 2008, section 9.2; singular points by their limits.
 *
 * @param rollOff
 *            part of the band that rolls off, 0 to 1
 * @param samplesPerSymbol
 *            at least 1
 * @param symbols
 *            length in symbols; the pulse has samplesPerSymbol * symbols + 1 coefficients
 * @param root
 *            the square root, otherwise the raised cosine itself
 * @param gain
 *            what the amplitude is scaled to
 */
public record RaisedCosine(double rollOff, int samplesPerSymbol, int symbols, boolean root, Gain gain) implements Design {

	/** What a pulse is scaled to. */
	public enum Gain {
		/** The coefficients add up to 1: gain 1 at frequency 0. */
		UNITY_AT_ZERO,
		/** The squares of the coefficients add up to 1: unit energy. */
		UNIT_ENERGY,
		/** The closed form for symbols of duration 1, unscaled. */
		CLOSED_FORM
	}

	private static final int LONGEST = 100_000;
	/** Nearer to a singular point than this, the series is more exact than the quotient. */
	private static final double NEAR = 1e-4;

	/** Checks the numbers. */
	public RaisedCosine {
		if (!(rollOff >= 0 && rollOff <= 1)) {
			throw new IllegalArgumentException("a roll-off of " + rollOff + "; it must be 0 to 1");
		}
		if (samplesPerSymbol < 1 || symbols < 1 || (long) samplesPerSymbol * symbols > LONGEST) {
			throw new IllegalArgumentException(samplesPerSymbol + " samples per symbol over " + symbols
					+ " symbols; each must be at least 1 and their product at most " + LONGEST);
		}
	}

	@Override
	public DesignResult compute(Progress progress) {
		int last = samplesPerSymbol * symbols;
		double[] taps = new double[last + 1];
		for (int k = 0; k <= last / 2; k++) {
			double time = (last / 2.0 - k) / samplesPerSymbol;
			double value = root ? root(time) : raised(time);
			taps[k] = value;
			taps[last - k] = value;
		}
		scale(taps);
		return new DesignResult(taps);
	}

	private double raised(double t) {
		if (t == Math.rint(t)) {
			return t == 0 ? 1 : 0; // exactly: no interference between symbols
		}
		double singular = 1 - 2 * rollOff * t;
		double sinc = Math.sin(Math.PI * t) / (Math.PI * t);
		if (Math.abs(singular) < NEAR) {
			// cos(pi b t) / (1 - (2 b t)^2) with 2 b t = 1 - s is sin(pi s / 2) / (s (2 - s)).
			double angle = Math.PI * singular / 2;
			return sinc * Math.PI / 2 * (1 - angle * angle / 6) / (2 - singular);
		}
		return sinc * Math.cos(Math.PI * rollOff * t) / (singular * (1 + 2 * rollOff * t));
	}

	private double root(double t) {
		if (t == 0) {
			return 1 - rollOff + 4 * rollOff / Math.PI;
		}
		double singular = 1 - 4 * rollOff * t;
		if (Math.abs(singular) < NEAR) {
			return nearSingular(t, singular);
		}
		double numerator = Math.sin(Math.PI * t * (1 - rollOff)) + 4 * rollOff * t * Math.cos(Math.PI * t * (1 + rollOff));
		return numerator / (Math.PI * t * singular * (1 + 4 * rollOff * t));
	}

	// Numerator and denominator both vanish at t0 = 1 / (4 b): Taylor's series of the numerator to third order, divided by t - t0.
	private double nearSingular(double t, double singular) {
		double b = rollOff;
		double t0 = 1 / (4 * b);
		double u = -singular / (4 * b); // t - t0, without cancellation
		double p = Math.PI * (1 - b);
		double q = Math.PI * (1 + b);
		double sinP = Math.sin(p * t0);
		double cosP = Math.cos(p * t0);
		double sinQ = Math.sin(q * t0);
		double cosQ = Math.cos(q * t0);
		double first = p * cosP + 4 * b * cosQ - q * sinQ;
		double second = -p * p * sinP - 8 * b * q * sinQ - q * q * cosQ;
		double third = -p * p * p * cosP - 12 * b * q * q * cosQ + q * q * q * sinQ;
		double numerator = first + u * (second / 2 + u * third / 6);
		return numerator / (Math.PI * t * -4 * b * (1 + 4 * b * t));
	}

	private void scale(double[] taps) {
		double sum = 0;
		for (double tap : taps) {
			sum += gain == Gain.UNITY_AT_ZERO ? tap : tap * tap;
		}
		double factor = switch (gain) {
		case UNITY_AT_ZERO -> 1 / sum;
		case UNIT_ENERGY -> 1 / Math.sqrt(sum);
		case CLOSED_FORM -> 1;
		};
		for (int k = 0; k < taps.length; k++) {
			taps[k] *= factor;
		}
	}
}
