// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.Locale;

import org.eclipse.swt.graphics.RGB;

/** Writes a plot as a drawing in SVG 1.1, with its text equivalent inside. Any thread. */
public final class PlotSvg {

	/**
	 * The colours of a drawing.
	 *
	 * @param paper
	 *            background
	 * @param ink
	 *            axes and words
	 * @param grid
	 *            lines of the grid
	 * @param forbidden
	 *            forbidden regions
	 * @param mark
	 *            grave marks
	 * @param curves
	 *            one for each curve, repeated when there are more
	 */
	public record Palette(RGB paper, RGB ink, RGB grid, RGB forbidden, RGB mark, RGB... curves) {

		/** The theme's colours. UI thread. */
		public static Palette ofTheme() {
			RGB[] curves = new RGB[6];
			for (int k = 0; k < curves.length; k++) {
				curves[k] = ChartColors.curve(k).getRGB();
			}
			return new Palette(ChartColors.paper().getRGB(), ChartColors.ink().getRGB(), ChartColors.grid().getRGB(),
					ChartColors.forbidden().getRGB(), ChartColors.mark().getRGB(), curves);
		}
	}

	private static final int LEFT = 70;
	private static final int RIGHT = 16;
	private static final int TOP = 34;
	private static final int BOTTOM = 48;
	private static final int PIXELS_PER_TICK = 80;
	private static final String[] DASHES = { "", "8 4", "8 3 2 3", "2 3", "8 3 2 3 2 3" };

	private final StringBuilder out = new StringBuilder();
	private final Plot plot;
	private final Window window;
	private final Palette palette;
	private final double width;
	private final double height;
	private final Projection projection;

	private PlotSvg(Plot plot, Window window, int width, int height, Palette palette) {
		this.plot = plot;
		this.window = window;
		this.palette = palette;
		this.width = width;
		this.height = height;
		this.projection = Projection.of(window, plot.x().logarithmic(), LEFT, TOP, width - LEFT - RIGHT, height - TOP - BOTTOM);
	}

	/** The drawing of a part of the plane, of at least 200 by 150 units. */
	public static String write(Plot plot, Window window, int width, int height, Palette palette) {
		return new PlotSvg(plot, window, Math.max(200, width), Math.max(150, height), palette).draw();
	}

	private String draw() {
		line("<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"%s\" height=\"%s\" viewBox=\"0 0 %s %s\" "
				+ "font-family=\"sans-serif\" font-size=\"12\">", n(width), n(height), n(width), n(height));
		line("<title>%s</title>", escape(plot.title()));
		line("<desc>%s</desc>", escape(plot.text()));
		line("<rect width=\"100%%\" height=\"100%%\" fill=\"%s\"/>", hex(palette.paper()));
		line("<clipPath id=\"area\"><rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\"/></clipPath>", n(LEFT), n(TOP),
				n(width - LEFT - RIGHT), n(height - TOP - BOTTOM));
		axes();
		line("<g clip-path=\"url(#area)\">");
		plot.regions().forEach(this::region);
		for (int k = 0; k < plot.curves().size(); k++) {
			curve(k, plot.curves().get(k));
		}
		plot.marks().forEach(this::mark);
		line("</g>");
		line("</svg>");
		return out.toString();
	}

	private void axes() {
		String ink = hex(palette.ink());
		String grid = hex(palette.grid());
		double right = width - RIGHT;
		double bottom = height - BOTTOM;
		int xPower = plot.x().prefixPower(Math.max(Math.abs(window.left()), Math.abs(window.right())));
		int yPower = plot.y().prefixPower(Math.max(Math.abs(window.bottom()), Math.abs(window.top())));
		for (double x : Ticks.of(window.left(), window.right(), (int) (right - LEFT) / PIXELS_PER_TICK, plot.x().logarithmic())) {
			String column = n(projection.column(x));
			line("<path d=\"M%s %sV%s\" stroke=\"%s\"/>", column, n(TOP), n(bottom), grid);
			line("<text x=\"%s\" y=\"%s\" text-anchor=\"middle\" fill=\"%s\">%s</text>", column, n(bottom + 16), ink,
					Ticks.format(x / Math.pow(10, xPower), 6));
		}
		for (double y : Ticks.of(window.bottom(), window.top(), (int) (bottom - TOP) / (PIXELS_PER_TICK / 2), false)) {
			String row = n(projection.row(y));
			line("<path d=\"M%s %sH%s\" stroke=\"%s\"/>", n(LEFT), row, n(right), grid);
			line("<text x=\"%s\" y=\"%s\" text-anchor=\"end\" dy=\"4\" fill=\"%s\">%s</text>", n(LEFT - 6), row, ink,
					Ticks.format(y / Math.pow(10, yPower), 6));
		}
		line("<path d=\"M%s %sV%sH%s\" fill=\"none\" stroke=\"%s\"/>", n(LEFT), n(TOP), n(bottom), n(right), ink);
		line("<text x=\"%s\" y=\"20\" font-weight=\"bold\" fill=\"%s\">%s</text>", n(LEFT), ink, escape(plot.title()));
		line("<text x=\"%s\" y=\"%s\" text-anchor=\"middle\" fill=\"%s\">%s</text>", n((LEFT + right) / 2), n(height - 10), ink,
				escape(plot.x().caption(xPower)));
		line("<text transform=\"translate(16 %s) rotate(-90)\" text-anchor=\"middle\" fill=\"%s\">%s</text>",
				n((TOP + bottom) / 2), ink, escape(plot.y().caption(yPower)));
	}

