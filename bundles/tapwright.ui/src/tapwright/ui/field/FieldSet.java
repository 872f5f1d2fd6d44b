// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Predicate;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

/** Fields for the features of a class, in the order of the model. UI thread. */
public final class FieldSet {

	private record Field(Consumer<EObject> show, Runnable refresh, Runnable commit) {
	}

	private final List<Field> fields = new ArrayList<>();

	/** Lays the fields out in a composite, which gets three columns. */
	public FieldSet(ModelAccess access, FormToolkit toolkit, Composite parent, EClass type,
			Predicate<EStructuralFeature> wanted) {
		GridLayoutFactory.fillDefaults().numColumns(3).margins(2, 2).spacing(8, 6).applyTo(parent);
		for (EStructuralFeature feature : type.getEAllStructuralFeatures()) {
			if (!wanted.test(feature)) {
				continue;
			}
			if (feature instanceof EReference reference && reference.isMany()) {
				var rows = new RowsField(access, toolkit, parent, reference);
				fields.add(new Field(rows::setObject, rows::refresh, rows::commit));
			} else if (feature instanceof EAttribute attribute && attribute.getEAttributeType() instanceof EEnum) {
				var choice = new ChoiceField(access, toolkit, parent, attribute);
				fields.add(new Field(choice::setObject, choice::refresh, choice::commit));
			} else if (feature instanceof EAttribute attribute && !attribute.isMany()) {
				int style = isLong(attribute) ? SWT.MULTI | SWT.WRAP | SWT.V_SCROLL : SWT.SINGLE;
				var text = new FeatureField(access, toolkit, parent, attribute, style);
				fields.add(new Field(text::setObject, text::refresh, text::commit));
			}
		}
	}

	private static boolean isLong(EAttribute attribute) {
		return List.of("note", "purpose", "description").contains(attribute.getName());
	}

	/** Shows an object of the class. */
	public void setObject(EObject object) {
		fields.forEach(field -> field.show().accept(object));
	}

	/** Shows what the model has now. */
	public void refresh() {
		fields.forEach(field -> field.refresh().run());
	}

	/** Brings what is being typed into the model, as far as it makes sense. */
	public void commit() {
		fields.forEach(field -> field.commit().run());
	}
}
