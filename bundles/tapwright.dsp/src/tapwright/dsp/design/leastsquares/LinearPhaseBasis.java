// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;

/**
 * The cosines or sines whose sum is the amplitude of a linear-phase filter, and the filter's own coefficients as linear
 * functions of their factors a[0..L-1].
 */
public final class LinearPhaseBasis {

	private final int taps;
	private final LinearPhaseType type;
	private final int size;

	/**
	 * The basis of filters with this many coefficients.
	 *
	 * @throws IllegalArgumentException
	 *             when nothing would be free
	 */
	public LinearPhaseBasis(int taps, Symmetry symmetry) {
		this.taps = taps;
		type = LinearPhaseType.of(taps, symmetry);
		size = type.unknowns(taps);
	}

	/** The type of linear phase. */
	public LinearPhaseType type() {
		return type;
	}

	/** Number L of free factors. */
	public int size() {
		return size;
	}

	/** The multiple v[k] of the frequency in basis function k. */
	public double harmonic(int k) {
		return type.firstHarmonic() + k;
	}

	/** Whether the functions are sines. */
	public boolean sines() {
		return type.symmetry() == Symmetry.ODD;
	}

	/**
	 * The derivative of each basis function by 2 pi f at a frequency, divided by (largest harmonic)^order so that no
	 * value exceeds 1.
	 *
	 * @param frequency
	 *            in cycles per sample
	 * @param order
	 *            of the derivative; 0 gives the functions themselves
	 * @return r[0..L-1], so that the sum of r[k] a[k] is the amplitude or its scaled derivative
	 */
	public double[] row(double frequency, int order) {
		double[] row = new double[size];
		double largest = slopeScale();
		// A derivative advances the phase by a quarter turn; a sine is a cosine three quarters further.
		int quarters = order + (sines() ? 3 : 0);
		for (int k = 0; k < size; k++) {
			double turns = frequency * harmonic(k);
			double angle = 2 * Math.PI * (turns - Math.rint(turns));
			double value = switch (quarters % 4) {
				case 0 -> Math.cos(angle);
				case 1 -> -Math.sin(angle);
				case 2 -> -Math.cos(angle);
				default -> Math.sin(angle);
			};
			row[k] = value * Math.pow(harmonic(k) / largest, order);
		}
		return row;
	}

	/** What {@link #row} divides a first derivative by: the largest harmonic, at least 1. */
	public double slopeScale() {
		return Math.max(harmonic(size - 1), 1);
	}

	/** The filter h[0..N-1] for factors a; exactly symmetric. */
	public double[] taps(double[] a) {
		double[] h = new double[taps];
		int middle = taps / 2;
		for (int k = 0; k < size; k++) {
			int before = before(k);
			if (before == middle && type == LinearPhaseType.I) {
				h[middle] = a[0];
			} else {
				h[before] = a[k] / 2;
				h[taps - 1 - before] = sines() ? -a[k] / 2 : a[k] / 2;
			}
		}
		return h;
	}

	/** Coefficient n of the filter as a linear function of the factors. */
	public double[] impulseRow(int n) {
		double[] row = new double[size];
		addImpulse(row, n);
		return row;
	}

	/** The sum of coefficients 0 to n as a linear function of the factors. */
	public double[] stepRow(int n) {
		double[] row = new double[size];
		for (int k = 0; k <= n; k++) {
			addImpulse(row, k);
		}
		return row;
	}

	private void addImpulse(double[] row, int n) {
		for (int first = Math.min(n, taps - 1 - n), k = size - 1; k >= 0; k--) {
			if (before(k) == first) {
				boolean middle = type == LinearPhaseType.I && k == 0;
				row[k] += middle ? 1 : sines() && n > first ? -0.5 : 0.5;
				return;
			}
		}
	}

	// The index in the first half that factor k determines.
	private int before(int k) {
		return (type == LinearPhaseType.I ? taps / 2 : taps / 2 - 1) - k;
	}
}
