// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Verdict;
import tapwright.model.io.ModelFiles;

class PortfolioVerifierTest {

	/** A single tap of one has gain 0 dB everywhere: whether this is met depends on the limit alone. */
	private static final String ONE_TAP = "\"sampleRate\": 1000, \"coefficients\": {\"values\": [1]}, ";

	private final MemoryContent content = new MemoryContent();
	private final EvidenceCache cache = new EvidenceCache(EvidenceStore.NONE);
	private final PortfolioVerifier verifier = new PortfolioVerifier(content, cache);
	private VerifiedPortfolio state = VerifiedPortfolio.EMPTY;

	@BeforeEach
	void verifyThreeFilters() throws IOException, InputException {
		content.parameters("low", "100", "high", "2 * low", "unused", "1");
		content.filter("a.filter", limit("low", "0.1"));
		content.filter("b.filter", limit("high", "0.1"));
		content.filter("deep/c.filter", limit("300", "0.1"));
		update(Change.EVERYTHING);
	}

	@Test
	void knowsWhichFiltersUseAParameter() {
		assertEquals(Map.of(), state.problems());
		assertEquals(3, cache.computed());
		assertEquals(List.of("a.filter"), state.usersOf("low"));
		assertEquals(List.of("b.filter"), state.usersOf("high"));
		assertEquals(List.of(), state.usersOf("unused"));
		assertEquals(Verdict.MET, verdict("deep/c.filter"));
	}

	@Test
	void verifiesOnlyTheFilterThatChanged() throws IOException, InputException {
		content.filter("a.filter", limit("low", "-0.1"));
		VerifiedFilter untouched = state.filter("b.filter").orElseThrow();
		change("a.filter");
		assertEquals(4, cache.computed());
		assertEquals(Verdict.MISSED, verdict("a.filter"));
		assertSame(untouched, state.filter("b.filter").orElseThrow());
	}

	@Test
	void verifiesExactlyTheFiltersWhoseParametersHaveOtherValues() throws IOException {
		content.parameters("low", "100", "high", "201", "unused", "7");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(4, cache.computed());
		content.parameters("low", "100.0", "high", "201 * 1", "unused", "7");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(4, cache.computed(), "other words for the same values");
		content.parameters("low", "101", "high", "2 * low", "unused", "7");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(6, cache.computed(), "one of them through another parameter");
	}

	@Test
	void computesNothingWhenNothingChanged() throws IOException {
		update(Change.EVERYTHING);
		update(Change.of(Set.of("a.filter", ModelFiles.PORTFOLIO_FILE), Set.of()));
		assertEquals(3, cache.computed());
	}

	@Test
	void computesNothingForAFileThatMoved() throws IOException, InputException {
		content.filter("a.filter", "\"name\": \"a\", " + limit("low", "-0.1"));
		change("a.filter");
		content.move("a.filter", "deep/other.filter");
		update(Change.of(Set.of("deep/other.filter"), Set.of("a.filter")));
		assertEquals(4, cache.computed());
		assertEquals(List.of(ProblemKind.MISSED), kinds("deep/other.filter"));
		assertEquals(List.of(), kinds("a.filter"));
	}

	@Test
	void looksAgainWhenAMissingParameterAppears() throws IOException, InputException {
		content.filter("a.filter", limit("edge", "0.1"));
		change("a.filter");
		assertEquals(List.of(ProblemKind.INVALID), kinds("a.filter"));
		content.parameters("low", "100", "high", "2 * low", "edge", "50");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(List.of(), kinds("a.filter"));
		content.parameters("low", "100", "high", "2 * low");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(List.of(ProblemKind.INVALID), kinds("a.filter"));
	}

	@Test
	void reportsParametersThatGoRoundInACircle() throws IOException {
		content.parameters("low", "high", "high", "2 * low");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(ProblemKind.PARAMETER, kinds(ModelFiles.PORTFOLIO_FILE).getFirst());
		assertTrue(state.problems(ModelFiles.PORTFOLIO_FILE).getFirst().message().contains("circle"));
		assertEquals(List.of(ProblemKind.INVALID), kinds("a.filter"));
		assertEquals(List.of(), kinds("deep/c.filter"));
	}

