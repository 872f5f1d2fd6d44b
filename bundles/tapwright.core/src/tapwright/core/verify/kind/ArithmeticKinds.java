// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import java.util.List;

import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.NoOverflow;
import tapwright.dsp.verify.OutputNoise;
import tapwright.model.InputClass;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.NoOverflowRequirement;
import tapwright.model.OutputNoiseRequirement;

/** Kinds that speak of what the number formats do to a signal. */
public final class ArithmeticKinds {

	/** All of them. */
	public static final List<RequirementKind<?>> ALL = List.of(
			new PlainKind<>(NoOverflowRequirement.class, "dB", "",
					(overflow, numbers) -> new NoOverflow(overflow.getInput() == InputClass.SINUSOID ? NoOverflow.Input.SINUSOID
							: NoOverflow.Input.ANY),
					(overflow, numbers) -> "no overflow for " + (overflow.getInput() == InputClass.SINUSOID ? "any sinusoid"
							: "any input")),
			new PlainKind<>(OutputNoiseRequirement.class, "dB", "",
					(noise, numbers) -> new OutputNoise(numbers.get(noise, Literals.OUTPUT_NOISE_REQUIREMENT__MAX)),
					(noise, numbers) -> "rounding noise at most "
							+ Words.exactly(numbers.get(noise, Literals.OUTPUT_NOISE_REQUIREMENT__MAX), "dB")));

	private ArithmeticKinds() {
	}
}
