// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/** Round numbers along an axis, and numbers in words. */
final class Ticks {

	private Ticks() {
	}

	/** About as many round numbers as asked for, inside the range, ascending. */
	static List<Double> of(double from, double to, int count, boolean logarithmic) {
		return logarithmic && from > 0 ? decades(from, to) : steps(from, to, count);
	}

	private static List<Double> steps(double from, double to, int count) {
		var ticks = new ArrayList<Double>();
		double rough = (to - from) / Math.max(1, count);
		if (!(rough > 0) || Double.isInfinite(rough)) {
			return ticks;
		}
		double decade = Math.pow(10, Math.floor(Math.log10(rough)));
		double ratio = rough / decade;
		double step = decade * (ratio <= 1 ? 1 : ratio <= 2 ? 2 : ratio <= 5 ? 5 : 10);
		for (long k = (long) Math.ceil(from / step - 1e-9); k * step <= to + 1e-9 * step; k++) {
			ticks.add(k * step);
		}
		return ticks;
	}

	private static List<Double> decades(double from, double to) {
		var ticks = new ArrayList<Double>();
		for (int power = (int) Math.floor(Math.log10(from)); Math.pow(10, power) <= to; power++) {
			for (int digit : new int[] { 1, 2, 5 }) {
				double tick = digit * Math.pow(10, power);
				if (tick >= from && tick <= to) {
					ticks.add(tick);
				}
			}
		}
		return ticks;
	}

	/** A number without needless zeros. */
	static String format(double value, int digits) {
		if (!Double.isFinite(value)) {
			return Double.isNaN(value) ? "?" : value > 0 ? "∞" : "−∞";
		}
		BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
		BigDecimal stripped = rounded.signum() == 0 ? BigDecimal.ZERO : rounded.stripTrailingZeros();
		int magnitude = stripped.precision() - stripped.scale() - 1;
		String text = magnitude < -5 || magnitude > 7 ? stripped.toString() : stripped.toPlainString();
		return text.replace('-', '−');
	}
}