	@Test
	void reportsAnUnreadableFileWithLineAndReason() throws IOException {
		content.text("a.filter", "<?xml version=\"1.0\"?>\n<open>\n");
		change("a.filter");
		Problem problem = state.problems("a.filter").getFirst();
		assertEquals(ProblemKind.UNREADABLE, problem.kind());
		assertTrue(problem.line() > 1, problem.toString());
		assertEquals(Verdict.MET, verdict("b.filter"));
	}

	@Test
	void keepsFiltersApartFromAnUnreadableRootFile() throws IOException {
		content.text(ModelFiles.PORTFOLIO_FILE, "no XML");
		change(ModelFiles.PORTFOLIO_FILE);
		assertEquals(List.of(ProblemKind.UNREADABLE), kinds(ModelFiles.PORTFOLIO_FILE));
		assertTrue(state.problems("a.filter").getFirst().message().contains("portfolio.tapwright cannot be read"));
		assertEquals(Verdict.MET, verdict("deep/c.filter"));
	}

	@Test
	void verifiesAFilterAgainWhenItsPartnerChanges() throws IOException, InputException {
		String pair = "\"sampleRate\": 1000, \"requirements\": [{\"id\": \"sum\", \"kind\": \"power-complementary\", "
				+ "\"partner\": \"other\", \"max\": 0.1}], \"coefficients\": {\"values\": [0.5, 0.5]}";
		content.filter("a.filter", pair);
		change("a.filter");
		assertEquals(List.of(ProblemKind.INVALID), kinds("a.filter"), "there is no partner yet");
		content.filter("other.filter", "\"sampleRate\": 1000, \"coefficients\": {\"values\": [0.5, -0.5]}");
		change("other.filter");
		// cos^2 + sin^2 = 1: the half-sum and the half-difference are power complementary
		assertEquals(Verdict.MET, verdict("a.filter"));
		content.filter("other.filter", "\"sampleRate\": 1000, \"coefficients\": {\"values\": [1, -1]}");
		change("other.filter");
		assertEquals(Verdict.MISSED, verdict("a.filter"));
		content.remove("other.filter");
		update(Change.of(Set.of(), Set.of("other.filter")));
		assertEquals(List.of(ProblemKind.INVALID), kinds("a.filter"));
	}

	@Test
	void leavesTheStateAloneWhenCancelledAndGoesOnFromThere() throws IOException, InputException {
		content.filter("a.filter", limit("low", "-0.1"));
		content.filter("b.filter", limit("low", "-0.2"));
		var asked = new AtomicInteger();
		Progress impatient = new Progress() {
			@Override
			public boolean isCancelled() {
				return asked.incrementAndGet() > 1;
			}
		};
		VerifiedPortfolio before = state;
		Change both = Change.of(Set.of("a.filter", "b.filter"), Set.of());
		assertThrows(CancellationException.class, () -> verifier.update(before, both, impatient));
		assertEquals(Verdict.MET, verdict("a.filter"));
		update(both);
		assertEquals(List.of(Verdict.MISSED, Verdict.MISSED), List.of(verdict("a.filter"), verdict("b.filter")));
	}

	@Test
	void callsAFilterWithoutANameLikeItsFile() {
		assertEquals("c", state.filter("deep/c.filter").orElseThrow().name());
	}

	private static String limit(String to, String max) {
		return ONE_TAP + "\"requirements\": [{\"id\": \"gain\", \"kind\": \"gain\", \"from\": 0, \"to\": \"" + to + "\", \"max\": "
				+ max + "}]";
	}

	private void change(String path) throws IOException {
		update(Change.of(Set.of(path), Set.of()));
	}

	private void update(Change change) throws IOException {
		state = verifier.update(state, change, Progress.NONE);
	}

	private Verdict verdict(String path) {
		return state.filter(path).orElseThrow().evidence().orElseThrow().verdict();
	}

	private List<ProblemKind> kinds(String path) {
		return state.problems(path).stream().map(Problem::kind).toList();
	}
}
