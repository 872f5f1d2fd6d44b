// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import tapwright.core.quantity.Words;
import tapwright.dsp.response.FrequencyResponse;
import tapwright.dsp.verify.GainLimit;
import tapwright.dsp.verify.GainLimit.Breakpoint;
import tapwright.dsp.verify.GainReference;
import tapwright.dsp.verify.Subject;

/** Gain over frequency as SVG, forbidden regions shaded. The picture illustrates; the proofs do not rest on it. */
final class ResponsePicture {

	private static final int WIDTH = 720;
	private static final int HEIGHT = 300;
	private static final int LEFT = 64;
	private static final int RIGHT = 16;
	private static final int TOP = 12;
	private static final int BOTTOM = 44;
	private static final int POINTS = 2561;
	private static final int PARTS = 24;
	private static final double USUAL_FLOOR = -100;
	private static final double DETAIL = 6;

	private final double[] hertz;
	private final double[] gain;
	private final List<Limit> limits = new ArrayList<>();

	/** One straight piece of a limit, relative to no reference any more. */
	private record Limit(double from, double to, double lowerFrom, double lowerTo, double upperFrom, double upperTo) {
	}

	ResponsePicture(Subject filter, List<GainLimit> claims) {
		double[] taps = filter.taps().toDoubles();
		double nyquist = filter.sampleRate() / 2;
		hertz = new double[POINTS];
		for (int k = 0; k < POINTS; k++) {
			hertz[k] = nyquist * k / (POINTS - 1);
		}
		gain = FrequencyResponse.of(taps, filter.sampleRate(), hertz).decibels();
		for (GainLimit claim : claims) {
			double reference = reference(claim.reference(), taps, filter.sampleRate());
			List<Breakpoint> points = claim.breakpoints();
			if (points.size() == 1) {
				add(points.getFirst(), points.getFirst(), reference, claim.logarithmic());
			}
			for (int k = 1; k < points.size(); k++) {
				add(points.get(k - 1), points.get(k), reference, claim.logarithmic());
			}
		}
	}

	private double reference(GainReference reference, double[] taps, double sampleRate) {
		return switch (reference) {
		case GainReference.Absolute absolute -> 0;
		case GainReference.AtFrequency at -> FrequencyResponse.of(taps, sampleRate, new double[] { at.frequency() })
				.decibels()[0];
		case GainReference.LargestIn in -> largest(in.from(), in.to());
		};
	}

	private double largest(double from, double to) {
		double largest = Double.NEGATIVE_INFINITY;
		for (int k = 0; k < POINTS; k++) {
			largest = hertz[k] >= from && hertz[k] <= to ? Math.max(largest, gain[k]) : largest;
		}
		return Double.isFinite(largest) ? largest : 0;
	}

	// A limit that is straight over the logarithm of frequency is drawn in short pieces.
	private void add(Breakpoint a, Breakpoint b, double reference, boolean logarithmic) {
		boolean bent = logarithmic && a.frequency() > 0 && b.frequency() > a.frequency();
		int parts = bent ? PARTS : 1;
		for (int k = 0; k < parts; k++) {
			double s = (double) k / parts;
			double t = (double) (k + 1) / parts;
			limits.add(new Limit(frequency(a, b, s, bent), frequency(a, b, t, bent), reference
					+ between(a.lower(), b.lower(), s),
					reference + between(a.lower(), b.lower(), t), reference + between(a.upper(), b.upper(), s),
							reference + between(a.upper(), b.upper(), t)));
		}
	}

	private static double frequency(Breakpoint a, Breakpoint b, double t, boolean bent) {
		return bent ? a.frequency() * Math.pow(b.frequency() / a.frequency(), t) : a.frequency()
				+ t * (b.frequency() - a.frequency());
	}

	private static double between(double a, double b, double t) {
		return a == b ? a : Double.isInfinite(a) || Double.isInfinite(b) ? t < 0.5 ? a : b : a + t * (b - a);
	}

	/** The whole band. */
	String whole(String name) {
		double low = USUAL_FLOOR;
		double high = 10 * Math.ceil((largest(0, hertz[POINTS - 1]) + 3) / 10);
		for (Limit limit : limits) {
			double level = Math.min(finite(limit.upperFrom, 0), finite(limit.upperTo, 0));
			low = Math.min(low, 10 * Math.floor((level - 25) / 10));
			high = Math.max(high, 10 * Math.ceil((Math.max(finite(limit.lowerFrom, high), finite(limit.lowerTo, high))
					+ 2) / 10));
		}
		return picture("Gain of " + name + " from 0 to " + Words.of(hertz[POINTS - 1], "Hz")
				+ ", forbidden regions shaded", 0, hertz[POINTS - 1],
				Math.max(low, -250), high);
	}

