// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.AliasRejection;
import tapwright.dsp.verify.ExactGain;
import tapwright.dsp.verify.GroupDelay;
import tapwright.dsp.verify.GroupDelayVariation;
import tapwright.dsp.verify.NonNegativeAmplitude;
import tapwright.dsp.verify.Null;
import tapwright.model.AliasRejectionRequirement;
import tapwright.model.ExactGainRequirement;
import tapwright.model.GroupDelayRequirement;
import tapwright.model.GroupDelayVariationRequirement;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.NonNegativeAmplitudeRequirement;
import tapwright.model.NullRequirement;

/** Kinds that speak of the frequency response, other than gain limits. */
public final class FrequencyKinds {

	/** All of them. */
	public static final List<RequirementKind<?>> ALL = List.of(
			new PlainKind<>(GroupDelayRequirement.class, "s", "Hz", FrequencyKinds::groupDelay, (delay, numbers) -> {
				GroupDelay claim = groupDelay(delay, numbers);
				return "group delay " + Words.band(claim.from(), claim.to()) + " " + Limits.words(claim.min(), claim.max(), "s");
			}), //
			new PlainKind<>(GroupDelayVariationRequirement.class, "s", "Hz", FrequencyKinds::variation, (delay, numbers) -> {
				GroupDelayVariation claim = variation(delay, numbers);
				return "group delay " + Words.band(claim.from(), claim.to()) + " varies by at most "
						+ Words.exactly(claim.max(), "s");
			}), //
			new PlainKind<>(NullRequirement.class, "1", "Hz",
					(zero, numbers) -> new Null(numbers.get(zero, Literals.NULL_REQUIREMENT__AT)),
					(zero, numbers) -> "no gain at " + Words.exactly(numbers.get(zero, Literals.NULL_REQUIREMENT__AT), "Hz")),
			new PlainKind<>(ExactGainRequirement.class, "1", "Hz",
					(gain, numbers) -> new ExactGain(numbers.get(gain, Literals.EXACT_GAIN_REQUIREMENT__AT),
							numbers.get(gain, Literals.EXACT_GAIN_REQUIREMENT__VALUE)),
					(gain, numbers) -> "gain at " + Words.exactly(numbers.get(gain, Literals.EXACT_GAIN_REQUIREMENT__AT), "Hz")
							+ " exactly " + Words.exactly(numbers.get(gain, Literals.EXACT_GAIN_REQUIREMENT__VALUE), "1")),
			new PlainKind<>(NonNegativeAmplitudeRequirement.class, "1", "Hz", (amplitude, numbers) -> new NonNegativeAmplitude(),
					(amplitude, numbers) -> "amplitude nowhere negative"),
			new PlainKind<>(AliasRejectionRequirement.class, "dB", "Hz", FrequencyKinds::alias, (alias, numbers) -> {
				AliasRejection claim = alias(alias, numbers);
				return "aliases into 0 to " + Words.exactly(claim.to(), "Hz") + " at least " + Words.exactly(claim.min(), "dB")
						+ " down when one sample in " + claim.factor() + " is kept";
			}));

	private FrequencyKinds() {
	}

	private static GroupDelay groupDelay(GroupDelayRequirement delay, Numbers numbers) throws InputException {
		OptionalDouble min = numbers.find(delay, Literals.GROUP_DELAY_REQUIREMENT__MIN);
		OptionalDouble max = numbers.find(delay, Literals.GROUP_DELAY_REQUIREMENT__MAX);
		if (min.isEmpty() && max.isEmpty()) {
			throw new InputException("", "there is no limit; give min, max or both");
		}
		return new GroupDelay(numbers.get(delay, Literals.GROUP_DELAY_REQUIREMENT__FROM),
				numbers.get(delay, Literals.GROUP_DELAY_REQUIREMENT__TO), min.orElse(Double.NEGATIVE_INFINITY),
				max.orElse(Double.POSITIVE_INFINITY));
	}

	private static GroupDelayVariation variation(GroupDelayVariationRequirement delay, Numbers numbers) throws InputException {
		return new GroupDelayVariation(numbers.get(delay, Literals.GROUP_DELAY_VARIATION_REQUIREMENT__FROM),
				numbers.get(delay, Literals.GROUP_DELAY_VARIATION_REQUIREMENT__TO),
				numbers.get(delay, Literals.GROUP_DELAY_VARIATION_REQUIREMENT__MAX));
	}

	private static AliasRejection alias(AliasRejectionRequirement alias, Numbers numbers) throws InputException {
		return new AliasRejection(numbers.getInt(alias, Literals.ALIAS_REJECTION_REQUIREMENT__FACTOR),
				numbers.get(alias, Literals.ALIAS_REJECTION_REQUIREMENT__TO),
				numbers.get(alias, Literals.ALIAS_REJECTION_REQUIREMENT__MIN));
	}
}
