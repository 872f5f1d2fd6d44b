// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/**
 * The part of the plane that a plot shows, in the units of its axes.
 *
 * @param left
 *            smallest place
 * @param right
 *            largest place
 * @param bottom
 *            smallest value
 * @param top
 *            largest value
 */
public record Window(double left, double right, double bottom, double top) {

	/** Refuses windows without an area. */
	public Window {
		if (!(left < right) || !(bottom < top)) {
			throw new IllegalArgumentException("empty window " + left + ".." + right + ", " + bottom + ".." + top);
		}
	}

	/** The window around a place, scaled by a factor; the place keeps its position on the screen. */
	public Window scaledAbout(double x, double y, double horizontal, double vertical) {
		return new Window(x - (x - left) * horizontal, x + (right - x) * horizontal, y - (y - bottom) * vertical,
				y + (top - y) * vertical);
	}

	/** The same window elsewhere. */
	public Window moved(double dx, double dy) {
		return new Window(left + dx, right + dx, bottom + dy, top + dy);
	}

	/** Horizontal extent. */
	public double width() {
		return right - left;
	}

	/** Vertical extent. */
	public double height() {
		return top - bottom;
	}
}
