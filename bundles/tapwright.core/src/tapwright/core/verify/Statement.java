// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.dsp.verify.ClockTolerance;
import tapwright.dsp.verify.Proof;
import tapwright.model.ModelPackage;
import tapwright.model.Requirement;
import tapwright.model.Severity;

/** A requirement as a statement that can be proven, with the words for its result. Immutable. */
record Statement(String id, String kind, Severity severity, String description, String valueUnit, String placeUnit,
		tapwright.dsp.verify.Requirement claim) {

	/**
	 * Takes the statement from the model.
	 *
	 * @throws InputException
	 *             when a number is missing or makes no sense
	 */
	static Statement of(Requirement requirement, Numbers numbers, Partners partners) throws InputException {
		return of(RequirementKinds.of(requirement), requirement, numbers, partners);
	}

	RequirementEvidence evidence(Proof proof) {
		return new RequirementEvidence(id, kind, severity, description, valueUnit, placeUnit, proof);
	}

	private static <T extends Requirement> Statement of(RequirementKind<T> kind, T requirement, Numbers numbers,
			Partners partners) throws InputException {
		try {
			String words = kind.describe(requirement, numbers);
			tapwright.dsp.verify.Requirement claim = kind.statement(requirement, numbers, partners);
			double ppm = numbers.get(requirement, ModelPackage.Literals.REQUIREMENT__CLOCK_TOLERANCE, 0);
			if (ppm != 0) {
				claim = new ClockTolerance(claim, ppm);
				words += ", with the clock off by up to " + Words.exactly(ppm, "ppm");
			}
			return new Statement(String.valueOf(requirement.getId()), Meta.kind(requirement.eClass()), requirement.getSeverity(),
					words, kind.valueUnit(), kind.placeUnit(), claim);
		} catch (IllegalArgumentException e) {
			throw new InputException("", e.getMessage());
		}
	}
}
