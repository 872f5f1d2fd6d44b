// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import java.util.List;
import java.util.Optional;

import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.design.Designer;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.ModelPackage.Literals;

/** Runs the stated design of a filter whose coefficients are older. */
public final class DesignAgain {

	private DesignAgain() {
	}

	/**
	 * The coefficients that the design yields now, with what is proven of them, be it good or bad; nothing for a filter without a
	 * design. Works on a copy; give it a filter that no other thread changes meanwhile.
	 *
	 * @throws InputException
	 *             when a number of the design makes no sense
	 * @throws DesignException
	 *             when it yields no coefficients
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public static Optional<Remedy> of(Filter filter, Expression.Names parameters, Progress progress)
			throws InputException, DesignException {
		Optional<Designer> designer = Designer.of(filter, parameters);
		if (designer.isEmpty()) {
			return Optional.empty();
		}
		Designer.Outcome outcome = designer.get().run(progress);
		Filter changed = EcoreUtil.copy(filter);
		changed.setCoefficients(EcoreUtil.copy(outcome.coefficients()));
		var effort = new Effort(progress, Effort.STANDARD.timeLimit());
		return Optional.of(new Remedy(Remedy.Kind.SAME_DESIGN,
				"coefficients of the " + Meta.label(filter.getDesign().eClass()) + " design as it is stated now",
				List.of(new Edit(filter, Literals.FILTER__COEFFICIENTS, outcome.coefficients())),
				FilterQuestion.of(changed, parameters).answer(effort)));
	}
}
