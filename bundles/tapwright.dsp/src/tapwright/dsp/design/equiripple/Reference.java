// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

/**
 * Points at which the error shall alternate, in rising frequency.
 *
 * @param x
 *            cos(2 pi f), falling
 * @param band
 *            the band that each point belongs to
 */
record Reference(double[] x, int[] band) {

	/** A start that mirrors at a quarter of the sample rate would make a mirrored problem's levelled error zero. */
	private static final double SKEW = 0.1;

	/** A start for few points: spread over the bands by width, evenly in each. */
	static Reference spread(Target target, int points) {
		int bands = target.bands();
		double[] share = new double[bands];
		for (int b = 0; b < bands; b++) {
			share[b] = Math.acos(target.xTo(b)) - Math.acos(target.xFrom(b));
		}
		int[] counts = apportion(share, points);
		Reference reference = new Reference(new double[points], new int[points]);
		int next = 0;
		for (int b = 0; b < bands; b++) {
			double from = Math.acos(target.xFrom(b));
			for (int i = 0; i < counts[b]; i++) {
				double fraction = counts[b] == 1 ? 0.5 : (double) i / (counts[b] - 1);
				fraction += SKEW * fraction * (1 - fraction);
				reference.x[next] = i == 0 && counts[b] > 1 ? target.xFrom(b)
						: i == counts[b] - 1 && i > 0 ? target.xTo(b) : Math.cos(from + share[b] * fraction);
				reference.band[next++] = b;
			}
		}
		reference.separate(target);
		return reference;
	}

	/**
	 * A start for more points from the solution of a smaller problem with the same bands: the density of the points is kept
	 * (S.-I. Filip, A robust and scalable implementation of the Parks-McClellan algorithm for designing FIR filters, ACM
	 * Transactions on Mathematical Software 43(1), 2016, calls this reference scaling).
	 */
	Reference scaled(Target target, int points) {
		int bands = target.bands();
		int[] start = new int[bands + 1];
		for (int b : band) {
			start[b + 1]++;
		}
		double[] share = new double[bands];
		for (int b = 0; b < bands; b++) {
			share[b] = start[b + 1];
			start[b + 1] += start[b];
		}
		int[] counts = apportion(share, points);
		Reference larger = new Reference(new double[points], new int[points]);
		int next = 0;
		for (int b = 0; b < bands; b++) {
			int old = start[b + 1] - start[b];
			double[] angle = new double[Math.max(old, 2)];
			for (int i = 0; i < old; i++) {
				angle[i] = Math.acos(x[start[b] + i]);
			}
			if (old < 2) {
				angle[0] = Math.acos(target.xFrom(b));
				angle[1] = Math.acos(target.xTo(b));
			}
			for (int i = 0; i < counts[b]; i++) {
				double position = counts[b] == 1 ? (angle.length - 1) / 2.0 : (double) i * (angle.length - 1) / (counts[b] - 1);
				int below = Math.min((int) position, angle.length - 2);
				double at = Math.cos(angle[below] + (position - below) * (angle[below + 1] - angle[below]));
				larger.x[next] = Math.min(Math.max(at, target.xTo(b)), target.xFrom(b));
				larger.band[next++] = b;
			}
		}
		larger.separate(target);
		return larger;
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

	// Whole numbers in proportion to the shares (largest fractions are rounded up), at least one for each band while they last.
	private static int[] apportion(double[] share, int points) {
		double total = 0;
		for (double s : share) {
			total += s;
		}
		int[] counts = new int[share.length];
		int left = points;
		for (int b = 0; b < share.length; b++) {
			counts[b] = Math.min(left, Math.max(1, (int) (points * share[b] / total)));
			left -= counts[b];
		}
		while (left > 0) {
			int neediest = 0;
			for (int b = 1; b < share.length; b++) {
				if (points * share[b] / total - counts[b] > points * share[neediest] / total - counts[neediest]) {
					neediest = b;
				}
			}
			counts[neediest]++;
			left--;
		}
		return counts;
	}
}
