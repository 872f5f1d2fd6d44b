// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Quantity;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Subject;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;
import tapwright.model.Requirement;
import tapwright.model.io.ModelFiles;

/**
 * All that is asked of one filter, taken from the model at one moment. Made on the thread that owns the model objects; immutable
 * afterwards, so that it can be answered on any thread, and answered again with the same result.
 */
public final class FilterQuestion {

	// Of a filter without usable coefficients nothing is known.
	private static final Enclosure ANYTHING = new Enclosure(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
	private static final Proof UNKNOWN = new Proof(Verdict.UNPROVEN, Double.NaN, ANYTHING, Double.NaN, ANYTHING,
			"there are no coefficients to prove it of");

	private final String name;
	private final String hash;
	private final Set<String> parameters;
	private final Optional<Subject> subject;
	private final List<Statement> statements;
	private final List<InputProblem> problems;

	private FilterQuestion(Filter filter, Numbers numbers, Optional<Subject> subject, List<Statement> statements,
			List<InputProblem> problems) {
		this.name = filter.getName() == null ? "" : filter.getName();
		this.hash = hash(filter, numbers.used());
		this.parameters = Set.copyOf(numbers.used().keySet());
		this.subject = subject;
		this.statements = List.copyOf(statements);
		this.problems = List.copyOf(problems);
	}

	/**
	 * Takes the questions from a filter.
	 *
	 * @param parameters
	 *            of the portfolio that the filter belongs to
	 */
	public static FilterQuestion of(Filter filter, Expression.Names parameters) {
		var numbers = new Numbers(parameters);
		var problems = new ArrayList<InputProblem>();
		Optional<Subject> subject = subject(filter, numbers, problems);
		var statements = new ArrayList<Statement>();
		var ids = new HashSet<String>();
		for (Requirement requirement : filter.getRequirements()) {
			String id = String.valueOf(requirement.getId());
			if (requirement.getId() == null || id.isBlank()) {
				problems.add(new InputProblem("", "a requirement has no id; give it a short name"));
			} else if (!ids.add(id)) {
				problems.add(new InputProblem(id, "two requirements have this id; rename one"));
			}
			try {
				statements.add(Statement.of(requirement, numbers));
			} catch (InputException e) {
				problems.add(new InputProblem(id, e.describe()));
			}
		}
		return new FilterQuestion(filter, numbers, subject, statements, problems);
	}

	/** Name of the filter. */
	public String name() {
		return name;
	}

	/** SHA-256 of all that the answer depends on, in hexadecimal digits: content of the filter and values of its parameters. */
	public String hash() {
		return hash;
	}

	/** Names of the parameters that the filter uses. */
	public Set<String> parameters() {
		return parameters;
	}

	/** The filter as the numbers that ship; nothing when it has no coefficients yet or they cannot be read. */
	public Optional<Subject> subject() {
		return subject;
	}

	/**
	 * Proves or disproves all statements. Deterministic but for the effort's time limit.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public FilterEvidence answer(Effort effort) {
		var evidence = new ArrayList<RequirementEvidence>();
		var found = new ArrayList<>(problems);
		for (Statement statement : statements) {
			effort.progress().checkCancelled();
			if (subject.isEmpty()) {
				evidence.add(statement.evidence(UNKNOWN));
			} else {
				try {
					evidence.add(statement.evidence(statement.claim().prove(subject.get(), effort)));
				} catch (IllegalArgumentException e) {
					found.add(new InputProblem(statement.id(), e.getMessage()));
				}
			}
		}
		return new FilterEvidence(name, hash, evidence, found);
	}

	private static Optional<Subject> subject(Filter filter, Numbers numbers, List<InputProblem> problems) {
		try {
			double rate = numbers.get(filter, ModelPackage.Literals.FILTER__SAMPLE_RATE);
			if (filter.getCoefficients() == null) {
				return Optional.empty();
			}
			ExactTaps stored = FilterNumbers.stored(filter.getCoefficients());
			if (filter.getArithmetic() == null) {
				return Optional.of(new Subject(stored, rate));
			}
			Arithmetic arithmetic = FilterNumbers.arithmetic(filter.getArithmetic(), numbers);
			return Optional.of(new Subject(FilterNumbers.shipped(stored, arithmetic), rate, Optional.of(arithmetic)));
		} catch (InputException e) {
			problems.add(new InputProblem("", e.describe()));
		} catch (IllegalArgumentException e) {
			problems.add(new InputProblem("", e.getMessage()));
		}
		return Optional.empty();
	}

	private static String hash(Filter filter, Map<String, Quantity> parameters) {
		try {
			MessageDigest digest = MessageDigest.getInstance("SHA-256");
			digest.update(ModelFiles.toBytes(filter));
			parameters.forEach((name, value) -> digest
					.update((name + "=" + value.value() + "\n").getBytes(StandardCharsets.UTF_8)));
			return HexFormat.of().formatHex(digest.digest());
		} catch (NoSuchAlgorithmException e) {
			throw new IllegalStateException("every Java platform has SHA-256", e);
		}
	}
}
