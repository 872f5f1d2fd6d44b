// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Parameters;
import tapwright.model.Severity;

class ContradictionsTest {

	private static final String PASS = "{\"id\": \"pass\", \"kind\": \"gain\", \"from\": 0, \"to\": 100, \"min\": -1}";

	@Test
	void namesTheTwoLimitsAndTheFrequencyWhereTheyClash() throws InputException {
		List<Problem> problems = problems(PASS, "{\"id\": \"stop\", \"kind\": \"gain\", \"from\": 90, \"to\": 500, \"max\": -40}");
		assertEquals(1, problems.size());
		assertEquals("'pass' asks for at least -1 dB at 100 Hz, where 'stop' allows at most -40 dB; no filter meets both",
				problems.getFirst().message());
		assertEquals(Severity.MUST, problems.getFirst().severity());
	}

	@Test
	void isNoErrorWhenOneOfThemIsOnlyAWish() throws InputException {
		assertEquals(Severity.SHOULD, problems(PASS,
				"{\"id\": \"stop\", \"severity\": \"should\", \"kind\": \"gain\", \"from\": 90, \"to\": 500, \"max\": -40}").getFirst()
				.severity());
	}

	@Test
	void findsNothingWhereLimitsTouchOrLieApart() throws InputException {
		assertEquals(List.of(), problems(PASS, "{\"id\": \"a\", \"kind\": \"gain\", \"from\": 0, \"to\": 100, \"max\": -1}"));
		assertEquals(List.of(), problems(PASS, "{\"id\": \"a\", \"kind\": \"gain\", \"from\": 101, \"to\": 500, \"max\": -40}"));
	}

	@Test
	void comparesLevelsOnASlope() throws InputException {
		String slope = "{\"id\": \"slope\", \"kind\": \"gain\", \"side\": \"max\", \"points\": [[50, %s], [150, %s]]}";
		// Half-way between the ends, at 100 Hz, the line is at -1.5 dB or at -0.5 dB.
		assertEquals(1, problems(PASS, slope.formatted("9", "-12")).size());
		assertEquals(List.of(), problems(PASS, slope.formatted("9", "-10")));
	}

	@Test
	void doesNotCompareLimitsThatMeanDifferentThingsByZero() throws InputException {
		assertEquals(List.of(), problems(PASS,
				"{\"id\": \"a\", \"kind\": \"gain\", \"from\": 90, \"to\": 500, \"max\": -40, \"referenceAt\": 0}"));
	}

	private static List<Problem> problems(String... requirements) throws InputException {
		return Contradictions.of(FilterJson.read("{\"format\": \"tapwright-filter/1\", \"name\": \"n\", \"sampleRate\": 1000, "
				+ "\"requirements\": [" + String.join(",", requirements) + "]}"), "n", new Numbers(Parameters.NONE));
	}
}
