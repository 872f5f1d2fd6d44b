// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import tapwright.core.InputException;
import tapwright.model.EquirippleDesign;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.IntegerCoefficients;
import tapwright.model.Interpolation;
import tapwright.model.RealCoefficients;
import tapwright.model.Rounding;
import tapwright.model.Side;
import tapwright.model.Structure;

class FilterJsonTest {

	private static final String FULL = """
			{
			  "format": "tapwright-filter/1",
			  "name": "mooring-strain decimator",
			  "sampleRate": 48000.0,
			  "requirements": [
			    {"id": "pass", "kind": "gain", "from": 0, "to": 6000, "min": -0.05, "max": 0.05},
			    {"id": "stop", "kind": "gain", "from": "8 kHz", "to": 24000, "max": -80},
			    {"id": "slope", "kind": "gain", "points": [[8000, -20], [12000, -80]], "side": "max", "interpolate": "log"},
			    {"id": "lin", "kind": "linear-phase"},
			    {"id": "head", "kind": "no-overflow", "input": "full-scale"},
			    {"id": "cost", "kind": "multiplies-per-second", "max": 5.0e6}
			  ],
			  "design": {"method": "equiripple", "taps": 95},
			  "coefficients": {"values": [0.001, 0.25, 1E-3]},
			  "arithmetic": {
			    "structure": "folded", "coefficient": {"word": 16, "fraction": 15}, "input": {"word": 16, "fraction": 15},
			    "accumulator": {"word": 40, "fraction": 30}, "output": {"word": 16, "fraction": 15},
			    "rounding": "half-even", "overflow": "saturate"
			  }
			}
			""";

	@Test
	void readsEveryPartOfAFilter() throws InputException {
		Filter filter = FilterJson.read(FULL);
		assertEquals("mooring-strain decimator", filter.getName());
		assertEquals("48000.0", filter.getSampleRate());
		assertEquals(6, filter.getRequirements().size());
		assertEquals("8 kHz", ((GainRequirement) filter.getRequirements().get(1)).getFrom());
		GainRequirement slope = (GainRequirement) filter.getRequirements().get(2);
		assertEquals("12000", slope.getPoints().get(1).getFrequency());
		assertEquals("-80", slope.getPoints().get(1).getLevel());
		assertEquals(Side.MAX, slope.getSide());
		assertEquals(Interpolation.LOG, slope.getInterpolate());
		assertEquals("95", ((EquirippleDesign) filter.getDesign()).getTaps());
		assertEquals(List.of(0.001, 0.25, 0.001), ((RealCoefficients) filter.getCoefficients()).getValues());
		assertEquals(Structure.FOLDED, filter.getArithmetic().getStructure());
		assertEquals(Rounding.HALF_EVEN, filter.getArithmetic().getRounding());
		assertEquals("40", filter.getArithmetic().getAccumulator().getWord());
	}

	@Test
	void readsIntegersWithTheirScale() throws InputException {
		Filter filter = FilterJson.read("""
				{"format": "tapwright-filter/1", "coefficients": {"integers": [-3, 12, 17, 12, -3], "scale": "1/35"}}""");
		IntegerCoefficients coefficients = (IntegerCoefficients) filter.getCoefficients();
		assertEquals(BigInteger.valueOf(-3), coefficients.getIntegers().getLast());
		assertEquals("1/35", coefficients.getScale());
	}

	@Test
	void writesWhatItReads() throws InputException {
		String once = FilterJson.write(FilterJson.read(FULL));
		assertEquals(once, FilterJson.write(FilterJson.read(once)));
		assertTrue(once.contains("\"from\": \"8 kHz\"") && once.contains("\"max\": 5.0e6") && once.contains("8000"), once);
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { //
			"\"from\": 0, \"to\"     | \"frmo\": 0, \"to\"       | /requirements/0/frmo | is not known; known are",
			"\"kind\": \"gain\"      | \"kind\": \"gian\"        | /requirements/0/kind | 'gian' is not known",
			"\"method\": \"equiripple\", | \"x\": 1,             | /design/method       | is missing",
			"\"taps\": 95            | \"taps\": [95]            | /design/taps         | must be a number",
			"0.25, 1E-3              | 0.25, \"0.1\"             | /coefficients/values/2 | must be a number",
			"0.25, 1E-3              | 0.25, 1E400               | /coefficients/values/2 | beyond the largest double",
			"\"side\": \"max\"       | \"side\": \"above\"       | /requirements/2/side | must be one of max, min",
			"[8000, -20]             | [8000]                    | /requirements/2/points/0 | must be a pair",
			"\"name\": \"mooring-strain decimator\" | \"name\": 5 | /name               | must be a string",
			"\"name\": \"mooring-strain decimator\" | \"name\": null | /name            | is null",
			"\"sampleRate\": 48000.0 | \"sampleRate\": 1, \"sampleRate\": 2 | /sampleRate | stands twice",
			"{\"values\"             | {\"scale\": \"1\", \"values\" | /coefficients/scale | is not known",
			"tapwright-filter/1      | tapwright-filter/9        | /format              | must be" })
	void pointsAtTheMistake(String find, String replace, String pointer, String reason) {
		String text = FULL.replaceFirst(Pattern.quote(find), Matcher.quoteReplacement(replace));
		var problem = assertThrows(InputException.class, () -> FilterJson.read(text));
		assertEquals(pointer, problem.place());
		assertTrue(problem.getMessage().contains(reason), problem.getMessage());
	}

	@ParameterizedTest
	@ValueSource(strings = { "", "[]", "{", "{}", "null", "42", "{\"format\": \"tapwright-filter/1\"} {}",
			"{'format': 'tapwright-filter/1'}", "{\"format\": \"tapwright-filter/1\",}", "{\"a\": NaN}", "// hi\n{}" })
	void refusesWhatIsNotOurJson(String text) {
		var problem = assertThrows(InputException.class, () -> FilterJson.read(text));
		assertTrue(!problem.getMessage().contains("http"), problem.getMessage());
	}

	@Test
	void refusesNestingThatWouldExhaustTheStack() {
		assertThrows(InputException.class, () -> FilterJson.read("[".repeat(100_000)));
	}
}
