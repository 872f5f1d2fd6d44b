// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Parameters;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;

class FilterQuestionTest {

	// Common practice, no source: three equal taps of one third have gain 1 at 0 Hz.
	@Test
	void provesThatAThreeTapMeanKeepsAConstant() throws InputException {
		FilterEvidence evidence = answer("""
				"coefficients": {"integers": [1, 1, 1], "scale": "1/3"},
				"requirements": [{"id": "unity", "kind": "gain", "from": 0, "to": 0, "min": 0, "max": 0}]""");
		assertEquals(Verdict.MET, evidence.verdict());
		assertEquals(0, evidence.find("unity").orElseThrow().proof().margin().hi());
	}

	// Common practice, no source: without the factor the gain at 0 Hz is 3, that is 9.5424 dB.
	@Test
	void findsTheGainOfThreeOfAThreeTapSum() throws InputException {
		FilterEvidence evidence = answer("""
				"coefficients": {"values": [1, 1, 1]},
				"requirements": [{"id": "low", "kind": "gain", "from": 0, "to": 100, "max": 9.5424},
				  {"id": "high", "kind": "gain", "from": 0, "to": 100, "max": 9.5425}]""");
		assertEquals(Verdict.MISSED, evidence.find("low").orElseThrow().proof().verdict());
		assertEquals(Verdict.MET, evidence.find("high").orElseThrow().proof().verdict());
		assertEquals(9.5424, evidence.find("high").orElseThrow().proof().value().middle(), 1e-4);
		assertEquals(Verdict.MISSED, evidence.verdict());
	}

	@Test
	void speaksOfTheCoefficientsThatShip() throws InputException {
		Filter filter = filter("""
				"coefficients": {"values": [0.3, 0.2, 0.3]},
				"arithmetic": {"structure": "direct", "coefficient": {"word": 3, "fraction": 2}}""");
		ExactTaps shipped = FilterQuestion.of(filter, Expression.Names.NONE).subject().orElseThrow().taps();
		assertEquals(ExactTaps.ofDoubles(0.25, 0.25, 0.25), shipped);
	}

	@Test
	void isUnprovenWithoutCoefficientsAndWithoutRequirements() throws InputException {
		FilterEvidence without = answer("""
				"requirements": [{"id": "a", "kind": "gain", "from": 0, "to": 1, "max": 0}]""");
		assertEquals(Verdict.UNPROVEN, without.verdict());
		assertEquals(List.of(), without.problems());
		assertTrue(without.requirements().getFirst().message().contains("no coefficients"));
		assertEquals(Verdict.UNPROVEN, answer("\"coefficients\": {\"values\": [1]}").verdict());
	}

	@Test
	void saysWhatIsWrongWithARequirementAndStillProvesTheOthers() throws InputException {
		FilterEvidence evidence = answer("""
				"coefficients": {"values": [1]},
				"requirements": [{"id": "a", "kind": "gain", "from": 0, "to": "1 dB", "max": 0},
				  {"id": "b", "kind": "gain", "from": 0, "to": 600, "max": 0},
				  {"id": "c", "kind": "gain", "from": 0, "to": 500},
				  {"id": "d", "kind": "gain", "from": 5, "to": 4, "max": 0},
				  {"id": "e", "kind": "gain", "from": 0, "to": 4, "min": 1, "max": 0},
				  {"id": "f", "kind": "gain", "from": 0, "to": 500, "max": 0},
				  {"id": "f", "kind": "gain", "from": 0, "to": 500, "max": 0},
				  {"kind": "gain", "from": 0, "to": 500, "max": 0}]""");
		assertEquals(List.of("a", "c", "d", "e", "f", "", "b"), evidence.problems().stream().map(InputProblem::requirement).toList());
		assertTrue(evidence.problems().getFirst().message().contains("to: is in dB, but Hz is expected"));
		assertEquals(Verdict.MET, evidence.find("f").orElseThrow().proof().verdict());
	}

	@Test
	void refusesAStructureThatCannotRunTheCoefficients() throws InputException {
		FilterEvidence evidence = answer("""
				"coefficients": {"values": [1, 2, 3]}, "arithmetic": {"structure": "folded"}""");
		assertTrue(evidence.problems().getFirst().message().contains("symmetric"), evidence.problems().toString());
	}

	@Test
	void hasAHashThatFollowsContentAndUsedParametersOnly() throws InputException {
		Filter filter = filter("\"requirements\": [{\"id\": \"a\", \"kind\": \"gain\", \"from\": 0, \"to\": \"edge\", \"max\": 0}]");
		FilterQuestion question = FilterQuestion.of(filter, parameters("100", "1"));
		assertEquals(Set.of("edge"), question.parameters());
		assertEquals(question.hash(), FilterQuestion.of(filter, parameters("100.0", "2")).hash());
		assertNotEquals(question.hash(), FilterQuestion.of(filter, parameters("101", "1")).hash());
		filter.setPurpose("another");
		assertNotEquals(question.hash(), FilterQuestion.of(filter, parameters("100", "1")).hash());
	}

	@Test
	void writesMessagesThatAPractitionerUnderstands() throws InputException {
		FilterEvidence evidence = answer("""
				"coefficients": {"values": [0.25, 0.5, 0.25]},
				"requirements": [{"id": "stop", "kind": "gain", "from": 400, "to": 500, "max": -25}]""");
		assertEquals("stop: gain from 400 to 500 Hz at most -25 dB: -20.4 dB at 400 Hz, short by 4.6 dB",
				evidence.requirements().getFirst().message());
	}

	private static FilterEvidence answer(String members) throws InputException {
		return FilterQuestion.of(filter(members), Expression.Names.NONE).answer(Effort.STANDARD);
	}

	private static Filter filter(String members) throws InputException {
		return FilterJson.read("{\"format\": \"tapwright-filter/1\", \"name\": \"x\", \"sampleRate\": 1000, " + members + "}");
	}

	private static Parameters parameters(String edge, String other) {
		return new Parameters(List.of(parameter("edge", edge), parameter("other", other)));
	}

	private static Parameter parameter(String name, String value) {
		Parameter parameter = ModelFactory.eINSTANCE.createParameter();
		parameter.setName(name);
		parameter.setValue(value);
		return parameter;
	}
}
