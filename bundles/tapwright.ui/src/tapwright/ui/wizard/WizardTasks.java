// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.wizard;

import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ICoreRunnable;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.jface.operation.IRunnableWithProgress;
import org.eclipse.ui.IEditorPart;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.WorkspaceModifyOperation;
import org.eclipse.ui.ide.IDE;

import tapwright.ui.Tasks;

/** What wizards do at their end. */
final class WizardTasks {

	private WizardTasks() {
	}

	/** Changes the workspace in one step. */
	static IRunnableWithProgress operation(ICoreRunnable work) {
		return new WorkspaceModifyOperation() {
			@Override
			protected void execute(IProgressMonitor monitor) throws CoreException {
				work.run(monitor);
			}
		};
	}

	/** Opens a file. UI thread. */
	static Optional<IEditorPart> open(IWorkbench workbench, IFile file) {
		try {
			return Optional.ofNullable(IDE.openEditor(workbench.getActiveWorkbenchWindow().getActivePage(), file));
		} catch (PartInitException e) {
			Tasks.show(file.getName() + " could not be opened", e);
			return Optional.empty();
		}
	}
}
