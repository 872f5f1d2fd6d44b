// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

import tapwright.charts.Region;
import tapwright.dsp.response.FrequencyResponse;
import tapwright.dsp.verify.GainLimit;
import tapwright.dsp.verify.GainReference;
import tapwright.dsp.verify.Requirement;
import tapwright.dsp.verify.Subject;

/** Turns gain limits into forbidden regions. Any thread. */
final class Limits {

	private static final int POINTS_OF_A_SLOPE = 48;
	private static final int POINTS_OF_A_BAND = 2001;

	private final Subject subject;
	private final boolean decibels;
	private final boolean logarithmic;

	Limits(Subject subject, PictureStyle style) {
		this.subject = subject;
		this.decibels = style.decibels();
		this.logarithmic = style.logarithmic();
	}

	/** The regions of all gain limits; the one with the given id stands out. */
	List<Region> regions(Map<String, Requirement> statements, String emphasized) {
		var regions = new ArrayList<Region>();
		statements.forEach((id, statement) -> {
			if (statement instanceof GainLimit limit) {
				add(regions, id, limit, id.equals(emphasized));
			}
		});
		return regions;
	}

	private void add(List<Region> regions, String id, GainLimit limit, boolean emphasized) {
		double reference = reference(limit.reference());
		var upper = new Line();
		var lower = new Line();
		List<GainLimit.Breakpoint> points = limit.breakpoints();
		for (int k = 0; k < points.size(); k++) {
			GainLimit.Breakpoint point = points.get(k);
			GainLimit.Breakpoint before = k == 0 ? point : points.get(k - 1);
			slope(upper, before, point, before.upper(), point.upper(), reference, limit.logarithmic());
			slope(lower, before, point, before.lower(), point.lower(), reference, limit.logarithmic());
		}
		upper.region(id, true, emphasized).ifPresent(regions::add);
		lower.region(id, false, emphasized).ifPresent(regions::add);
	}

	// A slope that is straight in the statement may be bent in the picture, so it gets corners on its way.
	private void slope(Line line, GainLimit.Breakpoint from, GainLimit.Breakpoint to, double fromDb, double toDb,
			double reference, boolean statedInLog) {
		boolean straight = fromDb == toDb || (decibels && statedInLog == logarithmic) || Double.isInfinite(fromDb);
		int steps = straight || from.frequency() == to.frequency() ? 1 : POINTS_OF_A_SLOPE;
		for (int k = 1; k <= steps; k++) {
			double share = (double) k / steps;
			double hertz = statedInLog && from.frequency() > 0
					? from.frequency() * Math.pow(to.frequency() / from.frequency(), share)
					: from.frequency() + share * (to.frequency() - from.frequency());
			line.add(hertz, level(share == 1 ? toDb : fromDb + share * (toDb - fromDb), reference));
		}
	}

	private double level(double db, double reference) {
		double total = db + reference;
		return decibels || Double.isInfinite(db) && db > 0 ? total : Math.pow(10, total / 20);
	}

	private double reference(GainReference reference) {
		return switch (reference) {
		case GainReference.Absolute absolute -> 0;
		case GainReference.AtFrequency at -> largest(new double[] { at.frequency() });
		case GainReference.LargestIn in -> largest(Places.between(in.from(), in.to(), POINTS_OF_A_BAND, false));
		};
	}

	private double largest(double[] hertz) {
		double[] levels = FrequencyResponse.of(subject.taps().toDoubles(), subject.sampleRate(), hertz).decibels();
		return Arrays.stream(levels).max().orElseThrow();
	}

	/** Lowest upper limit; nothing when there is none. */
	static OptionalDouble lowest(List<Region> regions) {
		return regions.stream().filter(Region::above).flatMapToDouble(region -> Arrays.stream(region.y()))
				.filter(Double::isFinite).min();
	}

	private static final class Line {

		private final List<double[]> corners = new ArrayList<>();

		void add(double hertz, double level) {
			if (Double.isFinite(level)) {
				corners.add(new double[] { hertz, level });
			}
		}

		Optional<Region> region(String id, boolean above, boolean emphasized) {
			if (corners.size() < 2) {
				return Optional.empty();
			}
			return Optional.of(new Region(id, corners.stream().mapToDouble(corner -> corner[0]).toArray(),
					corners.stream().mapToDouble(corner -> corner[1]).toArray(), above, emphasized));
		}
	}
}