	private void region(Region region) {
		double[] corners = projection.corners(region, window);
		if (corners.length == 0) {
			return;
		}
		var points = new StringBuilder();
		for (int k = 0; k < corners.length; k += 2) {
			points.append(k == 0 ? "" : " ").append(n(corners[k])).append(',').append(n(corners[k + 1]));
		}
		line("<polygon points=\"%s\" fill=\"%s\" fill-opacity=\"%s\" stroke=\"%s\"><title>%s</title></polygon>", points,
				hex(palette.forbidden()), region.emphasized() ? "0.45" : "0.2", hex(palette.forbidden()), escape(region.label()));
	}

	private void curve(int index, Curve curve) {
		String color = curve.style() == Curve.Style.GUIDE ? hex(palette.ink())
				: hex(palette.curves()[index % palette.curves().length]);
		switch (curve.style()) {
		case LINE, GUIDE -> line("<path d=\"%s\" fill=\"none\" stroke=\"%s\" stroke-width=\"%s\" stroke-dasharray=\"%s\"/>",
				joined(curve), color, curve.style() == Curve.Style.GUIDE ? "0.7" : "1.6", DASHES[index % DASHES.length]);
		case STEMS -> each(curve,
				(x, y) -> line("<path d=\"M%s %sV%s\" stroke=\"%s\"/>", n(x), n(projection.row(0)), n(y), color));
		case CIRCLES -> each(curve,
				(x, y) -> line("<circle cx=\"%s\" cy=\"%s\" r=\"4\" fill=\"none\" stroke=\"%s\"/>", n(x), n(y), color));
		case CROSSES -> each(curve,
				(x, y) -> line("<path d=\"M%s %sl8 8m0 -8l-8 8\" stroke=\"%s\"/>", n(x - 4), n(y - 4), color));
		}
	}

	private String joined(Curve curve) {
		Curve drawn = plot.sameScale() ? curve
				: Decimation.reduce(curve, window.left(), window.right(), (int) width, plot.x().logarithmic());
		var path = new StringBuilder();
		boolean gap = true;
		for (int k = 0; k < drawn.x().length; k++) {
			double column = projection.column(drawn.x()[k]);
			double row = projection.row(Math.clamp(drawn.y()[k], window.bottom() - window.height(), window.top() + window.height()));
			if (Double.isNaN(column) || Double.isInfinite(column) || Double.isNaN(drawn.y()[k])) {
				gap = true;
				continue;
			}
			path.append(gap ? 'M' : 'L').append(n(column)).append(' ').append(n(row));
			gap = false;
		}
		return path.toString();
	}

	private interface Point {
		void at(double column, double row);
	}

	private void each(Curve curve, Point point) {
		for (int k = 0; k < curve.x().length; k++) {
			point.at(projection.column(curve.x()[k]), projection.row(curve.y()[k]));
		}
	}

	private void mark(Mark mark) {
		String color = hex(mark.grave() ? palette.mark() : palette.ink());
		double column = projection.column(mark.x());
		double row = projection.row(mark.y());
		line(mark.grave() ? "<path d=\"M%s %sl10 10m0 -10l-10 10\" stroke=\"%s\" stroke-width=\"2\"/>"
				: "<path d=\"M%s %sl5 -5 5 5 -5 5z\" fill=\"none\" stroke=\"%s\" stroke-width=\"2\"/>", n(column - 5),
				n(mark.grave() ? row - 5 : row), color);
		line("<text x=\"%s\" y=\"%s\" fill=\"%s\">%s</text>", n(column + 9), n(row - 4), color, escape(mark.label()));
	}

	private void line(String format, Object... values) {
		out.append(String.format(Locale.ROOT, format, values)).append('\n');
	}

	private static String n(double value) {
		return String.format(Locale.ROOT, "%.2f", value).replaceFirst("\\.?0+$", "");
	}

	private static String hex(RGB color) {
		return String.format(Locale.ROOT, "#%02x%02x%02x", color.red, color.green, color.blue);
	}

	private static String escape(String text) {
		return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;").replace("\"", "&quot;");
	}
}
