// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Set;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.forms.events.HyperlinkAdapter;
import org.eclipse.ui.forms.events.HyperlinkEvent;
import org.eclipse.ui.forms.widgets.FormToolkit;
import org.eclipse.ui.forms.widgets.ImageHyperlink;

import tapwright.core.verify.InputProblem;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Verdict;
import tapwright.model.ModelPackage;
import tapwright.ui.field.FieldSet;
import tapwright.ui.field.ObjectTable;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.ui.picture.PicturePane;
import tapwright.ui.proof.Proven;

/** What the filter is, what needs attention, where it runs, and a glance at its response. */
final class FilterPage extends FilterEditorPage {

	static final String ID = "filter";

	private static final Set<String> IDENTITY = Set.of("name", "purpose", "sampleRate");
	private static final int LONGEST_LIST = 12;

	private FieldSet identity;
	private Composite attention;
	private ObjectTable deployments;
	private PicturePane picture;
	private FormToolkit toolkit;

	FilterPage(FilterEditor editor) {
		super(editor, ID, "Filter");
	}

	@Override
	void createBody(Composite body, FormToolkit formToolkit) {
		toolkit = formToolkit;
		GridLayoutFactory.swtDefaults().numColumns(2).equalWidth(true).margins(8, 8).spacing(16, 10).applyTo(body);
		Composite left = column(body);
		Composite fields = Sections.create(toolkit, left, "What it is", "", false);
		identity = new FieldSet(getEditor().document(), toolkit, fields, ModelPackage.Literals.FILTER,
				feature -> IDENTITY.contains(feature.getName()));
		add(identity);
		attention = Sections.create(toolkit, left, "Needs attention", "", false);
		Composite runs = Sections.create(toolkit, left, "Where it runs", "", true);
		deployments = new ObjectTable(getEditor().document(), toolkit, runs,
				ModelPackage.Literals.FILTER__DEPLOYMENTS);
		Composite right = column(body);
		Composite glance = Sections.create(toolkit, right, "Response", "", true);
		picture = new PicturePane(glance);
		picture.hideTools();
		GridDataFactory.fillDefaults().grab(true, true).hint(320, 260).applyTo(picture);
	}

	private Composite column(Composite body) {
		Composite column = toolkit.createComposite(body);
		GridLayoutFactory.fillDefaults().spacing(0, 12).applyTo(column);
		GridDataFactory.fillDefaults().grab(true, true).applyTo(column);
		return column;
	}

	@Override
	void refresh() {
		identity.setObject(filter());
		deployments.show(filter());
	}

	@Override
	void showEvidence(Proven proven) {
		picture.show(overlays());
		if (proven.stale()) {
			return; // the list is kept until the new one is there
		}
		for (Control child : attention.getChildren()) {
			child.dispose();
		}
		List<RequirementEvidence> open = proven.evidence().requirements().stream()
				.filter(found -> found.proof().verdict() != Verdict.MET).toList();
		List<InputProblem> problems = proven.evidence().problems();
		if (open.isEmpty() && problems.isEmpty()) {
			var met = toolkit.createLabel(attention, proven.evidence().requirements().isEmpty()
					? "Nothing is asked of this filter yet. Add requirements on the next page."
					: "Nothing. All requirements are proven to be met.");
			GridDataFactory.fillDefaults().grab(true, false).applyTo(met);
		}
		problems.stream().limit(LONGEST_LIST).forEach(problem -> link(Icons.get(Verdicts.icon(Verdict.UNPROVEN)),
				problem.describe(), problem.requirement()));
		open.stream().limit(LONGEST_LIST)
				.forEach(found -> link(Verdicts.image(found.proof().verdict()), found.message(), found.id()));
		int more = open.size() + problems.size() - 2 * LONGEST_LIST;
		if (more > 0) {
			toolkit.createLabel(attention, more + " more on the page Evidence");
		}
		attention.requestLayout(); // a reflow alone is ignored before the form was first laid out
		getManagedForm().reflow(true);
	}

	private void link(Image image, String text, String requirement) {
		ImageHyperlink link = toolkit.createImageHyperlink(attention, SWT.WRAP);
		link.setImage(image);
		link.setText(text);
		GridDataFactory.fillDefaults().grab(true, false).hint(100, SWT.DEFAULT).applyTo(link);
		link.addHyperlinkListener(new HyperlinkAdapter() {
			@Override
			public void linkActivated(HyperlinkEvent event) {
				if (requirement.isEmpty()) {
					getEditor().setActivePage(CoefficientsPage.ID);
				} else {
					getEditor().showRequirement(requirement);
				}
			}
		});
	}
}
