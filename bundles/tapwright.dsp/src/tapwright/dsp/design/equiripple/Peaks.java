// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

/** Extrema of the weighted error in rising frequency; a growing table. */
final class Peaks {

	final double[] x;
	final int[] band;
	final double[] error;
	int count;

	Peaks(int capacity) {
		x = new double[capacity];
		band = new int[capacity];
		error = new double[capacity];
	}

	void add(double at, int inBand, double e) {
		x[count] = at;
		band[count] = inBand;
		error[count++] = e;
	}

	/** The largest magnitude. */
	double largest() {
		double largest = 0;
		for (int i = 0; i < count; i++) {
			largest = Math.max(largest, Math.abs(error[i]));
		}
		return largest;
	}

	/** Of neighbours with the same sign only the largest. */
	Peaks alternating() {
		Peaks kept = new Peaks(count);
		for (int i = 0; i < count; i++) {
			if (kept.count > 0 && kept.error[kept.count - 1] * error[i] > 0) {
				if (Math.abs(error[i]) <= Math.abs(kept.error[kept.count - 1])) {
					continue;
				}
				kept.count--;
			}
			kept.add(x[i], band[i], error[i]);
		}
		return kept;
	}

	/**
	 * Drops the least of alternating peaks until {@code points} are left, which alternate too: an end alone, a peak
	 * inside together with its smaller neighbour.
	 */
	Reference best(int points) {
		while (count > points) {
			int least = count == points + 1 ? smaller(0, count - 1) : 0;
			for (int i = 1; count > points + 1 && i < count; i++) {
				least = smaller(least, i);
			}
			if (least == 0 || least == count - 1) {
				remove(least, 1);
			} else {
				remove(smaller(least - 1, least + 1) < least ? least - 1 : least, 2);
			}
		}
		Reference reference = new Reference(new double[points], new int[points]);
		System.arraycopy(x, 0, reference.x(), 0, points);
		System.arraycopy(band, 0, reference.band(), 0, points);
		return reference;
	}

	private int smaller(int i, int k) {
		return Math.abs(error[k]) < Math.abs(error[i]) ? k : i;
	}

	private void remove(int from, int size) {
		int rest = count - from - size;
		System.arraycopy(x, from + size, x, from, rest);
		System.arraycopy(band, from + size, band, from, rest);
		System.arraycopy(error, from + size, error, from, rest);
		count -= size;
	}
}
