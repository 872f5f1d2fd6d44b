// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.load.Resource;
import tapwright.core.path.VerifiedPath;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Verdict;
import tapwright.model.AliasRejectionRequirement;
import tapwright.model.Decimation;
import tapwright.model.FilterStage;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.Processor;
import tapwright.model.SignalPath;
import tapwright.model.TapsRequirement;
import tapwright.model.io.ModelFiles;

class PortfolioWideTest {

	private final MemoryContent content = new MemoryContent();
	private final EvidenceCache cache = new EvidenceCache(EvidenceStore.NONE);
	private final PortfolioVerifier verifier = new PortfolioVerifier(content, cache);
	private VerifiedPortfolio state = VerifiedPortfolio.EMPTY;

	// Means of two: |cos(pi f / rate)|, exactly 0 at half the rate. Two of them, at 1000 Hz and after one of two is kept at 500 Hz.
	@BeforeEach
	void verifyAChain() throws IOException, InputException {
		root(portfolio -> {
		});
		mean("a", 1000, "");
		mean("b", 500, "");
		update(Change.EVERYTHING);
	}

	@Test
	void provesTheWholeChainAndAllThatFolds() {
		assertEquals(List.of(), state.problems(ModelFiles.PORTFOLIO_FILE));
		VerifiedPath path = state.paths().getFirst();
		assertEquals(List.of(1000., 1000., 500., 500.), path.rates());
		assertEquals(Verdict.MET, path.evidence().orElseThrow().verdict());
		// cos(pi 100 / 1000) cos(pi 100 / 500) = 0.76942..., that is -2.277 dB
		double worst = path.evidence().orElseThrow().find("pass").orElseThrow().proof().value().middle();
		assertEquals(20 * Math.log10(Math.cos(Math.PI / 10) * Math.cos(Math.PI / 5)), worst, 1e-9);
		// Folded from 490 Hz to 10 Hz: cos(pi 490 / 1000) cos(pi 490 / 500)
		double rejection = path.evidence().orElseThrow().find("alias").orElseThrow().proof().value().middle();
		assertEquals(-20 * Math.log10(Math.cos(Math.PI * 0.49) * Math.abs(Math.cos(Math.PI * 0.98))), rejection, 1e-9);
	}

	@Test
	void saysWhatThePathMissesByHowMuch() throws IOException {
		changeRoot(portfolio -> ((GainRequirement) portfolio.getPaths().getFirst().getRequirements().getFirst()).setMin("-2"));
		Problem problem = only();
		assertEquals(ProblemKind.PATH, problem.kind());
		assertEquals("pass", problem.requirement());
		assertTrue(problem.message().startsWith("path chain: pass: gain from 0 to 100 Hz at least -2 dB: -2.277 dB"), problem.message());
	}

	@Test
	void verifiesAPathOnlyWhenItOrOneOfItsFiltersChanged() throws IOException, InputException {
		VerifiedPath before = state.paths().getFirst();
		mean("other", 500, "");
		change("other.filter");
		assertSame(before, state.paths().getFirst());
		content.filter("b.filter", "\"name\": \"b\", \"sampleRate\": 500, \"coefficients\": {\"values\": [0.25, 0.25]}");
		change("b.filter");
		assertEquals("pass", only().requirement());
		content.remove("b.filter");
		update(Change.of(Set.of(), Set.of("b.filter")));
		assertTrue(only().message().contains("no filter 'b'"), only().message());
	}

	@Test
	void computesNothingForAPathThatIsKnown() throws IOException {
		long computed = cache.computed();
		update(Change.EVERYTHING);
		assertEquals(computed, cache.computed());
	}

	@Test
	void noticesAFilterThatIsMeantForAnotherRate() throws IOException, InputException {
		mean("b", 400, "");
		change("b.filter");
		assertTrue(only().message().contains("'b' is meant for 400 Hz, but runs at 500 Hz here"), only().message());
		assertTrue(state.paths().getFirst().rates().isEmpty());
	}

	@Test
	void wantsToHearWhatMayFold() throws IOException {
		changeRoot(portfolio -> portfolio.getPaths().getFirst().getRequirements().removeLast());
		assertTrue(only().message().contains("no alias rejection by that factor"), only().message());
	}

