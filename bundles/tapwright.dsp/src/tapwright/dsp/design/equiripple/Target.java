// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.List;

import tapwright.dsp.design.Band;
import tapwright.dsp.design.LinearPhaseType;

/**
 * The approximation problem in x = cos(2 pi f): A - D = Q P - D = Q (P - D/Q), so P shall follow D/Q with weight W Q.
 * Band edges at a zero of Q are moved inward a little, where the weight would vanish; the proof covers the whole band
 * again.
 */
final class Target {

	private final LinearPhaseType type;
	private final List<Band> bands;
	private final double[] xFrom;
	private final double[] xTo;

	/**
	 * A target.
	 *
	 * @param unknowns
	 *            number of free coefficients
	 */
	Target(LinearPhaseType type, List<Band> bands, int unknowns) {
		this.type = type;
		this.bands = bands;
		xFrom = new double[bands.size()];
		xTo = new double[bands.size()];
		for (int b = 0; b < xFrom.length; b++) {
			Band band = bands.get(b);
			double inward = Math.min(1.0 / (128 * unknowns), (band.to() - band.from()) / 16);
			double from = band.from() == 0 && type.zeroAtZero() ? inward : band.from();
			double to = band.to() == 0.5 && type.zeroAtHalf() ? 0.5 - inward : band.to();
			xFrom[b] = Math.cos(2 * Math.PI * from);
			xTo[b] = Math.cos(2 * Math.PI * to);
		}
	}

	/** Number of bands. */
	int bands() {
		return xFrom.length;
	}

	/** x of the lower edge, the larger one. */
	double xFrom(int band) {
		return xFrom[band];
	}

	/** x of the upper edge. */
	double xTo(int band) {
		return xTo[band];
	}

	/** D/Q and W Q at points of one band, for indexes {@code from} to {@code to - 1}. */
	void fill(int band, double[] x, int from, int to, double[] desired, double[] weight) {
		Band line = bands.get(band);
		boolean level = line.desiredFrom() == line.desiredTo() && line.weightFrom() == line.weightTo();
		for (int i = from; i < to; i++) {
			double d = line.desiredFrom();
			double w = line.weightFrom();
			if (!level) {
				double f = frequency(band, x[i]);
				d = line.desired(f);
				w = line.weight(f);
			}
			double q = factor(x[i]);
			desired[i] = d / q;
			weight[i] = w * q;
		}
	}

	/** Frequency of a point in cycles per sample, never outside the band. */
	double frequency(int band, double x) {
		Band line = bands.get(band);
		return Math.min(Math.max(Math.acos(x) / (2 * Math.PI), line.from()), line.to());
	}

	private double factor(double x) {
		return switch (type) {
			case I -> 1;
			case II -> Math.sqrt((1 + x) / 2);
			case III -> Math.sqrt((1 - x) * (1 + x));
			case IV -> Math.sqrt((1 - x) / 2);
		};
	}
}
