// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EClass;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.model.ModelPackage;

/** Tells which class an object has where several are possible: by 'kind', by 'method', or by the numbers that coefficients have. */
final class Variants {

	private record Choice(String key, Function<EClass, String> name, List<EClass> types) {
	}

	private static final Map<EClass, Choice> CHOICES = Map.of( //
			ModelPackage.Literals.REQUIREMENT, new Choice("kind", Meta::kind, Meta.requirementKinds()),
			ModelPackage.Literals.DESIGN, new Choice("method", Meta::method, Meta.designMethods()));

	private Variants() {
	}

	/** The class that the members ask for. */
	static EClass choose(EClass base, Map<?, ?> members, String place) throws InputException {
		Choice choice = CHOICES.get(base);
		if (choice == null) {
			return coefficients(members, place);
		}
		Object name = members.get(choice.key());
		for (EClass type : choice.types()) {
			if (choice.name().apply(type).equals(name)) {
				return type;
			}
		}
		String known = choice.types().stream().map(choice.name()).collect(Collectors.joining(", "));
		throw new InputException(JsonTree.pointer(place, choice.key()),
				name == null ? "is missing; it must be one of " + known : "'" + name + "' is not known; known are " + known);
	}

	/** The members without the one that names the class. */
	static Map<?, ?> withoutName(EClass base, Map<?, ?> members) {
		Choice choice = CHOICES.get(base);
		if (choice == null) {
			return members;
		}
		var rest = new LinkedHashMap<>(members);
		rest.remove(choice.key());
		return rest;
	}

	/** The member that names the class of an object, as key and value; nothing where the class is plain. */
	static Map<String, String> name(EClass type) {
		for (Map.Entry<EClass, Choice> choice : CHOICES.entrySet()) {
			if (choice.getKey().isSuperTypeOf(type)) {
				return Map.of(choice.getValue().key(), choice.getValue().name().apply(type));
			}
		}
		return Map.of();
	}

	private static EClass coefficients(Map<?, ?> members, String place) throws InputException {
		boolean real = members.containsKey("values");
		if (real == members.containsKey("integers")) {
			throw new InputException(place, "must have either 'values' or 'integers'");
		}
		return real ? ModelPackage.Literals.REAL_COEFFICIENTS : ModelPackage.Literals.INTEGER_COEFFICIENTS;
	}
}
