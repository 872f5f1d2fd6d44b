// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.design.Adoption;
import tapwright.core.design.Candidate;
import tapwright.core.design.Candidates;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Arithmetic;
import tapwright.model.EquirippleDesign;
import tapwright.model.Filter;
import tapwright.model.Format;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Requirement;
import tapwright.model.WindowDesign;

/**
 * Looks for changes that meet a missed requirement of a filter. Works on copies; give it a filter that no other thread changes
 * meanwhile.
 */
public final class Remedies {

	private final Filter filter;
	private final Expression.Names parameters;
	private final Requirement requirement;
	private final FilterEvidence present;
	private final Effort effort;
	private final Progress progress;

	private Remedies(Filter filter, Expression.Names parameters, Requirement requirement, Progress progress) {
		this.filter = filter;
		this.parameters = parameters;
		this.requirement = requirement;
		this.progress = progress;
		this.effort = new Effort(progress, Effort.STANDARD.timeLimit());
		this.present = FilterQuestion.of(filter, parameters).answer(effort);
	}

	/**
	 * All remedies that can be proven, cheapest first; none when the requirement is not missed.
	 *
	 * @param id
	 *            of the requirement
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public static List<Remedy> of(Filter filter, Expression.Names parameters, String id, Progress progress) {
		Optional<Requirement> asked = filter.getRequirements().stream().filter(each -> id.equals(each.getId())).findFirst();
		if (asked.isEmpty()) {
			throw new IllegalArgumentException("the filter has no requirement '" + id + "'");
		}
		var remedies = new Remedies(filter, parameters, asked.get(), progress);
		return remedies.isMissed() ? remedies.find() : List.of();
	}

	private boolean isMissed() {
		return present.find(requirement.getId()).map(evidence -> evidence.proof().verdict() == Verdict.MISSED).orElse(false);
	}

	private List<Remedy> find() {
		var found = new ArrayList<Remedy>();
		longerWord().ifPresent(found::add);
		newDesign().ifPresent(found::add);
		relaxedLimit().ifPresent(found::add);
		return found;
	}

	private Optional<Remedy> longerWord() {
		Arithmetic arithmetic = filter.getArithmetic();
		if (arithmetic == null || arithmetic.getCoefficient() == null) {
			return Optional.empty();
		}
		Format format = arithmetic.getCoefficient();
		int word;
		int fraction;
		try {
			var numbers = new Numbers(parameters);
			word = numbers.getInt(format, Literals.FORMAT__WORD);
			fraction = numbers.getInt(format, Literals.FORMAT__FRACTION);
		} catch (InputException e) {
			return Optional.empty(); // the evidence names this problem already
		}
		for (int more = 1; word + more <= NumberFormat.MAX_WORD; more++) {
			progress.report("coefficients of " + (word + more) + " bits", -1);
			Filter changed = EcoreUtil.copy(filter);
			changed.getArithmetic().getCoefficient().setWord(String.valueOf(word + more));
			changed.getArithmetic().getCoefficient().setFraction(String.valueOf(fraction + more));
			FilterEvidence outcome = answer(changed);
			if (isBetter(outcome)) {
				return Optional.of(new Remedy(Remedy.Kind.LONGER_WORD,
						"coefficients of " + (word + more) + " instead of " + word + " bits",
						List.of(new Edit(format, Literals.FORMAT__WORD, String.valueOf(word + more)),
								new Edit(format, Literals.FORMAT__FRACTION, String.valueOf(fraction + more))),
						outcome));
			}
			if (more > 53 && outcome.find(requirement.getId()).equals(present.find(requirement.getId()))) {
				break; // the stored coefficients have no more bits to show
			}
		}
		return Optional.empty();
	}

	private Optional<Remedy> newDesign() {
		String method = filter.getDesign() instanceof WindowDesign ? "window"
				: filter.getDesign() instanceof EquirippleDesign ? "equiripple" : "";
		if (method.isEmpty()) {
			return Optional.empty();
		}
		try {
			Candidate candidate = Candidates.of(filter, parameters).search(method, progress);
			if (candidate.solution().isEmpty()) {
				return Optional.empty();
			}
			Adoption adoption = Adoption.of(filter, parameters, candidate);
			Filter changed = EcoreUtil.copy(filter);
			new Adoption(EcoreUtil.copy(adoption.design()), EcoreUtil.copy(adoption.coefficients())).apply(changed);
			return Optional.of(new Remedy(Remedy.Kind.NEW_DESIGN,
					Meta.label(filter.getDesign().eClass()) + " design with " + candidate.solution().get().taps().length + " taps",
					List.of(new Edit(filter, Literals.FILTER__DESIGN, adoption.design()),
							new Edit(filter, Literals.FILTER__COEFFICIENTS, adoption.coefficients())),
					answer(changed)));
		} catch (InputException | DesignException e) {
			return Optional.empty(); // the requirements imply no target, or none that can be met
		}
	}

	private Optional<Remedy> relaxedLimit() {
		RequirementEvidence evidence = present.find(requirement.getId()).orElseThrow();
		Optional<Edit> relaxed = Relaxation.of(requirement, evidence);
		if (relaxed.isEmpty()) {
			return Optional.empty();
		}
		Filter changed = EcoreUtil.copy(filter);
		Requirement twin = changed.getRequirements().get(filter.getRequirements().indexOf(requirement));
		twin.eSet(relaxed.get().feature(), relaxed.get().value());
		FilterEvidence outcome = answer(changed);
		return isBetter(outcome) ? Optional.of(new Remedy(Remedy.Kind.RELAXED_LIMIT,
				"limit " + relaxed.get().value() + " " + evidence.valueUnit() + " instead of "
						+ requirement.eGet(relaxed.get().feature()),
				List.of(relaxed.get()), outcome)) : Optional.empty();
	}

	private FilterEvidence answer(Filter changed) {
		return FilterQuestion.of(changed, parameters).answer(effort);
	}

	// The requirement is met, and none that was met is lost.
	private boolean isBetter(FilterEvidence outcome) {
		return isMet(outcome, requirement.getId())
				&& present.requirements().stream().filter(evidence -> evidence.proof().verdict() == Verdict.MET)
						.allMatch(evidence -> isMet(outcome, evidence.id()));
	}

	private static boolean isMet(FilterEvidence evidence, String id) {
		return evidence.find(id).map(found -> found.proof().verdict() == Verdict.MET).orElse(false);
	}
}
