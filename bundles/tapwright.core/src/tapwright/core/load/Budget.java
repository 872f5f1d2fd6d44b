// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import java.util.OptionalDouble;
import java.util.OptionalInt;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.Processor;

/**
 * What a processor has for filters. Immutable. What is not stated has no bound.
 *
 * @param processor
 *            its name
 * @param multiplyAccumulates
 *            per second
 * @param coefficientWords
 *            words of memory for coefficients
 * @param delayWords
 *            words of memory for delay lines
 * @param word
 *            bits of the multiplier's inputs
 * @param accumulator
 *            bits of the accumulator
 */
public record Budget(String processor, OptionalDouble multiplyAccumulates, OptionalDouble coefficientWords,
		OptionalDouble delayWords, OptionalInt word, OptionalInt accumulator) {

	/**
	 * Reads the budget of a processor.
	 *
	 * @throws InputException
	 *             when it has no name or a number makes no sense
	 */
	public static Budget of(Processor processor, Numbers numbers) throws InputException {
		if (processor.getName() == null || processor.getName().isBlank()) {
			throw new InputException("", "it has no name; give it one");
		}
		return new Budget(processor.getName(), numbers.find(processor, Literals.PROCESSOR__MAC_RATE),
				numbers.find(processor, Literals.PROCESSOR__COEFFICIENT_MEMORY),
				numbers.find(processor, Literals.PROCESSOR__DELAY_MEMORY), numbers.findInt(processor, Literals.PROCESSOR__WORD),
				numbers.findInt(processor, Literals.PROCESSOR__ACCUMULATOR));
	}
}
