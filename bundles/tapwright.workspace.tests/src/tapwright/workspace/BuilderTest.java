// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.jobs.Job;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.RegisterExtension;

import tapwright.core.problem.ProblemKind;
import tapwright.model.Filter;
import tapwright.model.Severity;
import tapwright.model.io.ModelFiles;
import tapwright.testing.Samples;
import tapwright.testing.WorkspaceExtension;
import tapwright.workspace.internal.ProjectVerification;

class BuilderTest {

	@RegisterExtension
	private final WorkspaceExtension workspace = new WorkspaceExtension();
	private IProject project;
	private IFile first;
	private IFile second;

	@BeforeEach
	void buildAPortfolioThatMeetsEverything() throws CoreException {
		project = workspace.portfolioProject();
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "100", "far", "400"));
		first = workspace.write(project, "first.filter", Samples.limited("first", "edge", "1"));
		second = workspace.write(project, "deep/second.filter", Samples.limited("second", "far", "1"));
		workspace.build(project);
		assertEquals(List.of(), problems());
		assertEquals(2, computed());
	}

	@Test
	void marksAMissedRequirementAndUnmarksItWhenItIsMet() throws CoreException {
		save(first, "-0.5");
		IMarker marker = onlyMarker(first);
		assertEquals("tapwright.workspace.missed", marker.getType());
		assertTrue(marker.isSubtypeOf(ProblemMarkers.TYPE) && marker.isSubtypeOf(IMarker.PROBLEM));
		assertEquals(IMarker.SEVERITY_ERROR, marker.getAttribute(IMarker.SEVERITY, -1));
		assertEquals("first", marker.getAttribute(ProblemMarkers.FILTER, ""));
		assertEquals(Samples.LIMIT, marker.getAttribute(ProblemMarkers.REQUIREMENT, ""));
		assertEquals("gain", marker.getAttribute(ProblemMarkers.REQUIREMENT_KIND, ""));
		assertEquals("MISSED", marker.getAttribute(ProblemMarkers.VERDICT, ""));
		assertEquals("Hz", marker.getAttribute(ProblemMarkers.WORST_UNIT, ""));
		assertTrue(marker.getAttribute(IMarker.LOCATION, "").startsWith("requirement limit"));
		assertTrue(marker.getAttribute(IMarker.MESSAGE, "").contains("short by 0.5 dB"), marker.getAttribute(IMarker.MESSAGE, ""));
		// 0 dB against a limit of -0.5 dB
		assertTrue(ProblemMarkers.number(marker, ProblemMarkers.MARGIN_LOW) <= -0.5);
		assertTrue(ProblemMarkers.number(marker, ProblemMarkers.MARGIN_HIGH) >= -0.5);
		assertEquals(ProblemKind.MISSED, ProblemMarkers.kind(marker).orElseThrow());
		save(first, "0.5");
		assertEquals(List.of(), problems());
		assertFalse(marker.exists());
	}

	@Test
	void warnsWhereARequirementSaysShould() throws CoreException {
		Filter filter = Samples.limited("first", "edge", "-1");
		filter.getRequirements().getFirst().setSeverity(Severity.SHOULD);
		workspace.write(project, "first.filter", filter);
		workspace.build(project);
		assertEquals(IMarker.SEVERITY_WARNING, onlyMarker(first).getAttribute(IMarker.SEVERITY, -1));
	}

	@Test
	void leavesAMarkerThatStillHoldsAsItIs() throws CoreException {
		Filter filter = Samples.limited("first", "edge", "-1");
		workspace.write(project, "first.filter", filter);
		workspace.build(project);
		long id = onlyMarker(first).getId();
		filter.setPurpose("another one");
		workspace.write(project, "first.filter", filter);
		workspace.build(project);
		assertEquals(id, onlyMarker(first).getId());
		assertEquals(4, computed());
	}

	@Test
	void verifiesAgainExactlyTheFiltersThatUseAChangedParameter() throws CoreException {
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "100", "far", "600"));
		workspace.build(project);
		assertEquals(3, computed());
		assertEquals(List.of(), problems(first));
		assertEquals(List.of("invalid"), problems(second), "the band ends above half the sample rate");
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "101", "far", "400"));
		workspace.build(project);
		assertEquals(4, computed(), "the second filter has its former evidence again");
		assertEquals(List.of(), problems());
	}

	@Test
	void reportsAnUnreadableFilterWithLineAndReasonAndLeavesItAlone() throws CoreException, IOException {
		byte[] text = "<?xml version=\"1.0\"?>\n<open>\n\n".getBytes(StandardCharsets.UTF_8);
		workspace.write(project, "first.filter", text);
		workspace.build(project);
		IMarker marker = onlyMarker(first);
		assertEquals("tapwright.workspace.unreadable", marker.getType());
		assertEquals(IMarker.SEVERITY_ERROR, marker.getAttribute(IMarker.SEVERITY, -1));
		assertTrue(marker.getAttribute(IMarker.LINE_NUMBER, 0) >= 2);
		assertTrue(marker.getAttribute(IMarker.MESSAGE, "").startsWith("the file cannot be read: "));
		assertArrayEquals(text, Files.readAllBytes(first.getLocation().toPath()));
		save(first, "1");
		assertEquals(List.of(), problems());
	}

	@Test
	void reportsAnUnreadableRootFileAndParametersWithoutValue() throws CoreException {
		IFile root = project.getFile(ModelFiles.PORTFOLIO_FILE);
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, "no XML".getBytes(StandardCharsets.UTF_8));
		workspace.build(project);
		assertEquals(List.of("unreadable"), problems(root));
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "far", "far", "edge"));
		workspace.build(project);
		assertEquals(List.of("parameter", "parameter"), problems(root));
		assertEquals(List.of("invalid"), problems(first));
	}

	@Test
	void reportsTwoFiltersWithTheSameIdentityUntilOneGetsItsOwn() throws CoreException {
		first.copy(project.getFile("copy.filter").getFullPath(), true, null);
		workspace.build(project);
		IFile copy = project.getFile("copy.filter");
		assertEquals(List.of("duplicate", "duplicate"), problems(first), "identity and name");
		assertEquals(List.of("duplicate", "duplicate"), problems(copy));
		assertEquals(2, computed(), "the same content has the same evidence");
		workspace.write(project, "copy.filter", Samples.limited("copy", "edge", "1"));
		workspace.build(project);
		assertEquals(List.of(), problems());
	}

	@Test
	void keepsMarkersWithFilesThatAreRenamedMovedOrDeleted() throws CoreException {
		save(first, "-1");
		int before = computed();
		first.move(project.getFile("renamed.filter").getFullPath(), true, null);
		workspace.build(project);
		assertEquals(List.of("missed"), problems(project.getFile("renamed.filter")));
		project.getFile("renamed.filter").move(project.getFile("deep/moved.filter").getFullPath(), true, null);
		workspace.build(project);
		assertEquals(List.of("missed"), problems(project.getFile("deep/moved.filter")));
		project.getFolder("deep").move(project.getFullPath().append("deeper"), true, null);
		workspace.build(project);
		assertEquals(List.of("missed"), problems());
		assertEquals(before, computed());
		project.getFolder("deeper").move(project.getFullPath().append("revisions"), true, null);
		workspace.build(project);
		assertEquals(List.of(), problems(), "history is no present filter");
		assertEquals(List.of(), PortfolioProject.of(project).orElseThrow().evidence());
		project.getFolder("revisions").delete(true, null);
		workspace.build(project);
		assertEquals(List.of(), problems());
	}

	@Test
	void seesWhatChangedOnDiskAfterARefresh() throws CoreException, IOException {
		Files.write(first.getLocation().toPath(), ModelFiles.toBytes(Samples.limited("first", "edge", "-1")));
		Files.delete(second.getLocation().toPath());
		workspace.refresh(project);
		workspace.build(project);
		assertEquals(List.of("missed"), problems());
		assertEquals(1, PortfolioProject.of(project).orElseThrow().evidence().size());
	}

	@Test
	void computesNothingAfterCleanNorAfterCloseAndReopen() throws CoreException {
		save(first, "-1");
		workspace.cleanBuild(project);
		assertEquals(3, computed());
		assertEquals(List.of("missed"), problems());
		project.close(null);
		project.open(null);
		assertEquals(List.of("missed"), problems(), "markers are kept");
		workspace.cleanBuild(project);
		assertEquals(0, computed(), "counted since opening");
		assertEquals(List.of("missed"), problems());
	}

	@Test
	void keepsEvidenceWhereVersionControlAndTheWorkspaceKnowThatItIsDerived() throws CoreException {
		assertTrue(project.getFolder(ProjectVerification.DERIVED_FOLDER).isDerived());
		assertTrue(project.getFile(ProjectVerification.DERIVED_FOLDER + "/.gitignore").exists());
		project.move(project.getFullPath().removeLastSegments(1).append(project.getName() + "-moved"), false, null);
		assertFalse(project.exists(), "a folder out of step with the disk would have prevented the move");
	}

	@Test
	void stopsWhenCancelledAndMakesUpForItAtTheNextBuild() throws CoreException {
		workspace.write(project, "first.filter", Samples.limited("first", "edge", "-1"));
		var monitor = new NullProgressMonitor();
		monitor.setCanceled(true);
		assertThrows(OperationCanceledException.class,
				() -> project.build(IncrementalProjectBuilder.INCREMENTAL_BUILD, monitor));
		assertEquals(List.of(), problems());
		workspace.build(project);
		assertEquals(List.of("missed"), problems());
		assertEquals(3, computed());
	}

	@Test
	void verifiesInTheBackgroundWhenFilesAreSaved() throws CoreException, InterruptedException {
		workspace.setAutoBuilding(true);
		workspace.write(project, "first.filter", Samples.limited("first", "edge", "-1"));
		Job.getJobManager().join(ResourcesPlugin.FAMILY_AUTO_BUILD, null);
		assertEquals(List.of("missed"), problems());
	}

	@Test
	void verifiesEachFilterOnceHoweverOftenSavesInterruptTheBuild() throws CoreException, InterruptedException {
		workspace.setAutoBuilding(true);
		for (int k = 0; k < 100; k++) {
			workspace.write(project, "more/f" + k + ".filter", Samples.limited("f" + k, "edge", "-1"));
		}
		Job.getJobManager().join(ResourcesPlugin.FAMILY_AUTO_BUILD, null);
		assertEquals(100, problems().size());
		assertEquals(102, computed());
	}

	@Test
	void tellsListenersOnceForEachBuildThatVerifiedSomething() throws CoreException {
		var told = new AtomicInteger();
		EvidenceListener listener = portfolio -> told.incrementAndGet();
		PortfolioProject.addListener(listener);
		try {
			save(first, "-1");
			assertEquals(1, told.get());
			workspace.write(project, "notes.txt", new byte[] { 'x' });
			workspace.build(project);
			assertEquals(1, told.get());
		} finally {
			PortfolioProject.removeListener(listener);
		}
		save(first, "-2");
		assertEquals(1, told.get());
	}

	private void save(IFile file, String max) throws CoreException {
		workspace.write(project, file.getProjectRelativePath().toString(), Samples.limited("first", "edge", max));
		workspace.build(project);
	}

	private int computed() {
		return (int) ProjectVerification.of(project).computed();
	}

	private static IMarker onlyMarker(IFile file) throws CoreException {
		IMarker[] markers = file.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_ZERO);
		assertEquals(1, markers.length);
		return markers[0];
	}

	private List<String> problems() throws CoreException {
		return problems(project);
	}

	private static List<String> problems(IResource resource) throws CoreException {
		return Stream.of(resource.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_INFINITE))
				.map(marker -> marker.getAttribute(ProblemMarkers.CODE, "")).toList();
	}
}
