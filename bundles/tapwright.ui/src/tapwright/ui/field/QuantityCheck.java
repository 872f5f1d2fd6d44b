// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.Optional;

import org.eclipse.emf.ecore.EAttribute;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.model.ModelPackage;

/** Checks what a person types for an attribute. */
final class QuantityCheck {

	private QuantityCheck() {
	}

	/** What keeps a text from being the value of an attribute; nothing when it makes sense, or is empty. */
	static Optional<String> problem(ModelAccess access, EAttribute attribute, String text) {
		if (!Meta.isQuantity(attribute) || text.isBlank()) {
			return Optional.empty();
		}
		try {
			if (attribute == ModelPackage.Literals.PARAMETER__VALUE) {
				Expression.evaluate(text, access.parameters()); // its unit stands in another column
			} else {
				new Numbers(access.parameters()).evaluate(text, attribute);
			}
			return Optional.empty();
		} catch (InputException e) {
			return Optional.of(e.getMessage());
		}
	}
}
