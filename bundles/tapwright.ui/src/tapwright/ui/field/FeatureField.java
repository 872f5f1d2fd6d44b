// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.Objects;
import java.util.Optional;
import java.util.regex.Pattern;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.fieldassist.ControlDecoration;
import org.eclipse.jface.fieldassist.FieldDecorationRegistry;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;

/**
 * A line of text for an attribute. Checks while typing, with the message at the field; changes the model by one command after a
 * pause, on Enter, or when the field is left. Text that makes no sense stays in the field and is kept from the model. UI thread.
 */
public final class FeatureField {

	private static final int PAUSE_MS = 400;
	private static final int GAP = 4;

	private final ModelAccess access;
	private final EAttribute feature;
	private final Text text;
	private final Label meaning;
	private final ControlDecoration decoration;
	private EObject object;
	private boolean filling;
	private int typed;

	/**
	 * Makes label, field and unit in a parent with three columns.
	 *
	 * @param style
	 *            of the text: SWT.SINGLE, or SWT.MULTI | SWT.WRAP
	 */
	public FeatureField(ModelAccess access, FormToolkit toolkit, Composite parent, EAttribute feature, int style) {
		this.access = access;
		this.feature = feature;
		Label label = toolkit.createLabel(parent, FeatureWords.label(feature));
		label.setToolTipText(Meta.documentation(feature));
		boolean multi = (style & SWT.MULTI) != 0;
		GridDataFactory.swtDefaults().align(SWT.BEGINNING, multi ? SWT.BEGINNING : SWT.CENTER).applyTo(label);
		text = toolkit.createText(parent, "", style | SWT.BORDER);
		text.setToolTipText(Meta.documentation(feature));
		text.setData("feature", feature.getName());
		GridDataFactory.fillDefaults().grab(true, false).indent(GAP, 0).hint(90, multi ? 3 * text.getLineHeight() : SWT.DEFAULT)
				.span(Meta.isQuantity(feature) ? 1 : 2, 1).applyTo(text);
		meaning = Meta.isQuantity(feature) ? toolkit.createLabel(parent, "") : null;
		if (meaning != null) {
			GridDataFactory.fillDefaults().align(SWT.FILL, SWT.CENTER).hint(meaningWidth(text), SWT.DEFAULT).applyTo(meaning);
		}
		decoration = new ControlDecoration(text, SWT.TOP | SWT.LEFT);
		decoration.setImage(
				FieldDecorationRegistry.getDefault().getFieldDecoration(FieldDecorationRegistry.DEC_ERROR).getImage());
		decoration.hide();
		text.addListener(SWT.Modify, event -> modified());
		text.addListener(SWT.FocusOut, event -> commit());
		text.addListener(SWT.DefaultSelection, event -> commit());
	}

	private static int meaningWidth(Control control) {
		var gc = new GC(control);
		try {
			return gc.textExtent("= 192.000 kHz").x;
		} finally {
			gc.dispose();
		}
	}

	/** The attribute. */
	public EAttribute feature() {
		return feature;
	}

	/** Shows the attribute of an object; null shows nothing. */
	public void setObject(EObject next) {
		if (next != object && object != null) {
			commit();
		}
		object = next;
		text.setEnabled(next != null);
		refresh();
	}

	/** Shows what the model has now, unless the field holds something that is being typed and makes no sense yet. */
	public void refresh() {
		if (text.isDisposed()) {
			return;
		}
		String value = value();
		boolean typing = text.isFocusControl() && problem().isPresent() && object != null;
		if (!typing && !text.getText().equals(value) && !meansTheSame(value)) {
			filling = true;
			text.setText(value);
			filling = false;
		}
		check();
	}

	private boolean meansTheSame(String value) {
		return text.isFocusControl() && text.getText().strip().equals(value);
	}

	/** Puts the cursor into the field. */
	public void setFocus() {
		text.setFocus();
	}

	/** What keeps the text from the model; nothing when it makes sense. */
	public Optional<String> problem() {
		return object == null ? Optional.empty() : QuantityCheck.problem(access, feature, text.getText());
	}

	private String value() {
		return object == null ? "" : Objects.toString(object.eGet(feature), "");
	}

	private void modified() {
		if (filling) {
			return;
		}
		check();
		int stamp = ++typed;
		text.getDisplay().timerExec(PAUSE_MS, () -> {
			if (stamp == typed && !text.isDisposed()) {
				commit();
			}
		});
	}

	private void check() {
		Optional<String> problem = problem();
		problem.ifPresent(decoration::setDescriptionText);
		if (problem.isPresent()) {
			decoration.show();
			decoration.showHoverText(text.isFocusControl() ? problem.get() : null);
		} else {
			decoration.hide();
			decoration.hideHover();
		}
		if (meaning != null) {
			meaning.setText(meaning(problem.isPresent()));
		}
	}

	// The unit, and what an expression comes to.
	private String meaning(boolean wrong) {
		String unit = Meta.unit(feature).equals("1") ? "" : Meta.unit(feature);
		String typedText = text.getText().strip();
		if (wrong || typedText.isEmpty() || object == null) {
			return unit;
		}
		try {
			double value = new Numbers(access.parameters()).evaluate(typedText, feature);
			boolean plain = typedText.matches("-?[0-9.]+");
			return plain ? unit : typedText.matches("-?[0-9.]+ ?" + Pattern.quote(unit)) ? ""
					: "= " + Words.exactly(value, Meta.unit(feature));
		} catch (InputException e) {
			return unit; // the message stands at the field already
		}
	}

	/** Brings what is being typed into the model if it makes sense. */
	public void commit() {
		typed++;
		if (object == null || text.isDisposed() || filling || problem().isPresent()) {
			return;
		}
		String typedText = text.getText();
		String next = (text.getStyle() & SWT.MULTI) != 0 ? typedText : typedText.strip();
		if (!next.equals(value())) {
			Object value = next.isBlank() ? SetCommand.UNSET_VALUE : next;
			access.domain().getCommandStack().execute(SetCommand.create(access.domain(), object, feature, value));
		}
	}
}
