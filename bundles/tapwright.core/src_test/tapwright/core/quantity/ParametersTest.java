// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Parameter;
import tapwright.model.Unit;

class ParametersTest {

	@Test
	void evaluateEachOtherInAnyOrder() throws InputException {
		var parameters = new Parameters(List.of(parameter("edge", "0.4 * rate", Unit.HZ), parameter("rate", "192 kHz", Unit.HZ)));
		assertEquals(76_800, parameters.value("edge").value().doubleValue());
		assertTrue(parameters.problems().isEmpty());
	}

	@Test
	void takeTheirOwnUnitForPlainNumbers() throws InputException {
		var parameters = new Parameters(List.of(parameter("delay", "0.5", Unit.S)));
		assertEquals(Expression.evaluate("500 ms", Expression.Names.NONE), parameters.value("delay"));
	}

	@Test
	void reportCirclesWithTheWayRound() {
		var parameters = new Parameters(List.of(parameter("a", "b", Unit.HZ), parameter("b", "c", Unit.HZ),
				parameter("c", "a + 1 Hz", Unit.HZ), parameter("d", "2", Unit.HZ)));
		assertEquals(Set.of("a", "b", "c"), parameters.problems().keySet());
		assertTrue(parameters.problems().get("c").getMessage().contains("a -> b -> c -> a"),
				parameters.problems().get("c").getMessage());
	}

	@Test
	void reportWrongUnitsDoublesAndBadNames() {
		var parameters = new Parameters(List.of(parameter("rate", "3 ms", Unit.HZ), parameter("x", "1", Unit.PLAIN),
				parameter("x", "2", Unit.PLAIN), parameter("2x", "1", Unit.PLAIN), parameter("kHz", "1", Unit.PLAIN)));
		assertEquals(Set.of("rate", "x", "2x", "kHz"), parameters.problems().keySet());
	}

	@Test
	void rememberWhichOnesWereUsed() throws InputException {
		var numbers = new Numbers(new Parameters(
				List.of(parameter("rate", "192 kHz", Unit.HZ), parameter("other", "1", Unit.PLAIN))));
		GainRequirement gain = ModelFactory.eINSTANCE.createGainRequirement();
		gain.setFrom("rate / 4");
		assertEquals(48_000, numbers.get(gain, Literals.GAIN_REQUIREMENT__FROM));
		assertEquals(Set.of("rate"), numbers.used().keySet());
	}

	@Test
	void roundOnceToTheNearestDouble() throws InputException {
		GainRequirement gain = ModelFactory.eINSTANCE.createGainRequirement();
		gain.setFrom("0.1 + 0.2");
		assertEquals(0.3, new Numbers(Expression.Names.NONE).get(gain, Literals.GAIN_REQUIREMENT__FROM), 0);
	}

	@Test
	void nameTheFeatureThatIsWrong() {
		GainRequirement gain = ModelFactory.eINSTANCE.createGainRequirement();
		gain.setMax("-80 Hz");
		var numbers = new Numbers(Expression.Names.NONE);
		var problem = assertThrows(InputException.class, () -> numbers.get(gain, Literals.GAIN_REQUIREMENT__MAX));
		assertEquals("max: is in Hz, but dB is expected", problem.describe());
		var missing = assertThrows(InputException.class, () -> numbers.get(gain, Literals.GAIN_REQUIREMENT__FROM));
		assertEquals("from: is missing", missing.describe());
	}

	@Test
	void boundTheLengthOfAChain() throws InputException {
		var chain = new ArrayList<Parameter>();
		chain.add(parameter("p0", "1", Unit.PLAIN));
		for (int k = 1; k < 1000; k++) {
			chain.add(parameter("p" + k, "p" + (k - 1) + " + 1", Unit.PLAIN));
		}
		assertEquals(1000, new Parameters(chain).value("p999").value().intValue());
		var backward = new Parameters(chain.reversed());
		assertTrue(backward.problems().get("p999").getMessage().contains("more than 100"), backward.problems().toString());
	}

	private static Parameter parameter(String name, String value, Unit unit) {
		Parameter parameter = ModelFactory.eINSTANCE.createParameter();
		parameter.setName(name);
		parameter.setValue(value);
		parameter.setUnit(unit);
		return parameter;
	}
}
