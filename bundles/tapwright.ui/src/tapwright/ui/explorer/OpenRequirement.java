// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.explorer;

import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.navigator.CommonActionProvider;
import org.eclipse.ui.navigator.ICommonActionConstants;
import org.eclipse.ui.navigator.ICommonActionExtensionSite;
import org.eclipse.ui.navigator.ICommonMenuConstants;
import org.eclipse.ui.navigator.ICommonViewerWorkbenchSite;

import tapwright.ui.Tasks;
import tapwright.ui.editor.FilterEditor;

/** Opens the filter of a requirement, at the requirement. */
public final class OpenRequirement extends CommonActionProvider {

	private Action open;

	@Override
	public void init(ICommonActionExtensionSite site) {
		open = new Action("&Open") {
			@Override
			public void run() {
				if (site.getViewSite() instanceof ICommonViewerWorkbenchSite workbench && site.getStructuredViewer()
						.getStructuredSelection().getFirstElement() instanceof RequirementNode node) {
					open(workbench.getPage(), node);
				}
			}
		};
	}

	private static void open(IWorkbenchPage page, RequirementNode node) {
		try {
			IEditorPart editor = IDE.openEditor(page, node.file());
			if (editor instanceof FilterEditor filter) {
				filter.showRequirement(node.evidence().id());
			}
		} catch (PartInitException e) {
			Tasks.show(node.file().getName() + " could not be opened", e);
		}
	}

	private boolean isForUs() {
		return getContext() != null && getContext().getSelection() instanceof IStructuredSelection selection
				&& selection.size() == 1 && selection.getFirstElement() instanceof RequirementNode;
	}

	@Override
	public void fillContextMenu(IMenuManager menu) {
		if (isForUs()) {
			menu.appendToGroup(ICommonMenuConstants.GROUP_OPEN, open);
		}
	}

	@Override
	public void fillActionBars(IActionBars bars) {
		if (isForUs()) {
			bars.setGlobalActionHandler(ICommonActionConstants.OPEN, open);
		}
	}
}
