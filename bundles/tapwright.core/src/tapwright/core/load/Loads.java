// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

import tapwright.core.InputException;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.model.Processor;
import tapwright.model.Severity;

/**
 * The loads of all processors of a portfolio.
 *
 * @param loads
 *            in the order of the portfolio
 * @param problems
 *            of the processors: overload, and numbers that make no sense
 */
public record Loads(List<ProcessorLoad> loads, List<Problem> problems) {

	/** Sums and differences of whole numbers below a million stay exact. */
	private static final int DIGITS = 6;

	/** No processors. */
	public static final Loads NONE = new Loads(List.of(), List.of());

	/** Takes copies. */
	public Loads {
		loads = List.copyOf(loads);
		problems = List.copyOf(problems);
	}

	/** Sums up what filters ask of processors. */
	public static Loads of(List<Processor> processors, Collection<Demand> demands, Numbers numbers) {
		var loads = new ArrayList<ProcessorLoad>();
		var problems = new ArrayList<Problem>();
		Set<String> names = new HashSet<>();
		for (Processor processor : processors) {
			try {
				Budget budget = Budget.of(processor, numbers);
				if (!names.add(budget.processor())) {
					throw new InputException("", "there are two of this name; rename one");
				}
				var load = new ProcessorLoad(budget,
						demands.stream().filter(demand -> demand.processor().equals(budget.processor())).toList());
				loads.add(load);
				problems.addAll(overloads(load));
			} catch (InputException e) {
				problems.add(problem(ProblemKind.INVALID, String.valueOf(processor.getName()), e.describe()));
			}
		}
		return new Loads(loads, problems);
	}

	/** The problems of one filter: processors that do not exist, or whose words are too short for it. */
	public List<Problem> problems(List<Demand> ofFilter) {
		var found = new ArrayList<Problem>();
		for (Demand demand : ofFilter) {
			Optional<Budget> budget = loads.stream().map(ProcessorLoad::budget)
					.filter(each -> each.processor().equals(demand.processor())).findFirst();
			if (budget.isEmpty()) {
				found.add(Demands.problem(demand.filter(), demand.processor(), Severity.MUST, unknown(demand)));
			} else {
				addIfLonger(found, demand, "words", demand.word(), budget.get().word().orElse(Integer.MAX_VALUE));
				addIfLonger(found, demand, "an accumulator", demand.accumulator(),
						budget.get().accumulator().orElse(Integer.MAX_VALUE));
			}
		}
		return found;
	}

	private String unknown(Demand demand) {
		if (demand.processor().isBlank()) {
			return "a deployment names no processor; choose one";
		}
		String known = loads.stream().map(load -> load.budget().processor()).collect(Collectors.joining(", "));
		return "it is deployed on '" + demand.processor() + "', which is no usable processor of the portfolio"
				+ (known.isEmpty() ? "; add one" : "; there are: " + known);
	}

	private static void addIfLonger(List<Problem> found, Demand demand, String what, int needed, int available) {
		if (needed > available) {
			found.add(Demands.problem(demand.filter(), demand.processor(), Severity.SHOULD, "it uses " + what + " of " + needed
					+ " bit, but " + demand.processor() + " has " + available + " bit; more of them takes several operations"));
		}
	}

	private static List<Problem> overloads(ProcessorLoad load) {
		var problems = new ArrayList<Problem>();
		for (Resource resource : Resource.values()) {
			if (load.isOverloaded(resource)) {
				double used = load.used(resource);
				double available = load.available(resource).getAsDouble();
				Demand largest = load.largest(resource).getFirst();
				problems.add(problem(ProblemKind.OVERLOAD, load.budget().processor(),
						"its filters need " + count(used) + " " + resource.words() + ", it has " + count(available) + ": "
								+ count(used - available) + " too many; most of them for " + largest.filter() + ", "
								+ count(load.used(resource, largest))));
			}
		}
		return problems;
	}

	private static Problem problem(ProblemKind kind, String processor, String message) {
		return new Problem(kind, Severity.MUST, "", "", "processor " + processor + ": " + message, "processor " + processor, 0,
				Optional.empty());
	}

	private static String count(double number) {
		return number >= 1e6 ? Words.of(number / 1e6, "", DIGITS) + " million" : Words.of(number, "", DIGITS);
	}
}
