// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.quantity.Words;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.verify.Subject;
import tapwright.model.Arithmetic;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;
import tapwright.model.Structure;
import tapwright.ui.field.FieldSet;
import tapwright.ui.proof.Proven;

/** The structure and the number formats that the filter runs in, and what it costs. */
final class ArithmeticPage extends FilterEditorPage {

	static final String ID = "arithmetic";

	private Composite stack;
	private Composite without;
	private Composite with;
	private FieldSet operations;
	private FormatTable formats;
	private Label cost;

	ArithmeticPage(FilterEditor editor) {
		super(editor, ID, "Arithmetic");
	}

	@Override
	void createBody(Composite body, FormToolkit toolkit) {
		GridLayoutFactory.swtDefaults().margins(8, 8).applyTo(body);
		stack = toolkit.createComposite(body);
		stack.setLayout(new StackLayout());
		GridDataFactory.fillDefaults().grab(true, true).applyTo(stack);
		without = toolkit.createComposite(stack);
		GridLayoutFactory.swtDefaults().applyTo(without);
		toolkit.createLabel(without, "The filter runs with the stored numbers as they are. "
				+ "Word lengths, overflow and noise are not considered.");
		Button state = toolkit.createButton(without, "State the Arithmetic", SWT.PUSH);
		state.addListener(SWT.Selection, event -> set(start()));
		with = toolkit.createComposite(stack);
		GridLayoutFactory.fillDefaults().numColumns(2).equalWidth(true).spacing(16, 10).applyTo(with);
		Composite left = Sections.create(toolkit, with, "Order of operations", "", false);
		Composite fields = toolkit.createComposite(left);
		operations = new FieldSet(getEditor().document(), toolkit, fields, ModelPackage.Literals.ARITHMETIC, feature -> true);
		GridDataFactory.fillDefaults().grab(true, false).applyTo(fields);
		add(operations);
		Composite right = Sections.create(toolkit, with, "What it costs", "", false);
		cost = toolkit.createLabel(right, "", SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, true).hint(200, SWT.DEFAULT).applyTo(cost);
		Composite below = Sections.create(toolkit, with, "Number formats",
				"An empty word means exact numbers. Coefficients are rounded to the nearest step: so they ship, so they are proven.",
				true);
		GridDataFactory.fillDefaults().grab(true, true).span(2, 1).applyTo(below.getParent());
		formats = new FormatTable(getEditor().document(), toolkit, below);
		Button drop = toolkit.createButton(below, "Run With Exact Numbers", SWT.PUSH);
		drop.setToolTipText("Removes structure and formats; can be undone");
		drop.addListener(SWT.Selection, event -> set(null));
	}

	private static Arithmetic start() {
		Arithmetic arithmetic = ModelFactory.eINSTANCE.createArithmetic();
		arithmetic.setStructure(Structure.DIRECT);
		return arithmetic;
	}

	private void set(Arithmetic arithmetic) {
		ModelDocument<Filter> document = getEditor().document();
		document.domain().getCommandStack().execute(SetCommand.create(document.domain(), filter(),
				ModelPackage.Literals.FILTER__ARITHMETIC, arithmetic == null ? SetCommand.UNSET_VALUE : arithmetic));
	}

	@Override
	void refresh() {
		Arithmetic arithmetic = filter().getArithmetic();
		((StackLayout) stack.getLayout()).topControl = arithmetic == null ? without : with;
		stack.layout();
		operations.setObject(arithmetic);
		formats.show(arithmetic);
	}

	@Override
	void showEvidence(Proven proven) {
		String words = proven.snapshot().subject().map(ArithmeticPage::cost)
				.orElse("It cannot be counted while something is to be corrected.");
		cost.setText(words);
		cost.requestLayout();
	}

	private static String cost(Subject subject) {
		if (subject.arithmetic().isEmpty()) {
			return "";
		}
		Cost counted = Cost.of(subject.taps(), subject.arithmetic().get());
		return counted.multiplies() + " multiplications and " + counted.adds() + " additions for every "
				+ (counted.inputs() == 1 ? "input sample" : counted.inputs() + " input samples") + "\n"
				+ Words.of(counted.multipliesPerSecond(subject.sampleRate()), "1")
				+ " multiplications per second\n" + counted.coefficientWords() + " words for coefficients, "
				+ counted.delayWords() + " words for delay lines";
	}
}
