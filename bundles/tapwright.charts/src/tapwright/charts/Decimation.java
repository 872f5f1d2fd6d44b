// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.Arrays;

/**
 * Reduces a curve to what the pixels of a screen can show: per column of pixels the first, smallest, largest and last value, so
 * that no peak is lost. Pure function; any thread.
 */
final class Decimation {

	private static final int POINTS_PER_COLUMN = 4;

	private Decimation() {
	}

	/**
	 * The curve between two places, with the neighbours just outside so that lines run to the edge.
	 *
	 * @param columns
	 *            width of the screen in pixels
	 * @param logarithmic
	 *            whether columns stand for equal ratios instead of equal steps
	 * @return a curve with at most about four points per column; the same one when it is short enough
	 */
	static Curve reduce(Curve curve, double from, double to, int columns, boolean logarithmic) {
		double[] x = curve.x();
		int first = Math.max(0, lowerBound(x, from) - 1);
		int end = Math.min(x.length, lowerBound(x, to) + 2);
		if (end - first <= POINTS_PER_COLUMN * columns) {
			return first == 0 && end == x.length ? curve
					: new Curve(curve.label(), Arrays.copyOfRange(x, first, end),
							Arrays.copyOfRange(curve.y(), first, end), curve.style());
		}
		var out = new Collector(POINTS_PER_COLUMN * (columns + 4));
		int start = first;
		while (start < end) {
			int column = column(x[start], from, to, columns, logarithmic);
			int stop = start + 1;
			while (stop < end && column(x[stop], from, to, columns, logarithmic) == column) {
				stop++;
			}
			out.addColumn(curve, start, stop);
			start = stop;
		}
		return out.curve(curve);
	}

	private static int column(double x, double from, double to, int columns, boolean logarithmic) {
		double share = logarithmic ? Math.log(x / from) / Math.log(to / from) : (x - from) / (to - from);
		return (int) Math.floor(Math.clamp(share * columns, -1, columns));
	}

	private static int lowerBound(double[] x, double value) {
		int found = Arrays.binarySearch(x, value);
		return found < 0 ? -found - 1 : found;
	}

	private static final class Collector {

		private double[] x;
		private double[] y;
		private int size;

		Collector(int capacity) {
			x = new double[capacity];
			y = new double[capacity];
		}

		void addColumn(Curve curve, int start, int stop) {
			int smallest = start;
			int largest = start;
			for (int k = start; k < stop; k++) {
				smallest = curve.y()[k] < curve.y()[smallest] ? k : smallest;
				largest = curve.y()[k] > curve.y()[largest] ? k : largest;
			}
			int[] chosen = { start, smallest, largest, stop - 1 };
			Arrays.sort(chosen);
			for (int k = 0; k < chosen.length; k++) {
				if (k == 0 || chosen[k] != chosen[k - 1]) {
					add(curve.x()[chosen[k]], curve.y()[chosen[k]]);
				}
			}
		}

		private void add(double place, double value) {
			if (size == x.length) {
				x = Arrays.copyOf(x, 2 * size + 1);
				y = Arrays.copyOf(y, 2 * size + 1);
			}
			x[size] = place;
			y[size++] = value;
		}

		Curve curve(Curve original) {
			return new Curve(original.label(), Arrays.copyOf(x, size), Arrays.copyOf(y, size), original.style());
		}
	}
}
