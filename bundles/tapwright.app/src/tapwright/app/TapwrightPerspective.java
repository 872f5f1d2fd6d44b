// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IPerspectiveFactory;
import org.eclipse.ui.navigator.resources.ProjectExplorer;

/** The first arrangement: projects on the left, problems below the editors. */
public final class TapwrightPerspective implements IPerspectiveFactory {

	/** Id of the perspective in this bundle's plugin.xml. */
	public static final String ID = "tapwright.app.perspective";

	@Override
	public void createInitialLayout(IPageLayout layout) {
		layout.addView(ProjectExplorer.VIEW_ID, IPageLayout.LEFT, 0.25f, layout.getEditorArea());
		layout.addView(IPageLayout.ID_PROBLEM_VIEW, IPageLayout.BOTTOM, 0.7f, layout.getEditorArea());
	}
}
