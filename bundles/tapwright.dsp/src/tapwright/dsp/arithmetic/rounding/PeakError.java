// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;

import tapwright.dsp.design.Band;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/**
 * The largest weighted error of a linear-phase filter over whole bands, enclosed.
 *
 * <p>
 * Bands are cut into cells. In a cell of half-width s the amplitude differs from its Taylor polynomial of second degree by at
 * most M s^3 / 6, where M is the sum of the sizes of all terms' third derivatives. The largest size of the polynomial is taken at
 * the ends and the vertex. The rounding of doubles is covered by {@link #SLACK} times the sum of the sizes of all terms, each of
 * which carries less than 10 roundings of 2^-53, and their sum less than one rounding per term.
 */
final class PeakError {

	private static final double SLACK = 0x1p-52;
	private static final int CELLS_PER_TAP = 256;

	private final List<Band> bands;

	PeakError(List<Band> bands) {
		this.bands = List.copyOf(bands);
	}

	/**
	 * Encloses the largest weighted error.
	 *
	 * @throws IllegalArgumentException
	 *             when the coefficients are not symmetric
	 */
	Enclosure of(ExactTaps taps) {
		LinearPhaseType type = LinearPhaseType.of(taps.length(), taps.symmetry());
		double[] a = type.amplitude(taps.toDoubles());
		double first = type.firstHarmonic();
		double size = 1;
		double third = 0;
		for (int k = 0; k < a.length; k++) {
			size += Math.abs(a[k]);
			third += Math.abs(a[k]) * Math.pow(2 * Math.PI * (first + k), 3);
		}
		double below = 0;
		double above = 0;
		for (Band band : bands) {
			int cells = (int) Math.ceil((band.to() - band.from()) * CELLS_PER_TAP * taps.length()) + 1;
			double half = (band.to() - band.from()) / (2 * cells);
			double desiredSize = Math.max(Math.abs(band.desiredFrom()), Math.abs(band.desiredTo()));
			double slack = (20 + a.length) * SLACK * (size + desiredSize) + (third * Math.pow(half, 3) / 6) * (1 + 1e-9);
			double slope = (band.desiredTo() - band.desiredFrom()) / (band.to() - band.from());
			for (int cell = 0; cell < cells; cell++) {
				double f = band.from() + (2 * cell + 1) * half;
				double[] taylor = taylor(a, first, f, type.zeroAtZero());
				taylor[0] -= band.desired(f);
				taylor[1] -= slope;
				double heaviest = Math.max(band.weight(f - half), band.weight(f + half)) * (1 + 1e-12);
				double lightest = Math.min(band.weight(f - half), band.weight(f + half)) * (1 - 1e-12);
				// Taken a little wider for the bound from above and narrower for places that surely lie in the band.
				above = Math.max(above, heaviest * (largest(taylor, half * (1 + 1e-9)) + slack));
				below = Math.max(below, lightest * (largest(taylor, half * (1 - 1e-9)) - slack));
			}
		}
		return new Enclosure(below, Math.max(above, below));
	}

	// Value, first derivative and half the second derivative of the amplitude over frequency in cycles per sample.
	private static double[] taylor(double[] a, double first, double f, boolean sines) {
		double angle = 2 * Math.PI * f;
		double turnCos = StrictMath.cos(angle);
		double turnSin = StrictMath.sin(angle);
		double cos = StrictMath.cos(angle * first);
		double sin = StrictMath.sin(angle * first);
		double value = 0;
		double derivative = 0;
		double second = 0;
		for (int k = 0; k < a.length; k++) {
			if (k % 16 == 0) {
				cos = StrictMath.cos(angle * (first + k));
				sin = StrictMath.sin(angle * (first + k));
			}
			double rate = 2 * Math.PI * (first + k);
			double even = sines ? sin : cos;
			double odd = sines ? cos : -sin;
			value += a[k] * even;
			derivative += a[k] * rate * odd;
			second -= a[k] * rate * rate * even / 2;
			double next = cos * turnCos - sin * turnSin;
			sin = sin * turnCos + cos * turnSin;
			cos = next;
		}
		return new double[] { value, derivative, second };
	}

	private static double largest(double[] p, double s) {
		double largest = Math.max(Math.abs(p[0] + s * (p[1] + s * p[2])), Math.abs(p[0] - s * (p[1] - s * p[2])));
		if (Math.abs(p[1]) < 2 * s * Math.abs(p[2])) {
			largest = Math.max(largest, Math.abs(p[0] - p[1] * p[1] / (4 * p[2])));
		}
		return largest;
	}
}
