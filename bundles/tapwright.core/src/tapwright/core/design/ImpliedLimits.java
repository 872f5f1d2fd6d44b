// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.leastsquares.AmplitudeLimit;
import tapwright.dsp.design.leastsquares.PointCondition;
import tapwright.dsp.design.linearprogram.TimeLimit;
import tapwright.model.ExactGainRequirement;
import tapwright.model.GainRequirement;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.NullRequirement;
import tapwright.model.Requirement;
import tapwright.model.StepOvershootRequirement;
import tapwright.model.StepSettlingRequirement;
import tapwright.model.StepUndershootRequirement;

/** What requirements other than the target itself ask of a design: limits that it must keep, and what must hold exactly. */
public final class ImpliedLimits {

	/** Methods work to a tolerance; within limits this much tighter their results are proven to keep the requirements. */
	private static final double TIGHTER = 1 - 1e-6;

	private final DesignInput input;

	/** The limits of a filter. */
	public ImpliedLimits(DesignInput input) {
		this.input = input;
	}

	/** Limits on the amplitude that the gain requirements make; amplitudes of a stop band may have either sign. */
	public List<AmplitudeLimit> amplitudes() throws InputException {
		var limits = new ArrayList<AmplitudeLimit>();
		for (Requirement requirement : input.filter().getRequirements()) {
			if (requirement instanceof GainRequirement gain) {
				for (Corridor corridor : Corridor.of(gain, numbers())) {
					double from = corridor.from() / input.sampleRate();
					double to = Math.min(corridor.to() / input.sampleRate(), 0.5);
					if (from < to) {
						limits.add(limit(corridor, from, to));
					}
				}
			}
		}
		return limits;
	}

	/** Nulls and exact gains. */
	public List<PointCondition> conditions() throws InputException {
		var conditions = new ArrayList<PointCondition>();
		for (Requirement requirement : input.filter().getRequirements()) {
			if (requirement instanceof NullRequirement) {
				conditions.add(new PointCondition(
						numbers().get(requirement, Literals.NULL_REQUIREMENT__AT) / input.sampleRate(), 0, 0));
			} else if (requirement instanceof ExactGainRequirement) {
				conditions.add(
						new PointCondition(numbers().get(requirement, Literals.EXACT_GAIN_REQUIREMENT__AT) / input.sampleRate(), 0,
								numbers().get(requirement, Literals.EXACT_GAIN_REQUIREMENT__VALUE)));
			}
		}
		return conditions;
	}

	/** Whether a requirement limits the step response. */
	public boolean limitTheStep() {
		return input.filter().getRequirements().stream().anyMatch(requirement -> requirement instanceof StepOvershootRequirement
				|| requirement instanceof StepUndershootRequirement || requirement instanceof StepSettlingRequirement);
	}

	/** Limits on the step response, whose final value is the desired amplitude at 0 Hz. */
	public List<TimeLimit> steps(int taps, List<Band> bands) throws InputException {
		double end = bands.getFirst().from() == 0 ? bands.getFirst().desiredFrom() : 0;
		var limits = new ArrayList<TimeLimit>();
		if (limitTheStep() && !(end > 0)) {
			throw new InputException("requirements", "limits of the step response need a target above zero at 0 Hz");
		}
		for (Requirement requirement : input.filter().getRequirements()) {
			switch (requirement) {
			case StepOvershootRequirement step -> limits.add(new TimeLimit(true, 0, taps - 1, Double.NEGATIVE_INFINITY,
					end * (1 + TIGHTER * numbers().get(step, Literals.STEP_OVERSHOOT_REQUIREMENT__MAX) / 100)));
			case StepUndershootRequirement step -> limits.add(new TimeLimit(true, 0, taps - 1,
					-end * TIGHTER * numbers().get(step, Literals.STEP_UNDERSHOOT_REQUIREMENT__MAX) / 100,
					Double.POSITIVE_INFINITY));
			case StepSettlingRequirement step -> {
				int from = (int) Math.floor(numbers().get(step, Literals.STEP_SETTLING_REQUIREMENT__MAX) * input.sampleRate());
				double part = TIGHTER * numbers().get(step, Literals.STEP_SETTLING_REQUIREMENT__WITHIN) / 100;
				if (from < taps) {
					limits.add(new TimeLimit(true, Math.max(from, 0), taps - 1, end * (1 - part), end * (1 + part)));
				}
			}
			default -> {
				// says nothing of the step response
			}
			}
		}
		return limits;
	}

	private static AmplitudeLimit limit(Corridor corridor, double from, double to) {
		double upperFrom = corridor.upper(corridor.from());
		double upperTo = corridor.upper(corridor.to());
		boolean bothSigns = Double.isInfinite(corridor.lower(corridor.from()));
		double lowerFrom = bothSigns ? -upperFrom : corridor.lower(corridor.from());
		double lowerTo = bothSigns ? -upperTo : corridor.lower(corridor.to());
		return new AmplitudeLimit(from, to, inward(lowerFrom, upperFrom), inward(lowerTo, upperTo), inward(upperFrom, lowerFrom),
				inward(upperTo, lowerTo));
	}

	private static double inward(double limit, double opposite) {
		return Double.isInfinite(opposite) || Double.isInfinite(limit) ? limit
				: opposite + (limit - opposite) * (1 + TIGHTER) / 2;
	}

	private Numbers numbers() {
		return input.numbers();
	}
}
