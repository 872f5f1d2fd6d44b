// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

import org.eclipse.jface.dialogs.IMessageProvider;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.IManagedForm;
import org.eclipse.ui.forms.editor.FormPage;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.core.quantity.Parameters;
import tapwright.model.ModelPackage;
import tapwright.model.Portfolio;
import tapwright.ui.field.FieldSet;
import tapwright.ui.field.ObjectTable;

/** What the product is, the numbers that its filters share, and what they run on. */
final class PortfolioPage extends FormPage {

	private static final Set<String> IDENTITY = Set.of("name", "description", "erosion");

	private final PortfolioEditor editor;
	private FieldSet identity;
	private ObjectTable parameters;
	private ObjectTable processors;

	PortfolioPage(PortfolioEditor editor) {
		super(editor, "portfolio", "Portfolio");
		this.editor = editor;
	}

	@Override
	protected void createFormContent(IManagedForm form) {
		FormToolkit toolkit = form.getToolkit();
		toolkit.decorateFormHeading(form.getForm().getForm());
		form.getForm().setText("Portfolio");
		Composite body = form.getForm().getBody();
		GridLayoutFactory.swtDefaults().numColumns(2).equalWidth(true).margins(8, 8).spacing(16, 12).applyTo(body);
		Composite what = Sections.create(toolkit, body, "What it is", "", false);
		identity = new FieldSet(editor.document(), toolkit, what, ModelPackage.Literals.PORTFOLIO,
				feature -> IDENTITY.contains(feature.getName()));
		Composite numbers = Sections.create(toolkit, body, "Parameters",
				"Numbers that filters share. A change is proven in every filter that uses them as soon as it is saved.", true);
		parameters = new ObjectTable(editor.document(), toolkit, numbers, ModelPackage.Literals.PORTFOLIO__PARAMETERS);
		Composite targets = Sections.create(toolkit, body, "Processors",
				"What the filters run on, and what it offers them.", false);
		processors = new ObjectTable(editor.document(), toolkit, targets, ModelPackage.Literals.PORTFOLIO__PROCESSORS);
		GridDataFactory.fillDefaults().grab(true, false).span(2, 1).applyTo(targets.getParent());
		refresh();
	}

	/** Shows what the model has now. */
	void refresh() {
		if (identity == null) {
			return;
		}
		Portfolio portfolio = editor.document().root();
		identity.setObject(portfolio);
		parameters.show(portfolio);
		processors.show(portfolio);
		Map<String, InputException> problems = new Parameters(portfolio.getParameters()).problems();
		String words = problems.values().stream().map(InputException::describe).collect(Collectors.joining("; "));
		getManagedForm().getForm().setMessage(words.isEmpty() ? null : words, IMessageProvider.ERROR);
	}

	/** Brings what is being typed into the model. */
	void commitFields() {
		if (identity != null) {
			identity.commit();
		}
	}
}
