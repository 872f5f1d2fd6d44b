// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.fix;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.IJobFunction;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IMarkerResolution2;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.remedy.Edit;
import tapwright.core.remedy.Remedy;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.model.Filter;
import tapwright.ui.Tasks;
import tapwright.ui.editor.FilterEditor;
import tapwright.workspace.ProblemMarkers;

/**
 * Opens the filter, looks for remedies in the background, lets a person choose by their proven outcome, and makes the chosen change in
 * the editor, where it can be undone and waits to be saved.
 */
final class RemedyResolution implements IMarkerResolution2 {

	/** How a person chooses. */
	@FunctionalInterface
	interface Chooser {

		/** The chosen one of at least one remedy; nothing when none is wanted. UI thread. */
		Optional<Remedy> choose(Shell shell, List<Remedy> remedies);
	}

	private final RemedySearch search;
	private final Chooser chooser;

	RemedyResolution(RemedySearch search, Chooser chooser) {
		this.search = search;
		this.chooser = chooser;
	}

	@Override
	public String getLabel() {
		return search.label();
	}

	@Override
	public String getDescription() {
		return "Shows what is proven of the filter after each change before you choose one. It can be undone in the editor.";
	}

	@Override
	public Image getImage() {
		return null; // the platform's own
	}

	@Override
	public void run(IMarker marker) {
		try {
			var page = PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
			if (IDE.openEditor(page, (IFile) marker.getResource()) instanceof FilterEditor editor
					&& editor.document().isLoaded()) {
				look(editor, marker.getAttribute(ProblemMarkers.REQUIREMENT, ""));
			}
		} catch (PartInitException e) {
			Tasks.show(marker.getResource().getName() + " could not be opened", e);
		}
	}

	private void look(FilterEditor editor, String requirement) {
		Filter copy = EcoreUtil.copy(editor.document().root());
		Expression.Names parameters = editor.document().parameters();
		Job job = Job.create("Looking for remedies of " + copy.getName(),
				(IJobFunction) monitor -> look(editor, copy, parameters, requirement, monitor));
		job.setUser(true);
		job.schedule();
	}

	// job thread
	private IStatus look(FilterEditor editor, Filter copy, Expression.Names parameters, String requirement,
			IProgressMonitor monitor) {
		monitor.beginTask("Proving", IProgressMonitor.UNKNOWN);
		try {
			List<Remedy> found = search.find(copy, parameters, requirement, progress(monitor));
			finish(editor, () -> offer(editor, copy, found));
		} catch (InputException e) {
			finish(editor, () -> say(editor, e.describe()));
		} catch (DesignException | IllegalArgumentException e) {
			finish(editor, () -> say(editor, e.getMessage()));
		} catch (CancellationException e) {
			return Status.CANCEL_STATUS;
		}
		return Status.OK_STATUS;
	}

	private void offer(FilterEditor editor, Filter asked, List<Remedy> found) {
		if (found.isEmpty()) {
			say(editor, "No change could be proven to help: neither a longer word, nor a new design, nor another limit.");
			return;
		}
		Optional<Remedy> chosen = chooser.choose(editor.getSite().getShell(), found);
		if (chosen.isEmpty()) {
			return;
		}
		if (EcoreUtil.equals(editor.document().root(), asked)) {
			apply(editor.getEditingDomain(), chosen.get().on(editor.document().root(), asked));
		} else {
			say(editor, "The filter was changed meanwhile, so what was proven does not hold for it; look again.");
		}
	}

	private static void apply(EditingDomain domain, Remedy remedy) {
		var command = new CompoundCommand(remedy.description());
		for (Edit edit : remedy.edits()) {
			command.append(SetCommand.create(domain, edit.owner(), edit.feature(), edit.value()));
		}
		domain.getCommandStack().execute(command);
	}

	private static void say(FilterEditor editor, String words) {
		MessageDialog.openInformation(editor.getSite().getShell(), "No Remedy", words);
	}

	// Nothing is shown for an editor that was closed meanwhile.
	private static void finish(FilterEditor editor, Runnable action) {
		PlatformUI.getWorkbench().getDisplay().asyncExec(() -> {
			if (editor.getSite().getPage().findEditor(editor.getEditorInput()) == editor) {
				action.run();
			}
		});
	}

	private static Progress progress(IProgressMonitor monitor) {
		return new Progress() {
			@Override
			public void report(String message, double fraction) {
				monitor.subTask(message);
			}

			@Override
			public boolean isCancelled() {
				return monitor.isCanceled();
			}
		};
	}
}
