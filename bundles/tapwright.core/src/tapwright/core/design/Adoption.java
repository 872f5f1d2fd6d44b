// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.model.BandDesign;
import tapwright.model.Coefficients;
import tapwright.model.Design;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;

/**
 * New model objects for a filter that takes over a candidate. The filter itself is not changed: the window does that by a command.
 *
 * @param design
 *            method and number of coefficients; bands that the filter's design stated are kept
 * @param coefficients
 *            what the design gives
 */
public record Adoption(Design design, Coefficients coefficients) {

	/**
	 * Prepares to take over a candidate.
	 *
	 * @throws InputException
	 *             when the candidate has no solution
	 * @throws DesignException
	 *             when the design cannot be run again
	 */
	public static Adoption of(Filter filter, Expression.Names parameters, Candidate candidate)
			throws InputException, DesignException {
		Candidate.Solution solution = candidate.solution()
				.orElseThrow(() -> new InputException(candidate.method(), "has found nothing to take over"));
		BandDesign design = design(candidate.method());
		design.setTaps(String.valueOf(solution.taps().length));
		if (filter.getDesign() instanceof BandDesign present) {
			design.getBands().addAll(EcoreUtil.copyAll(present.getBands()));
		}
		Filter changed = EcoreUtil.copy(filter);
		changed.setDesign(EcoreUtil.copy(design));
		Designer designer = Designer.of(changed, parameters).orElseThrow();
		return new Adoption(design, designer.run(Progress.NONE).coefficients());
	}

	/** Changes a filter that no editor holds. */
	public void apply(Filter filter) {
		filter.setDesign(design);
		filter.setCoefficients(coefficients);
	}

	private static BandDesign design(String method) {
		return switch (method) {
		case "equiripple" -> ModelFactory.eINSTANCE.createEquirippleDesign();
		case "window" -> ModelFactory.eINSTANCE.createWindowDesign();
		default -> throw new IllegalArgumentException("there is no search with the method '" + method + "'");
		};
	}
}
