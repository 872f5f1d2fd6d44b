// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.verify.Subject;
import tapwright.model.IntegerCoefficients;
import tapwright.model.Revision;

/**
 * All that differs between two states of a filter, or between two filters. Immutable.
 *
 * @param changes
 *            in what a person wrote
 * @param coefficients
 *            those that ship
 * @param response
 *            nothing when one has no usable coefficients
 * @param margins
 *            by the evidence that the states carry
 * @param costBefore
 *            nothing without usable coefficients; without arithmetic, in a direct structure
 * @param costAfter
 *            likewise
 */
public record Comparison(List<ContentChange> changes, CoefficientTable coefficients, Optional<ResponseDifference> response,
		List<MarginChange> margins, Optional<Cost> costBefore, Optional<Cost> costAfter) {

	/**
	 * Compares two states, each with its parameters and evidence. On the thread that owns the model objects.
	 */
	public static Comparison of(Revision before, Revision after) {
		FilterQuestion old = question(before);
		FilterQuestion young = question(after);
		Optional<ResponseDifference> response = old.subject()
				.flatMap(one -> young.subject().map(other -> ResponseDifference.of(one, other)));
		return new Comparison(ContentChanges.between(before, after),
				CoefficientTable.of(old.subject().map(Subject::taps), young.subject().map(Subject::taps),
						commonStep(step(before, old), step(after, young))),
				response, MarginChange.between(before.getEvidence(), after.getEvidence()), cost(old), cost(young));
	}

	/** Whether nothing differs that has a meaning. */
	public boolean isEmpty() {
		return changes.isEmpty() && coefficients.changed() == 0;
	}

	private static FilterQuestion question(Revision state) {
		return FilterQuestion.of(state.getFilter(), new Parameters(state.getParameters()));
	}

	private static Optional<Cost> cost(FilterQuestion question) {
		return question.subject().map(subject -> Cost.of(subject.taps(),
				subject.arithmetic().orElseGet(() -> Arithmetic.exact(Structure.DIRECT, 1))));
	}

	private static Optional<BigFraction> step(Revision state, FilterQuestion question) {
		Optional<NumberFormat> format = question.arithmetic().flatMap(Arithmetic::coefficient);
		if (format.isPresent()) {
			return format.map(NumberFormat::step);
		}
		if (state.getFilter().getCoefficients() instanceof IntegerCoefficients integers) {
			try {
				return Optional.of(Expression.scale(integers.getScale()));
			} catch (InputException e) {
				return Optional.empty(); // there are then no usable coefficients either, and no row has a difference
			}
		}
		return Optional.empty();
	}

	private static Optional<BigFraction> commonStep(Optional<BigFraction> one, Optional<BigFraction> other) {
		return one.equals(other) ? one : Optional.empty();
	}
}
