// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

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
 *            in products, the accumulator and the output
 * @param factor
 *            rate factor of polyphase structures, at least 1; 1 or 2 for a half-band filter; 1 for all others
 */
public record Arithmetic(Structure structure, Optional<NumberFormat> coefficient, Optional<NumberFormat> input,
		Optional<NumberFormat> product, Optional<NumberFormat> accumulator, Optional<NumberFormat> output, Rounding rounding,
		Overflow overflow, int factor) {

	/** Checks the rate factor. */
	public Arithmetic {
		Objects.requireNonNull(structure);
		Objects.requireNonNull(coefficient);
		Objects.requireNonNull(input);
		Objects.requireNonNull(product);
		Objects.requireNonNull(accumulator);
		Objects.requireNonNull(output);
		Objects.requireNonNull(rounding);
		Objects.requireNonNull(overflow);
		int highest = switch (structure) {
		case DIRECT, FOLDED, TRANSPOSED -> 1;
		case HALF_BAND -> 2;
		case POLYPHASE_DECIMATOR, POLYPHASE_INTERPOLATOR -> Integer.MAX_VALUE;
		};
		if (factor < 1 || factor > highest) {
			throw new IllegalArgumentException("the rate factor is " + factor + "; " + (highest == Integer.MAX_VALUE
					? "a polyphase structure needs at least 1" : "this structure takes 1" + (highest == 2 ? " or 2" : "")));
		}
	}

	/** A structure that does not change the sample rate. */
	public Arithmetic(Structure structure, Optional<NumberFormat> coefficient, Optional<NumberFormat> input,
			Optional<NumberFormat> product, Optional<NumberFormat> accumulator, Optional<NumberFormat> output,
			Rounding rounding, Overflow overflow) {
		this(structure, coefficient, input, product, accumulator, output, rounding, overflow, 1);
	}

	/** Exact arithmetic in a structure: no format is stated. */
	public static Arithmetic exact(Structure structure, int factor) {
		return new Arithmetic(structure, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(),
				Optional.empty(), Rounding.HALF_EVEN, Overflow.SATURATE, factor);
	}

	/** Input samples between two outputs: the factor of a structure that lowers the rate, otherwise 1. */
	public int decimation() {
		return structure == Structure.POLYPHASE_INTERPOLATOR ? 1 : factor;
	}

	/** Outputs per input sample: the factor of a structure that raises the rate, otherwise 1. */
	public int interpolation() {
		return structure == Structure.POLYPHASE_INTERPOLATOR ? factor : 1;
	}

	/**
	 * Tells whether the structure can run the coefficients.
	 *
	 * @throws IllegalArgumentException
	 *             when it cannot; the message says which property is missing
	 */
	public void check(ExactTaps taps) {
		if (structure == Structure.FOLDED && taps.symmetry() == Symmetry.NONE) {
			throw new IllegalArgumentException("the coefficients are not symmetric; a folded structure needs symmetric ones");
		}
		if (structure == Structure.HALF_BAND) {
			checkHalfBand(taps);
		}
		coefficient.ifPresent(format -> {
			if (!format.contains(taps)) {
				throw new IllegalArgumentException(
						"the coefficients are no numbers of their format (" + format.text() + "); round them first");
			}
		});
	}

	private static void checkHalfBand(ExactTaps taps) {
		int middle = taps.length() / 2;
		boolean fits = taps.length() % 2 == 1 && taps.symmetry() == Symmetry.EVEN;
		for (int k = middle % 2; fits && k < middle; k += 2) {
			fits = taps.integer(k).signum() == 0;
		}
		if (!fits) {
			throw new IllegalArgumentException("the half-band structure needs an odd number of even-symmetric coefficients"
					+ " with zeros at every even distance from the middle");
		}
	}

	/**
	 * The coefficients as the integers that are stored: in steps of their format, or in lowest terms when none is stated.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients or they are no numbers of the format
	 */
	public ExactTaps stored(ExactTaps taps) {
		check(taps);
		BigInteger common = BigInteger.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			common = common.gcd(taps.integer(k));
		}
		BigFraction step = coefficient.isPresent() ? coefficient.get().step()
				: taps.unit().multiply(common.max(BigInteger.ONE));
		List<BigInteger> integers = new ArrayList<>(taps.length());
		for (int k = 0; k < taps.length(); k++) {
			integers.add(taps.tap(k).divide(step).getNumerator());
		}
		return ExactTaps.ofIntegers(integers, step);
	}

	/**
	 * The products of one output in the order in which they are added. A transposed structure forms all of them at once; there
	 * the order is that of the coefficients.
	 *
	 * @param phase
	 *            which of the {@link #interpolation()} outputs per input
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients
	 */
	public List<Term> terms(ExactTaps taps, int phase) {
		check(taps);
		Objects.checkIndex(phase, interpolation());
		List<Term> terms = new ArrayList<>();
		if (structure == Structure.FOLDED || structure == Structure.HALF_BAND) {
			foldedTerms(taps, terms);
		} else {
			int step = interpolation();
			for (int k = phase, delay = 0; k < taps.length(); k += step, delay++) {
				terms.add(new Term(k, delay));
			}
		}
		return List.copyOf(terms);
	}

	private void foldedTerms(ExactTaps taps, List<Term> terms) {
		int sign = taps.symmetry() == Symmetry.EVEN ? 1 : -1;
		for (int k = 0, mirror = taps.length() - 1; k < mirror; k++, mirror--) {
			if (structure == Structure.FOLDED || !taps.integer(k).equals(BigInteger.ZERO)) {
				terms.add(new Term(k, k, mirror, sign));
			}
		}
		// The middle coefficient of an odd-symmetric set is zero and has no multiplier.
		if (taps.length() % 2 == 1 && sign == 1) {
			terms.add(new Term(taps.length() / 2, taps.length() / 2));
		}
	}
}
