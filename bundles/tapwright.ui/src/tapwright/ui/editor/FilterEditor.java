// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.io.IOException;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.emf.edit.domain.IEditingDomainProvider;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.forms.editor.FormEditor;
import org.eclipse.ui.ide.IGotoMarker;
import org.eclipse.ui.part.FileEditorInput;

import tapwright.model.io.ModelFileException;
import tapwright.ui.Tasks;
import tapwright.ui.proof.FilterSnapshot;
import tapwright.ui.proof.LiveProof;
import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;
import tapwright.workspace.ProblemMarkers;

/**
 * Edits one filter file. Dirty means that the command stack is off its save point. After each command the filter is proven anew in
 * the background. A file that cannot be read opens a page that says why, and is never written.
 */
public final class FilterEditor extends FormEditor implements IEditingDomainProvider, IGotoMarker {

	/** Id of the editor in this bundle's plugin.xml. */
	public static final String ID = "tapwright.ui.editor.filter";

	private FilterDocument document;
	private LiveProof proof;
	private UndoHandlers undo;
	private FileWatch watch;
	private List<FilterEditorPage> filterPages = List.of();
	private UnreadablePage unreadable;
	private final CommandStackListener stackListener = event -> modelChanged();
	private final EvidenceListener evidenceListener = portfolio -> parametersMayHaveChanged();

	@Override
	public void init(IEditorSite site, IEditorInput input) throws PartInitException {
		if (!(input instanceof FileEditorInput fileInput)) {
			throw new PartInitException("Only filters in a portfolio can be edited; bring the file into one first.");
		}
		super.init(site, input);
		setPartName(fileInput.getFile().getFullPath().removeFileExtension().lastSegment());
		document = new FilterDocument(fileInput.getFile());
		proof = new LiveProof(Display.getCurrent());
		undo = new UndoHandlers(site, document.commandStack());
		document.commandStack().addCommandStackListener(stackListener);
		PortfolioProject.addListener(evidenceListener);
	}

	@Override
	protected void addPages() {
		read();
		watch = new FileWatch(this);
	}

	/** Reads the file and shows its pages, or the page that says why it cannot be read. */
	void read() {
		try {
			document.load();
			showFilterPages();
			modelChanged();
		} catch (ModelFileException e) {
			showReason(e);
		} catch (CoreException | IOException e) {
			showReason(new ModelFileException(document.file().getName(), 0, 0, e.getMessage()));
		}
		editorDirtyStateChanged();
	}

	private void showFilterPages() {
		if (!filterPages.isEmpty()) {
			return; // they show the new content by themselves
		}
		filterPages = List.of(new FilterPage(this), new RequirementsPage(this), new CoefficientsPage(this),
				new EvidencePage(this));
		try {
			for (FilterEditorPage page : filterPages) {
				addPage(page);
			}
		} catch (PartInitException e) {
			Tasks.show("The pages of the filter could not be opened", e);
		}
		if (unreadable != null) {
			removePage(unreadable.getIndex());
			unreadable = null;
		}
		setActivePage(0);
	}

	private void showReason(ModelFileException reason) {
		if (unreadable == null) {
			unreadable = new UnreadablePage(this);
			unreadable.setReason(reason);
			try {
				addPage(0, unreadable);
			} catch (PartInitException e) {
				Tasks.show("The page could not be opened", e);
			}
			for (FilterEditorPage page : filterPages) {
				removePage(page.getIndex());
			}
			filterPages = List.of();
			setActivePage(0);
		} else {
			unreadable.setReason(reason);
		}
	}

	private void modelChanged() {
		if (!isReadable()) {
			return;
		}
		proof.ask(FilterSnapshot.of(document.filter(), document.parameters()));
		filterPages.forEach(FilterEditorPage::modelChanged);
		editorDirtyStateChanged();
	}

	// any thread: a save of the portfolio may have given a parameter another value
	private void parametersMayHaveChanged() {
		getSite().getShell().getDisplay().asyncExec(() -> {
			if (isReadable()) {
				proof.ask(FilterSnapshot.of(document.filter(), document.parameters()));
			}
		});
	}

	/** Whether the file could be read. */
	boolean isReadable() {
		return !filterPages.isEmpty() && getContainer() != null && !getContainer().isDisposed();
	}

	/** Somebody else wrote the file: reads it again, after asking if there is work to lose. */
	void fileChangedOutside() {
		if (!document.isChangedOutside()) {
			return;
		}
		boolean reload = !isDirty() || MessageDialog.open(MessageDialog.QUESTION, getSite().getShell(), "Changed outside",
				document.file().getName() + " was changed by another program. Read it again and lose the changes made here, "
						+ "or keep them?",
				0, "Read Again", "Keep Mine") == 0;
		if (reload) {
			read();
		} else {
			document.keep();
		}
	}

	/** The file with its content. */
	public FilterDocument document() {
		return document;
	}

	/** The evidence of the content. */
	public LiveProof proof() {
		return proof;
	}

	@Override
	public EditingDomain getEditingDomain() {
		return document.domain();
	}

	@Override
	public boolean isDirty() {
		return document.commandStack().isSaveNeeded();
	}

	@Override
	public void doSave(IProgressMonitor monitor) {
		filterPages.forEach(FilterEditorPage::commitFields);
		try {
			document.save(monitor);
		} catch (CoreException | IOException e) {
			monitor.setCanceled(true); // keeps the editor open when it is saved on closing
			Tasks.show(document.file().getName() + " was not saved", e);
		}
		editorDirtyStateChanged();
	}

	@Override
	public boolean isSaveAsAllowed() {
		return false;
	}

	@Override
	public void doSaveAs() {
		throw new UnsupportedOperationException("filters are copied in the Project Explorer");
	}

	@Override
	public void gotoMarker(IMarker marker) {
		String requirement = marker.getAttribute(ProblemMarkers.REQUIREMENT, "");
		if (!isReadable()) {
			return;
		}
		if (requirement.isEmpty()) {
			setActivePage(FilterPage.ID);
		} else {
			showRequirement(requirement);
		}
	}

	/** Goes to a requirement where it can be changed. */
	public void showRequirement(String id) {
		setActivePage(RequirementsPage.ID);
		((RequirementsPage) findPage(RequirementsPage.ID)).select(id);
	}

	/** Goes to the evidence of a requirement. */
	public void showEvidence(String id) {
		setActivePage(EvidencePage.ID);
		((EvidencePage) findPage(EvidencePage.ID)).select(id);
	}

	@Override
	public <T> T getAdapter(Class<T> adapter) {
		return adapter == IFile.class ? adapter.cast(document.file()) : super.getAdapter(adapter);
	}

	@Override
	public void dispose() {
		PortfolioProject.removeListener(evidenceListener);
		if (document != null) {
			document.commandStack().removeCommandStackListener(stackListener);
			undo.dispose();
			proof.dispose();
			document.dispose();
		}
		if (watch != null) {
			watch.dispose();
		}
		super.dispose();
	}
}
