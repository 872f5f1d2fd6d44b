// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.meta.Meta;
import tapwright.model.Requirement;
import tapwright.ui.field.FieldSet;
import tapwright.ui.picture.PicturePane;
import tapwright.ui.proof.Proven;

/** What is asked of the filter: the list, the details of one requirement, and the limits over the response. */
final class RequirementsPage extends FilterEditorPage {

	static final String ID = "requirements";

	private FormToolkit toolkit;
	private RequirementTable table;
	private ScrolledComposite scroller;
	private FieldSet details;
	private Requirement shown;
	private Label documentation;
	private PicturePane picture;

	RequirementsPage(FilterEditor editor) {
		super(editor, ID, "Requirements");
	}

	@Override
	void createBody(Composite body, FormToolkit formToolkit) {
		toolkit = formToolkit;
		GridLayoutFactory.swtDefaults().margins(8, 8).applyTo(body);
		var columns = new SashForm(body, SWT.HORIZONTAL | SWT.SMOOTH);
		toolkit.adapt(columns);
		GridDataFactory.fillDefaults().grab(true, true).hint(500, 330).applyTo(columns);
		var rows = new SashForm(columns, SWT.VERTICAL | SWT.SMOOTH);
		toolkit.adapt(rows);
		Composite top = Sections.pane(toolkit, rows);
		table = new RequirementTable(getEditor(), toolkit, Sections.create(toolkit, top, "What is asked", "", true),
				this::showDetails);
		Composite bottom = Sections.pane(toolkit, rows);
		picture = new PicturePane(Sections.create(toolkit, bottom, "Limits over the response", "", true));
		GridDataFactory.fillDefaults().grab(true, true).hint(300, 100).applyTo(picture);
		rows.setWeights(42, 58);
		Composite right = Sections.pane(toolkit, columns);
		Composite client = Sections.create(toolkit, right, "Details", "", true);
		documentation = toolkit.createLabel(client, "", SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, false).hint(200, SWT.DEFAULT).applyTo(documentation);
		scroller = new ScrolledComposite(client, SWT.V_SCROLL);
		scroller.setExpandHorizontal(true);
		scroller.setExpandVertical(true);
		toolkit.adapt(scroller);
		GridDataFactory.fillDefaults().grab(true, true).hint(240, 120).applyTo(scroller);
		columns.setWeights(64, 36);
	}

	@Override
	void refresh() {
		table.refresh(proven());
		if (shown != null && !filter().getRequirements().contains(shown)) {
			showDetails(null); // it was removed, or its adding was undone
		}
	}

	@Override
	void showEvidence(Proven proven) {
		table.refresh(proven());
		picture.show(overlays());
	}

	/** Selects a requirement by its id. */
	void select(String id) {
		if (table != null) {
			table.select(id);
		}
	}

	private void showDetails(Requirement requirement) {
		if (requirement == shown && details != null) {
			return;
		}
		EClass before = shown == null ? null : shown.eClass();
		if (details != null) {
			details.commit();
		}
		shown = requirement;
		if (requirement == null) {
			clear();
			documentation.setText("Select a requirement to change it, or add one.");
		} else {
			if (requirement.eClass() != before) {
				clear();
				Composite fields = toolkit.createComposite(scroller);
				details = new FieldSet(getEditor().document(), toolkit, fields, requirement.eClass(), feature -> true);
				add(details);
				scroller.setContent(fields);
			}
			details.setObject(requirement);
			documentation.setText(Meta.label(requirement.eClass()) + ". " + Meta.documentation(requirement.eClass()));
			scroller.setMinSize(scroller.getContent().computeSize(SWT.DEFAULT, SWT.DEFAULT));
			scroller.getContent().requestLayout();
		}
		picture.emphasize(requirement == null ? "" : requirement.getId());
		documentation.requestLayout();
	}

	private void clear() {
		Control content = scroller.getContent();
		if (details != null) {
			remove(details);
			details = null;
		}
		if (content != null) {
			scroller.setContent(null);
			content.dispose();
		}
	}
}
