// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.Adapters;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.Platform;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.RegisterExtension;

import tapwright.core.InputException;
import tapwright.dsp.verify.Verdict;
import tapwright.model.io.ModelFiles;
import tapwright.testing.Samples;
import tapwright.testing.WorkspaceExtension;

class PortfolioProjectTest {

	@RegisterExtension
	private final WorkspaceExtension workspace = new WorkspaceExtension();
	private IProject project;
	private IFile filter;

	@BeforeEach
	void createAPortfolioWithOneFilter() throws CoreException {
		project = workspace.portfolioProject();
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "100"));
		filter = workspace.write(project, "a.filter", Samples.limited("a", "edge", "1"));
	}

	@Test
	void isFoundFromEveryResourceOfAPortfolioAndFromNoOther() throws CoreException {
		assertEquals(new PortfolioProject(project), Adapters.adapt(filter, PortfolioProject.class));
		assertEquals(new PortfolioProject(project), Adapters.adapt(project, PortfolioProject.class));
		IProject plain = ResourcesPlugin.getWorkspace().getRoot().getProject("plain");
		plain.create(null);
		plain.open(null);
		assertNull(Adapters.adapt(plain, PortfolioProject.class));
		PortfolioNature.addTo(plain, null);
		assertTrue(PortfolioProject.of(plain).isPresent());
		plain.close(null);
		assertEquals(Optional.empty(), PortfolioProject.of(plain));
		assertEquals(Optional.empty(), PortfolioProject.of(ResourcesPlugin.getWorkspace().getRoot()));
	}

	@Test
	void hasEvidenceAfterABuildUntilTheContentChanges() throws CoreException {
		assertEquals(Optional.empty(), portfolio().evidence(filter));
		workspace.build(project);
		PresentEvidence present = portfolio().evidence(filter).orElseThrow();
		assertEquals(Verdict.MET, present.evidence().verdict());
		assertFalse(present.stale());
		workspace.write(project, "a.filter", Samples.limited("a", "edge", "-1"));
		assertTrue(portfolio().evidence(filter).orElseThrow().stale());
		workspace.build(project);
		assertFalse(portfolio().evidence(filter).orElseThrow().stale());
		workspace.write(project, ModelFiles.PORTFOLIO_FILE, Samples.portfolio("edge", "200"));
		assertTrue(portfolio().evidence(filter).orElseThrow().stale(), "parameters count, too");
	}

	@Test
	void knowsParametersBeforeTheFirstVerification() throws CoreException, InputException {
		assertEquals(100, portfolio().parameters().value("edge").value().doubleValue());
		workspace.build(project);
		assertEquals(100, portfolio().parameters().value("edge").value().doubleValue());
		assertEquals(List.of("a.filter"), portfolio().state().usersOf("edge"));
	}

	@Test
	void findsPartnersByTheNamesOfTheirFiles() throws InputException {
		assertEquals(1, portfolio().partners().shipped("a").length());
	}

	@Test
	void verifiesInTheBackgroundOnDemandAfterAProjectWasOpened() throws CoreException, InterruptedException {
		var told = new CountDownLatch(1);
		EvidenceListener listener = portfolio -> told.countDown();
		PortfolioProject.addListener(listener);
		try {
			portfolio().ensureVerified();
			assertTrue(told.await(1, TimeUnit.MINUTES));
			assertEquals(1, portfolio().evidence().size());
		} finally {
			PortfolioProject.removeListener(listener);
		}
	}

	@Test
	void listsFilterFilesWithoutHistoryAndHiddenFolders() throws CoreException {
		for (String folder : List.of("deep", "revisions", "baselines", ".hidden")) {
			workspace.write(project, folder + "/b.filter", Samples.unity("b"));
		}
		assertEquals(List.of("a.filter", "deep/b.filter"),
				portfolio().filterFiles().stream().map(file -> file.getProjectRelativePath().toString()).toList());
	}

	@Test
	void givesFilesTheirContentTypes() {
		assertEquals("tapwright.workspace.filter", Platform.getContentTypeManager().findContentTypeFor("a.filter").getId());
		assertEquals("tapwright.workspace.portfolio",
				Platform.getContentTypeManager().findContentTypeFor(ModelFiles.PORTFOLIO_FILE).getId());
	}

	private PortfolioProject portfolio() {
		return PortfolioProject.of(project).orElseThrow();
	}
}
