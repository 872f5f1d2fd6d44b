// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

import tapwright.core.load.ProcessorLoad;
import tapwright.core.load.Resource;
import tapwright.core.portfolio.FolderContent;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Verdict;
import tapwright.model.io.ModelFiles;

/** Processors and the signal path of the demo portfolio. */
class SamplePathTest {

	private static VerifiedPortfolio state;

	@BeforeAll
	static void verify() throws IOException {
		state = new PortfolioVerifier(new FolderContent(marram()), new EvidenceCache(EvidenceStore.NONE))
				.update(VerifiedPortfolio.EMPTY, Change.EVERYTHING, Progress.NONE);
	}

	// SciPy 1.17.1, signal.freqz of each stage at its own rate, multiplied, on 200001 points of each band:
	// 0.029800012520945 dB at 2185.1 Hz, and 74.700177736140 dB at 172 kHz.
	@Test
	void provesTheHydrophoneChainAsAGeneralPurposeLibraryEvaluatesIt() {
		FilterEvidence evidence = state.paths().getFirst().evidence().orElseThrow();
		assertEquals(Verdict.MET, evidence.verdict());
		Proof pass = evidence.find("pass").orElseThrow().proof();
		assertEquals(0.029800012520945, pass.value().middle(), 1e-9);
		assertEquals(2185.1, pass.worst(), 0.1);
		Proof alias = evidence.find("alias").orElseThrow().proof();
		assertEquals(74.700177736140, alias.value().middle(), 1e-9);
		assertEquals(172_000, alias.worst(), 1e-6);
	}

	@Test
	void hasOneProcessorThatIsALittleOverloadedAndNoOtherProblemOfItsOwn() {
		assertEquals(List.of(ProblemKind.OVERLOAD),
				state.problems(ModelFiles.PORTFOLIO_FILE).stream().map(Problem::kind).toList());
		ProcessorLoad microcontroller = state.loads().getFirst();
		assertEquals(1.014, microcontroller.used(Resource.MULTIPLY_ACCUMULATES)
				/ microcontroller.available(Resource.MULTIPLY_ACCUMULATES).orElseThrow(), 1e-3);
	}

	@Test
	void hasOneDesignThatIsOlderThanTheSensor() {
		var stale = new TreeSet<String>();
		state.problems().forEach((file, problems) -> problems.stream().filter(problem -> problem.kind() == ProblemKind.STALE)
				.forEach(problem -> stale.add(file)));
		assertEquals(List.of("wave-antialias.filter"), List.copyOf(stale));
	}

	private static Path marram() {
		Path folder = Path.of("").toAbsolutePath();
		while (!Files.isDirectory(folder.resolve("sample-workspace"))) {
			folder = folder.getParent();
		}
		return folder.resolve("sample-workspace/marram");
	}
}
