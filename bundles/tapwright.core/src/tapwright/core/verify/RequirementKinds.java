// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import tapwright.core.verify.kind.GainKind;
import tapwright.model.Requirement;

/** Finds the kind that a requirement is of. A new kind is added here and nowhere else. */
public final class RequirementKinds {

	private static final Map<Class<?>, RequirementKind<?>> KINDS = new LinkedHashMap<>();

	static {
		for (RequirementKind<?> kind : List.of(new GainKind())) {
			KINDS.put(kind.type(), kind);
		}
	}

	private RequirementKinds() {
	}

	/** The kind of a requirement. */
	public static <T extends Requirement> RequirementKind<T> of(T requirement) {
		Class<?> type = requirement.eClass().getInstanceClass();
		RequirementKind<?> kind = KINDS.get(type);
		if (kind == null) {
			throw new IllegalArgumentException("no kind is registered for " + type.getSimpleName());
		}
		@SuppressWarnings("unchecked") // the map holds each kind under its own type
		RequirementKind<T> found = (RequirementKind<T>) kind;
		return found;
	}
}
