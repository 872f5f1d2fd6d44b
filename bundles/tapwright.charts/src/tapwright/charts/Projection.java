// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/** Maps places and values to pixels; pixel rows count downwards. */
interface Projection {

	/** Pixel column of a place. */
	double column(double x);

	/** Pixel row of a value. */
	double row(double y);

	/** A window onto a rectangle. */
	static Projection of(Window window, boolean logX, double left, double top, double width, double height) {
		return new Projection() {
			@Override
			public double column(double x) {
				double share = logX ? Math.log(x / window.left()) / Math.log(window.right() / window.left())
						: (x - window.left()) / window.width();
				return left + share * width;
			}

			@Override
			public double row(double y) {
				return top + (window.top() - y) / window.height() * height;
			}
		};
	}

	/**
	 * Corners of the forbidden side of a limit line inside a window, as column, row, column, row, ...; empty when the line lies
	 * outside.
	 */
	default double[] corners(Region region, Window window) {
		double[] x = region.x();
		int last = x.length - 1;
		double from = Math.max(x[0], window.left());
		double to = Math.min(x[last], window.right());
		if (!(from < to)) {
			return new double[0];
		}
		int inside = 0;
		for (double place : x) {
			inside += place > from && place < to ? 1 : 0;
		}
		double[] corners = new double[2 * (inside + 4)];
		int n = 0;
		double edge = row(region.above() ? window.top() + window.height() : window.bottom() - window.height());
		n = put(corners, n, column(from), edge);
		n = put(corners, n, column(from), row(within(lineAt(region, from), window)));
		for (int k = 0; k <= last; k++) {
			if (x[k] > from && x[k] < to) {
				n = put(corners, n, column(x[k]), row(within(region.y()[k], window)));
			}
		}
		n = put(corners, n, column(to), row(within(lineAt(region, to), window)));
		put(corners, n, column(to), edge);
		return corners;
	}

	private static int put(double[] corners, int n, double column, double row) {
		corners[n] = column;
		corners[n + 1] = row;
		return n + 2;
	}

	// The corner at the left of a jump belongs to what lies left of it.
	private static double lineAt(Region region, double place) {
		double[] x = region.x();
		for (int k = 1; k < x.length; k++) {
			if (place <= x[k] && x[k - 1] < x[k]) {
				double share = (place - x[k - 1]) / (x[k] - x[k - 1]);
				return share <= 0 ? region.y()[k - 1] : region.y()[k - 1] + share * (region.y()[k] - region.y()[k - 1]);
			}
		}
		return region.y()[x.length - 1];
	}

	// Keeps pixel numbers small when a limit lies far outside.
	private static double within(double value, Window window) {
		return Math.clamp(value, window.bottom() - window.height(), window.top() + window.height());
	}
}
