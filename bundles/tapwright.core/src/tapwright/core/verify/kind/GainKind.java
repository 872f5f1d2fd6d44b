// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.core.verify.Partners;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.GainLimit;
import tapwright.dsp.verify.GainLimit.Breakpoint;
import tapwright.dsp.verify.GainReference;
import tapwright.model.GainRequirement;
import tapwright.model.Interpolation;
import tapwright.model.LimitPoint;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Side;

/** Gain limits over a band: constant, or a line through points. */
public final class GainKind implements RequirementKind<GainRequirement> {

	private static final double NO_LOWER = Double.NEGATIVE_INFINITY;
	private static final double NO_UPPER = Double.POSITIVE_INFINITY;

	@Override
	public Class<GainRequirement> type() {
		return GainRequirement.class;
	}

	@Override
	public GainLimit statement(GainRequirement gain, Numbers numbers, Partners partners) throws InputException {
		return limit(gain, numbers);
	}

	private static GainLimit limit(GainRequirement gain, Numbers numbers) throws InputException {
		GainReference reference = reference(gain, numbers);
		if (gain.getPoints().isEmpty()) {
			double min = numbers.get(gain, Literals.GAIN_REQUIREMENT__MIN, NO_LOWER);
			double max = numbers.get(gain, Literals.GAIN_REQUIREMENT__MAX, NO_UPPER);
			double from = numbers.get(gain, Literals.GAIN_REQUIREMENT__FROM);
			double to = numbers.get(gain, Literals.GAIN_REQUIREMENT__TO);
			if (min == NO_LOWER && max == NO_UPPER) {
				throw new InputException("", "there is no limit; give min, max or both");
			}
			if (from > to) {
				throw new InputException("from", Words.exactly(from, "Hz") + " is above " + Words.exactly(to, "Hz"));
			}
			return GainLimit.between(from, to, min, max).relativeTo(reference);
		}
		if (!isEmpty(gain.getFrom()) || !isEmpty(gain.getTo()) || !isEmpty(gain.getMin()) || !isEmpty(gain.getMax())) {
			throw new InputException("points", "a line through points takes no from, to, min or max; remove one or the other");
		}
		var breakpoints = new ArrayList<Breakpoint>();
		for (LimitPoint point : gain.getPoints()) {
			double level = numbers.get(point, Literals.LIMIT_POINT__LEVEL);
			breakpoints.add(new Breakpoint(numbers.get(point, Literals.LIMIT_POINT__FREQUENCY),
					gain.getSide() == Side.MIN ? level : NO_LOWER, gain.getSide() == Side.MAX ? level : NO_UPPER));
		}
		return new GainLimit(breakpoints, gain.getInterpolate() == Interpolation.LOG, reference);
	}

	@Override
	public String describe(GainRequirement gain, Numbers numbers) throws InputException {
		List<Breakpoint> points = limit(gain, numbers).breakpoints();
		Breakpoint first = points.getFirst();
		Breakpoint last = points.getLast();
		String band = first.frequency() == last.frequency() ? "at " + Words.exactly(first.frequency(), "Hz")
				: Words.band(first.frequency(), last.frequency());
		return "gain " + band + " " + (gain.getPoints().isEmpty() ? Limits.words(first.lower(), first.upper(), "dB") : line(gain, first, last))
				+ relative(gain, numbers);
	}

	@Override
	public String valueUnit() {
		return "dB";
	}

	@Override
	public String placeUnit() {
		return "Hz";
	}

	private static String line(GainRequirement gain, Breakpoint first, Breakpoint last) {
		boolean upper = gain.getSide() == Side.MAX;
		return (upper ? "at most " : "at least ") + "a line from " + Words.exactly(upper ? first.upper() : first.lower(), "dB")
				+ " to " + Words.exactly(upper ? last.upper() : last.lower(), "dB");
	}

	private static String relative(GainRequirement gain, Numbers numbers) throws InputException {
		return switch (reference(gain, numbers)) {
		case GainReference.Absolute absolute -> "";
		case GainReference.AtFrequency at -> ", relative to the gain at " + Words.exactly(at.frequency(), "Hz");
		case GainReference.LargestIn in -> ", relative to the largest gain " + Words.band(in.from(), in.to());
		};
	}

	private static GainReference reference(GainRequirement gain, Numbers numbers) throws InputException {
		OptionalDouble at = numbers.find(gain, Literals.GAIN_REQUIREMENT__REFERENCE_AT);
		OptionalDouble from = numbers.find(gain, Literals.GAIN_REQUIREMENT__REFERENCE_FROM);
		OptionalDouble to = numbers.find(gain, Literals.GAIN_REQUIREMENT__REFERENCE_TO);
		if (at.isPresent() && (from.isPresent() || to.isPresent())) {
			throw new InputException("referenceAt", "cannot stand beside referenceFrom and referenceTo; remove one or the other");
		}
		if (from.isPresent() != to.isPresent()) {
			throw new InputException(from.isPresent() ? "referenceTo" : "referenceFrom", "is missing");
		}
		if (at.isPresent()) {
			return new GainReference.AtFrequency(at.getAsDouble());
		}
		return from.isPresent() ? new GainReference.LargestIn(from.getAsDouble(), to.getAsDouble()) : GainReference.ABSOLUTE;
	}

	private static boolean isEmpty(String text) {
		return text == null || text.isBlank();
	}
}
