// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.RealCoefficients;

class DesignServicesTest {

	private static final String LOW_PASS = """
			{"format": "tapwright-filter/1", "name": "x", "sampleRate": 48000,
			 "requirements": [{"id": "pass", "kind": "gain", "from": 0, "to": 6000, "min": -0.1, "max": 0.1},
			   {"id": "stop", "kind": "gain", "from": 9000, "to": 24000, "max": -60},
			   {"id": "ceiling", "kind": "gain", "from": 0, "to": 24000, "max": 1}],
			 "design": {"method": "equiripple", "taps": 55}}
			""";

	@Test
	void everyMethodOfTheModelIsRegistered() throws InputException {
		for (EClass type : Meta.designMethods()) {
			Filter filter = FilterJson.read(LOW_PASS);
			filter.setDesign((tapwright.model.Design) EcoreUtil.create(type));
			try {
				DesignKinds.method(filter.getDesign(), new DesignInput(filter, 48000, new Numbers(Expression.Names.NONE)));
			} catch (InputException e) {
				assertFalse(e.getMessage().isBlank()); // a missing parameter is fine here, an unknown method is not
			}
		}
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = {
			"'method': 'least-squares', 'taps': 61 | {'id': 'null', 'kind': 'null', 'at': 12000}",
			"'method': 'constrained-least-squares', 'taps': 61 | {'id': 'null', 'kind': 'null', 'at': 12000}",
			"'method': 'linear-program', 'taps': 55 | {'id': 'step', 'kind': 'step-overshoot', 'max': 9.5}",
			"'method': 'linear-program', 'taps': 61, 'monotone': true | {'id': 'null', 'kind': 'null', 'at': 12000}",
			"'method': 'window', 'taps': 75 | {'id': 'type', 'kind': 'linear-phase', 'type': 'I'}",
			"'method': 'minimum-phase', 'prototype': {'method': 'equiripple', 'taps': 111, 'bands': [{'from': 0, 'to': 6000, 'desired': 1}, {'from': 9000, 'to': 24000, 'desired': 0, 'weight': 1000}]} | {'id': 'delay', 'kind': 'group-delay', 'from': 0, 'to': 3000, 'max': '0.5 ms'}" })
	void runsEveryMethodUntilTheRequirementsAreMet(String design, String more) throws Exception {
		Filter filter = FilterJson.read(LOW_PASS
				.replace("\"method\": \"equiripple\", \"taps\": 55", design.replace('\'', '"'))
				.replace("\"max\": 1}]", "\"max\": 1}, " + more.replace('\'', '"') + "]"));
		Designer designer = Designer.of(filter, Expression.Names.NONE).orElseThrow();
		filter.setCoefficients(designer.run(Progress.NONE).coefficients());
		var evidence = FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD);
		evidence.requirements().stream().filter(each -> !each.id().equals("null"))
				.forEach(each -> assertEquals(Verdict.MET, each.proof().verdict(), each.message()));
		// A null in double precision is as deep as the coefficients allow, not exact.
		evidence.find("null").ifPresent(each -> assertTrue(each.proof().value().hi() < 1e-14, each.message()));
		assertEquals(designer.hash(), Designer.of(filter, Expression.Names.NONE).orElseThrow().hash());
	}

	@Test
	void takesTheTargetFromTheRequirements() throws InputException {
		Filter filter = FilterJson.read(LOW_PASS);
		List<Band> bands = ImpliedBands.of(filter.getRequirements(), 48000, new Numbers(Expression.Names.NONE));
		assertEquals(2, bands.size());
		assertEquals(0.125, bands.getFirst().to());
		// 0.1 dB are a factor of 1.01158 (10^(0.1/20)): the middle of both limits is 1.0000663.
		assertEquals(1.0000663, bands.getFirst().desiredFrom(), 1e-7);
		assertEquals(0, bands.getLast().desiredFrom());
		assertEquals(1000, bands.getLast().weightFrom(), 1e-3); // -60 dB is one thousandth
	}

	@Test
	void runsADesignThatMeetsItsRequirements() throws Exception {
		Filter filter = FilterJson.read(LOW_PASS);
		Designer designer = Designer.of(filter, Expression.Names.NONE).orElseThrow();
		filter.setCoefficients(designer.run(Progress.NONE).coefficients());
		assertEquals(Verdict.MET, FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD).verdict());
		assertEquals(designer.hash(), filter.getCoefficients().getDesignHash());
	}

	@Test
	void hasAHashThatChangesWithWhatTheCoefficientsDependOn() throws InputException {
		String hash = Designer.of(FilterJson.read(LOW_PASS), Expression.Names.NONE).orElseThrow().hash();
		assertEquals(hash, Designer.of(FilterJson.read(LOW_PASS), Expression.Names.NONE).orElseThrow().hash());
		assertNotEquals(hash,
				Designer.of(FilterJson.read(LOW_PASS.replace("-60", "-61")), Expression.Names.NONE).orElseThrow().hash());
		assertEquals(hash,
				Designer.of(FilterJson.read(LOW_PASS.replace("\"stop\"", "\"reject\"")), Expression.Names.NONE).orElseThrow().hash());
	}

	@Test
	void refusesLimitsThatContradictEachOther() throws InputException {
		Filter filter = FilterJson.read(LOW_PASS.replace("9000", "5000"));
		var problem = assertThrows(InputException.class, () -> Designer.of(filter, Expression.Names.NONE));
		assertTrue(problem.getMessage().contains("contradict each other from 5 to 6 kHz"), problem.getMessage());
	}

	@Test
	void leavesGivenCoefficientsAlone() throws InputException {
		Filter filter = FilterJson.read(LOW_PASS);
		filter.setDesign(ModelFactory.eINSTANCE.createGivenDesign());
		assertTrue(Designer.of(filter, Expression.Names.NONE).isEmpty());
	}

	@Test
	void findsTheShortestProvenFilterWithEachMethod() throws Exception {
		Filter filter = FilterJson.read(LOW_PASS);
		Candidates search = Candidates.of(filter, Expression.Names.NONE);
		Candidate equiripple = search.search("equiripple", Progress.NONE);
		Candidate window = search.search("window", Progress.NONE);
		Candidate.Solution best = equiripple.solution().orElseThrow();
		assertTrue(best.provenShortest(), equiripple.notes().toString());
		assertEquals(Verdict.MET, best.evidence().verdict());
		assertTrue(best.taps().length < window.solution().orElseThrow().taps().length);

		Adoption adoption = Adoption.of(filter, Expression.Names.NONE, equiripple);
		adoption.apply(filter);
		assertArrayEquals(best.taps(), ((RealCoefficients) filter.getCoefficients()).getValues().stream()
				.mapToDouble(Double::doubleValue).toArray());
		assertEquals(Designer.of(filter, Expression.Names.NONE).orElseThrow().hash(), filter.getCoefficients().getDesignHash());
	}

	@Test
	void searchesInTheNumbersThatShip() throws Exception {
		Filter filter = FilterJson.read(LOW_PASS.replace("\"design\"",
				"\"arithmetic\": {\"structure\": \"folded\", \"coefficient\": {\"word\": 14, \"fraction\": 14}}, \"design\""));
		Candidate.Solution rounded = Candidates.of(filter, Expression.Names.NONE).search("equiripple", Progress.NONE).solution()
				.orElseThrow();
		Candidate.Solution exact = Candidates.of(FilterJson.read(LOW_PASS), Expression.Names.NONE)
				.search("equiripple", Progress.NONE).solution().orElseThrow();
		assertTrue(rounded.taps().length >= exact.taps().length);
		assertTrue(rounded.multiplies() <= (rounded.taps().length + 1) / 2);
	}
}
