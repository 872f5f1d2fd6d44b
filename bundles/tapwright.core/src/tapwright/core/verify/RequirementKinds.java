// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import tapwright.core.verify.kind.ArithmeticKinds;
import tapwright.core.verify.kind.CostKinds;
import tapwright.core.verify.kind.FrequencyKinds;
import tapwright.core.verify.kind.GainKind;
import tapwright.core.verify.kind.PowerComplementaryKind;
import tapwright.core.verify.kind.TimeKinds;
import tapwright.model.Requirement;

/** Finds the kind that a requirement is of. A new kind is added here and nowhere else. */
public final class RequirementKinds {

	private static final Map<Class<?>, RequirementKind<?>> KINDS = new LinkedHashMap<>();

	static {
		register(List.of(new GainKind(), new PowerComplementaryKind()));
		register(FrequencyKinds.ALL);
		register(TimeKinds.ALL);
		register(CostKinds.ALL);
		register(ArithmeticKinds.ALL);
	}

	private RequirementKinds() {
	}

	private static void register(List<RequirementKind<?>> kinds) {
		kinds.forEach(kind -> KINDS.put(kind.type(), kind));
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
