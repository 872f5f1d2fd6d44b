// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.design.Designer;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;

class RemediesTest {

	@Test
	void offersALongerWordAnotherDesignAndTheAchievedLimit() throws Exception {
		Filter filter = filter(12);
		assertEquals(Verdict.MISSED, verdict(filter, "stop"));
		Map<Remedy.Kind, Remedy> remedies = Remedies.of(filter, Expression.Names.NONE, "stop", Progress.NONE).stream()
				.collect(Collectors.toMap(Remedy::kind, Function.identity()));
		assertTrue(remedies.containsKey(Remedy.Kind.LONGER_WORD) && remedies.containsKey(Remedy.Kind.RELAXED_LIMIT),
				remedies.toString());
		for (Remedy remedy : remedies.values()) {
			assertEquals(Verdict.MET, remedy.outcome().find("stop").orElseThrow().proof().verdict());
		}
		assertEquals(Verdict.MISSED, verdict(filter, "stop"), "looking must not change anything");
	}

	@Test
	void givesTheSmallestWordThatIsProven() throws Exception {
		Filter filter = filter(10);
		Remedy remedy = Remedies.of(filter, Expression.Names.NONE, "stop", Progress.NONE).getFirst();
		assertEquals(Remedy.Kind.LONGER_WORD, remedy.kind());
		remedy.apply();
		assertEquals(Verdict.MET, verdict(filter, "stop"));
		int word = Integer.parseInt(filter.getArithmetic().getCoefficient().getWord());
		for (int shorter = 10; shorter < word; shorter++) {
			assertEquals(Verdict.MISSED, verdict(filter(shorter), "stop"));
		}
	}

	@Test
	void roundsTheAchievedLimitOutward() throws Exception {
		Filter filter = filter(10);
		Remedy remedy = Remedies.of(filter, Expression.Names.NONE, "stop", Progress.NONE).getLast();
		assertEquals(Remedy.Kind.RELAXED_LIMIT, remedy.kind());
		remedy.apply();
		assertEquals(Verdict.MET, verdict(filter, "stop"));
		double margin = remedy.outcome().find("stop").orElseThrow().proof().margin().hi();
		assertTrue(margin < 1.1, "margin " + margin);
	}

	@Test
	void hasNothingToOfferForWhatIsMet() throws Exception {
		assertEquals(List.of(), Remedies.of(filter(24), Expression.Names.NONE, "stop", Progress.NONE));
	}

	private static Verdict verdict(Filter filter, String id) {
		return FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD).find(id).orElseThrow().proof().verdict();
	}

	private static Filter filter(int word) throws Exception {
		Filter filter = read(word);
		filter.setCoefficients(Designer.of(filter, Expression.Names.NONE).orElseThrow().run(Progress.NONE).coefficients());
		return filter;
	}

	private static Filter read(int word) throws InputException {
		return FilterJson.read("""
				{"format": "tapwright-filter/1", "name": "x", "sampleRate": 48000,
				 "requirements": [{"id": "pass", "kind": "gain", "from": 0, "to": 6000, "min": -0.1, "max": 0.1},
				   {"id": "stop", "kind": "gain", "from": 9000, "to": 24000, "max": -60}],
				 "design": {"method": "equiripple", "taps": 55},
				 "arithmetic": {"structure": "folded", "coefficient": {"word": WORD, "fraction": WORD}}}
				""".replace("WORD", String.valueOf(word)));
	}
}
