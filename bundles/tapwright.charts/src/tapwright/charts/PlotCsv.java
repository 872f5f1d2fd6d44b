// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/** Writes the curves of a plot as a table of text. Any thread. */
public final class PlotCsv {

	private PlotCsv() {
	}

	/**
	 * Two columns per curve, place and value, in base units, with all digits; a header with names and units.
	 *
	 * @param separator
	 *            between columns
	 */
	public static String write(Plot plot, char separator) {
		var out = new StringBuilder();
		int rows = 0;
		for (Curve curve : plot.curves()) {
			out.append(out.isEmpty() ? "" : separator).append(quote(header(plot.x()), separator)).append(separator)
					.append(quote(curve.label() + unit(plot.y()), separator));
			rows = Math.max(rows, curve.x().length);
		}
		out.append('\n');
		for (int row = 0; row < rows; row++) {
			for (int k = 0; k < plot.curves().size(); k++) {
				Curve curve = plot.curves().get(k);
				out.append(k == 0 ? "" : separator);
				if (row < curve.x().length) {
					out.append(curve.x()[row]).append(separator).append(curve.y()[row]);
				} else {
					out.append(separator);
				}
			}
			out.append('\n');
		}
		return out.toString();
	}

	private static String header(Axis axis) {
		return axis.title() + unit(axis);
	}

	private static String unit(Axis axis) {
		return axis.unit().isEmpty() ? "" : " (" + axis.unit() + ")";
	}

	private static String quote(String text, char separator) {
		return text.indexOf(separator) < 0 && text.indexOf('"') < 0 ? text : '"' + text.replace("\"", "\"\"") + '"';
	}
}
