// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;

import tapwright.charts.Axis;
import tapwright.charts.Curve;
import tapwright.charts.Mark;
import tapwright.charts.Plot;
import tapwright.charts.Region;
import tapwright.charts.Window;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.response.FrequencyResponse;
import tapwright.dsp.response.StepCurve;
import tapwright.dsp.verify.Subject;
import tapwright.dsp.verify.Verdict;
import tapwright.ui.look.Verdicts;

/** Computes pictures of filters. Pure functions, for the background. */
public final class Pictures {

	private static final int POINTS = 4001;
	private static final double LEAST_SHARE = 1e-4;
	private static final double FLOOR_DB = -320;
	private static final double BELOW_LIMIT_DB = 40;
	private static final double WITHOUT_LIMIT_DB = 100;

	private Pictures() {
	}

	/**
	 * A picture of some filters.
	 *
	 * @param emphasized
	 *            id of the requirement that stands out; empty for none
	 * @param detail
	 *            places outside of which nothing is computed; null for all
	 */
	public static Plot of(List<Overlay> overlays, PictureStyle style, String emphasized, Window detail) {
		List<Overlay> drawn = overlays.stream().filter(overlay -> overlay.snapshot().subject().isPresent()).toList();
		String title = style.kind().label() + (drawn.size() == 1 ? " of " + drawn.getFirst().snapshot().name() : "");
		if (drawn.isEmpty()) {
			return Plot.of(title, new Axis("Frequency", "Hz"), new Axis(style.kind().label(), ""), List.of(),
					new Window(0, 1, 0, 1), "There are no coefficients to draw.");
		}
		return switch (style.kind()) {
		case MAGNITUDE, PHASE, GROUP_DELAY -> overFrequency(drawn, style, title, emphasized, detail);
		case IMPULSE, STEP -> overTime(drawn, style.kind(), title);
		case ZEROS -> ZeroPictures.of(drawn, title);
		};
	}

	private static Plot overFrequency(List<Overlay> drawn, PictureStyle style, String title, String emphasized, Window detail) {
		double half = drawn.stream().mapToDouble(overlay -> rate(overlay) / 2).max().orElseThrow();
		double least = style.logarithmic() ? half * LEAST_SHARE : 0;
		var curves = new ArrayList<Curve>();
		var regions = new ArrayList<Region>();
		var marks = new ArrayList<Mark>();
		for (Overlay overlay : drawn) {
			Subject subject = overlay.snapshot().subject().orElseThrow();
			double[] hertz = places(least, subject.sampleRate() / 2, style.logarithmic(), detail);
			curves.add(new Curve(overlay.snapshot().name(), hertz, values(response(subject, hertz), style), Curve.Style.LINE));
			if (style.kind() == PictureKind.MAGNITUDE) {
				regions.addAll(new Limits(subject, style).regions(overlay.snapshot().statements(), emphasized));
				overlay.evidence().ifPresent(evidence -> evidence.requirements()
						.forEach(found -> mark(found, style, subject, found.id().equals(emphasized), marks)));
			}
		}
		Axis y = switch (style.kind()) {
		case PHASE -> new Axis("Phase without bulk delay", "°");
		case GROUP_DELAY -> new Axis("Group delay", "s");
		default -> style.decibels() ? new Axis("Gain", "dB") : new Axis("Gain", "");
		};
		Window home = style.kind() == PictureKind.MAGNITUDE ? magnitudeHome(curves, regions, style, least, half)
				: fit(curves, least, half);
		return new Plot(title, new Axis("Frequency", "Hz", style.logarithmic()), y, curves, regions, marks, home, false,
				PictureWords.of(title, drawn));
	}

	private static double rate(Overlay overlay) {
		return overlay.snapshot().subject().orElseThrow().sampleRate();
	}

	// The whole range, and more places where a person looks closer.
	private static double[] places(double least, double half, boolean logarithmic, Window detail) {
		double[] all = Places.between(least, half, POINTS, logarithmic);
		if (detail == null || detail.left() >= half) {
			return all;
		}
		double[] close = Places.between(Math.max(least, detail.left()), Math.min(half, detail.right()), POINTS, logarithmic);
		return DoubleStream.concat(Arrays.stream(all), Arrays.stream(close)).sorted()
				.toArray();
	}

	private static FrequencyResponse response(Subject subject, double... hertz) {
		return FrequencyResponse.of(subject.taps().toDoubles(), subject.sampleRate(), hertz);
	}

	private static double[] values(FrequencyResponse response, PictureStyle style) {
		return switch (style.kind()) {
		case PHASE -> phase(response);
		case GROUP_DELAY -> response.groupDelay();
		default -> style.decibels() ? Arrays.stream(response.decibels()).map(level -> Math.max(FLOOR_DB, level)).toArray()
				: response.magnitude();
		};
	}

	// Degrees, without the straight line that the delay at the strongest frequency makes.
	private static double[] phase(FrequencyResponse response) {
		double[] magnitude = response.magnitude();
		int strongest = 0;
		for (int k = 0; k < magnitude.length; k++) {
			strongest = magnitude[k] > magnitude[strongest] ? k : strongest;
		}
		double delay = response.groupDelay()[strongest];
		double[] phase = response.phase();
		double[] degrees = new double[phase.length];
		for (int k = 0; k < degrees.length; k++) {
			double turned = phase[k] + 2 * Math.PI * response.hertz()[k] * delay;
			degrees[k] = Math.toDegrees(Math.IEEEremainder(turned, 2 * Math.PI));
		}
		return degrees;
	}