	/** The bands with close limits on both sides, where ripple is too small to be seen in the whole; nothing without such bands. */
	Optional<String> detail(String name) {
		double from = Double.POSITIVE_INFINITY;
		double to = 0;
		double low = Double.POSITIVE_INFINITY;
		double high = Double.NEGATIVE_INFINITY;
		for (Limit limit : limits) {
			if (limit.to > limit.from && limit.upperFrom - limit.lowerFrom <= DETAIL
					&& limit.upperTo - limit.lowerTo <= DETAIL) {
				from = Math.min(from, limit.from);
				to = Math.max(to, limit.to);
				low = Math.min(low, Math.min(limit.lowerFrom, limit.lowerTo));
				high = Math.max(high, Math.max(limit.upperFrom, limit.upperTo));
			}
		}
		if (!(to > from) || !(high > low)) {
			return Optional.empty();
		}
		double room = (high - low) * 0.4;
		return Optional.of(picture("Detail: gain of " + name + " " + Words.band(from, to), from,
				Math.min(to + (to - from) * 0.05, hertz[POINTS - 1]),
				low - room, high + room));
	}

	/** A line without axes, for tables. */
	String spark() {
		var x = new Axis(0, hertz[POINTS - 1], 1, 119);
		var y = new Axis(USUAL_FLOOR, Math.max(5, largest(0, hertz[POINTS - 1])), 29, 1);
		return "<svg class=\"spark\" viewBox=\"0 0 120 30\" width=\"120\" height=\"30\" aria-hidden=\"true\"><path class=\"line\" d=\"" + path(x, y, 16) + "\"/></svg>";
	}

	private String picture(String title, double from, double to, double low, double high) {
		var x = new Axis(from, to, LEFT, WIDTH - RIGHT);
		var y = new Axis(low, high, HEIGHT - BOTTOM, TOP);
		var svg = new StringBuilder("<svg class=\"picture\" role=\"img\" viewBox=\"0 0 " + WIDTH + " " + HEIGHT
				+ "\" aria-label=\"" + Html.escape(title) + "\">\n");
		for (double tick : y.ticks(6)) {
			svg.append(format("<path class=\"grid\" d=\"M%.1f %.1fH%.1f\"/><text class=\"tick\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"end\">%s</text>%n", x.first(), y.place(tick),
					x.last(), x.first() - 6, y.place(tick) + 4, number(tick)));
		}
		for (double tick : x.ticks(8)) {
			svg.append(format("<path class=\"grid\" d=\"M%.1f %.1fV%.1f\"/><text class=\"tick\" x=\"%.1f\" y=\"%.1f\" text-anchor=\"middle\">%s</text>%n", x.place(tick), y.first(),
					y.last(), x.place(tick), y.first() + 16, Html.escape(tick == 0 ? "0" : Words.of(tick, "Hz"))));
		}
		for (Limit limit : limits) {
			shade(svg, x, y, limit);
		}
		svg.append("<path class=\"line\" d=\"").append(path(x, y, 1)).append("\"/>\n");
		svg.append(format("<text class=\"label\" x=\"%d\" y=\"%d\" text-anchor=\"middle\">frequency</text>%n",
				(LEFT + WIDTH - RIGHT) / 2, HEIGHT - 8));
		svg.append(format("<text class=\"label\" x=\"14\" y=\"%d\" text-anchor=\"middle\" transform=\"rotate(-90 14 %d)\">gain in dB</text>%n", (TOP + HEIGHT - BOTTOM) / 2,
				(TOP + HEIGHT - BOTTOM) / 2));
		return svg.append("</svg>").toString();
	}

	private static void shade(StringBuilder svg, Axis x, Axis y, Limit limit) {
		if (limit.to < x.low() || limit.from > x.high()) {
			return;
		}
		double a = x.place(limit.from);
		double b = Math.max(x.place(limit.to), a + 1); // a limit at one frequency is still seen
		if (limit.upperFrom < Double.POSITIVE_INFINITY && limit.upperTo < Double.POSITIVE_INFINITY) {
			region(svg, a, b, y.place(limit.upperFrom), y.place(limit.upperTo), y.last());
		}
		if (limit.lowerFrom > Double.NEGATIVE_INFINITY && limit.lowerTo > Double.NEGATIVE_INFINITY) {
			region(svg, a, b, y.place(limit.lowerFrom), y.place(limit.lowerTo), y.first());
		}
	}

	private static void region(StringBuilder svg, double a, double b, double from, double to, double edge) {
		svg.append(format("<path class=\"forbidden\" d=\"M%.1f %.1fL%.1f %.1fV%.1fH%.1fZ\"/><path class=\"limit\" d=\"M%.1f %.1fL%.1f %.1f\"/>%n", a, from, b, to, edge, a, a, from,
				b, to));
	}

	private String path(Axis x, Axis y, int step) {
		var path = new StringBuilder();
		int margin = 2;
		for (int k = 0; k < POINTS; k += step) {
			boolean near = hertz[Math.min(k + margin, POINTS - 1)] >= x.low()
					&& hertz[Math.max(k - margin, 0)] <= x.high();
			if (near) {
				double level = gain[k];
				for (int j = k + 1; j < Math.min(k + step, POINTS); j++) {
					level = Math.max(level, gain[j]);
				}
				path.append(path.isEmpty() ? 'M' : 'L')
						.append(format("%.1f %.1f", x.place(hertz[k]), y.place(Double.isNaN(level) ? y.low() : level)));
			}
		}
		return path.toString();
	}

	private static double finite(double value, double otherwise) {
		return Double.isFinite(value) ? value : otherwise;
	}

	private static String number(double tick) {
		return Words.of(tick, "1").replace("-", "−");
	}

	private static String format(String pattern, Object... values) {
		return String.format(Locale.ROOT, pattern.replace("%n", "\n"), values);
	}
}
