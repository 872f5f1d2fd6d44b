// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** Word lengths that a noise requirement needs. */
public final class WordLengths {

	private WordLengths() {
	}

	/**
	 * The given arithmetic with the shortest output word, then the shortest product and accumulator words, whose expected noise
	 * power stays within a limit. Bits before the point stay as they are; product and accumulator get the same fraction bits.
	 *
	 * @param arithmetic
	 *            with a stated output format; product and accumulator stay unstated when they are
	 * @param limit
	 *            expected noise power in dB relative to a square wave of full scale
	 * @param fullScale
	 *            of the output
	 * @return nothing when no word of up to {@link NumberFormat#MAX_WORD} bits is long enough
	 * @throws IllegalArgumentException
	 *             when no output format is stated, or the structure cannot run the coefficients
	 */
	public static Optional<Arithmetic> forNoise(ExactTaps taps, Arithmetic arithmetic, double limit, BigFraction fullScale) {
		NumberFormat output = arithmetic.output().orElseThrow(
				() -> new IllegalArgumentException("no output format is stated; give one whose bits before the point are right"));
		int whole = output.word() - output.fraction();
		for (int word = 1; word <= NumberFormat.MAX_WORD; word++) {
			Arithmetic outer = with(arithmetic, Optional.empty(), Optional.empty(),
					new NumberFormat(word, word - whole, output.signed()));
			if (Noise.of(taps, outer).decibels(fullScale) <= limit) {
				Optional<Arithmetic> inner = inner(taps, arithmetic, outer.output().get(), limit, fullScale);
				if (inner.isPresent()) {
					return inner;
				}
			}
		}
		return Optional.empty();
	}

	private static Optional<Arithmetic> inner(ExactTaps taps, Arithmetic arithmetic, NumberFormat output, double limit,
			BigFraction fullScale) {
		for (int fraction = output.fraction(); fraction < output.fraction() + NumberFormat.MAX_WORD; fraction++) {
			Optional<NumberFormat> product = stretched(arithmetic.product(), fraction);
			Optional<NumberFormat> accumulator = stretched(arithmetic.accumulator(), fraction);
			boolean possible = product.isPresent() == arithmetic.product().isPresent()
					&& accumulator.isPresent() == arithmetic.accumulator().isPresent();
			Arithmetic candidate = with(arithmetic, product, accumulator, output);
			if (possible && Noise.of(taps, candidate).decibels(fullScale) <= limit) {
				return Optional.of(candidate);
			}
		}
		return Optional.empty();
	}

	// The format with other fraction bits and the same bits before the point, if there is such a word.
	private static Optional<NumberFormat> stretched(Optional<NumberFormat> format, int fraction) {
		return format.filter(given -> isWord(given.word() - given.fraction() + fraction))
				.map(given -> new NumberFormat(given.word() - given.fraction() + fraction, fraction, given.signed()));
	}

	private static boolean isWord(int bits) {
		return bits >= 1 && bits <= NumberFormat.MAX_WORD;
	}

	private static Arithmetic with(Arithmetic from, Optional<NumberFormat> product, Optional<NumberFormat> accumulator,
			NumberFormat output) {
		return new Arithmetic(from.structure(), from.coefficient(), from.input(), product, accumulator, Optional.of(output),
				from.rounding(), from.overflow(), from.factor());
	}
}
