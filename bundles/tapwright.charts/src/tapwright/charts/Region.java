// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.Objects;

/**
 * Where a curve must not go: one side of a limit line.
 *
 * @param label
 *            what forbids it
 * @param x
 *            places of the corners of the line, ascending
 * @param y
 *            values of the corners
 * @param above
 *            whether the side above the line is forbidden, otherwise below
 * @param emphasized
 *            whether the region stands out among the others
 */
public record Region(String label, double[] x, double[] y, boolean above, boolean emphasized) {

	/** Checks the lengths. */
	public Region {
		Objects.requireNonNull(label);
		if (x.length != y.length || x.length < 2) {
			throw new IllegalArgumentException("a limit line needs two corners or more, each with place and value");
		}
	}
}
