// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResourceChangeEvent;
import org.eclipse.core.resources.IResourceChangeListener;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.IWorkbenchPartReference;

/** Notices that an editor's file was changed by others, or is gone. The question comes when the editor is looked at. */
final class FileWatch implements IResourceChangeListener, IPartListener2 {

	private final ModelEditor<?> editor;
	private final Display display;
	private boolean disposed;

	FileWatch(ModelEditor<?> editor) {
		this.editor = editor;
		this.display = editor.getSite().getShell().getDisplay();
		ResourcesPlugin.getWorkspace().addResourceChangeListener(this, IResourceChangeEvent.POST_CHANGE);
		editor.getSite().getPage().addPartListener(this);
	}

	@Override
	public void resourceChanged(IResourceChangeEvent event) {
		IFile file = editor.document().file();
		IResourceDelta delta = event.getDelta() == null ? null : event.getDelta().findMember(file.getFullPath());
		if (delta == null) {
			return;
		}
		if (delta.getKind() == IResourceDelta.REMOVED) {
			display.asyncExec(() -> {
				if (!disposed) {
					editor.close(false); // there is nothing to save to
				}
			});
		} else if ((delta.getFlags() & (IResourceDelta.CONTENT | IResourceDelta.REPLACED)) != 0) {
			display.asyncExec(this::check);
		}
	}

	private void check() {
		if (disposed) {
			return;
		}
		boolean active = editor.getSite().getPage().getActiveEditor() == editor;
		if (active || !editor.isDirty()) {
			editor.fileChangedOutside();
		}
	}

	@Override
	public void partActivated(IWorkbenchPartReference reference) {
		if (reference.getPart(false) == editor) {
			editor.fileChangedOutside();
		}
	}

	void dispose() {
		disposed = true;
		ResourcesPlugin.getWorkspace().removeResourceChangeListener(this);
		editor.getSite().getPage().removePartListener(this);
	}
}
