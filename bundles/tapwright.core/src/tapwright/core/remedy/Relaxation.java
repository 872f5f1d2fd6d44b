// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;

import org.eclipse.emf.ecore.EStructuralFeature;

import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Proof;
import tapwright.model.Requirement;

/** The limit that a filter achieves, rounded outward to a few digits. */
final class Relaxation {

	private static final int DIGITS_OF_MISS = 2;

	private Relaxation() {
	}

	/** A new value of the missed limit; nothing where the limit is not a single number. */
	static Optional<Edit> of(Requirement requirement, RequirementEvidence evidence) {
		Proof proof = evidence.proof();
		boolean above = proof.value().lo() > proof.limit();
		EStructuralFeature feature = requirement.eClass().getEStructuralFeature(above ? "max" : "min");
		double achieved = above ? proof.value().hi() : proof.value().lo();
		if (feature == null || !requirement.eIsSet(feature) || !Double.isFinite(achieved)) {
			return Optional.empty();
		}
		BigDecimal miss = new BigDecimal(achieved).subtract(new BigDecimal(proof.limit()));
		BigDecimal rounded = miss.round(new MathContext(DIGITS_OF_MISS, RoundingMode.UP));
		BigDecimal limit = new BigDecimal(Double.toString(proof.limit())).add(rounded);
		return Optional.of(new Edit(requirement, feature, limit.stripTrailingZeros().toPlainString()));
	}
}
