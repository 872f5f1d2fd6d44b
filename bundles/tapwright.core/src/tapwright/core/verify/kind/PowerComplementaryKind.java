// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.core.verify.Partners;
import tapwright.core.verify.RequirementKind;
import tapwright.dsp.verify.PowerComplementary;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.PowerComplementaryRequirement;

/** Two filters that share the power. */
public final class PowerComplementaryKind implements RequirementKind<PowerComplementaryRequirement> {

	@Override
	public Class<PowerComplementaryRequirement> type() {
		return PowerComplementaryRequirement.class;
	}

	@Override
	public PowerComplementary statement(PowerComplementaryRequirement pair, Numbers numbers, Partners partners)
			throws InputException {
		if (pair.getPartner() == null || pair.getPartner().isBlank()) {
			throw new InputException("partner", "is missing; give the name of the other filter");
		}
		return new PowerComplementary(partners.shipped(pair.getPartner()),
				numbers.get(pair, Literals.POWER_COMPLEMENTARY_REQUIREMENT__MAX));
	}

	@Override
	public String describe(PowerComplementaryRequirement pair, Numbers numbers) throws InputException {
		return "power together with " + pair.getPartner() + " within ±"
				+ Words.exactly(numbers.get(pair, Literals.POWER_COMPLEMENTARY_REQUIREMENT__MAX), "dB");
	}

	@Override
	public String valueUnit() {
		return "dB";
	}

	@Override
	public String placeUnit() {
		return "Hz";
	}
}
