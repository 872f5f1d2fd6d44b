// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.RegisterExtension;

import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.model.Deployment;
import tapwright.model.Filter;
import tapwright.model.FilterStage;
import tapwright.model.ModelFactory;
import tapwright.model.Portfolio;
import tapwright.model.Processor;
import tapwright.model.Severity;
import tapwright.model.SignalPath;
import tapwright.model.io.ModelFiles;
import tapwright.testing.Samples;
import tapwright.testing.WorkspaceExtension;

class ProblemMarkersTest {

	@RegisterExtension
	private final WorkspaceExtension workspace = new WorkspaceExtension();
	private IProject project;
	private IFile root;

	@BeforeEach
	void makeAPortfolio() throws CoreException {
		project = workspace.portfolioProject();
		root = workspace.write(project, ModelFiles.PORTFOLIO_FILE, ModelFactory.eINSTANCE.createPortfolio());
	}

	@Test
	void givesEveryKindAMarkerTypeOfItsOwn() throws CoreException {
		List<Problem> problems = Arrays.stream(ProblemKind.values())
				.map(kind -> new Problem(kind, Severity.MUST, "", "", kind.code(), "", 0, Optional.empty())).toList();
		ProblemMarkers.replaceAll(root, problems);
		assertEquals(problems.size(), markers(root).length);
		for (IMarker marker : markers(root)) {
			assertTrue(marker.isSubtypeOf(IMarker.PROBLEM), marker.getType());
			assertEquals(ProblemMarkers.type(ProblemMarkers.kind(marker).orElseThrow()), marker.getType());
		}
	}

	@Test
	void marksProcessorsAndPathsAtTheRootFileAndDeploymentsAtTheFilter() throws CoreException {
		IFile filter = workspace.write(project, "first.filter", deployed("board"));
		workspace.build(project);
		assertEquals(List.of("deployment"), codes(filter));
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		Processor processor = ModelFactory.eINSTANCE.createProcessor();
		processor.setName("board");
		processor.setMacRate("1");
		portfolio.getProcessors().add(processor);
		SignalPath path = ModelFactory.eINSTANCE.createSignalPath();
		path.setName("chain");
		path.setSampleRate("1000");
		FilterStage stage = ModelFactory.eINSTANCE.createFilterStage();
		stage.setFilter("gone");
		path.getStages().add(stage);
		portfolio.getPaths().add(path);
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, portfolio);
		workspace.build(project);
		assertEquals(List.of(), codes(filter));
		assertEquals(List.of("overload", "path"), codes(root));
	}

	private static Filter deployed(String processor) {
		Filter filter = Samples.limited("first", "100", "1");
		Deployment deployment = ModelFactory.eINSTANCE.createDeployment();
		deployment.setProcessor(processor);
		filter.getDeployments().add(deployment);
		return filter;
	}

	private static List<String> codes(IFile file) throws CoreException {
		return Arrays.stream(markers(file)).map(marker -> marker.getAttribute(ProblemMarkers.CODE, "")).sorted().toList();
	}

	private static IMarker[] markers(IFile file) throws CoreException {
		return file.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_ZERO);
	}
}
