// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.explorer;

import org.eclipse.core.resources.IFile;
import org.eclipse.jface.viewers.ITreeContentProvider;
import org.eclipse.jface.viewers.StructuredViewer;
import org.eclipse.jface.viewers.Viewer;

import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;

/** Requirements below filters; answers from memory. UI thread. */
public final class RequirementContent implements ITreeContentProvider {

	private static final Object[] NOTHING = {};

	private StructuredViewer viewer;
	private final EvidenceListener listener = this::evidenceChanged;

	/** Listens for new evidence. */
	public RequirementContent() {
		PortfolioProject.addListener(listener);
	}

	@Override
	public void inputChanged(Viewer next, Object before, Object after) {
		viewer = (StructuredViewer) next;
	}

	@Override
	public Object[] getElements(Object input) {
		return NOTHING;
	}

	@Override
	public Object[] getChildren(Object parent) {
		if (!(parent instanceof IFile file)) {
			return NOTHING;
		}
		return PortfolioProject.of(file).flatMap(portfolio -> portfolio.evidence(file))
				.map(present -> present.evidence().requirements().stream().map(found -> new RequirementNode(file, found)).toArray())
				.orElse(NOTHING);
	}

	@Override
	public Object getParent(Object element) {
		return element instanceof RequirementNode node ? node.file() : null;
	}

	@Override
	public boolean hasChildren(Object element) {
		return getChildren(element).length > 0;
	}

	// build thread
	private void evidenceChanged(PortfolioProject portfolio) {
		if (viewer != null && !viewer.getControl().isDisposed()) {
			viewer.getControl().getDisplay().asyncExec(() -> {
				if (!viewer.getControl().isDisposed()) {
					viewer.refresh(portfolio.project());
				}
			});
		}
	}

	@Override
	public void dispose() {
		PortfolioProject.removeListener(listener);
	}
}
