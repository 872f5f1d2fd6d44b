// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.List;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.meta.Meta;

/** A list of choices for an attribute. UI thread. */
public final class ChoiceField {

	private static final int GAP = 4;

	private final ModelAccess access;
	private final EAttribute feature;
	private final Combo combo;
	private final List<EEnumLiteral> literals;
	private EObject object;

	/** Makes label and list in a parent with three columns. */
	public ChoiceField(ModelAccess access, FormToolkit toolkit, Composite parent, EAttribute feature) {
		this.access = access;
		this.feature = feature;
		Label label = toolkit.createLabel(parent, FeatureWords.label(feature));
		label.setToolTipText(Meta.documentation(feature));
		combo = new Combo(parent, SWT.READ_ONLY | SWT.DROP_DOWN);
		combo.setToolTipText(Meta.documentation(feature));
		combo.setData("feature", feature.getName());
		toolkit.adapt(combo, true, true);
		literals = ((EEnum) feature.getEAttributeType()).getELiterals();
		literals.forEach(literal -> combo.add(FeatureWords.choice(literal.getLiteral())));
		GridDataFactory.fillDefaults().grab(true, false).indent(GAP, 0).span(2, 1).applyTo(combo);
		combo.addListener(SWT.Selection, event -> commit());
	}

	/** Shows the attribute of an object; null shows nothing. */
	public void setObject(EObject next) {
		object = next;
		combo.setEnabled(next != null);
		refresh();
	}

	/** Shows what the model has now. */
	public void refresh() {
		if (combo.isDisposed() || object == null) {
			return;
		}
		var value = (Enumerator) object.eGet(feature);
		for (int k = 0; k < literals.size(); k++) {
			if (literals.get(k).getInstance().equals(value) && combo.getSelectionIndex() != k) {
				combo.select(k);
			}
		}
	}

	/** Brings what is being typed into the model if it makes sense. */
	public void commit() {
		int index = combo.getSelectionIndex();
		if (object != null && index >= 0 && !literals.get(index).getInstance().equals(object.eGet(feature))) {
			access.domain().getCommandStack().execute(
					SetCommand.create(access.domain(), object, feature, literals.get(index).getInstance()));
		}
	}
}
