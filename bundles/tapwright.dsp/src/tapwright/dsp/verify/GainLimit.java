// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * The magnitude of the frequency response stays between a lower and an upper limit, each a broken line in decibels.
 * Between two breakpoints a limit is straight; two breakpoints at one frequency make a step, where both values hold.
 * The proof's unit is decibels relative to the reference, its places are frequencies in hertz.
 * <p>
 * All numbers count as the exact doubles they are. For limits that are not constant, the proof's value is stated at
 * the place {@code worst}: the limit there less (upper) or plus (lower) the margin.
 *
 * @param breakpoints
 *            in order of rising frequency, at least one; a single one states limits at one frequency
 * @param logarithmic
 *            whether limits are straight over the logarithm of frequency, otherwise over frequency
 * @param reference
 *            what 0 dB means
 */
public record GainLimit(List<Breakpoint> breakpoints, boolean logarithmic,
		GainReference reference) implements Requirement, ClockRange.Aware {

	/**
	 * Limits at one frequency.
	 *
	 * @param frequency
	 *            hertz, not negative
	 * @param lower
	 *            lower limit in dB, negative infinity for none
	 * @param upper
	 *            upper limit in dB, positive infinity for none, negative infinity for no gain at all
	 */
	public record Breakpoint(double frequency, double lower, double upper) {

		/** Checks the numbers. */
		public Breakpoint {
			Frequencies.check("the frequency of a breakpoint", frequency);
			if (Double.isNaN(lower) || Double.isNaN(upper) || lower == Double.POSITIVE_INFINITY) {
				throw new IllegalArgumentException("limits " + lower + " to " + upper + " dB at " + frequency
						+ " Hz; a lower limit is a number or negative infinity, an upper limit a number or infinity");
			}
			if (lower > upper) {
				throw new IllegalArgumentException("the lower limit " + lower + " dB is above the upper limit "
						+ upper + " dB at "
						+ frequency + " Hz");
			}
		}
	}

	/** Checks that the breakpoints make limits. */
	public GainLimit {
		Objects.requireNonNull(reference);
		breakpoints = List.copyOf(breakpoints);
		if (breakpoints.isEmpty()) {
			throw new IllegalArgumentException("a gain limit needs at least one breakpoint");
		}
		for (int k = 1; k < breakpoints.size(); k++) {
			Breakpoint a = breakpoints.get(k - 1);
			Breakpoint b = breakpoints.get(k);
			if (a.frequency > b.frequency) {
				throw new IllegalArgumentException("breakpoint " + (k + 1) + " at " + b.frequency
						+ " Hz comes after one at "
						+ a.frequency + " Hz; breakpoints must be in order of rising frequency");
			}
			if (a.frequency < b.frequency) {
				checkLine(a, b, a.lower, b.lower, logarithmic);
				checkLine(a, b, a.upper, b.upper, logarithmic);
			}
		}
		if (breakpoints.stream().allMatch(point -> Double.isInfinite(point.lower)
				&& point.upper == Double.POSITIVE_INFINITY)) {
			throw new IllegalArgumentException("the gain limit limits nothing; state a lower or an upper limit");
		}
	}

	/** At most this gain from one frequency to another. */
	public static GainLimit atMost(double from, double to, double db) {
		return between(from, to, Double.NEGATIVE_INFINITY, db);
	}

	/** At least this gain from one frequency to another. */
	public static GainLimit atLeast(double from, double to, double db) {
		return between(from, to, db, Double.POSITIVE_INFINITY);
	}

	/** Constant limits from one frequency to another. */
	public static GainLimit between(double from, double to, double lowerDb, double upperDb) {
		return new GainLimit(List.of(new Breakpoint(from, lowerDb, upperDb), new Breakpoint(to, lowerDb, upperDb)),
				false,
				GainReference.ABSOLUTE);
	}

	/** The same limits with another meaning of 0 dB. */
	public GainLimit relativeTo(GainReference other) {
		return new GainLimit(breakpoints, logarithmic, other);
	}

	// Relative limits whose reference moves with the clock have no single statement.
	@Override
	public Optional<Proof> prove(Subject subject, Effort effort, ClockRange clocks) {
		check(subject);
		boolean isFixed = reference instanceof GainReference.Absolute
				|| reference instanceof GainReference.AtFrequency at && at.frequency() == 0;
		if (!isFixed) {
			return Optional.empty();
		}
		List<LimitLine> stretched = lines().stream().flatMap(line -> line.stretched(clocks).stream()).toList();
		return Optional.of(new GainProof(stretched, reference, subject, effort).prove());
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		check(subject);
		return new GainProof(lines(), reference, subject, effort).prove();
	}

	private void check(Subject subject) {
		Frequencies.checkBelowHalf("the last breakpoint", breakpoints.getLast().frequency, subject.sampleRate());
		switch (reference) {
			case GainReference.Absolute absolute -> {
				// needs no frequency
			}
			case GainReference.AtFrequency at ->
				Frequencies.checkBelowHalf("the reference frequency", at.frequency(), subject.sampleRate());
			case GainReference.LargestIn in ->
				Frequencies.checkBelowHalf("the upper edge of the reference band", in.to(), subject.sampleRate());
		}
	}

	/** Every straight piece of every limit. */
	List<LimitLine> lines() {
		List<LimitLine> lines = new ArrayList<>();
		for (int k = 0; k < breakpoints.size(); k++) {
			Breakpoint a = breakpoints.get(k);
			Breakpoint b = breakpoints.get(Math.min(k + 1, breakpoints.size() - 1));
			if (k > 0 && k == breakpoints.size() - 1 && breakpoints.get(k - 1).frequency < a.frequency) {
				break;
			}
			if (a.frequency == b.frequency) {
				add(lines, a.frequency, a.frequency, a.lower, a.lower, a.upper, a.upper);
			} else {
				add(lines, a.frequency, b.frequency, a.lower, b.lower, a.upper, b.upper);
			}
		}
		return lines;
	}

	private void add(List<LimitLine> lines, double from, double to, double lowerFrom, double lowerTo, double upperFrom,
			double upperTo) {
		if (upperFrom != Double.POSITIVE_INFINITY) {
			lines.add(new LimitLine(from, to, upperFrom, upperTo, true, logarithmic));
		}
		if (lowerFrom != Double.NEGATIVE_INFINITY) {
			lines.add(new LimitLine(from, to, lowerFrom, lowerTo, false, logarithmic));
		}
	}

	private static void checkLine(Breakpoint a, Breakpoint b, double from, double to, boolean logarithmic) {
		if (from == to) {
			return;
		}
		if (Double.isInfinite(from) || Double.isInfinite(to)) {
			throw new IllegalArgumentException("a limit runs from " + from + " dB at " + a.frequency + " Hz to " + to
					+ " dB at "
					+ b.frequency + " Hz; end it with a second breakpoint at the same frequency instead");
		}
		if (logarithmic && a.frequency == 0) {
			throw new IllegalArgumentException(
					"a sloping limit over the logarithm of frequency cannot start at 0 Hz; start it higher");
		}
	}
}
