// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.Locale;

import tapwright.core.quantity.Words;

/** Coefficients as SVG, one line for each. */
final class ImpulsePicture {

	private static final int WIDTH = 720;
	private static final int HEIGHT = 200;
	private static final int LEFT = 64;
	private static final int RIGHT = 16;
	private static final int TOP = 10;
	private static final int BOTTOM = 40;

	private ImpulsePicture() {
	}

	static String of(String name, double[] taps) {
		double high = 0;
		double low = 0;
		for (double tap : taps) {
			high = Math.max(high, tap);
			low = Math.min(low, tap);
		}
		double room = high == low ? 1 : (high - low) * 0.06;
		var x = new Axis(-0.5, taps.length - 0.5, LEFT, WIDTH - RIGHT);
		var y = new Axis(low - (low < 0 ? room : 0), high + room, HEIGHT - BOTTOM, TOP);
		var svg = new StringBuilder("<svg class=\"picture\" role=\"img\" viewBox=\"0 0 " + WIDTH + " " + HEIGHT
				+ "\" aria-label=\"The " + taps.length
				+ " coefficients of " + Html.escape(name) + "\">\n");
		for (double tick : y.ticks(4)) {
			svg.append(String.format(Locale.ROOT,
					"<path class=\"grid\" d=\"M%.1f %.1fH%.1f\"/><text class=\"tick\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"end\">%s</text>\n",
					x.first(), y.place(tick), x.last(), x.first() - 6, y.place(tick) + 4, Words.of(tick, "1")
							.replace("-", "−")));
		}
		for (double tick : x.ticks(8)) {
			if (tick == Math.rint(tick)) {
				svg.append(String.format(Locale.ROOT,
						"<text class=\"tick\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"middle\">%d</text>\n", x.place(tick),
						y.first() + 16, (long) tick));
			}
		}
		svg.append("<path class=\"stem\" d=\"");
		for (int k = 0; k < taps.length; k++) {
			svg.append(String.format(Locale.ROOT, "M%.1f %.1fV%.1f", x.place(k), y.place(0), y.place(taps[k])));
		}
		svg.append("\"/>\n<path class=\"dots\" d=\"");
		for (int k = 0; k < taps.length; k++) {
			svg.append(String.format(Locale.ROOT, "M%.1f %.1fh0", x.place(k), y.place(taps[k])));
		}
		svg.append("\"/>\n<text class=\"label\" x=\"" + (LEFT + WIDTH - RIGHT) / 2 + "\" y=\"" + (HEIGHT - 6)
				+ "\" text-anchor=\"middle\">coefficient</text>\n");
		return svg.append("</svg>").toString();
	}
}
