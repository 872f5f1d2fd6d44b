// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.design.kind.ClosedFormKinds;
import tapwright.core.design.kind.EquirippleDesignKind;
import tapwright.core.design.kind.OptimalKinds;
import tapwright.core.design.kind.SpecialKinds;
import tapwright.core.design.kind.WindowDesignKind;
import tapwright.model.Design;
import tapwright.model.GivenDesign;

/** Finds the method that a design asks for. A new method is added here and nowhere else. */
public final class DesignKinds {

	private static final Map<Class<?>, DesignKind<?>> KINDS = new LinkedHashMap<>();

	static {
		register(List.of(new WindowDesignKind(), new EquirippleDesignKind()));
		register(ClosedFormKinds.ALL);
		register(OptimalKinds.ALL);
		register(SpecialKinds.ALL);
	}

	private DesignKinds() {
	}

	private static void register(List<DesignKind<?>> kinds) {
		kinds.forEach(kind -> KINDS.put(kind.type(), kind));
	}

	/** The method with all its numbers; nothing for coefficients that were made elsewhere. */
	public static Optional<tapwright.dsp.design.Design> method(Design design, DesignInput input) throws InputException {
		if (design instanceof GivenDesign) {
			return Optional.empty();
		}
		try {
			return Optional.of(method(of(design), design, input));
		} catch (IllegalArgumentException e) {
			throw new InputException("design", e.getMessage());
		}
	}

	private static <T extends Design> tapwright.dsp.design.Design method(DesignKind<T> kind, Design design, DesignInput input)
			throws InputException {
		return kind.method(kind.type().cast(design), input);
	}

	private static DesignKind<?> of(Design design) {
		DesignKind<?> kind = KINDS.get(design.eClass().getInstanceClass());
		if (kind == null) {
			throw new IllegalStateException("no method is registered for " + design.eClass().getName());
		}
		return kind;
	}
}
