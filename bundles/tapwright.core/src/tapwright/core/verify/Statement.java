// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.verify.Proof;
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
	static Statement of(Requirement requirement, Numbers numbers) throws InputException {
		return of(RequirementKinds.of(requirement), requirement, numbers);
	}

	RequirementEvidence evidence(Proof proof) {
		return new RequirementEvidence(id, kind, severity, description, valueUnit, placeUnit, proof);
	}

	private static <T extends Requirement> Statement of(RequirementKind<T> kind, T requirement, Numbers numbers)
			throws InputException {
		try {
			return new Statement(String.valueOf(requirement.getId()), Meta.kind(requirement.eClass()), requirement.getSeverity(),
					kind.describe(requirement, numbers), kind.valueUnit(), kind.placeUnit(),
					kind.statement(requirement, numbers));
		} catch (IllegalArgumentException e) {
			throw new InputException("", e.getMessage());
		}
	}
}
