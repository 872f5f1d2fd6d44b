// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.Optional;

/**
 * Structure and number formats that a filter runs in. Formats that are not stated put no bound on that node.
 *
 * @param structure
 *            order of operations
 * @param coefficient
 *            format of the coefficients
 * @param input
 *            format of the input samples
 * @param product
 *            format that every product is rounded to; without one, products go to the accumulator exactly
 * @param accumulator
 *            format of the running sum
 * @param output
 *            format of the output samples
 * @param rounding
 *            wherever bits are dropped
 * @param overflow
 *            in the accumulator and the output
 */
public record Arithmetic(Structure structure, Optional<NumberFormat> coefficient, Optional<NumberFormat> input,
		Optional<NumberFormat> product, Optional<NumberFormat> accumulator, Optional<NumberFormat> output, Rounding rounding,
		Overflow overflow) {
}
