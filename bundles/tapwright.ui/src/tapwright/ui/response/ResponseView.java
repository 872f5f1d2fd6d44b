// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.response;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.IJobFunction;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.ISelectionListener;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.IWorkbenchPartReference;
import org.eclipse.ui.part.ViewPart;

import tapwright.core.quantity.Expression;
import tapwright.core.verify.Partners;
import tapwright.model.Filter;
import tapwright.model.io.ModelFiles;
import tapwright.ui.editor.FilterEditor;
import tapwright.ui.explorer.RequirementNode;
import tapwright.ui.picture.Overlay;
import tapwright.ui.picture.PictureKind;
import tapwright.ui.picture.PicturePane;
import tapwright.ui.proof.FilterSnapshot;
import tapwright.ui.proof.Proven;
import tapwright.workspace.PortfolioProject;

/** Draws the filters that are selected, or the one that is being edited. UI thread. */
public final class ResponseView extends ViewPart {

	/** Id of the view in this bundle's plugin.xml. */
	public static final String ID = "tapwright.ui.response";

	private static final int MOST_FILTERS = 6;

	private PicturePane pane;
	private FilterEditor followed;
	private int request;
	private final Consumer<Proven> proofListener = proven -> show(
			List.of(new Overlay(proven.snapshot(), Optional.of(proven.evidence()))));
	private final ISelectionListener selectionListener = this::selectionChanged;
	private final IPartListener2 partListener = new IPartListener2() {
		@Override
		public void partActivated(IWorkbenchPartReference reference) {
			if (reference.getPart(false) instanceof FilterEditor editor) {
				follow(editor);
			}
		}

		@Override
		public void partClosed(IWorkbenchPartReference reference) {
			if (reference.getPart(false) == followed) {
				unfollow();
				show(List.of());
			}
		}
	};

	@Override
	public void createPartControl(Composite parent) {
		pane = new PicturePane(parent);
		fillMenu();
		getSite().getPage().addPartListener(partListener);
		getSite().getPage().addSelectionListener(selectionListener);
		if (getSite().getPage().getActiveEditor() instanceof FilterEditor editor) {
			follow(editor);
		}
	}

	private void fillMenu() {
		IMenuManager menu = getViewSite().getActionBars().getMenuManager();
		for (PictureKind kind : PictureKind.values()) {
			var action = new Action(kind.label(), IAction.AS_RADIO_BUTTON) {
				@Override
				public void run() {
					if (isChecked()) {
						pane.setStyle(pane.style().with(kind));
						setContentDescription(kind == PictureKind.MAGNITUDE ? "" : kind.label());
					}
				}
			};
			action.setChecked(kind == pane.style().kind());
			menu.add(action);
		}
	}

	private void follow(FilterEditor editor) {
		if (followed != editor) {
			unfollow();
			followed = editor;
			editor.proof().addListener(proofListener);
		}
		request++;
		editor.proof().latest().ifPresent(proofListener);
	}

	private void unfollow() {
		if (followed != null) {
			followed.proof().removeListener(proofListener);
			followed = null;
		}
	}

	private void show(List<Overlay> overlays) {
		if (!pane.isDisposed()) {
			pane.show(overlays);
		}
	}

	private void selectionChanged(IWorkbenchPart part, ISelection selection) {
		if (!(selection instanceof IStructuredSelection structured) || part == this || part instanceof FilterEditor) {
			return;
		}
		List<IFile> files = new ArrayList<>();
		for (Object element : structured) {
			if (element instanceof RequirementNode node) {
				files.add(node.file());
			} else if (element instanceof IFile file && ModelFiles.FILTER_EXTENSION.equals(file.getFileExtension())) {
				files.add(file);
			}
		}
		if (!files.isEmpty()) {
			unfollow();
			read(files.stream().distinct().limit(MOST_FILTERS).toList());
		}
	}

	private void read(List<IFile> files) {
		int number = ++request;
		Job job = Job.create("Reading filters", (IJobFunction) monitor -> read(files, number));
		job.setSystem(true);
		job.setPriority(Job.INTERACTIVE);
		job.schedule();
	}

	// job thread
	private IStatus read(List<IFile> files, int number) {
		List<Overlay> overlays = new ArrayList<>();
		for (IFile file : files) {
			read(file).ifPresent(overlays::add);
		}
		pane.getDisplay().asyncExec(() -> {
			if (number == request) {
				show(overlays);
			}
		});
		return Status.OK_STATUS;
	}

	// What cannot be read has a problem marker already; here it only leaves no curve.
	private static Optional<Overlay> read(IFile file) {
		try (InputStream stream = file.getContents(true)) {
			Filter filter = ModelFiles.parse(stream.readAllBytes(), file.getName(), Filter.class);
			if (filter.getName() == null) {
				filter.setName(file.getFullPath().removeFileExtension().lastSegment());
			}
			Optional<PortfolioProject> portfolio = PortfolioProject.of(file);
			Expression.Names parameters = portfolio.map(PortfolioProject::parameters).orElse(Expression.Names.NONE);
			Partners partners = portfolio.map(PortfolioProject::partners).orElse(Partners.NONE);
			return Optional.of(new Overlay(FilterSnapshot.of(filter, parameters, partners),
					portfolio.flatMap(found -> found.evidence(file)).map(present -> present.evidence())));
		} catch (CoreException | IOException e) {
			return Optional.empty();
		}
	}

	@Override
	public void setFocus() {
		pane.setFocus();
	}

	@Override
	public void dispose() {
		unfollow();
		getSite().getPage().removePartListener(partListener);
		getSite().getPage().removeSelectionListener(selectionListener);
		super.dispose();
	}
}
