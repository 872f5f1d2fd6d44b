// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import java.util.List;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.model.Interpolation;
import tapwright.model.Requirement;
import tapwright.model.Side;

/**
 * Frequency weighting A as a target with a tolerance of one's own choice. Pole frequencies by IEC 61672-1, recalled and confirmed
 * against the printed table; the standard's own tolerances are not included.
 */
final class AWeightingMask implements PublishedMask {

	private static final MaskChoice TOLERANCE = new MaskChoice("tolerance", "dB", 1);
	private static final MaskChoice FROM = new MaskChoice("lowest frequency", "Hz", 20);
	private static final MaskChoice TO = new MaskChoice("highest frequency", "Hz", 16_000);

	private static final double[] POLES = { 20.598997, 107.65265, 737.86223, 12194.217 };
	/** Corners of the limit lines per decade: fine enough that the curve bends less than 0.02 dB away from them. */
	private static final int PER_DECADE = 40;

	@Override
	public String id() {
		return "a-weighting";
	}

	@Override
	public String title() {
		return "Frequency weighting A, as a target";
	}

	@Override
	public String source() {
		return "IEC 61672-1, frequency weighting A (pole frequencies recalled; tolerance chosen by you)";
	}

	@Override
	public List<MaskChoice> choices() {
		return List.of(FROM, TO, TOLERANCE);
	}

	@Override
	public List<Requirement> requirements(double sampleRate, Map<String, Double> values) throws InputException {
		double from = FROM.positive(values);
		double to = Math.min(TO.positive(values), sampleRate / 2);
		double tolerance = TOLERANCE.positive(values);
		if (!(from < to)) {
			throw new InputException(FROM.name(), "must lie below " + TO.name() + " and half the sample rate");
		}
		var upper = new LimitCurve(Side.MAX, Interpolation.LOG);
		var lower = new LimitCurve(Side.MIN, Interpolation.LOG);
		int corners = (int) Math.ceil(PER_DECADE * Math.log10(to / from)) + 1;
		for (int k = 0; k < corners; k++) {
			double frequency = k == corners - 1 ? to : from * Math.pow(to / from, (double) k / (corners - 1));
			upper.add(frequency, weighting(frequency) + tolerance);
			lower.add(frequency, weighting(frequency) - tolerance);
		}
		return List.of(lower.requirement("weighting-min", source(), sampleRate),
				upper.requirement("weighting-max", source(), sampleRate));
	}

	/** The weighting in dB, 0 at 1 kHz. */
	static double weighting(double frequency) {
		return level(frequency) - level(1000);
	}

	private static double level(double f) {
		double square = f * f;
		return 20 * Math.log10(square * square / ((square + POLES[0] * POLES[0]) * (square + POLES[3] * POLES[3])
				* Math.sqrt((square + POLES[1] * POLES[1]) * (square + POLES[2] * POLES[2]))));
	}
}
