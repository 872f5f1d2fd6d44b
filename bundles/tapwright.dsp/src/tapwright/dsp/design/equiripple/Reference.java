// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.Arrays;

/**
 * Points at which the error shall alternate, in rising frequency.
 *
 * @param x
 *            cos(2 pi f), falling
 * @param band
 *            the band that each point belongs to
 */
record Reference(double[] x, int[] band) {

	/**
	 * Places of points in a band as angles: the middle of the band plus its half width times the cosine. Points that
	 * belong to best approximations become denser towards both ends of a band, about evenly in this angle. The middle
	 * one is moved a little, as a start that mirrors at a quarter of the sample rate would make a mirrored problem's
	 * levelled error zero.
	 */
	private static final double[] EVEN = { 0, 0.52 * Math.PI, Math.PI };

	/** A start without knowledge: spread over the bands by width. */
	static Reference spread(Target target, int points) {
		double[] share = new double[target.bands()];
		double[][] angles = new double[share.length][];
		double all = 0;
		for (int b = 0; b < share.length; b++) {
			share[b] = Math.acos(target.xTo(b)) - Math.acos(target.xFrom(b));
			all += share[b];
			angles[b] = EVEN;
		}
		for (int b = 0; b < share.length; b++) {
			share[b] *= points / all;
		}
		return placed(target, rounded(share, points), angles);
	}

	/**
	 * A start from the solution of a problem with the same bands and another number of coefficients: the density of the
	 * points is kept (S.-I. Filip, A robust and scalable implementation of the Parks-McClellan algorithm for designing
	 * FIR filters, ACM Transactions on Mathematical Software 43(1), 2016, calls this reference scaling).
	 */
	Reference scaled(Target target, int points) {
		int[] old = new int[target.bands()];
		for (int b : band) {
			old[b]++;
		}
		double[] share = new double[old.length];
		double[][] angles = new double[old.length][];
		int next = 0;
		for (int b = 0; b < old.length; b++) {
			// Of L + 1 points a band has its share of L and half a point for an end of the whole axis; so a single band
			// has all.
			double ends = (b == 0 ? 0.5 : 0) + (b == old.length - 1 ? 0.5 : 0);
			share[b] = (old[b] - ends) * (points - 1) / (x.length - 1) + ends;
			double[] own = new double[old[b]];
			double half = (target.xFrom(b) - target.xTo(b)) / 2;
			for (int i = 0; i < own.length; i++) {
				double cosine = (x[next++] - target.xTo(b) - half) / half;
				own[i] = Math.acos(Math.min(Math.max(cosine, -1), 1));
			}
			angles[b] = own.length < 2 ? EVEN : own;
		}
		return placed(target, rounded(share, points), angles);
	}

	// Points of each band evenly along the broken line through its angles.
	private static Reference placed(Target target, int[] counts, double[][] angles) {
		int points = Arrays.stream(counts).sum();
		Reference reference = new Reference(new double[points], new int[points]);
		int next = 0;
		for (int b = 0; b < counts.length; b++) {
			double[] angle = angles[b];
			double half = (target.xFrom(b) - target.xTo(b)) / 2;
			for (int i = 0; i < counts[b]; i++) {
				double position = (counts[b] == 1 ? 0.5 : (double) i / (counts[b] - 1)) * (angle.length - 1);
				int below = Math.min((int) position, angle.length - 2);
				double at = angle[below] + (position - below) * (angle[below + 1] - angle[below]);
				// Edges must be met to the bit.
				reference.x[next] = at == 0 ? target.xFrom(b) : at == Math.PI ? target.xTo(b)
						: Math.min(Math.max(target.xTo(b) + half * (1 + Math.cos(at)), target.xTo(b)), target.xFrom(b));
				reference.band[next++] = b;
			}
		}
		reference.separate(target);
		return reference;
	}

	// Two bands that touch share a point, which may be in the reference only once.
	private void separate(Target target) {
		for (int i = 1; i < x.length; i++) {
			if (x[i] >= x[i - 1]) {
				boolean last = i + 1 == x.length || band[i + 1] != band[i];
				x[i] = (x[i - 1] + (last ? target.xTo(band[i]) : x[i + 1])) / 2;
			}
		}
	}

	/** The points as frequencies in cycles per sample, inside their bands. */
	double[] frequencies(Target target) {
		double[] frequencies = new double[x.length];
		for (int i = 0; i < x.length; i++) {
			frequencies[i] = target.frequency(band[i], x[i]);
		}
		return frequencies;
	}

	// Whole numbers near the shares that sum up to the points, at least one for each band while they last.
	private static int[] rounded(double[] share, int points) {
		int[] counts = new int[share.length];
		int left = points;
		for (int b = 0; b < share.length; b++) {
			counts[b] = Math.min(left, Math.max(1, (int) share[b]));
			left -= counts[b];
		}
		for (; left > 0; left--) {
			int neediest = 0;
			for (int b = 1; b < share.length; b++) {
				if (share[b] - counts[b] > share[neediest] - counts[neediest]) {
					neediest = b;
				}
			}
			counts[neediest]++;
		}
		return counts;
	}
}
