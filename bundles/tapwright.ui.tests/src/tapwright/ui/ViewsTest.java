// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Table;
import org.eclipse.ui.navigator.CommonNavigator;
import org.eclipse.ui.navigator.resources.ProjectExplorer;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

import tapwright.charts.PlotSvg;
import tapwright.charts.PlotView;
import tapwright.model.GainRequirement;
import tapwright.model.io.ModelFiles;
import tapwright.ui.board.MarginBoard;
import tapwright.ui.response.ResponseView;

@ExtendWith(NoErrorsLogged.class)
class ViewsTest {

	private Sample sample;

	@BeforeEach
	void makeAPortfolioWithAProblem() throws Exception {
		sample = new Sample();
		var filter = Sample.movingAverage();
		((GainRequirement) filter.getRequirements().getFirst()).setMax("-3");
		sample.filter.setContents(ModelFiles.toBytes(filter), true, false, null);
		Ui.waitUntil("the problem", () -> sample.problems() == 1);
	}

	@AfterEach
	void removeThePortfolio() throws Exception {
		sample.close();
	}

	@Test
	void theExplorerSaysWhatWasProvenOfAFilterAndShowsItsRequirements() throws Exception {
		var explorer = (CommonNavigator) Ui.page().showView(ProjectExplorer.VIEW_ID);
		var viewer = explorer.getCommonViewer();
		viewer.setSelection(new StructuredSelection(sample.filter), true);
		Ui.waitUntil("the verdict at the file", () -> viewer.getTree().getSelectionCount() == 1
				&& viewer.getTree().getSelection()[0].getText().contains("1 missed"));
		viewer.expandToLevel(sample.filter, 1);
		String requirement = viewer.getTree().getSelection()[0].getItem(0).getText();
		assertTrue(requirement.startsWith("ceiling: gain from 0 to 4 kHz at most -3 dB"), requirement);
	}

	@Test
	void theMarginBoardHasARowForTheFilterWithItsMargin() throws Exception {
		var board = (MarginBoard) Ui.page().showView(MarginBoard.ID);
		Table table = Ui.all(Ui.page().getWorkbenchWindow().getShell(), Table.class).stream()
				.filter(candidate -> candidate.getColumnCount() > 2 && "Worst margin".equals(candidate.getColumn(2).getText()))
				.findFirst().orElseThrow();
		Ui.waitUntil("the row", () -> table.getItemCount() > 0 && table.getItem(0).getText(0).equals("average"));
		assertEquals("1 missed", table.getItem(0).getText(1));
		assertEquals("−3 dB", table.getItem(0).getText(2)); // the gain is exactly 1 at 0 Hz
		Ui.page().hideView(board);
	}

	@Test
	void theResponseFollowsTheSelectionAndCanBeReadWithoutSeeing() throws Exception {
		var view = (ResponseView) Ui.page().showView(ResponseView.ID);
		var explorer = (CommonNavigator) Ui.page().showView(ProjectExplorer.VIEW_ID);
		explorer.getCommonViewer().setSelection(new StructuredSelection(sample.filter), true);
		PlotView picture = Ui.all(Ui.page().getWorkbenchWindow().getShell(), PlotView.class).getFirst();
		Ui.waitUntil("the curve", () -> picture.plot().curves().size() == 1);
		assertTrue(picture.description().contains("4 coefficients at 8 kHz"), picture.description());
		assertTrue(picture.description().contains("1 missed"), picture.description());
		assertFalse(picture.plot().regions().isEmpty(), "the limit");
		assertEquals(1, picture.plot().marks().size(), "the worst place");
		picture.setCursor(0);
		assertTrue(picture.description().endsWith("average: 0 dB"), picture.description());
		String svg = PlotSvg.write(picture.plot(), picture.window(), 640, 400, new PlotSvg.Palette(new RGB(255, 255, 255),
				new RGB(0, 0, 0), new RGB(200, 200, 200), new RGB(150, 120, 90), new RGB(170, 40, 20), new RGB(0, 114, 178)));
		assertTrue(svg.startsWith("<svg") && svg.contains("<polygon") && svg.contains("4 coefficients"), svg);
		Ui.page().hideView(view);
	}
}
