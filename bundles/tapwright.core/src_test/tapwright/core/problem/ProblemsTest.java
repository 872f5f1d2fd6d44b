// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Severity;

class ProblemsTest {

	@Test
	void saysWhatIsMissedByHowMuchAndAsGravelyAsTheRequirementSays() throws InputException {
		List<Problem> problems = problems("""
				"coefficients": {"values": [2]}, "requirements": [
				  {"id": "must", "kind": "gain", "from": 0, "to": 100, "max": 6},
				  {"id": "met", "kind": "gain", "from": 0, "to": 100, "max": 7},
				  {"id": "should", "severity": "should", "kind": "gain", "from": 0, "to": 100, "max": 5}]""");
		assertEquals(List.of("must", "should"), problems.stream().map(Problem::requirement).toList());
		assertEquals(List.of(Severity.MUST, Severity.SHOULD), problems.stream().map(Problem::severity).toList());
		Problem first = problems.getFirst();
		assertEquals(ProblemKind.MISSED, first.kind());
		assertEquals(Verdict.MISSED, first.evidence().orElseThrow().proof().verdict());
		// 20 log10(2) = 6.0206 dB
		assertTrue(first.message().contains("short by 0.0206 dB"), first.message());
		assertTrue(first.location().startsWith("requirement must at "), first.location());
	}

	@Test
	void speaksOfAFilterThatNothingIsAskedOf() throws InputException {
		Problem problem = problems("\"coefficients\": {\"values\": [1]}").getFirst();
		assertEquals(ProblemKind.EMPTY, problem.kind());
		assertEquals(Severity.SHOULD, problem.severity());
	}

	@Test
	void findsFiltersWithTheSameNameOrIdentity() {
		Map<String, List<Problem>> problems = Duplicates.among(List.of(new Duplicates.Claim("a", "one", "id"),
				new Duplicates.Claim("b", "two", "id"), new Duplicates.Claim("c", "two", ""), new Duplicates.Claim("d", "four", "")));
		assertEquals(Set.of("a", "b", "c"), problems.keySet());
		assertEquals(2, problems.get("b").size());
		assertTrue(problems.get("a").getFirst().message().contains("identity of this filter is also that of b"));
		assertTrue(problems.get("c").getFirst().message().contains("name of this filter is also that of b"));
	}

	@Test
	void givesEachKindItsOwnCode() {
		assertEquals(ProblemKind.values().length, List.of(ProblemKind.values()).stream().map(ProblemKind::code).distinct().count());
	}

	private static List<Problem> problems(String members) throws InputException {
		return Problems.of(FilterQuestion
				.of(FilterJson.read("{\"format\": \"tapwright-filter/1\", \"name\": \"n\", \"sampleRate\": 1000, " + members + "}"),
						Parameters.NONE)
				.answer(Effort.STANDARD));
	}
}
