// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.navigator.CommonNavigator;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

import tapwright.ui.board.MarginBoard;
import tapwright.ui.editor.FilterEditor;
import tapwright.ui.response.ResponseView;
import tapwright.ui.wizard.NewFilterWizard;
import tapwright.workspace.PortfolioProject;

/** Walks through the window in both themes and leaves a picture of every screen in the folder of the property tapwright.screens. */
class ScreensTest {

	private static final String LIGHT = "org.eclipse.e4.ui.css.theme.e4_default";
	private static final String DARK = "org.eclipse.e4.ui.css.theme.e4_dark";
	private static final int DRAWING_MS = 700;
	private static final int FEWEST_COLORS = 60;

	private final IWorkbenchPage page = PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
	private final Shell window = page.getWorkbenchWindow().getShell();

	@AfterEach
	void backToLight() {
		theme(LIGHT);
	}

	@Test
	void everyScreenIsDrawnInBothThemesWithoutAnErrorDialog() throws Exception {
		IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject("marram");
		Waiting.until("the portfolio", project::isOpen);
		Waiting.until("the evidence", () -> PortfolioProject.of(project).filter(found -> !found.evidence().isEmpty()).isPresent());
		window.setBounds(0, 0, 1600, 1000);
		((CommonNavigator) page.showView("org.eclipse.ui.navigator.ProjectExplorer")).getCommonViewer().expandToLevel(project, 1);
		for (String theme : List.of(LIGHT, DARK)) {
			page.closeAllEditors(false); // what is open keeps some colours of the theme before
			theme(theme);
			walk(project, theme.equals(DARK) ? "dark" : "light");
		}
	}

	private void theme(String id) {
		IThemeEngine engine = PlatformUI.getWorkbench().getService(IThemeEngine.class);
		if (engine.getActiveTheme() == null || !engine.getActiveTheme().getId().equals(id)) {
			engine.setTheme(id, false);
			Waiting.forDrawing(DRAWING_MS);
		}
	}

	private void walk(IProject project, String name) throws Exception {
		page.showView(IPageLayout.ID_PROBLEM_VIEW);
		var editor = (FilterEditor) IDE.openEditor(page, project.getFile("strain-antialias.filter"));
		Waiting.until("its proof", () -> editor.proof().latest().filter(proven -> !proven.stale()).isPresent());
		for (String id : List.of("filter", "requirements", "coefficients", "arithmetic")) {
			editor.setActivePage(id);
			picture(name + "-" + id);
		}
		page.showView(MarginBoard.ID);
		page.activate(editor);
		editor.showEvidence("stop");
		picture(name + "-evidence-and-margin-board");
		page.showView(ResponseView.ID);
		page.activate(editor);
		editor.showRequirement("stop");
		picture(name + "-requirements-and-response");
		IDE.openEditor(page, PortfolioProject.of(project).orElseThrow().portfolioFile());
		picture(name + "-portfolio");
		wizard(project, name);
	}

	private void wizard(IProject project, String name) throws IOException {
		var wizard = new NewFilterWizard();
		wizard.init(PlatformUI.getWorkbench(), new StructuredSelection(project));
		var dialog = new WizardDialog(window, wizard);
		dialog.setBlockOnOpen(false);
		dialog.open();
		picture(name + "-new-filter");
		dialog.close();
	}

	private void picture(String name) throws IOException {
		Waiting.forDrawing(DRAWING_MS);
		long dialogs = List.of(Display.getCurrent().getShells()).stream().filter(Shell::isVisible)
				.filter(shell -> shell != window && !name.endsWith("-new-filter")).count();
		assertEquals(0, dialogs, "dialogs over " + name);
		Rectangle area = window.getBounds();
		var image = new Image(Display.getCurrent(), area.width, area.height);
		var gc = new GC(Display.getCurrent());
		try {
			gc.copyArea(image, area.x, area.y);
			ImageData data = image.getImageData();
			assertTrue(colors(data) >= FEWEST_COLORS, name + " is empty");
			save(data, name);
		} finally {
			gc.dispose();
			image.dispose();
		}
	}

	private static int colors(ImageData data) {
		Set<Integer> found = new HashSet<>();
		for (int y = 0; y < data.height; y += 3) {
			for (int x = 0; x < data.width; x += 3) {
				found.add(data.getPixel(x, y));
			}
		}
		return found.size();
	}

	private static void save(ImageData data, String name) throws IOException {
		String folder = System.getProperty("tapwright.screens");
		if (folder == null) {
			return;
		}
		Files.createDirectories(Path.of(folder));
		var loader = new ImageLoader();
		loader.data = new ImageData[] { data };
		loader.save(Path.of(folder, name + ".png").toString(), SWT.IMAGE_PNG);
	}
}
