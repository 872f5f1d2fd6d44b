// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;

import tapwright.core.compare.ContentChange.Part;
import tapwright.core.meta.Meta;
import tapwright.model.Design;
import tapwright.model.ModelPackage;
import tapwright.model.Parameter;
import tapwright.model.Requirement;
import tapwright.model.Revision;

/** Finds what differs in the content of two states, feature by feature; coefficients are left to {@link CoefficientTable}. */
final class ContentChanges {

	private final List<ContentChange> changes = new ArrayList<>();

	private ContentChanges() {
	}

	/** All differences, in the order of the parts. */
	static List<ContentChange> between(Revision before, Revision after) {
		var found = new ContentChanges();
		for (EAttribute attribute : ModelPackage.Literals.FILTER.getEAllAttributes()) {
			found.value(Part.FILTER, Meta.key(attribute), text(before.getFilter(), attribute), text(after.getFilter(), attribute));
		}
		found.list(Part.FILTER, "deployment", before.getFilter().getDeployments(), after.getFilter().getDeployments());
		found.list(Part.PARAMETERS, "parameter", before.getParameters(), after.getParameters());
		found.list(Part.REQUIREMENTS, "requirement", before.getFilter().getRequirements(), after.getFilter().getRequirements());
		found.object(Part.DESIGN, "", before.getFilter().getDesign(), after.getFilter().getDesign());
		found.object(Part.ARITHMETIC, "", before.getFilter().getArithmetic(), after.getFilter().getArithmetic());
		return List.copyOf(found.changes);
	}

	private void object(Part part, String place, EObject before, EObject after) {
		if (before == null || after == null || before.eClass() != after.eClass()) {
			value(part, place.isEmpty() ? "all" : place, words(before), words(after));
			return;
		}
		String prefix = place.isEmpty() ? "" : place + ": ";
		for (EStructuralFeature feature : before.eClass().getEAllStructuralFeatures()) {
			String inner = prefix + Meta.key(feature);
			if (feature instanceof EReference && feature.isMany()) {
				list(part, inner, (List<?>) before.eGet(feature), (List<?>) after.eGet(feature));
			} else if (feature instanceof EReference) {
				object(part, inner, (EObject) before.eGet(feature), (EObject) after.eGet(feature));
			} else {
				value(part, inner, text(before, feature), text(after, feature));
			}
		}
	}

	private void list(Part part, String name, List<?> before, List<?> after) {
		Map<String, EObject> old = byKey(name, before);
		Map<String, EObject> young = byKey(name, after);
		var keys = new LinkedHashSet<>(old.keySet());
		keys.addAll(young.keySet());
		keys.forEach(key -> object(part, key, old.get(key), young.get(key)));
	}

	private void value(Part part, String place, String before, String after) {
		if (!before.equals(after)) {
			changes.add(new ContentChange(part, place, before, after));
		}
	}

	// Objects that have a name of their own are found by it wherever they stand; others by their place.
	private static Map<String, EObject> byKey(String name, List<?> objects) {
		var keys = new LinkedHashMap<String, EObject>();
		for (Object element : objects) {
			String key = switch (element) {
			case Requirement requirement -> String.valueOf(requirement.getId());
			case Parameter parameter -> String.valueOf(parameter.getName());
			default -> name + " " + (keys.size() + 1);
			};
			while (keys.containsKey(key)) {
				key += " again";
			}
			keys.put(key, (EObject) element);
		}
		return keys;
	}

	private static String words(EObject object) {
		if (object == null) {
			return "";
		}
		String inner = object.eClass().getEAllStructuralFeatures().stream().filter(object::eIsSet)
				.filter(feature -> !Objects.equals(feature.getName(), "id") && !Objects.equals(feature.getName(), "name"))
				.map(feature -> Meta.key(feature) + " " + (feature instanceof EReference reference ? inner(object, reference)
						: text(object, feature)))
				.collect(Collectors.joining(", "));
		String label = object instanceof Requirement || object instanceof Design ? Meta.label(object.eClass())
				: object.eClass().getName().toLowerCase(Locale.ROOT);
		return inner.isEmpty() ? label : label + " (" + inner + ")";
	}

	private static String inner(EObject object, EReference reference) {
		return reference.isMany() ? ((List<?>) object.eGet(reference)).stream().map(element -> words((EObject) element))
				.collect(Collectors.joining("; ")) : words((EObject) object.eGet(reference));
	}

	private static String text(EObject object, EStructuralFeature feature) {
		Object value = object.eGet(feature);
		return switch (value) {
		case null -> "";
		case Enumerator choice -> choice.getLiteral();
		case String text when feature instanceof EAttribute attribute && Meta.isQuantity(attribute) && !text.isBlank()
				&& text.matches("[-+0-9.eE]+") && !Meta.unit(attribute).equals("1") -> text + " " + Meta.unit(attribute);
		default -> value.toString();
		};
	}
}
