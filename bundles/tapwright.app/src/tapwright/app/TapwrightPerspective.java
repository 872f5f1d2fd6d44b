// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.ui.IFolderLayout;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IPerspectiveFactory;
import org.eclipse.ui.navigator.resources.ProjectExplorer;

import tapwright.ui.board.MarginBoard;
import tapwright.ui.response.ResponseView;

/** The first arrangement: portfolios on the left, filters in the middle, problems, response and margins below. */
public final class TapwrightPerspective implements IPerspectiveFactory {

	/** Id of the perspective in this bundle's plugin.xml. */
	public static final String ID = "tapwright.app.perspective";


	private static final String NEW_FILTER = "tapwright.ui.new.filter";
	private static final String NEW_PORTFOLIO = "tapwright.ui.new.portfolio";

	@Override
	public void createInitialLayout(IPageLayout layout) {
		layout.addView(ProjectExplorer.VIEW_ID, IPageLayout.LEFT, 0.24f, layout.getEditorArea());
		IFolderLayout bottom = layout.createFolder("bottom", IPageLayout.BOTTOM, 0.72f, layout.getEditorArea());
		bottom.addView(IPageLayout.ID_PROBLEM_VIEW);
		bottom.addView(MarginBoard.ID);
		bottom.addView(ResponseView.ID);
		bottom.addPlaceholder(IPageLayout.ID_PROGRESS_VIEW);
		layout.addNewWizardShortcut(NEW_PORTFOLIO);
		layout.addNewWizardShortcut(NEW_FILTER);
		for (String view : new String[] { ProjectExplorer.VIEW_ID, IPageLayout.ID_PROBLEM_VIEW, MarginBoard.ID, ResponseView.ID,
				IPageLayout.ID_PROGRESS_VIEW }) {
			layout.addShowViewShortcut(view);
		}
	}
}
