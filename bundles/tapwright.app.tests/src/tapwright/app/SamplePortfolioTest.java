// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Arrays;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.Test;

import tapwright.dsp.verify.Verdict;
import tapwright.ui.editor.FilterEditor;
import tapwright.workspace.PortfolioProject;
import tapwright.workspace.ProblemMarkers;

/** The first start with the sample workspace, as releng/tapwright does it. */
class SamplePortfolioTest {

	@Test
	void theFirstStartOpensThePortfolioInPlaceAndAFilterThatMissesARequirement() throws Exception {
		IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject("marram");
		Waiting.until("the portfolio", project::isOpen);
		assertTrue(project.getLocation().toPath().endsWith(Path.of("sample-workspace", "marram")), project.getLocation().toString());
		Waiting.until("the evidence", () -> PortfolioProject.of(project).filter(found -> !found.evidence().isEmpty()).isPresent());
		int problems = project.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_INFINITE).length;
		assertTrue(problems >= 2, problems + " problems");
		IWorkbenchPage page = PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
		Waiting.until("an editor on a filter that misses a requirement", () -> Arrays.stream(page.getEditorReferences())
				.anyMatch(reference -> reference.getEditor(false) instanceof FilterEditor editor && misses(editor)));
	}

	private static boolean misses(FilterEditor editor) {
		return editor.proof().latest().filter(proven -> proven.evidence().verdict() == Verdict.MISSED).isPresent();
	}
}
