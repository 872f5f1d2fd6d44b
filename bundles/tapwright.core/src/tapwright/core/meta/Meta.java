// SPDX-License-Identifier: EPL-2.0
package tapwright.core.meta;

import java.util.List;
import java.util.Optional;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EModelElement;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.model.ModelPackage;

/** Reads the annotations of the model: the one place where names of kinds, units and documentation are written. */
public final class Meta {

	private static final String SOURCE = "urn:tapwright:meta";

	private Meta() {
	}

	/** The name of a requirement kind in interchange files: 'gain', 'linear-phase', ... */
	public static String kind(EClass requirement) {
		return required(requirement, "kind");
	}

	/** The name of a design method in interchange files: 'equiripple', 'window', ... */
	public static String method(EClass design) {
		return required(design, "method");
	}

	/** What a person calls the requirement kind or design method. */
	public static String label(EClass type) {
		return required(type, "label");
	}

	/** The unit symbol of a number; '1' for plain numbers. */
	public static String unit(EAttribute feature) {
		return detail(feature, "unit").orElse("1");
	}

	/** Whether the feature is a number that a person may write as an expression. */
	public static boolean isQuantity(EStructuralFeature feature) {
		return feature.getEType() == ModelPackage.Literals.QUANTITY;
	}

	/** The name of a feature in files and messages. */
	public static String key(EStructuralFeature feature) {
		return feature.getName();
	}

	/** What the model's documentation says of an element, for a tool tip. */
	public static String documentation(EModelElement element) {
		return Optional.ofNullable(EcoreUtil.getDocumentation(element)).orElse("");
	}

	/** All kinds of requirement, in the order of the model. */
	public static List<EClass> requirementKinds() {
		return concrete(ModelPackage.Literals.REQUIREMENT);
	}

	/** All design methods, in the order of the model. */
	public static List<EClass> designMethods() {
		return concrete(ModelPackage.Literals.DESIGN);
	}

	private static List<EClass> concrete(EClass base) {
		return ModelPackage.eINSTANCE.getEClassifiers().stream().filter(EClass.class::isInstance).map(EClass.class::cast)
				.filter(type -> !type.isAbstract() && base.isSuperTypeOf(type)).toList();
	}

	private static String required(EModelElement element, String key) {
		return detail(element, key)
				.orElseThrow(() -> new IllegalArgumentException(element + " has no annotation '" + key + "'"));
	}

	private static Optional<String> detail(EModelElement element, String key) {
		return Optional.ofNullable(EcoreUtil.getAnnotation(element, SOURCE, key));
	}
}
