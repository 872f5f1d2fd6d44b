// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.junit.jupiter.api.Test;

import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;

import tapwright.core.meta.Meta;
import tapwright.model.ModelPackage;

/**
 * The published JSON Schema (draft 2020-12) of tapwright-filter/1 says what the reader accepts. It is made from the model here; when
 * the model changes, run this test with -Dtapwright.update=true and look at the difference.
 */
class FilterSchemaTest {

	private static final Path FILE = Path.of("schema/tapwright-filter-1.schema.json");

	@Test
	void describesWhatTheReaderAccepts() throws IOException {
		Path file = Files.isDirectory(Path.of("schema")) ? FILE : Path.of("bundles/tapwright.core").resolve(FILE);
		String schema = new GsonBuilder().setPrettyPrinting().disableHtmlEscaping().create().toJson(schema()) + "\n";
		if (Boolean.getBoolean("tapwright.update")) {
			Files.writeString(file, schema);
		}
		assertEquals(schema, Files.readString(file));
	}

	private static JsonObject schema() {
		JsonObject schema = new JsonObject();
		schema.addProperty("$schema", "https://json-schema.org/draft/2020-12/schema");
		schema.addProperty("$id", "urn:tapwright:filter:1");
		schema.addProperty("title", "One digital filter: requirements, design, coefficients, arithmetic");
		JsonObject filter = object(ModelPackage.Literals.FILTER, "format", FilterJson.FORMAT);
		filter.entrySet().forEach(member -> schema.add(member.getKey(), member.getValue()));
		JsonObject definitions = new JsonObject();
		JsonObject quantity = new JsonObject();
		quantity.addProperty("description", Meta.documentation(ModelPackage.Literals.QUANTITY));
		quantity.add("type", strings("number", "string"));
		definitions.add("quantity", quantity);
		definitions.add("design", variants(ModelPackage.Literals.DESIGN)); // designs can contain designs
		schema.add("$defs", definitions);
		return schema;
	}

	private static JsonObject object(EClass type, String nameKey, String name) {
		JsonObject properties = new JsonObject();
		JsonArray required = new JsonArray();
		if (!nameKey.isEmpty()) {
			JsonObject constant = new JsonObject();
			constant.addProperty("const", name);
			properties.add(nameKey, constant);
			required.add(nameKey);
		}
		for (EStructuralFeature feature : type.getEAllStructuralFeatures()) {
			properties.add(Meta.key(feature), feature(feature));
		}
		if (type == ModelPackage.Literals.REAL_COEFFICIENTS || type == ModelPackage.Literals.INTEGER_COEFFICIENTS) {
			required.add(type == ModelPackage.Literals.REAL_COEFFICIENTS ? "values" : "integers");
		}
		JsonObject schema = new JsonObject();
		schema.addProperty("description", Meta.documentation(type));
		schema.addProperty("type", "object");
		schema.add("properties", properties);
		if (!required.isEmpty()) {
			schema.add("required", required);
		}
		schema.addProperty("additionalProperties", false);
		return schema;
	}

	private static JsonObject feature(EStructuralFeature feature) {
		JsonObject value = feature instanceof EReference reference ? reference(reference) : attribute((EAttribute) feature);
		JsonObject schema = value;
		if (feature.isMany()) {
			schema = new JsonObject();
			schema.addProperty("type", "array");
			schema.add("items", value);
		}
		schema.addProperty("description", Meta.documentation(feature));
		return schema;
	}

	private static JsonObject reference(EReference reference) {
		EClass type = reference.getEReferenceType();
		JsonObject schema = new JsonObject();
		if (Pairs.isPair(reference)) {
			schema.addProperty("type", "array");
			JsonArray items = new JsonArray();
			type.getEAllAttributes().forEach(attribute -> items.add(feature(attribute)));
			schema.add("prefixItems", items);
			schema.addProperty("minItems", items.size());
			schema.addProperty("maxItems", items.size());
			return schema;
		}
		if (!type.isAbstract()) {
			return object(type, "", "");
		}
		if (type == ModelPackage.Literals.DESIGN) {
			schema.addProperty("$ref", "#/$defs/design");
			return schema;
		}
		return variants(type);
	}

	private static JsonObject variants(EClass type) {
		JsonArray variants = new JsonArray();
		for (EClassifier classifier : ModelPackage.eINSTANCE.getEClassifiers()) {
			if (classifier instanceof EClass variant && !variant.isAbstract() && type.isSuperTypeOf(variant)) {
				var name = Variants.name(variant);
				variants.add(name.isEmpty() ? object(variant, "", "")
						: object(variant, name.keySet().iterator().next(), name.values().iterator().next()));
			}
		}
		JsonObject schema = new JsonObject();
		schema.add("oneOf", variants);
		return schema;
	}

	private static JsonObject attribute(EAttribute attribute) {
		JsonObject schema = new JsonObject();
		if (Meta.isQuantity(attribute)) {
			schema.addProperty("$ref", "#/$defs/quantity");
		} else if (attribute.getEType() instanceof EEnum choices) {
			schema.add("enum", strings(choices.getELiterals().stream().map(literal -> literal.getLiteral()).toArray(String[]::new)));
		} else {
			schema.addProperty("type", switch (attribute.getEType().getClassifierID()) {
			case EcorePackage.EDOUBLE -> "number";
			case EcorePackage.EBIG_INTEGER -> "integer";
			case EcorePackage.EBOOLEAN -> "boolean";
			default -> "string";
			});
		}
		return schema;
	}

	private static JsonArray strings(String... texts) {
		JsonArray array = new JsonArray();
		List.of(texts).forEach(array::add);
		return array;
	}
}
