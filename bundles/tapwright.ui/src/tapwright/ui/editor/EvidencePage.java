// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.Optional;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.verify.RequirementEvidence;
import tapwright.ui.picture.PicturePane;
import tapwright.ui.proof.Proven;

/** What was proven of each requirement, where it is worst, and the picture of that place. */
final class EvidencePage extends FilterEditorPage {

	static final String ID = "evidence";

	private static final String CAUTION = "The proof holds for exactly the numbers of this file as they are entered here. It covers "
			+ "neither the analogue parts, nor the compiler, nor the board.";

	private EvidenceTable table;
	private PicturePane picture;
	private Label note;

	EvidencePage(FilterEditor editor) {
		super(editor, ID, "Evidence");
	}

	@Override
	void createBody(Composite body, FormToolkit toolkit) {
		GridLayoutFactory.swtDefaults().margins(8, 8).applyTo(body);
		var rows = new SashForm(body, SWT.VERTICAL | SWT.SMOOTH);
		toolkit.adapt(rows);
		GridDataFactory.fillDefaults().grab(true, true).hint(500, 330).applyTo(rows);
		Composite top = toolkit.createComposite(rows);
		GridLayoutFactory.fillDefaults().applyTo(top);
		Composite list = Sections.create(toolkit, top, "What was proven",
				"Select a requirement to see the place where its margin is smallest.", true);
		table = new EvidenceTable(toolkit, list, this::selected);
		note = toolkit.createLabel(list, "", SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, false).hint(300, SWT.DEFAULT).applyTo(note);
		Composite bottom = toolkit.createComposite(rows);
		GridLayoutFactory.fillDefaults().applyTo(bottom);
		picture = new PicturePane(Sections.create(toolkit, bottom, "The place", "", true));
		GridDataFactory.fillDefaults().grab(true, true).hint(400, 120).applyTo(picture);
		rows.setWeights(45, 55);
		Label caution = toolkit.createLabel(body, CAUTION, SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, false).hint(400, SWT.DEFAULT).applyTo(caution);
	}

	@Override
	void refresh() {
		// all that is shown comes with the evidence
	}

	@Override
	void showEvidence(Proven proven) {
		table.show(proven);
		picture.show(overlays());
	}

	/** Selects the evidence of a requirement and shows its place. */
	void select(String id) {
		if (table != null) {
			table.select(id);
		}
	}

	private void selected(Optional<RequirementEvidence> evidence) {
		note.setText(evidence.map(RequirementEvidence::message).orElse(""));
		note.requestLayout();
		evidence.ifPresent(picture::lookAt);
	}
}
