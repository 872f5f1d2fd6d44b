// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.model.GainRequirement;
import tapwright.model.Interpolation;
import tapwright.model.LimitPoint;
import tapwright.model.ModelFactory;
import tapwright.model.Side;

/** A limit line that is collected point by point and cut at half the sample rate. */
final class LimitCurve {

	private record Point(double frequency, double level) {
	}

	private final Side side;
	private final Interpolation interpolation;
	private final List<Point> points = new ArrayList<>();

	LimitCurve(Side side, Interpolation interpolation) {
		this.side = side;
		this.interpolation = interpolation;
	}

	void add(double frequency, double level) {
		points.add(new Point(frequency, level));
	}

	/**
	 * The line as a requirement.
	 *
	 * @throws InputException
	 *             when no part of it lies below half the sample rate
	 */
	GainRequirement requirement(String id, String note, double sampleRate) throws InputException {
		List<Point> kept = cut(sampleRate / 2);
		if (kept.size() < 2) {
			throw new InputException(id, "the mask lies above half the sample rate; choose a higher rate or a lower frequency");
		}
		GainRequirement gain = ModelFactory.eINSTANCE.createGainRequirement();
		gain.setId(id);
		gain.setNote(note);
		gain.setSide(side);
		gain.setInterpolate(interpolation);
		for (Point point : kept) {
			LimitPoint corner = ModelFactory.eINSTANCE.createLimitPoint();
			corner.setFrequency(Double.toString(point.frequency));
			corner.setLevel(Double.toString(point.level));
			gain.getPoints().add(corner);
		}
		return gain;
	}

	private List<Point> cut(double end) {
		var kept = new ArrayList<Point>();
		for (Point point : points) {
			if (point.frequency > end) {
				if (!kept.isEmpty() && kept.getLast().frequency < end) {
					kept.add(new Point(end, between(kept.getLast(), point, end)));
				}
				break;
			}
			kept.add(point);
		}
		return kept;
	}

	private double between(Point left, Point right, double at) {
		double part = interpolation == Interpolation.LOG && left.frequency > 0
				? Math.log(at / left.frequency) / Math.log(right.frequency / left.frequency)
				: (at - left.frequency) / (right.frequency - left.frequency);
		return left.level + part * (right.level - left.level);
	}
}
