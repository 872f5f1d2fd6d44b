// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementKinds;
import tapwright.dsp.verify.GainLimit;
import tapwright.dsp.verify.GainLimit.Breakpoint;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.Requirement;
import tapwright.model.Severity;

/**
 * Finds gain limits that no filter meets together: at one frequency, one asks for more than another allows. They are compared at
 * their breakpoints, where limits are numbers and not lines; where 0 dB means the same to both. What is found is a contradiction,
 * but not every one is found: two sloping limits may cross between breakpoints only.
 */
public final class Contradictions {

	/** More than rounding does to a level in dB that lies on a line. */
	private static final double CERTAIN = 1e-9;

	private record Limit(String id, Severity severity, GainLimit gain) {
	}

	private Contradictions() {
	}

	/** One problem for each pair of requirements. Requirements that make no sense alone are left to their own problems. */
	public static List<Problem> of(Filter filter, String name, Numbers numbers) {
		var limits = new ArrayList<Limit>();
		for (Requirement requirement : filter.getRequirements()) {
			if (requirement instanceof GainRequirement gain) {
				read(gain, numbers).ifPresent(limits::add);
			}
		}
		var problems = new ArrayList<Problem>();
		for (Limit floor : limits) {
			for (Limit ceiling : limits) {
				if (floor != ceiling && floor.gain().reference().equals(ceiling.gain().reference())) {
					clash(floor.gain(), ceiling.gain()).ifPresent(at -> problems.add(problem(name, floor, ceiling, at)));
				}
			}
		}
		return problems;
	}

	private static Optional<Limit> read(GainRequirement gain, Numbers numbers) {
		try {
			var limit = (GainLimit) RequirementKinds.of(gain).statement(gain, numbers, partner -> {
				throw new IllegalStateException("a gain limit speaks of one filter");
			});
			return Optional.of(new Limit(String.valueOf(gain.getId()), gain.getSeverity(), limit));
		} catch (InputException | IllegalArgumentException e) {
			return Optional.empty(); // the evidence names this problem already
		}
	}

	private static OptionalDouble clash(GainLimit floor, GainLimit ceiling) {
		for (Breakpoint point : floor.breakpoints()) {
			if (point.lower() > level(ceiling, point.frequency(), true) + CERTAIN) {
				return OptionalDouble.of(point.frequency());
			}
		}
		for (Breakpoint point : ceiling.breakpoints()) {
			if (level(floor, point.frequency(), false) > point.upper() + CERTAIN) {
				return OptionalDouble.of(point.frequency());
			}
		}
		return OptionalDouble.empty();
	}

	/** The strictest level at a frequency; infinite where there is no limit. */
	private static double level(GainLimit limit, double frequency, boolean upper) {
		double strictest = upper ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
		List<Breakpoint> points = limit.breakpoints();
		for (int k = 0; k < points.size(); k++) {
			Breakpoint left = points.get(k);
			Breakpoint right = points.get(Math.min(k + 1, points.size() - 1));
			if (left.frequency() <= frequency && frequency <= right.frequency()) {
				double from = upper ? left.upper() : left.lower();
				double to = upper ? right.upper() : right.lower();
				double here = between(left.frequency(), right.frequency(), from, to, frequency, limit.logarithmic());
				strictest = upper ? Math.min(strictest, here) : Math.max(strictest, here);
			}
		}
		return strictest;
	}

	private static double between(double left, double right, double from, double to, double frequency, boolean logarithmic) {
		if (from == to || frequency == left) {
			return from;
		}
		double part = logarithmic ? Math.log(frequency / left) / Math.log(right / left) : (frequency - left) / (right - left);
		return from + part * (to - from);
	}

	private static Problem problem(String filter, Limit floor, Limit ceiling, double frequency) {
		Severity severity = floor.severity() == Severity.MUST && ceiling.severity() == Severity.MUST ? Severity.MUST : Severity.SHOULD;
		return new Problem(ProblemKind.CONTRADICTORY, severity, filter, floor.id(),
				"'" + floor.id() + "' asks for at least " + Words.of(level(floor.gain(), frequency, false), "dB") + " at "
						+ Words.of(frequency, "Hz") + ", where '" + ceiling.id() + "' allows at most "
						+ Words.of(level(ceiling.gain(), frequency, true), "dB") + "; no filter meets both",
				"requirement " + floor.id() + " at " + Words.of(frequency, "Hz"), 0, Optional.empty());
	}
}
