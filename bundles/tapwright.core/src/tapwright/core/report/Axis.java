// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.ArrayList;
import java.util.List;

/**
 * From numbers to places in a picture.
 *
 * @param low
 *            number at the first place
 * @param high
 *            number at the last place
 * @param first
 *            place, in picture units
 * @param last
 *            place, in picture units
 */
record Axis(double low, double high, double first, double last) {

	private static final double[] STEPS = { 1, 2, 5, 10 };

	/** The place of a number, kept within the axis. */
	double place(double value) {
		double clamped = Math.clamp(value, low, high);
		return first + (clamped - low) / (high - low) * (last - first);
	}

	/** Round numbers along the axis, about as many as asked for. */
	List<Double> ticks(int about) {
		double raw = (high - low) / about;
		double power = Math.pow(10, Math.floor(Math.log10(raw)));
		double step = 10 * power;
		for (double candidate : STEPS) {
			if (candidate * power >= raw * 0.999) {
				step = candidate * power;
				break;
			}
		}
		var ticks = new ArrayList<Double>();
		for (long k = (long) Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * step; k++) {
			ticks.add(k * step);
		}
		return ticks;
	}
}
