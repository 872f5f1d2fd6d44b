// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;

import com.google.gson.stream.JsonWriter;

import tapwright.core.meta.Meta;

/** Writes model objects as JSON by the names and types of their features; what is not set is left out. */
final class ObjectWriter {

	private final JsonWriter json;

	private ObjectWriter(JsonWriter json) {
		this.json = json;
	}

	static String write(EObject root, String formatKey, String format) {
		var text = new StringWriter();
		try (var json = new JsonWriter(text)) {
			json.setIndent("  ");
			json.setHtmlSafe(false);
			json.beginObject();
			json.name(formatKey).value(format);
			new ObjectWriter(json).features(root);
			json.endObject();
		} catch (IOException e) {
			throw new UncheckedIOException("writing to memory", e);
		}
		return text.append('\n').toString();
	}

	private void features(EObject object) throws IOException {
		for (EStructuralFeature feature : object.eClass().getEAllStructuralFeatures()) {
			if (!object.eIsSet(feature)) {
				continue;
			}
			json.name(Meta.key(feature));
			if (feature.isMany()) {
				json.beginArray();
				for (Object value : (List<?>) object.eGet(feature)) {
					value(feature, value);
				}
				json.endArray();
			} else {
				value(feature, object.eGet(feature));
			}
		}
	}

	private void value(EStructuralFeature feature, Object value) throws IOException {
		switch (value) {
		case EObject object when Pairs.isPair((EReference) feature) -> pair(object);
		case EObject object -> object(object);
		case Double number -> json.value(number);
		case BigInteger number -> json.value(number);
		case Boolean flag -> json.value(flag);
		case Enumerator literal -> json.value(literal.getLiteral());
		default -> quantity(feature, value.toString());
		}
	}

	private void object(EObject object) throws IOException {
		json.beginObject();
		for (Map.Entry<String, String> name : Variants.name(object.eClass()).entrySet()) {
			json.name(name.getKey()).value(name.getValue());
		}
		features(object);
		json.endObject();
	}

	private void pair(EObject object) throws IOException {
		json.beginArray();
		for (String text : Pairs.write(object)) {
			number(text);
		}
		json.endArray();
	}

	private void quantity(EStructuralFeature feature, String text) throws IOException {
		if (Meta.isQuantity(feature)) {
			number(text);
		} else {
			json.value(text);
		}
	}

	// A plain number is written as one, an expression in quotes.
	private void number(String text) throws IOException {
		if (text != null && text.matches("-?(0|[1-9]\\d*)(\\.\\d+)?([eE][-+]?\\d{1,3})?")) {
			json.jsonValue(text);
		} else {
			json.value(text);
		}
	}
}
