// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.BulkDelay;
import tapwright.dsp.verify.ImpulseTail;
import tapwright.dsp.verify.LinearPhase;
import tapwright.dsp.verify.StepOvershoot;
import tapwright.dsp.verify.StepSettling;
import tapwright.dsp.verify.StepUndershoot;
import tapwright.model.BulkDelayRequirement;
import tapwright.model.ImpulseTailRequirement;
import tapwright.model.LinearPhaseRequirement;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.PhaseType;
import tapwright.model.StepOvershootRequirement;
import tapwright.model.StepSettlingRequirement;
import tapwright.model.StepUndershootRequirement;

/** Kinds that speak of symmetry, delay and behaviour in time. */
public final class TimeKinds {

	/** All of them. */
	public static final List<RequirementKind<?>> ALL = List.of(
			new PlainKind<>(LinearPhaseRequirement.class, "1", "",
					(linear, numbers) -> new LinearPhase(LinearPhase.Type.valueOf(linear.getType().name())),
					(linear, numbers) -> "linear phase" + (linear.getType() == PhaseType.ANY ? ""
							: " of type " + linear.getType().getLiteral())),
			new PlainKind<>(BulkDelayRequirement.class, "s", "", TimeKinds::bulkDelay,
					(delay, numbers) -> "delay " + limits(bulkDelay(delay, numbers))),
			new PlainKind<>(StepOvershootRequirement.class, "%", "s",
					(step, numbers) -> new StepOvershoot(numbers.get(step, Literals.STEP_OVERSHOOT_REQUIREMENT__MAX)),
					(step, numbers) -> "step overshoot at most "
							+ Words.exactly(numbers.get(step, Literals.STEP_OVERSHOOT_REQUIREMENT__MAX), "%")),
			new PlainKind<>(StepUndershootRequirement.class, "%", "s",
					(step, numbers) -> new StepUndershoot(numbers.get(step, Literals.STEP_UNDERSHOOT_REQUIREMENT__MAX)),
					(step, numbers) -> "step undershoot at most "
							+ Words.exactly(numbers.get(step, Literals.STEP_UNDERSHOOT_REQUIREMENT__MAX), "%")),
			new PlainKind<>(StepSettlingRequirement.class, "s", "s",
					(step, numbers) -> new StepSettling(numbers.get(step, Literals.STEP_SETTLING_REQUIREMENT__WITHIN),
							numbers.get(step, Literals.STEP_SETTLING_REQUIREMENT__MAX)),
					(step, numbers) -> "step settles within ±"
							+ Words.exactly(numbers.get(step, Literals.STEP_SETTLING_REQUIREMENT__WITHIN), "%") + " after at most "
							+ Words.exactly(numbers.get(step, Literals.STEP_SETTLING_REQUIREMENT__MAX), "s")),
			new PlainKind<>(ImpulseTailRequirement.class, "%", "s",
					(tail, numbers) -> new ImpulseTail(numbers.get(tail, Literals.IMPULSE_TAIL_REQUIREMENT__AFTER),
							numbers.get(tail, Literals.IMPULSE_TAIL_REQUIREMENT__MAX)),
					(tail, numbers) -> "impulse response from "
							+ Words.exactly(numbers.get(tail, Literals.IMPULSE_TAIL_REQUIREMENT__AFTER), "s") + " on at most "
							+ Words.exactly(numbers.get(tail, Literals.IMPULSE_TAIL_REQUIREMENT__MAX), "%") + " of its largest value"));

	private TimeKinds() {
	}

	private static BulkDelay bulkDelay(BulkDelayRequirement delay, Numbers numbers) throws InputException {
		OptionalDouble min = numbers.find(delay, Literals.BULK_DELAY_REQUIREMENT__MIN);
		OptionalDouble max = numbers.find(delay, Literals.BULK_DELAY_REQUIREMENT__MAX);
		if (min.isEmpty() && max.isEmpty()) {
			throw new InputException("", "there is no limit; give min, max or both");
		}
		return new BulkDelay(min.orElse(Double.NEGATIVE_INFINITY), max.orElse(Double.POSITIVE_INFINITY));
	}

	private static String limits(BulkDelay delay) {
		return Limits.words(delay.min(), delay.max(), "s");
	}
}
