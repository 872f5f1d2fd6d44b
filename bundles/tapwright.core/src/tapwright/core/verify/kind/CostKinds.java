// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import java.util.List;

import org.eclipse.emf.ecore.EAttribute;

import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.CoefficientWord;
import tapwright.dsp.verify.CostLimit;
import tapwright.dsp.verify.CostLimit.Resource;
import tapwright.model.AddsRequirement;
import tapwright.model.CoefficientWordRequirement;
import tapwright.model.MemoryRequirement;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.MultipliesRequirement;
import tapwright.model.MultiplyRateRequirement;
import tapwright.model.Requirement;
import tapwright.model.TapsRequirement;

/** Kinds that speak of what a filter needs of a processor or circuit. */
public final class CostKinds {

	/** All of them. */
	public static final List<RequirementKind<?>> ALL = List.of(
			new PlainKind<>(CoefficientWordRequirement.class, "bit", "",
					(word, numbers) -> new CoefficientWord(numbers.getInt(word, Literals.COEFFICIENT_WORD_REQUIREMENT__MAX)),
					(word, numbers) -> "coefficients of at most "
							+ Words.exactly(numbers.get(word, Literals.COEFFICIENT_WORD_REQUIREMENT__MAX), "bit")),
			cost(TapsRequirement.class, Literals.TAPS_REQUIREMENT__MAX, Resource.TAPS, "taps"),
			cost(MultipliesRequirement.class, Literals.MULTIPLIES_REQUIREMENT__MAX, Resource.MULTIPLIES, "multiplies per output sample"),
			cost(AddsRequirement.class, Literals.ADDS_REQUIREMENT__MAX, Resource.ADDS, "adds per output sample"),
			cost(MemoryRequirement.class, Literals.MEMORY_REQUIREMENT__MAX, Resource.MEMORY, "words of memory"),
			cost(MultiplyRateRequirement.class, Literals.MULTIPLY_RATE_REQUIREMENT__MAX, Resource.MULTIPLIES_PER_SECOND,
					"multiplies per second"));

	private CostKinds() {
	}

	private static <T extends Requirement> PlainKind<T> cost(Class<T> type, EAttribute max, Resource resource, String noun) {
		return new PlainKind<>(type, "1", "", (cost, numbers) -> new CostLimit(resource, numbers.get(cost, max)),
				(cost, numbers) -> "at most " + Words.exactly(numbers.get(cost, max), "1") + " " + noun);
	}
}
