// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * The steps that a number takes from the multiplier to the output, as the package's description defines them. Integers on the
 * way count these units: products coefficient step times input step, the accumulator {@code sumStep}, outputs {@code outputStep};
 * the coefficient step is the unit of {@link Arithmetic#stored}.
 *
 * @param input
 *            format of the samples
 * @param product
 *            from the exact product to the product format; identity without one
 * @param align
 *            from there to the steps of the accumulator, without overflow; identity without an accumulator format
 * @param sumStep
 *            what one step of the accumulator is worth
 * @param output
 *            from the accumulator to the output format; identity without one
 * @param outputStep
 *            what one step of the output is worth
 */
public record Datapath(NumberFormat input, Requantizer product, Requantizer align, BigFraction sumStep, Requantizer output,
		BigFraction outputStep) {

	/**
	 * The path of a filter.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients or no input format is stated
	 */
	public static Datapath of(ExactTaps taps, Arithmetic arithmetic) {
		NumberFormat input = arithmetic.input().orElseThrow(() -> new IllegalArgumentException(
				"no input format is stated; give the samples' word and fraction bits to simulate or bound the filter"));
		BigFraction exact = arithmetic.stored(taps).unit().multiply(input.step());
		BigFraction productStep = arithmetic.product().map(NumberFormat::step).orElse(exact);
		BigFraction sumStep = arithmetic.accumulator().map(NumberFormat::step).orElse(productStep);
		BigFraction outputStep = arithmetic.output().map(NumberFormat::step).orElse(sumStep);
		return new Datapath(input, requantizer(exact, productStep, arithmetic.product(), arithmetic),
				requantizer(productStep, sumStep, Optional.empty(), arithmetic), sumStep,
				requantizer(sumStep, outputStep, arithmetic.output(), arithmetic), outputStep);
	}

	private static Requantizer requantizer(BigFraction from, BigFraction to, Optional<NumberFormat> range,
			Arithmetic arithmetic) {
		return new Requantizer(from.divide(to), arithmetic.rounding(), range, arithmetic.overflow());
	}
}