	@Test
	void refusesWhatCannotBeAskedOfAPath() throws IOException {
		changeRoot(portfolio -> {
			TapsRequirement taps = ModelFactory.eINSTANCE.createTapsRequirement();
			taps.setId("taps");
			taps.setMax("5");
			portfolio.getPaths().getFirst().getRequirements().add(taps);
		});
		assertTrue(only().message().contains("can be asked of a filter only"), only().message());
		changeRoot(portfolio -> ((AliasRejectionRequirement) portfolio.getPaths().getFirst().getRequirements().getLast())
				.setFactor("4"));
		assertTrue(state.problems(ModelFiles.PORTFOLIO_FILE).stream()
				.anyMatch(problem -> problem.message().contains("does not keep one of 4 samples")));
	}

	@Test
	void sumsUpProcessorsAndFindsOverload() throws IOException, InputException {
		mean("a", 1000, "\"deployments\": [{\"processor\": \"p\", \"channels\": \"channels\"}], ");
		changeRoot(portfolio -> addParameter(portfolio, "2"));
		update(Change.EVERYTHING);
		assertEquals(4000, state.loads().getFirst().used(Resource.MULTIPLY_ACCUMULATES), "2 channels, 2 taps, 1000 Hz");
		assertEquals(List.of(), state.problems(ModelFiles.PORTFOLIO_FILE));
		changeRoot(portfolio -> addParameter(portfolio, "3"));
		assertEquals(ProblemKind.OVERLOAD, only().kind());
		assertEquals(List.of("a.filter"), state.usersOf("channels"));
	}

	@Test
	void showsAnUnknownProcessorAtTheFilterUntilThereIsOne() throws IOException, InputException {
		mean("a", 1000, "\"deployments\": [{\"processor\": \"q\"}], ");
		change("a.filter");
		assertEquals(List.of(ProblemKind.DEPLOYMENT), state.problems("a.filter").stream().map(Problem::kind).toList());
		changeRoot(portfolio -> portfolio.getProcessors().getFirst().setName("q"));
		assertEquals(List.of(), state.problems("a.filter"));
	}

	private void mean(String name, int rate, String more) throws InputException {
		content.filter(name + ".filter", "\"name\": \"" + name + "\", \"sampleRate\": " + rate + ", " + more
				+ "\"requirements\": [{\"id\": \"dc\", \"kind\": \"gain\", \"from\": 0, \"to\": 0, \"min\": 0, \"max\": 0}], "
				+ "\"coefficients\": {\"values\": [0.5, 0.5]}");
	}

	private void changeRoot(Consumer<Portfolio> change) throws IOException {
		root(change);
		change(ModelFiles.PORTFOLIO_FILE);
	}

	private void root(Consumer<Portfolio> change) {
		ModelFactory factory = ModelFactory.eINSTANCE;
		Portfolio portfolio = factory.createPortfolio();
		Processor processor = factory.createProcessor();
		processor.setName("p");
		processor.setMacRate("5000");
		portfolio.getProcessors().add(processor);
		SignalPath path = factory.createSignalPath();
		path.setName("chain");
		path.setSampleRate("1000");
		Decimation decimation = factory.createDecimation();
		decimation.setFactor("2");
		path.getStages().addAll(List.of(stage("a"), decimation, stage("b")));
		GainRequirement pass = factory.createGainRequirement();
		pass.setId("pass");
		pass.setFrom("0");
		pass.setTo("100");
		pass.setMin("-2.3");
		AliasRejectionRequirement alias = factory.createAliasRejectionRequirement();
		alias.setId("alias");
		alias.setFactor("2");
		alias.setTo("10");
		alias.setMin("30");
		path.getRequirements().addAll(List.of(pass, alias));
		portfolio.getPaths().add(path);
		change.accept(portfolio);
		content.text(ModelFiles.PORTFOLIO_FILE, new String(ModelFiles.toBytes(portfolio), StandardCharsets.UTF_8));
	}

	private static FilterStage stage(String name) {
		FilterStage stage = ModelFactory.eINSTANCE.createFilterStage();
		stage.setFilter(name);
		return stage;
	}

	private static void addParameter(Portfolio portfolio, String value) {
		Parameter parameter = ModelFactory.eINSTANCE.createParameter();
		parameter.setName("channels");
		parameter.setValue(value);
		portfolio.getParameters().add(parameter);
	}

	private Problem only() {
		List<Problem> problems = state.problems(ModelFiles.PORTFOLIO_FILE);
		assertEquals(1, problems.size(), problems::toString);
		return problems.getFirst();
	}

	private void change(String path) throws IOException {
		update(Change.of(Set.of(path), Set.of()));
	}

	private void update(Change change) throws IOException {
		state = verifier.update(state, change, Progress.NONE);
	}
}
