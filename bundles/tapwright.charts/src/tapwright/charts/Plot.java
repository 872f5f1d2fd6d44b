// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.List;
import java.util.Objects;

/**
 * A picture as plain data: no colour, no widget, no thread.
 *
 * @param title
 *            what the picture shows
 * @param x
 *            horizontal axis
 * @param y
 *            vertical axis
 * @param curves
 *            in the order of the legend
 * @param regions
 *            forbidden regions
 * @param marks
 *            places to look at
 * @param home
 *            what is shown at first
 * @param sameScale
 *            whether both axes get the same scale, as for places in a plane
 * @param text
 *            the picture in words, for people who do not see it
 */
public record Plot(String title, Axis x, Axis y, List<Curve> curves, List<Region> regions, List<Mark> marks, Window home,
		boolean sameScale, String text) {

	/** Takes copies of the lists. */
	public Plot {
		Objects.requireNonNull(title);
		Objects.requireNonNull(text);
		Objects.requireNonNull(home);
		curves = List.copyOf(curves);
		regions = List.copyOf(regions);
		marks = List.copyOf(marks);
	}

	/** A plot of curves alone. */
	public static Plot of(String title, Axis x, Axis y, List<Curve> curves, Window home, String text) {
		return new Plot(title, x, y, curves, List.of(), List.of(), home, false, text);
	}
}
