// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.dsp.verify.Effort;
import tapwright.model.Requirement;

class RequirementKindsTest {

	@Test
	void everyKindOfTheModelIsRegistered() {
		for (EClass type : Meta.requirementKinds()) {
			Requirement requirement = (Requirement) EcoreUtil.create(type);
			assertEquals(type.getInstanceClass(), RequirementKinds.of(requirement).type());
		}
	}

	// Facts of a mean of four samples at 1 kHz, worked by hand: delay 1.5 ms, step 25 50 75 100 %, no gain at 250 and 500 Hz, gain at 0 is 1.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { //
			"'kind': 'linear-phase', 'type': 'II' | met", "'kind': 'linear-phase', 'type': 'I' | missed",
			"'kind': 'bulk-delay', 'min': 0.0014, 'max': '1.6 ms' | met", "'kind': 'bulk-delay', 'max': 0.0014 | missed",
			"'kind': 'group-delay', 'from': 0, 'to': 200, 'max': 0.0015 | met",
			"'kind': 'group-delay', 'from': 0, 'to': 200, 'max': 0.00149 | missed",
			"'kind': 'group-delay-variation', 'from': 0, 'to': 200, 'max': 0 | met", "'kind': 'step-overshoot', 'max': 0 | met",
			"'kind': 'step-undershoot', 'max': 0 | met", "'kind': 'step-settling', 'within': 0, 'max': '3 ms' | met",
			"'kind': 'step-settling', 'within': 10, 'max': '2 ms' | missed", "'kind': 'impulse-tail', 'after': '4 ms', 'max': 0 | met",
			"'kind': 'impulse-tail', 'after': '2.5 ms', 'max': 99 | missed", "'kind': 'null', 'at': 250 | met",
			"'kind': 'null', 'at': 500 | met", "'kind': 'null', 'at': 251 | missed", "'kind': 'exact-gain', 'at': 0, 'value': 1 | met",
			"'kind': 'exact-gain', 'at': 100, 'value': 1 | missed", "'kind': 'coefficient-word', 'max': 2 | met",
			"'kind': 'taps', 'max': 4 | met", "'kind': 'taps', 'max': 3 | missed", "'kind': 'multiplies', 'max': 4 | met",
			"'kind': 'adds', 'max': 2 | missed", "'kind': 'adds', 'max': 3 | met", "'kind': 'memory', 'max': 1000 | met",
			"'kind': 'multiplies-per-second', 'max': 3999 | missed", "'kind': 'multiplies-per-second', 'max': '2 * 2000' | met",
			"'kind': 'non-negative-amplitude' | missed", "'kind': 'alias-rejection', 'factor': 4, 'to': 10, 'min': 20 | met",
			"'kind': 'alias-rejection', 'factor': 4, 'to': 100, 'min': 20 | missed" })
	void judgeAMeanOfFourSamples(String members, String verdict) throws InputException {
		var filter = FilterJson.read(("""
				{'format': 'tapwright-filter/1', 'name': 'x', 'sampleRate': 1000,
				 'coefficients': {'integers': [1, 1, 1, 1], 'scale': '1/4'}, 'requirements': [{'id': 'a', MEMBERS}]}""")
				.replace("MEMBERS", members).replace('\'', '"'));
		FilterEvidence evidence = FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD);
		assertTrue(evidence.problems().isEmpty(), evidence.problems().toString());
		RequirementEvidence only = evidence.requirements().getFirst();
		assertEquals(verdict.toUpperCase(Locale.ROOT), only.proof().verdict().name(), only.message());
		assertTrue(only.description().length() > 3);
	}

	// Four unit coefficients and samples of 8 bits, two's complement, add up to -512 at most: 10 bits hold that, 9 do not. Rounding
	// away 10 of 15 fraction bits makes noise of q^2/12 with q = 2^-5 (B. Widrow, 1956), -40.9 dB, a little less for the finer start.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "10 | 'kind': 'no-overflow', 'input': 'full-scale' | met",
			"9 | 'kind': 'no-overflow', 'input': 'full-scale' | missed", "9 | 'kind': 'no-overflow', 'input': 'sinusoid' | unproven",
			"10 | 'kind': 'no-overflow', 'input': 'sinusoid' | met", "16 | 'kind': 'output-noise', 'max': -40.8 | met",
			"16 | 'kind': 'output-noise', 'max': -41 | missed" })
	void judgeWhatFormatsDo(int accumulator, String members, String verdict) throws InputException {
		var filter = FilterJson.read(("""
				{'format': 'tapwright-filter/1', 'name': 'x', 'sampleRate': 1000, 'coefficients': {'integers': [1, 1, 1, 1], 'scale': '1'},
				 'arithmetic': {'structure': 'direct', 'coefficient': {'word': 2, 'fraction': 0}, 'input': {'word': 8, 'fraction': 15},
				   'accumulator': {'word': ACC, 'fraction': 15}, 'output': {'word': 6, 'fraction': 5}, 'overflow': 'saturate'},
				 'requirements': [{'id': 'a', MEMBERS}]}""").replace("ACC", String.valueOf(accumulator)).replace("MEMBERS", members)
				.replace('\'', '"'));
		FilterEvidence evidence = FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD);
		assertTrue(evidence.problems().isEmpty(), evidence.problems().toString());
		RequirementEvidence only = evidence.requirements().getFirst();
		assertEquals(verdict.toUpperCase(Locale.ROOT), only.proof().verdict().name(), only.message());
	}

	@Test
	void sayThatAPartnerNeedsAPortfolio() throws InputException {
		var filter = FilterJson.read("""
				{"format": "tapwright-filter/1", "sampleRate": 1, "coefficients": {"values": [1]},
				 "requirements": [{"id": "a", "kind": "power-complementary", "partner": "b", "max": 0.1}]}""");
		FilterEvidence evidence = FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD);
		assertTrue(evidence.problems().getFirst().message().contains("portfolio"), evidence.problems().toString());
	}
}
