// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

import org.eclipse.jface.dialogs.IMessageProvider;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.IManagedForm;
import org.eclipse.ui.forms.editor.FormPage;
import org.eclipse.ui.forms.widgets.FormToolkit;
import org.eclipse.ui.forms.widgets.ScrolledForm;

import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.ui.field.FieldSet;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.ui.picture.Overlay;
import tapwright.ui.proof.Proven;

/** What the pages of the filter editor share: heading with the verdict, sections, and staying up to date. UI thread. */
abstract class FilterEditorPage extends FormPage {

	private final List<FieldSet> fieldSets = new ArrayList<>();
	private final Consumer<Proven> proofListener = this::provenChanged;

	FilterEditorPage(FilterEditor editor, String id, String title) {
		super(editor, id, title);
	}

	@Override
	public FilterEditor getEditor() {
		return (FilterEditor) super.getEditor();
	}

	Filter filter() {
		return getEditor().document().root();
	}

	Optional<Proven> proven() {
		return getEditor().proof().latest();
	}

	/** The filter for pictures; nothing before the first proof. */
	List<Overlay> overlays() {
		return proven().map(proven -> new Overlay(proven.snapshot(), Optional.of(proven.evidence()))).stream().toList();
	}

	@Override
	protected final void createFormContent(IManagedForm form) {
		ScrolledForm scrolled = form.getForm();
		form.getToolkit().decorateFormHeading(scrolled.getForm());
		scrolled.setText(getTitle());
		createBody(scrolled.getBody(), form.getToolkit());
		getEditor().proof().addListener(proofListener);
		refresh();
		proven().ifPresent(this::provenChanged);
	}

	/** Makes the controls. */
	abstract void createBody(Composite body, FormToolkit toolkit);

	/** Shows what the model has now. */
	abstract void refresh();

	/** Shows new evidence. */
	abstract void showEvidence(Proven proven);

	/** The model has changed; pages that were never looked at have nothing to do. */
	final void modelChanged() {
		if (isShown()) {
			fieldSets.forEach(FieldSet::refresh);
			refresh();
		}
	}

	/** Brings what is being typed into the model. */
	final void commitFields() {
		fieldSets.forEach(FieldSet::commit);
	}

	private boolean isShown() {
		return getManagedForm() != null && !getManagedForm().getForm().isDisposed();
	}

	private void provenChanged(Proven proven) {
		if (!isShown()) {
			return;
		}
		ScrolledForm form = getManagedForm().getForm();
		Verdict verdict = proven.evidence().verdict();
		form.setImage(Icons.get(proven.stale() ? Icons.STALE : Verdicts.icon(verdict)));
		form.setText(getTitle());
		form.setMessage(proven.stale() ? "Proving..." : filter().getName() + ": " + Verdicts.summary(proven.evidence()),
				IMessageProvider.NONE);
		showEvidence(proven);
	}

	final void add(FieldSet fields) {
		fieldSets.add(fields);
	}

	final void remove(FieldSet fields) {
		fieldSets.remove(fields);
	}

	@Override
	public void dispose() {
		getEditor().proof().removeListener(proofListener);
		super.dispose();
	}
}
