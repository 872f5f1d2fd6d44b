// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.interchange.JsonTree.NumberLiteral;
import tapwright.core.meta.Meta;

/** Fills model objects from JSON by the names and types of their features. */
final class ObjectReader {

	private ObjectReader() {
	}

	static void fill(EObject object, Map<?, ?> members, String pointer) throws InputException {
		for (Map.Entry<?, ?> member : members.entrySet()) {
			String key = (String) member.getKey();
			String place = JsonTree.pointer(pointer, key);
			EStructuralFeature feature = object.eClass().getEStructuralFeature(key);
			if (feature == null) {
				throw new InputException(place, "is not known; known are " + object.eClass().getEAllStructuralFeatures().stream()
						.map(EStructuralFeature::getName).collect(Collectors.joining(", ")));
			}
			object.eSet(feature, feature.isMany() ? many(feature, member.getValue(), place)
					: one(feature, member.getValue(), place));
		}
	}

	private static List<Object> many(EStructuralFeature feature, Object value, String place) throws InputException {
		if (!(value instanceof List<?> elements)) {
			throw new InputException(place, "must be a JSON array");
		}
		var results = new ArrayList<>(elements.size());
		for (int k = 0; k < elements.size(); k++) {
			results.add(one(feature, elements.get(k), place + "/" + k));
		}
		return results;
	}

	private static Object one(EStructuralFeature feature, Object value, String place) throws InputException {
		return feature instanceof EReference reference ? object(reference, value, place)
				: attribute((EAttribute) feature, value, place);
	}

	private static EObject object(EReference reference, Object value, String place) throws InputException {
		EClass type = reference.getEReferenceType();
		if (Pairs.isPair(reference) && value instanceof List<?> pair) {
			return Pairs.read(type, pair, place);
		}
		if (!(value instanceof Map<?, ?> members)) {
			throw new InputException(place, Pairs.isPair(reference) ? "must be a pair of numbers" : "must be a JSON object");
		}
		EObject object = EcoreUtil.create(type.isAbstract() ? Variants.choose(type, members, place) : type);
		fill(object, Variants.withoutName(type, members), place);
		return object;
	}

	static Object attribute(EAttribute feature, Object value, String place) throws InputException {
		if (Meta.isQuantity(feature)) {
			return switch (value) {
			case NumberLiteral number -> number.text();
			case String expression -> expression;
			default -> throw new InputException(place, "must be a number or an expression in quotes");
			};
		}
		if (feature.getEType() instanceof EEnum choices) {
			EEnumLiteral literal = value instanceof String name ? choices.getEEnumLiteralByLiteral(name) : null;
			if (literal == null) {
				throw new InputException(place, "must be one of " + choices.getELiterals().stream()
						.map(EEnumLiteral::getLiteral).collect(Collectors.joining(", ")));
			}
			return literal.getInstance();
		}
		return switch (feature.getEType().getClassifierID()) {
		case EcorePackage.EDOUBLE -> real(value, place);
		case EcorePackage.EBIG_INTEGER -> integer(value, place);
		case EcorePackage.EBOOLEAN -> typed(Boolean.class, value, place, "true or false");
		default -> typed(String.class, value, place, "a string");
		};
	}

	private static double real(Object value, String place) throws InputException {
		double number = Double.parseDouble(typed(NumberLiteral.class, value, place, "a number").text());
		if (Double.isInfinite(number)) {
			throw new InputException(place, "is beyond the largest double");
		}
		return number;
	}

	private static BigInteger integer(Object value, String place) throws InputException {
		String text = typed(NumberLiteral.class, value, place, "a whole number").text();
		if (!text.matches("-?\\d{1,400}")) {
			throw new InputException(place, "must be a whole number of at most 400 digits");
		}
		return new BigInteger(text);
	}

	private static <T> T typed(Class<T> type, Object value, String place, String expected) throws InputException {
		if (!type.isInstance(value)) {
			throw new InputException(place, "must be " + expected);
		}
		return type.cast(value);
	}
}
