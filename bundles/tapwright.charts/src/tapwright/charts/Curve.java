// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.Objects;

/**
 * One curve of a plot. The arrays belong to the curve from then on and must not be changed.
 *
 * @param label
 *            name in the legend
 * @param x
 *            places; ascending unless the style is {@link Style#CIRCLES} or {@link Style#CROSSES}
 * @param y
 *            values; NaN leaves a gap
 * @param style
 *            how it is drawn
 */
public record Curve(String label, double[] x, double[] y, Style style) {

	/** Ways to draw a curve. */
	public enum Style {
		/** Neighbours are joined. */
		LINE,
		/** A line from zero to each value. */
		STEMS,
		/** A circle at each place. */
		CIRCLES,
		/** A cross at each place. */
		CROSSES,
		/** A thin line that only guides the eye; not in the legend. */
		GUIDE
	}

	/** Checks the lengths. */
	public Curve {
		Objects.requireNonNull(label);
		Objects.requireNonNull(style);
		if (x.length != y.length) {
			throw new IllegalArgumentException(x.length + " places, but " + y.length + " values");
		}
	}

	/** Whether neighbours are joined by a line. */
	public boolean isLine() {
		return style == Style.LINE || style == Style.GUIDE;
	}

	/** Index of the point whose place is nearest; -1 when the curve is empty. */
	public int nearest(double place) {
		int best = -1;
		for (int k = 0; k < x.length; k++) {
			if (best < 0 || Math.abs(x[k] - place) < Math.abs(x[best] - place)) {
				best = k;
			}
		}
		return best;
	}
}
