// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import tapwright.dsp.design.Band;

/**
 * Integrals over one band of its weight, or of weight times desired amplitude, times a cosine or sine. The polynomial is
 * written in Legendre polynomials, and the integral of P_l(x) exp(i z x) over -1..1 is 2 i^l j_l(z) with the spherical
 * Bessel functions j_l (M. Abramowitz and I. A. Stegun, Handbook of Mathematical Functions, 1964, 10.1.14), which loses no
 * digits however slow or fast the cosine is.
 */
final class BandIntegrals {

	private static final double SMALL = 0.75;

	private final double centre;
	private final double half;
	private final double[] weight;
	private final double[] target;

	BandIntegrals(Band band) {
		centre = (band.from() + band.to()) / 2;
		half = (band.to() - band.from()) / 2;
		double w0 = (band.weightFrom() + band.weightTo()) / 2;
		double w1 = (band.weightTo() - band.weightFrom()) / 2;
		double d0 = (band.desiredFrom() + band.desiredTo()) / 2;
		double d1 = (band.desiredTo() - band.desiredFrom()) / 2;
		weight = new double[] { w0, w1, 0 };
		target = new double[] { w0 * d0 + w1 * d1 / 3, w0 * d1 + w1 * d0, 2 * w1 * d1 / 3 };
	}

	/** The integral of the weight times cos(2 pi m f). */
	double weightCosine(double m) {
		return integral(weight, m, false);
	}

	/** The integral of weight and desired amplitude times cos(2 pi m f), or sin when asked. */
	double target(double m, boolean sine) {
		return integral(target, m, sine);
	}

	private double integral(double[] legendre, double m, boolean sine) {
		double z = 2 * Math.PI * m * half;
		double turns = m * centre;
		double angle = 2 * Math.PI * (turns - Math.rint(turns));
		double even = legendre[0] * bessel(0, z) - legendre[2] * bessel(2, z);
		double odd = legendre[1] * bessel(1, z);
		return 2 * half * (sine ? Math.sin(angle) * even + Math.cos(angle) * odd : Math.cos(angle) * even - Math.sin(angle) * odd);
	}

	private static double bessel(int order, double z) {
		if (z < SMALL) {
			return series(order, z);
		}
		double sin = Math.sin(z);
		double cos = Math.cos(z);
		return switch (order) {
			case 0 -> sin / z;
			case 1 -> (sin / z - cos) / z;
			default -> ((3 / (z * z) - 1) * sin - 3 * cos / z) / z;
		};
	}

	private static double series(int order, double z) {
		double term = 1;
		for (int k = 1; k <= order; k++) {
			term *= z / (2 * k + 1);
		}
		double sum = term;
		for (int k = 1; k <= 9; k++) {
			term *= -z * z / 2 / (k * (2.0 * (order + k) + 1));
			sum += term;
		}
		return sum;
	}
}
