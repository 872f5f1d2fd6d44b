// SPDX-License-Identifier: EPL-2.0
package tapwright.testing;

import java.util.UUID;

import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.RealCoefficients;
import tapwright.model.Unit;

/** Small model objects whose verdicts can be told without computing. */
public final class Samples {

	/** Id of the requirement that sample filters have. */
	public static final String LIMIT = "limit";

	private Samples() {
	}

	/** A filter with one tap of one, so with a gain of 0 dB everywhere, at 1 kHz; without requirements. */
	public static Filter unity(String name) {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName(name);
		filter.setIdentity(UUID.randomUUID().toString());
		filter.setSampleRate("1 kHz");
		RealCoefficients one = ModelFactory.eINSTANCE.createRealCoefficients();
		one.getValues().add(1.0);
		filter.setCoefficients(one);
		return filter;
	}

	/**
	 * The same with a requirement that the gain stays below a limit.
	 *
	 * @param to
	 *            upper end of the band, a number in Hz or an expression
	 * @param max
	 *            in dB: met from 0 on, missed below
	 */
	public static Filter limited(String name, String to, String max) {
		Filter filter = unity(name);
		GainRequirement limit = ModelFactory.eINSTANCE.createGainRequirement();
		limit.setId(LIMIT);
		limit.setFrom("0");
		limit.setTo(to);
		limit.setMax(max);
		filter.getRequirements().add(limit);
		return filter;
	}

	/** A portfolio with frequencies as parameters: name, value, name, value, ... */
	public static Portfolio portfolio(String... namesAndValues) {
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		portfolio.setName("Marram");
		for (int k = 0; k < namesAndValues.length; k += 2) {
			Parameter parameter = ModelFactory.eINSTANCE.createParameter();
			parameter.setName(namesAndValues[k]);
			parameter.setValue(namesAndValues[k + 1]);
			parameter.setUnit(Unit.HZ);
			portfolio.getParameters().add(parameter);
		}
		return portfolio;
	}
}
