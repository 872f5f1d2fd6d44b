// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.dsp.exact.Rationals;

/**
 * Reads the numbers of model objects: evaluates what a person wrote, in the unit that the feature declares, exactly, and rounds
 * once to the nearest double. Remembers which parameters were used. Confined to one thread.
 */
public final class Numbers {

	private final Expression.Names names;
	private final Map<String, Quantity> used = new LinkedHashMap<>();

	/**
	 * @param names
	 *            the parameters that may be used
	 */
	public Numbers(Expression.Names names) {
		this.names = name -> {
			Quantity value = names.value(name);
			used.put(name, value);
			return value;
		};
	}

	/** Values of the parameters that were asked for so far, in order of use. */
	public Map<String, Quantity> used() {
		return new LinkedHashMap<>(used);
	}

	/**
	 * The number of a feature that must be there.
	 *
	 * @throws InputException
	 *             when it is missing or cannot be evaluated; names the feature
	 */
	public double get(EObject object, EStructuralFeature feature) throws InputException {
		OptionalDouble value = find(object, feature);
		if (value.isEmpty()) {
			throw new InputException(Meta.key(feature), "is missing");
		}
		return value.getAsDouble();
	}

	/** The number of a feature, or the given one when it is empty. */
	public double get(EObject object, EStructuralFeature feature, double otherwise) throws InputException {
		return find(object, feature).orElse(otherwise);
	}

	/** The number of a feature; nothing when it is empty. */
	public OptionalDouble find(EObject object, EStructuralFeature feature) throws InputException {
		String text = (String) object.eGet(feature);
		if (text == null || text.isBlank()) {
			return OptionalDouble.empty();
		}
		return OptionalDouble.of(evaluate(text, (EAttribute) feature));
	}

	/**
	 * The whole number of a feature that must be there.
	 *
	 * @throws InputException
	 *             when it is missing, cannot be evaluated or has a fraction
	 */
	public int getInt(EObject object, EStructuralFeature feature) throws InputException {
		return whole(get(object, feature), feature);
	}

	/** The whole number of a feature; nothing when it is empty. */
	public OptionalInt findInt(EObject object, EStructuralFeature feature) throws InputException {
		OptionalDouble value = find(object, feature);
		return value.isEmpty() ? OptionalInt.empty() : OptionalInt.of(whole(value.getAsDouble(), feature));
	}

	/**
	 * What a text means as the value of a feature.
	 *
	 * @throws InputException
	 *             when it cannot be evaluated; names the feature
	 */
	public double evaluate(String text, EAttribute feature) throws InputException {
		try {
			Quantity value = Parameters.inUnit(Expression.evaluate(text, names), Meta.unit(feature));
			double rounded = Rationals.nearest(value.value());
			if (Double.isInfinite(rounded)) {
				throw new InputException("", "'" + text + "' is too large");
			}
			return rounded;
		} catch (InputException e) {
			throw new InputException(Meta.key(feature), e.getMessage());
		}
	}

	private static int whole(double value, EStructuralFeature feature) throws InputException {
		if (value != Math.rint(value) || Math.abs(value) > Integer.MAX_VALUE) {
			throw new InputException(Meta.key(feature), value + " must be a whole number");
		}
		return (int) value;
	}
}
