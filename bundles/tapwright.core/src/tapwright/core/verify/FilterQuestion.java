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
import java.util.TreeMap;

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
	private final Set<String> partners;
	private final Optional<Platform> platform;
	private final Optional<Subject> subject;
	private final List<Statement> statements;
	private final List<InputProblem> problems;

	/** What coefficients run on. */
	private record Platform(double sampleRate, Optional<Arithmetic> arithmetic) {

		Subject carry(ExactTaps stored) {
			return new Subject(arithmetic.map(formats -> FilterNumbers.shipped(stored, formats)).orElse(stored), sampleRate,
					arithmetic);
		}
	}

	private FilterQuestion(Filter filter, Numbers numbers, Map<String, ExactTaps> partners, Optional<Platform> platform,
			Optional<Subject> subject, List<Statement> statements, List<InputProblem> problems) {
		this.name = filter.getName() == null ? "" : filter.getName();
		this.hash = hash(filter, numbers.used(), partners, problems);
		this.parameters = Set.copyOf(numbers.used().keySet());
		this.partners = Set.copyOf(partners.keySet());
		this.platform = platform;
		this.subject = subject;
		this.statements = List.copyOf(statements);
		this.problems = List.copyOf(problems);
	}

	/**
	 * Takes the questions from a filter that stands alone.
	 *
	 * @param parameters
	 *            that its numbers may use
	 */
	public static FilterQuestion of(Filter filter, Expression.Names parameters) {
		return of(filter, parameters, Partners.NONE);
	}

	/**
	 * Takes the questions from a filter of a portfolio.
	 *
	 * @param parameters
	 *            of the portfolio
	 * @param partners
	 *            the other filters of the portfolio
	 */
	public static FilterQuestion of(Filter filter, Expression.Names parameters, Partners partners) {
		var asked = new TreeMap<String, ExactTaps>();
		Partners recorder = name -> {
			ExactTaps shipped = partners.shipped(name);
			asked.put(name, shipped);
			return shipped;
		};
		var numbers = new Numbers(parameters);
		var problems = new ArrayList<InputProblem>();
		Optional<Platform> platform = platform(filter, numbers, problems);
		Optional<Subject> subject = platform.flatMap(carrier -> subject(filter, carrier, problems));
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
				statements.add(Statement.of(requirement, numbers, recorder));
			} catch (InputException e) {
				problems.add(new InputProblem(id, e.describe()));
			}
		}
		return new FilterQuestion(filter, numbers, asked, platform, subject, statements, problems);
	}

	/** Names of the other filters that the answer depends on. */
	public Set<String> partners() {
		return partners;
	}

	/** Structure and formats; nothing when the filter states none or they make no sense. */
	public Optional<Arithmetic> arithmetic() {
		return platform.flatMap(Platform::arithmetic);
	}

	/** Name of the filter. */
	public String name() {
		return name;
	}

	/**
	 * SHA-256 of all that the answer depends on, in hexadecimal digits: content of the filter, values of its parameters,
	 * coefficients of its partners, and what is wrong with any of them.
	 */
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
		return answer(subject, problems, effort);
	}

	/**
	 * Proves or disproves the same statements of other coefficients, as if they were stored in the filter: they are rounded to the
	 * coefficient format where there is one. The hash of the evidence is empty.
	 *
	 * @param stored
	 *            in place of the filter's own
	 */
	public FilterEvidence answerFor(ExactTaps stored, Effort effort) {
		var found = new ArrayList<>(problems);
		Optional<Subject> other = platform.flatMap(carrier -> carry(carrier, stored, found));
		FilterEvidence evidence = answer(other, found, effort);
		return new FilterEvidence(name, "", evidence.requirements(), evidence.problems());
	}

	private FilterEvidence answer(Optional<Subject> of, List<InputProblem> known, Effort effort) {
		var evidence = new ArrayList<RequirementEvidence>();
		var found = new ArrayList<>(known);
		for (Statement statement : statements) {
			effort.progress().checkCancelled();
			if (of.isEmpty()) {
				evidence.add(statement.evidence(UNKNOWN));
			} else {
				try {
					evidence.add(statement.evidence(statement.claim().prove(of.get(), effort)));
				} catch (IllegalArgumentException e) {
					found.add(new InputProblem(statement.id(), e.getMessage()));
				}
			}
		}
		return new FilterEvidence(name, hash, evidence, found);
	}

	private static Optional<Platform> platform(Filter filter, Numbers numbers, List<InputProblem> problems) {
		try {
			double rate = numbers.get(filter, ModelPackage.Literals.FILTER__SAMPLE_RATE);
			Optional<Arithmetic> arithmetic = filter.getArithmetic() == null ? Optional.empty()
					: Optional.of(FilterNumbers.arithmetic(filter.getArithmetic(), numbers));
			return Optional.of(new Platform(rate, arithmetic));
		} catch (InputException e) {
			problems.add(new InputProblem("", e.describe()));
			return Optional.empty();
		}
	}

	private static Optional<Subject> subject(Filter filter, Platform platform, List<InputProblem> problems) {
		if (filter.getCoefficients() == null) {
			return Optional.empty();
		}
		try {
			return carry(platform, FilterNumbers.stored(filter.getCoefficients()), problems);
		} catch (InputException e) {
			problems.add(new InputProblem("", e.describe()));
			return Optional.empty();
		}
	}

	private static Optional<Subject> carry(Platform platform, ExactTaps stored, List<InputProblem> problems) {
		try {
			return Optional.of(platform.carry(stored));
		} catch (IllegalArgumentException e) {
			problems.add(new InputProblem("", e.getMessage()));
			return Optional.empty();
		}
	}

	private static String hash(Filter filter, Map<String, Quantity> parameters, Map<String, ExactTaps> partners,
			List<InputProblem> problems) {
		try {
			MessageDigest digest = MessageDigest.getInstance("SHA-256");
			digest.update(ModelFiles.toBytes(filter));
			parameters.forEach((name, value) -> digest
					.update((name + "=" + value.value() + "\n").getBytes(StandardCharsets.UTF_8)));
			partners.forEach((name, taps) -> digest.update((name + "=" + taps + "\n").getBytes(StandardCharsets.UTF_8)));
			problems.forEach(problem -> digest.update((problem.describe() + "\n").getBytes(StandardCharsets.UTF_8)));
			return HexFormat.of().formatHex(digest.digest());
		} catch (NoSuchAlgorithmException e) {
			throw new IllegalStateException("every Java platform has SHA-256", e);
		}
	}
}
