// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.IJobFunction;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.core.design.Designer;
import tapwright.core.meta.Meta;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.model.Design;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;
import tapwright.ui.field.FieldSet;
import tapwright.ui.look.Icons;

/** The design method with its numbers, and the button that computes the coefficients. UI thread. */
final class DesignSection {

	private final FilterEditorPage page;
	private final FormToolkit toolkit;
	private final List<EClass> methods = Meta.designMethods();
	private final Combo method;
	private final Button compute;
	private final Label outcome;
	private final ScrolledComposite scroller;
	private FieldSet fields;
	private EClass shown;

	DesignSection(FilterEditorPage page, FormToolkit toolkit, Composite parent) {
		this.page = page;
		this.toolkit = toolkit;
		GridLayoutFactory.fillDefaults().numColumns(3).margins(2, 2).spacing(8, 6).applyTo(parent);
		toolkit.createLabel(parent, "Method");
		method = new Combo(parent, SWT.READ_ONLY | SWT.DROP_DOWN);
		toolkit.adapt(method, true, true);
		methods.forEach(type -> method.add(Meta.label(type)));
		GridDataFactory.fillDefaults().grab(true, false).applyTo(method);
		method.addListener(SWT.Selection, event -> changeMethod());
		compute = toolkit.createButton(parent, "Compute", SWT.PUSH);
		compute.setImage(Icons.get(Icons.COMPUTE));
		compute.setToolTipText("Compute the coefficients by this method; can be undone");
		compute.addListener(SWT.Selection, event -> compute());
		scroller = new ScrolledComposite(parent, SWT.V_SCROLL);
		scroller.setExpandHorizontal(true);
		scroller.setExpandVertical(true);
		toolkit.adapt(scroller);
		GridDataFactory.fillDefaults().grab(true, true).span(3, 1).hint(240, 140).applyTo(scroller);
		outcome = toolkit.createLabel(parent, "", SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, false).span(3, 1).hint(200, SWT.DEFAULT).applyTo(outcome);
	}

	/** Shows what the model has now. */
	void refresh() {
		Design design = page.filter().getDesign();
		EClass type = design == null ? null : design.eClass();
		if (type != shown) {
			shown = type;
			clear();
			if (type != null) {
				Composite content = toolkit.createComposite(scroller);
				fields = new FieldSet(page.getEditor().document(), toolkit, content, type, feature -> true);
				page.add(fields);
				scroller.setContent(content);
			}
		}
		method.select(type == null ? -1 : methods.indexOf(type));
		if (fields != null) {
			fields.setObject(design);
			scroller.setMinSize(scroller.getContent().computeSize(SWT.DEFAULT, SWT.DEFAULT));
			scroller.getContent().requestLayout();
		}
		compute.setEnabled(type != null && type != ModelPackage.Literals.GIVEN_DESIGN);
		say(state());
	}

	private void clear() {
		Control content = scroller.getContent();
		if (fields != null) {
			page.remove(fields);
			fields = null;
		}
		if (content != null) {
			scroller.setContent(null);
			content.dispose();
		}
	}

	private String state() {
		ModelDocument<Filter> document = page.getEditor().document();
		try {
			Optional<Designer> designer = Designer.of(page.filter(), document.parameters());
			if (designer.isEmpty()) {
				return shown == null ? "No method is stated." : "";
			}
			String made = page.filter().getCoefficients() == null ? null : page.filter().getCoefficients().getDesignHash();
			return designer.get().hash().equals(made) ? "The numbers were computed by this method."
					: "The numbers were not computed by this method as it stands here; press Compute.";
		} catch (InputException e) {
			return e.describe();
		}
	}

	private void say(String words) {
		if (!outcome.getText().equals(words)) {
			outcome.setText(words);
			outcome.requestLayout();
		}
	}

	private void changeMethod() {
		EClass chosen = methods.get(method.getSelectionIndex());
		if (chosen != shown) {
			ModelDocument<Filter> document = page.getEditor().document();
			document.domain().getCommandStack().execute(SetCommand.create(document.domain(), page.filter(),
					ModelPackage.Literals.FILTER__DESIGN, EcoreUtil.create(chosen)));
		}
	}

	private void compute() {
		fields.commit();
		ModelDocument<Filter> document = page.getEditor().document();
		try {
			Designer.of(page.filter(), document.parameters()).ifPresent(this::run);
		} catch (InputException e) {
			say(e.describe());
		}
	}

	private void run(Designer designer) {
		compute.setEnabled(false);
		say("Computing...");
		Job job = Job.create("Computing the coefficients of " + page.filter().getName(),
				(IJobFunction) monitor -> run(designer, monitor));
		job.setUser(true);
		job.schedule();
	}

	// job thread
	private IStatus run(Designer designer, IProgressMonitor monitor) {
		monitor.beginTask("Computing", IProgressMonitor.UNKNOWN);
		try {
			Designer.Outcome result = designer.run(progress(monitor));
			finish(() -> adopt(result));
		} catch (DesignException e) {
			finish(() -> say(e.getMessage()));
		} catch (CancellationException e) {
			finish(() -> say("Cancelled."));
			return Status.CANCEL_STATUS;
		}
		return Status.OK_STATUS;
	}

	private void finish(Runnable action) {
		page.getEditor().getSite().getShell().getDisplay().asyncExec(() -> {
			if (!compute.isDisposed()) {
				compute.setEnabled(true);
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

	private void adopt(Designer.Outcome result) {
		ModelDocument<Filter> document = page.getEditor().document();
		document.domain().getCommandStack().execute(SetCommand.create(document.domain(), page.filter(),
				ModelPackage.Literals.FILTER__COEFFICIENTS, result.coefficients()));
		say(String.join(" ", result.notes()));
	}
}
