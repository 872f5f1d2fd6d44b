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
		var columns = new SashForm(body, SWT.HORIZONTAL | SWT.SMOOTH);
		toolkit.adapt(columns);
		GridDataFactory.fillDefaults().grab(true, true).hint(500, 330).applyTo(columns);
		Composite left = Sections.pane(toolkit, columns);
		design = new DesignSection(this, toolkit, Sections.create(toolkit, left, "Where they come from", "", true));
		var rows = new SashForm(columns, SWT.VERTICAL | SWT.SMOOTH);
		toolkit.adapt(rows);
		Composite top = Sections.pane(toolkit, rows);
		numbers = new CoefficientTable(getEditor(), toolkit, Sections.create(toolkit, top, "The numbers", "", true));
		Composite bottom = Sections.pane(toolkit, rows);
		picture = new PicturePane(Sections.create(toolkit, bottom, "Impulse response", "", true));
		picture.hideTools();
		picture.setStyle(PictureStyle.USUAL.with(PictureKind.IMPULSE));
		GridDataFactory.fillDefaults().grab(true, true).hint(300, 90).applyTo(picture);
		rows.setWeights(52, 48);
		columns.setWeights(42, 58);
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
