// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;

import tapwright.core.InputException;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.verify.Subject;
import tapwright.model.Deployment;
import tapwright.model.Filter;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Severity;

/**
 * What a filter asks of processors.
 *
 * @param demands
 *            one for each processor
 * @param problems
 *            deployments whose numbers make no sense
 */
public record Demands(List<Demand> demands, List<Problem> problems) {

	/** Takes copies. */
	public Demands {
		demands = List.copyOf(demands);
		problems = List.copyOf(problems);
	}

	/**
	 * Counts what the deployments of a filter need: instances times rate times the cost of the structure. A filter that states no
	 * structure runs in the direct one.
	 *
	 * @param name
	 *            of the filter
	 * @param subject
	 *            the filter as it ships
	 */
	public static Demands of(Filter filter, String name, Subject subject, Numbers numbers) {
		var demands = new LinkedHashMap<String, Demand>();
		var problems = new ArrayList<Problem>();
		for (Deployment deployment : filter.getDeployments()) {
			String processor = Objects.requireNonNullElse(deployment.getProcessor(), "");
			try {
				demands.merge(processor, demand(deployment, name, processor, subject, numbers), Demand::with);
			} catch (InputException e) {
				problems.add(problem(name, processor, Severity.MUST, e.describe()));
			}
		}
		return new Demands(List.copyOf(demands.values()), problems);
	}

	/** What is wrong with a deployment. */
	static Problem problem(String filter, String processor, Severity severity, String message) {
		return new Problem(ProblemKind.DEPLOYMENT, severity, filter, "", message, "deployment on " + processor, 0, Optional.empty());
	}

	private static Demand demand(Deployment deployment, String name, String processor, Subject subject, Numbers numbers)
			throws InputException {
		double instances = positive(numbers.get(deployment, Literals.DEPLOYMENT__CHANNELS, 1), "channels")
				* positive(numbers.get(deployment, Literals.DEPLOYMENT__COPIES, 1), "copies");
		double rate = positive(numbers.get(deployment, Literals.DEPLOYMENT__INPUT_RATE, subject.sampleRate()), "inputRate");
		Optional<Arithmetic> arithmetic = subject.arithmetic();
		Cost cost = Cost.of(subject.taps(), arithmetic.orElseGet(() -> Arithmetic.exact(Structure.DIRECT, 1)));
		int word = Stream.of(arithmetic.flatMap(Arithmetic::coefficient), arithmetic.flatMap(Arithmetic::input))
				.flatMap(Optional::stream).mapToInt(NumberFormat::word).max().orElse(0);
		int accumulator = arithmetic.flatMap(Arithmetic::accumulator).map(NumberFormat::word).orElse(0);
		return new Demand(name, processor, instances * cost.multipliesPerSecond(rate), cost.coefficientWords(),
				instances * cost.delayWords(), word, accumulator);
	}

	private static double positive(double value, String feature) throws InputException {
		if (!(value > 0)) {
			throw new InputException(feature, value + " must be positive");
		}
		return value;
	}
}
