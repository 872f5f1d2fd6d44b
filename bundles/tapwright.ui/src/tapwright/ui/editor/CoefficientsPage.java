// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.ui.picture.PictureKind;
import tapwright.ui.picture.PicturePane;
import tapwright.ui.picture.PictureStyle;
import tapwright.ui.proof.Proven;

/** Where the coefficients come from, and the numbers themselves. */
final class CoefficientsPage extends FilterEditorPage {

	static final String ID = "coefficients";

	private DesignSection design;
	private CoefficientTable numbers;
	private PicturePane picture;

	CoefficientsPage(FilterEditor editor) {
		super(editor, ID, "Coefficients");
	}

	@Override
	void createBody(Composite body, FormToolkit toolkit) {
		GridLayoutFactory.swtDefaults().margins(8, 8).applyTo(body);
		var rows = new SashForm(body, SWT.VERTICAL | SWT.SMOOTH);
		toolkit.adapt(rows);
		GridDataFactory.fillDefaults().grab(true, true).hint(500, 330).applyTo(rows);
		var top = new SashForm(rows, SWT.HORIZONTAL | SWT.SMOOTH);
		toolkit.adapt(top);
		Composite left = Sections.pane(toolkit, top);
		design = new DesignSection(this, toolkit, Sections.create(toolkit, left, "Where they come from", "", true));
		Composite right = Sections.pane(toolkit, top);
		numbers = new CoefficientTable(getEditor(), toolkit, Sections.create(toolkit, right, "The numbers", "", true));
		top.setWeights(45, 55);
		Composite bottom = Sections.pane(toolkit, rows);
		picture = new PicturePane(Sections.create(toolkit, bottom, "Impulse response", "", true));
		picture.hideTools();
		picture.setStyle(PictureStyle.USUAL.with(PictureKind.IMPULSE));
		GridDataFactory.fillDefaults().grab(true, true).hint(400, 90).applyTo(picture);
		rows.setWeights(62, 38);
	}

	@Override
	void refresh() {
		design.refresh();
		numbers.refresh(proven());
	}

	@Override
	void showEvidence(Proven proven) {
		numbers.refresh(proven());
		picture.show(overlays());
	}
}
