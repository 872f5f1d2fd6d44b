// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.model.GainRequirement;
import tapwright.model.Interpolation;
import tapwright.model.LimitPoint;
import tapwright.model.ModelPackage;
import tapwright.model.Side;

/**
 * Limits of a gain requirement over a stretch of frequency, as a target for design: levels in dB are straight over the stretch.
 * A limit that is not there is infinite.
 */
record Corridor(double from, double to, double minFrom, double minTo, double maxFrom, double maxTo) {

	/** Pieces that a sloping limit is cut into, since a design's target is straight in amplitude, not in dB. */
	private static final int PIECES = 8;

	static List<Corridor> of(GainRequirement gain, Numbers numbers) throws InputException {
		if (!gain.getPoints().isEmpty()) {
			return line(gain, numbers);
		}
		double min = orInfinite(numbers.find(gain, ModelPackage.Literals.GAIN_REQUIREMENT__MIN), -1);
		double max = orInfinite(numbers.find(gain, ModelPackage.Literals.GAIN_REQUIREMENT__MAX), 1);
		return List.of(new Corridor(numbers.get(gain, ModelPackage.Literals.GAIN_REQUIREMENT__FROM),
				numbers.get(gain, ModelPackage.Literals.GAIN_REQUIREMENT__TO), min, min, max, max));
	}

	/** Lowest amplitude at a frequency inside. */
	double lower(double frequency) {
		return Double.isInfinite(minFrom) ? minFrom : amplitude(level(minFrom, minTo, frequency));
	}

	/** Highest amplitude at a frequency inside. */
	double upper(double frequency) {
		return Double.isInfinite(maxFrom) ? maxFrom : amplitude(level(maxFrom, maxTo, frequency));
	}

	private static List<Corridor> line(GainRequirement gain, Numbers numbers) throws InputException {
		var corridors = new ArrayList<Corridor>();
		boolean logarithmic = gain.getInterpolate() == Interpolation.LOG;
		for (int k = 0; k + 1 < gain.getPoints().size(); k++) {
			LimitPoint left = gain.getPoints().get(k);
			LimitPoint right = gain.getPoints().get(k + 1);
			double from = numbers.get(left, ModelPackage.Literals.LIMIT_POINT__FREQUENCY);
			double to = numbers.get(right, ModelPackage.Literals.LIMIT_POINT__FREQUENCY);
			double atFrom = numbers.get(left, ModelPackage.Literals.LIMIT_POINT__LEVEL);
			double atTo = numbers.get(right, ModelPackage.Literals.LIMIT_POINT__LEVEL);
			int pieces = atFrom == atTo ? 1 : PIECES;
			for (int piece = 0; piece < pieces && from < to; piece++) {
				double start = (double) piece / pieces;
				double end = (double) (piece + 1) / pieces;
				double levelStart = atFrom + start * (atTo - atFrom);
				double levelEnd = atFrom + end * (atTo - atFrom);
				double none = gain.getSide() == Side.MAX ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
				double low = between(from, to, start, logarithmic);
				double high = between(from, to, end, logarithmic);
				corridors.add(gain.getSide() == Side.MAX ? new Corridor(low, high, none, none, levelStart, levelEnd)
						: new Corridor(low, high, levelStart, levelEnd, none, none));
			}
		}
		return corridors;
	}

	private static double between(double from, double to, double part, boolean logarithmic) {
		if (part == 0 || part == 1) {
			return part == 0 ? from : to;
		}
		return logarithmic && from > 0 ? from * Math.pow(to / from, part) : from + part * (to - from);
	}

	private double level(double atFrom, double atTo, double frequency) {
		return atFrom + (atTo - atFrom) * (frequency - from) / (to - from);
	}

	private static double amplitude(double decibel) {
		return Math.pow(10, decibel / 20);
	}

	private static double orInfinite(OptionalDouble level, int sign) {
		return level.isPresent() ? level.getAsDouble() : sign * Double.POSITIVE_INFINITY;
	}
}
