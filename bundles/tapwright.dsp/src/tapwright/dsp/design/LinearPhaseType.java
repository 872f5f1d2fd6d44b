// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.List;

import tapwright.dsp.exact.Symmetry;

/**
 * The four types of linear-phase filter. With c = (N-1)/2 the response is H(f) = exp(-2 pi i f c) A(f) for even
 * symmetry and H(f) = i exp(-2 pi i f c) A(f) for odd symmetry, where the real <i>amplitude</i> A is a sum of cosines
 * or sines. Every amplitude can be written A = Q P with a fixed factor Q, positive between 0 and half the sample rate,
 * and a free sum of cosines P(f) = p[0] + p[1] cos(2 pi f) + ... + p[L-1] cos(2 pi f (L-1)).
 * <p>
 * Source: J. H. McClellan and T. W. Parks, A unified approach to the design of optimum FIR linear-phase digital
 * filters, IEEE Transactions on Circuit Theory 20(6), 1973.
 */
public enum LinearPhaseType {

	/** Odd length, even symmetry; Q = 1. */
	I(Symmetry.EVEN, true),
	/** Even length, even symmetry; Q = cos(pi f): forced to zero at half the sample rate. */
	II(Symmetry.EVEN, false),
	/** Odd length, odd symmetry; Q = sin(2 pi f): forced to zero at 0 and at half the sample rate. */
	III(Symmetry.ODD, true),
	/** Even length, odd symmetry; Q = sin(pi f): forced to zero at 0. */
	IV(Symmetry.ODD, false);

	private final Symmetry symmetry;
	private final boolean oddLength;

	LinearPhaseType(Symmetry symmetry, boolean oddLength) {
		this.symmetry = symmetry;
		this.oddLength = oddLength;
	}

	/**
	 * The type of a filter with this many coefficients.
	 *
	 * @throws IllegalArgumentException
	 *             when the symmetry is {@link Symmetry#NONE} or no coefficient would be free
	 */
	public static LinearPhaseType of(int taps, Symmetry symmetry) {
		if (symmetry == Symmetry.NONE) {
			throw new IllegalArgumentException("linear phase needs even or odd symmetry of the coefficients");
		}
		boolean odd = taps % 2 != 0;
		LinearPhaseType type = symmetry == Symmetry.EVEN ? odd ? I : II : odd ? III : IV;
		if (taps < 1 || type.unknowns(taps) < 1) {
			throw new IllegalArgumentException(taps + " coefficients with " + symmetry.name().toLowerCase()
					+ " symmetry leave nothing to design; ask for at least "
					+ (type == III ? 3 : symmetry == Symmetry.EVEN ? 1 : 2));
		}
		return type;
	}

	/** Symmetry of the coefficients. */
	public Symmetry symmetry() {
		return symmetry;
	}

	/** Whether the number of coefficients is odd. */
	public boolean oddLength() {
		return oddLength;
	}

	/** Number L of free coefficients of P for a filter of {@code taps} coefficients. */
	public int unknowns(int taps) {
		return switch (this) {
			case I -> (taps + 1) / 2;
			case II, IV -> taps / 2;
			case III -> (taps - 1) / 2;
		};
	}

	/** Whether the amplitude is zero at frequency 0 whatever the coefficients. */
	public boolean zeroAtZero() {
		return symmetry == Symmetry.ODD;
	}

	/** Whether the amplitude is zero at half the sample rate whatever the coefficients. */
	public boolean zeroAtHalf() {
		return this == II || this == III;
	}

	/** The fixed factor Q at a frequency in cycles per sample; not negative from 0 to 0.5. */
	public double factor(double frequency) {
		return switch (this) {
			case I -> 1;
			// Sines of the distance to the zero keep full accuracy there.
			case II -> Math.sin(Math.PI * (0.5 - frequency));
			case III -> frequency <= 0.25 ? Math.sin(2 * Math.PI * frequency)
					: Math.sin(2 * Math.PI * (0.5 - frequency));
			case IV -> Math.sin(Math.PI * frequency);
		};
	}

	/**
	 * The filter whose amplitude is Q P.
	 *
	 * @param p
	 *            p[0..L-1], the coefficients of P
	 * @return h[0..N-1], exactly symmetric
	 */
	public double[] taps(double[] p) {
		int l = p.length;
		int n = oddLength ? this == I ? 2 * l - 1 : 2 * l + 1 : 2 * l;
		double[] h = new double[n];
		if (this == III) {
			h[n / 2] = 0;
		}
		// Product formulas: 2 cos a cos b = cos(a+b) + cos(a-b) and 2 sin a cos b = sin(a+b) + sin(a-b); p at index -k
		// is p at k.
		for (int k = 0; k < n / 2 + (this == I ? 1 : 0); k++) {
			double value = switch (this) {
				case I -> k == 0 ? p[0] : p[k] / 2;
				case II -> ((k == 0 ? 2 * p[0] : p[k]) + at(p, k + 1)) / 4;
				case III -> ((k == 0 ? 2 * p[0] : p[k]) - at(p, k + 2)) / 4;
				case IV -> ((k == 0 ? 2 * p[0] : p[k]) - at(p, k + 1)) / 4;
			};
			int before = this == I ? n / 2 - k : n / 2 - 1 - k;
			h[before] = value;
			h[n - 1 - before] = symmetry == Symmetry.ODD ? -value : value;
		}
		return h;
	}

	/**
	 * The coefficients a[k] of the amplitude A(f) = sum of a[k] cos(2 pi f v[k]) or sin(2 pi f v[k]), with v[k] = k for
	 * type I, k + 1 for type III, and k + 1/2 for types II and IV.
	 *
	 * @param taps
	 *            h[0..N-1]; only its first half is read
	 * @return a[0..L-1], a new array
	 */
	public double[] amplitude(double[] taps) {
		int n = taps.length;
		double[] a = new double[unknowns(n)];
		for (int k = 0; k < a.length; k++) {
			a[k] = this == I && k == 0 ? taps[n / 2] : 2 * taps[(this == I ? n / 2 : n / 2 - 1) - k];
		}
		return a;
	}

	/** The multiple v[0] of the first cosine or sine of {@link #amplitude(double[])}: 0, 1/2 or 1. */
	public double firstHarmonic() {
		return switch (this) {
			case I -> 0;
			case II, IV -> 0.5;
			case III -> 1;
		};
	}

	/**
	 * Refuses targets that this type cannot approach because its amplitude is forced to zero.
	 *
	 * @throws IllegalArgumentException
	 *             when a band asks for something else at a forced zero; says which and what to do
	 */
	public void refuseImpossible(List<Band> bands) {
		for (Band band : bands) {
			if (zeroAtZero() && band.from() == 0 && band.desiredFrom() != 0) {
				throw impossible(band, "0", band.desiredFrom());
			}
			if (zeroAtHalf() && band.to() == 0.5 && band.desiredTo() != 0) {
				throw impossible(band, "half the sample rate", band.desiredTo());
			}
		}
	}

	private IllegalArgumentException impossible(Band band, String place, double desired) {
		return new IllegalArgumentException("a filter with " + (oddLength ? "an odd" : "an even")
				+ " number of coefficients and "
				+ symmetry.name().toLowerCase() + " symmetry (type " + this + ") has gain 0 at " + place
				+ ", but the band from "
				+ band.from() + " to " + band.to() + " asks for " + desired + " there; use "
				+ (this == II ? "an odd number of coefficients" : this == III
				? "another number of coefficients or end the band earlier"
						: "even symmetry or start the band later"));
	}

	private static double at(double[] p, int k) {
		return k < p.length ? p[k] : 0;
	}
}