	private static void mark(RequirementEvidence found, PictureStyle style, Subject subject, boolean emphasized,
			List<Mark> marks) {
		double place = found.proof().worst();
		boolean missed = found.proof().verdict() == Verdict.MISSED;
		if (!found.placeUnit().equals("Hz") || Double.isNaN(place) || !(missed || emphasized)) {
			return;
		}
		double level = values(response(subject, place), style)[0];
		marks.add(new Mark(place, level, found.id() + " " + Verdicts.margin(found), missed));
	}

	private static Window magnitudeHome(List<Curve> curves, List<Region> regions, PictureStyle style, double least, double half) {
		double top = curves.stream().mapToDouble(curve -> max(curve.y())).max().orElseThrow();
		for (Region region : regions) {
			for (double level : region.y()) {
				top = Math.max(top, level);
			}
		}
		if (!style.decibels()) {
			return new Window(least, half, 0, top > 0 ? 1.1 * top : 1);
		}
		double lowest = Limits.lowest(regions).orElse(top - WITHOUT_LIMIT_DB + BELOW_LIMIT_DB);
		double bottom = 10 * Math.floor((Math.min(lowest, top - 20) - BELOW_LIMIT_DB) / 10);
		double height = top - bottom;
		return new Window(least, half, bottom, top + 0.08 * height);
	}

	private static Plot overTime(List<Overlay> drawn, PictureKind kind, String title) {
		var curves = new ArrayList<Curve>();
		double end = 0;
		for (Overlay overlay : drawn) {
			double[] taps = overlay.snapshot().subject().orElseThrow().taps().toDoubles();
			double rate = rate(overlay);
			double[] x = new double[taps.length];
			for (int n = 0; n < taps.length; n++) {
				x[n] = n / rate;
			}
			double[] y = kind == PictureKind.STEP ? StepCurve.of(taps) : taps;
			end = Math.max(end, taps.length / rate);
			curves.add(new Curve(overlay.snapshot().name(), x, y,
					kind == PictureKind.STEP ? Curve.Style.LINE : Curve.Style.STEMS));
		}
		Window fitted = fit(curves, 0, end);
		Window home = new Window(-0.02 * end, end, Math.min(fitted.bottom(), 0), Math.max(fitted.top(), 0));
		return Plot.of(title, new Axis("Time", "s"), new Axis("Amplitude", ""), curves, home, PictureWords.of(title, drawn));
	}

	private static Window fit(List<Curve> curves, double left, double right) {
		double top = curves.stream().mapToDouble(curve -> max(curve.y())).max().orElse(1);
		double bottom = curves.stream().mapToDouble(curve -> min(curve.y())).min().orElse(0);
		double room = top > bottom ? 0.1 * (top - bottom) : Math.max(1e-12, 0.5 * Math.abs(top));
		return new Window(left, right, bottom - room, top + room);
	}

	private static double max(double[] values) {
		return Arrays.stream(values).filter(Double::isFinite).max().orElse(1);
	}

	private static double min(double[] values) {
		return Arrays.stream(values).filter(Double::isFinite).min().orElse(0);
	}

	/**
	 * The window around a place, for a closer look: high enough to show the value, its limit, and a limit on the other side when it is
	 * near.
	 */
	public static Window around(Plot plot, double place, double level, double margin) {
		double width = 0.06 * plot.home().width();
		double from = Math.clamp(place - width, plot.home().left(), plot.home().right() - width);
		double to = Math.min(Math.max(place + width, from + width), plot.home().right());
		double near = Math.max(10 * Math.abs(margin), 1e-6 * plot.home().height());
		double lowest = level;
		double highest = level;
		for (Region region : plot.regions()) {
			if (min(region.x()) > place || max(region.x()) < place) {
				continue;
			}
			for (double limit : region.y()) {
				if (Math.abs(limit - level) < near) {
					lowest = Math.min(lowest, limit);
					highest = Math.max(highest, limit);
				}
			}
		}
		double room = highest > lowest ? highest - lowest : near;
		return new Window(from, to, lowest - 1.2 * room, highest + 1.2 * room);
	}

	/** The window around the bands that have a lower limit: where the signal passes. */
	public static Optional<Window> passBand(Plot plot) {
		double left = Double.POSITIVE_INFINITY;
		double right = Double.NEGATIVE_INFINITY;
		double bottom = Double.POSITIVE_INFINITY;
		double top = Double.NEGATIVE_INFINITY;
		Set<String> passed = plot.regions().stream().filter(region -> !region.above()).map(Region::label)
				.collect(Collectors.toSet());
		for (Region region : plot.regions()) {
			if (passed.contains(region.label())) {
				left = Math.min(left, min(region.x()));
				right = Math.max(right, max(region.x()));
				bottom = Math.min(bottom, min(region.y()));
				top = Math.max(top, max(region.y()));
			}
		}
		if (!(left < right)) {
			return Optional.empty();
		}
		double height = top > bottom ? top - bottom : 0.02 * plot.home().height();
		double side = 0.05 * (right - left);
		return Optional.of(new Window(Math.max(plot.home().left(), left - side), Math.min(plot.home().right(), right + side),
				bottom - 0.6 * height, top + 0.6 * height));
	}
}
