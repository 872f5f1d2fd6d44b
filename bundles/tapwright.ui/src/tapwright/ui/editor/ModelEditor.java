// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.io.IOException;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.emf.edit.domain.IEditingDomainProvider;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.forms.editor.FormEditor;
import org.eclipse.ui.forms.editor.FormPage;
import org.eclipse.ui.part.FileEditorInput;

import tapwright.model.io.ModelFileException;
import tapwright.ui.Tasks;

/**
 * Edits one model file. Dirty means that the command stack is off its save point. A file that cannot be read opens a page that says
 * why, and is never written. UI thread.
 *
 * @param <T>
 *            what the file holds
 */
abstract class ModelEditor<T extends EObject> extends FormEditor implements IEditingDomainProvider {

	private ModelDocument<T> document;
	private UndoHandlers undo;
	private FileWatch watch;
	private List<? extends FormPage> modelPages = List.of();
	private UnreadablePage unreadable;
	private final CommandStackListener stackListener = event -> stackChanged();

	/** A document for the editor's file, not loaded yet. */
	abstract ModelDocument<T> createDocument(IFile file);

	/** The pages for a file that could be read. */
	abstract List<? extends FormPage> createModelPages();

	/** The content has changed, by a command or by reading the file. */
	abstract void modelChanged();

	/** Brings what is being typed into the model. */
	abstract void commitFields();

	@Override
	public void init(IEditorSite site, IEditorInput input) throws PartInitException {
		if (!(input instanceof FileEditorInput fileInput)) {
			throw new PartInitException("Only files in a portfolio can be edited; bring the file into one first.");
		}
		super.init(site, input);
		document = createDocument(fileInput.getFile());
		undo = new UndoHandlers(site, document.commandStack());
		document.commandStack().addCommandStackListener(stackListener);
	}

	@Override
	protected void addPages() {
		read();
		watch = new FileWatch(this);
	}

	/** Reads the file and shows its pages, or the page that says why it cannot be read. */
	final void read() {
		try {
			document.load();
			showModelPages();
			modelChanged();
		} catch (ModelFileException e) {
			showReason(e);
		} catch (CoreException | IOException e) {
			showReason(new ModelFileException(document.file().getName(), 0, 0, e.getMessage()));
		}
		editorDirtyStateChanged();
	}

	private void showModelPages() {
		if (!modelPages.isEmpty()) {
			return; // they show the new content by themselves
		}
		modelPages = createModelPages();
		modelPages.forEach(page -> open(getPageCount(), page));
		if (unreadable != null) {
			removePage(unreadable.getIndex());
			unreadable = null;
		}
		setActivePage(0);
	}

	private void showReason(ModelFileException reason) {
		if (unreadable != null) {
			unreadable.setReason(reason);
			return;
		}
		unreadable = new UnreadablePage(this, reason);
		open(0, unreadable);
		modelPages.forEach(page -> removePage(page.getIndex()));
		modelPages = List.of();
		setActivePage(0);
	}

	private void open(int index, FormPage page) {
		try {
			addPage(index, page);
		} catch (PartInitException e) {
			Tasks.show("A page of " + document.file().getName() + " could not be opened", e);
		}
	}

	private void stackChanged() {
		if (isReadable()) {
			modelChanged();
		}
		editorDirtyStateChanged();
	}

	/** Whether the file could be read and the editor is open. */
	final boolean isReadable() {
		return !modelPages.isEmpty() && getContainer() != null && !getContainer().isDisposed();
	}

	/** Somebody else wrote the file: reads it again, after asking if there is work to lose. */
	final void fileChangedOutside() {
		if (!document.isChangedOutside()) {
			return;
		}
		document.keep(); // asked once for each change, also while the question is open
		boolean again = !isDirty() || MessageDialog.open(MessageDialog.QUESTION, getSite().getShell(), "Changed outside",
				document.file().getName() + " was changed by another program. Read it again and lose the changes made here, "
						+ "or keep them?",
				0, "Read Again", "Keep Mine") == 0;
		if (again) {
			read();
		}
	}

	/** The file with its content. */
	public final ModelDocument<T> document() {
		return document;
	}

	@Override
	public final EditingDomain getEditingDomain() {
		return document.domain();
	}

	@Override
	public final boolean isDirty() {
		return document.commandStack().isSaveNeeded();
	}

	@Override
	public final void doSave(IProgressMonitor monitor) {
		commitFields();
		try {
			document.save(monitor);
		} catch (CoreException | IOException e) {
			monitor.setCanceled(true); // keeps the editor open when it is saved on closing
			Tasks.show(document.file().getName() + " was not saved", e);
		}
		editorDirtyStateChanged();
	}

	@Override
	public final boolean isSaveAsAllowed() {
		return false;
	}

	@Override
	public final void doSaveAs() {
		throw new UnsupportedOperationException("files are copied in the Project Explorer");
	}

	@Override
	public <A> A getAdapter(Class<A> adapter) {
		return adapter == IFile.class ? adapter.cast(document.file()) : super.getAdapter(adapter);
	}

	@Override
	public void dispose() {
		if (watch != null) {
			watch.dispose();
		}
		if (document != null) {
			document.commandStack().removeCommandStackListener(stackListener);
			undo.dispose();
			document.dispose();
		}
		super.dispose();
	}
}
