// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.Optional;

import org.eclipse.emf.common.util.Enumerator;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.model.Coefficients;
import tapwright.model.Format;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelPackage;
import tapwright.model.RealCoefficients;

/** The exact numbers of a filter: coefficients as they are stored, and the formats they run in. */
public final class FilterNumbers {

	private FilterNumbers() {
	}

	/**
	 * The stored coefficients, before any rounding to a format.
	 *
	 * @throws InputException
	 *             when there are none, or one is no finite number
	 */
	public static ExactTaps stored(Coefficients coefficients) throws InputException {
		try {
			return switch (coefficients) {
			case RealCoefficients real -> ExactTaps
					.ofDoubles(real.getValues().stream().mapToDouble(Double::doubleValue).toArray());
			case IntegerCoefficients integers -> ExactTaps.ofIntegers(integers.getIntegers(),
					Expression.scale(integers.getScale()));
			default -> throw new IllegalArgumentException("unknown coefficients " + coefficients.eClass().getName());
			};
		} catch (IllegalArgumentException e) {
			throw new InputException("coefficients", e.getMessage());
		} catch (InputException e) {
			throw new InputException("coefficients: scale", e.getMessage());
		}
	}

	/**
	 * Structure and formats.
	 *
	 * @throws InputException
	 *             when a word length makes no sense
	 */
	public static Arithmetic arithmetic(tapwright.model.Arithmetic arithmetic, Numbers numbers) throws InputException {
		return new Arithmetic(same(Structure.class, arithmetic.getStructure()), format(arithmetic.getCoefficient(), numbers),
				format(arithmetic.getInput(), numbers), format(arithmetic.getProduct(), numbers),
				format(arithmetic.getAccumulator(), numbers), format(arithmetic.getOutput(), numbers),
				same(Rounding.class, arithmetic.getRounding()), same(Overflow.class, arithmetic.getOverflow()),
				numbers.findInt(arithmetic, ModelPackage.Literals.ARITHMETIC__FACTOR).orElse(1));
	}

	/**
	 * The coefficients that ship: each stored one at the nearest number of the coefficient format, ties to even.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run them
	 */
	public static ExactTaps shipped(ExactTaps stored, Arithmetic arithmetic) {
		ExactTaps shipped = arithmetic.coefficient().map(format -> format.nearest(stored)).orElse(stored);
		arithmetic.check(shipped);
		return shipped;
	}

	private static Optional<NumberFormat> format(Format format, Numbers numbers) throws InputException {
		if (format == null) {
			return Optional.empty();
		}
		String place = "arithmetic: " + format.eContainingFeature().getName();
		try {
			return Optional.of(new NumberFormat(numbers.getInt(format, ModelPackage.Literals.FORMAT__WORD),
					numbers.getInt(format, ModelPackage.Literals.FORMAT__FRACTION), format.isSigned()));
		} catch (IllegalArgumentException | InputException e) {
			throw new InputException(place, e instanceof InputException input ? input.describe() : e.getMessage());
		}
	}

	// The choices of the model and of the numerics have the same names.
	private static <E extends Enum<E>> E same(Class<E> type, Enumerator literal) {
		return Enum.valueOf(type, ((Enum<?>) literal).name());
	}
}
