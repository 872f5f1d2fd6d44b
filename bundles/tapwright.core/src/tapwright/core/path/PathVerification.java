// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.apache.commons.math3.fraction.BigFraction;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.path.SignalChain.Folding;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.problem.Problems;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Subject;
import tapwright.model.AliasRejectionRequirement;
import tapwright.model.Filter;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Requirement;
import tapwright.model.Severity;
import tapwright.model.SignalPath;

/**
 * Verifies signal paths from end to end: what is asked of a path is asked of the one filter that it is equal to.
 * Frequencies are those at the path's input; after an expansion they reach as far as the rate that it raises to. The
 * factor of an alias rejection is that of some decimation and all before it, multiplied, so that it covers all that
 * these fold; with the factors of all decimations, it covers everything that folds at all.
 */
public final class PathVerification {

	// What is asked of a response means the same for a path; cost, words and sample-by-sample behaviour do not.
	private static final Set<EClass> MEANINGFUL = Set.of(Literals.GAIN_REQUIREMENT, Literals.ALIAS_REJECTION_REQUIREMENT,
			Literals.NULL_REQUIREMENT, Literals.EXACT_GAIN_REQUIREMENT, Literals.LINEAR_PHASE_REQUIREMENT,
			Literals.GROUP_DELAY_REQUIREMENT, Literals.GROUP_DELAY_VARIATION_REQUIREMENT);

	private final SignalPath path;
	private final Numbers numbers;
	private final String name;
	private final List<Problem> problems = new ArrayList<>();

	private PathVerification(SignalPath path, Expression.Names parameters) {
		this.path = path;
		this.numbers = new Numbers(parameters);
		this.name = Objects.requireNonNullElse(path.getName(), "");
	}

	/**
	 * Verifies one path; on the thread that owns it.
	 *
	 * @param filters
	 *            finds filters as they ship, by name
	 * @param answer
	 *            finds what is proven of a filter
	 * @throws java.util.concurrent.CancellationException
	 *             when that is cancelled
	 */
	public static VerifiedPath verify(SignalPath path, Expression.Names parameters,
			Function<String, Optional<Subject>> filters, Function<FilterQuestion, FilterEvidence> answer) {
		return new PathVerification(path, parameters).verify(parameters, filters, answer);
	}

	private VerifiedPath verify(Expression.Names parameters, Function<String, Optional<Subject>> filters,
			Function<FilterQuestion, FilterEvidence> answer) {
		var stages = new PathStages(path, numbers, filters);
		stages.problems().forEach(message -> add(Severity.MUST, "", message));
		Optional<SignalChain> chain = stages.problems().isEmpty() ? chain(stages.steps()) : Optional.empty();
		Optional<FilterEvidence> evidence = chain
				.map(whole -> answer.apply(FilterQuestion.of(asFilter(whole), parameters)));
		evidence.ifPresent(this::add);
		chain.ifPresent(this::checkAliases);
		return new VerifiedPath(name, stages.names(), stages.rates(), chain, evidence, problems);
	}

	private Optional<SignalChain> chain(List<Step> steps) {
		try {
			return Optional.of(SignalChain.of(steps));
		} catch (InputException e) {
			add(Severity.MUST, "", e.describe());
			return Optional.empty();
		}
	}

	private Filter asFilter(SignalChain chain) {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName(name);
		filter.setSampleRate(chain.expansion() == 1 ? path.getSampleRate() : chain.expansion() + " * (" + path.getSampleRate() + ")");
		IntegerCoefficients coefficients = ModelFactory.eINSTANCE.createIntegerCoefficients();
		ExactTaps taps = chain.taps();
		for (int k = 0; k < taps.length(); k++) {
			coefficients.getIntegers().add(taps.integer(k));
		}
		coefficients.setScale(scale(taps.unit()));
		filter.setCoefficients(coefficients);
		for (Requirement requirement : path.getRequirements()) {
			if (MEANINGFUL.contains(requirement.eClass())) {
				filter.getRequirements().add(EcoreUtil.copy(requirement));
			} else {
				add(Severity.MUST, String.valueOf(requirement.getId()), "'" + Meta.label(requirement.eClass())
						+ "' can be asked of a filter only, not of a path; remove it");
			}
		}
		return filter;
	}

	// Powers of two may be smaller than what can be written as digits.
	private static String scale(BigFraction unit) {
		BigInteger denominator = unit.getDenominator();
		return unit.getNumerator().equals(BigInteger.ONE) && denominator.bitCount() == 1 ? "2^-" + (denominator.bitLength() - 1)
				: unit.getNumerator() + "/" + denominator;
	}

	private void checkAliases(SignalChain chain) {
		Set<Integer> folded = chain.foldings().stream().map(Folding::decimation).collect(Collectors.toSet());
		boolean all = folded.isEmpty();
		for (Requirement requirement : path.getRequirements()) {
			if (requirement instanceof AliasRejectionRequirement alias) {
				try {
					int factor = numbers.getInt(alias, Literals.ALIAS_REJECTION_REQUIREMENT__FACTOR);
					all |= factor == chain.decimation();
					if (!folded.contains(factor)) {
						add(Severity.MUST, alias.getId(), "the path does not keep one of " + factor
								+ " samples anywhere; its decimations come to " + folded.stream().sorted().toList());
					}
				} catch (InputException e) {
					all = true; // the evidence names this problem already
				}
			}
		}
		if (!all) {
			add(Severity.SHOULD, "", "it keeps one of " + chain.decimation()
					+ " samples, but no alias rejection by that factor is asked, so nothing is proven of what folds");
		}
	}

	private void add(FilterEvidence evidence) {
		for (Problem problem : Problems.of(evidence)) {
			problems.add(new Problem(ProblemKind.PATH, problem.severity(), "", problem.requirement(),
					"path " + name + ": " + (problem.kind() == ProblemKind.EMPTY
							? "it has no requirements, so nothing is proven from end to end; state what it is meant to do"
							: problem.message()),
					place() + ", " + problem.location(), 0, problem.evidence()));
		}
	}

	private void add(Severity severity, String requirement, String message) {
		problems.add(new Problem(ProblemKind.PATH, severity, "", Objects.requireNonNullElse(requirement, ""),
				"path " + name + ": " + message, place(), 0, Optional.empty()));
	}

	private String place() {
		return "path " + name;
	}
}
