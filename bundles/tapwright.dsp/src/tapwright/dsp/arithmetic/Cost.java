// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * What a filter needs of a processor or of a circuit, counted exactly. One cycle takes {@code inputs} samples and yields
 * {@code outputs} samples; operations are counted per cycle.
 *
 * @param inputs
 *            input samples of a cycle: the factor of a decimator, otherwise 1
 * @param outputs
 *            output samples of a cycle: the factor of an interpolator, otherwise 1
 * @param multiplies
 *            multiplications per cycle
 * @param adds
 *            additions and subtractions of two numbers per cycle, those before the multipliers included
 * @param coefficientWords
 *            coefficients that are stored
 * @param delayWords
 *            numbers that are kept from one input sample to the next: input samples, or sums in a transposed structure
 * @param adderDepth
 *            most adders in a row between two registers, which bounds the clock of a circuit
 * @param groupDelay
 *            (N-1)/2 in samples at the rate at which the coefficients run, for symmetric coefficients
 */
public record Cost(int inputs, int outputs, long multiplies, long adds, long coefficientWords, long delayWords,
		int adderDepth, Optional<BigFraction> groupDelay) {

	/**
	 * Counts the operations.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients
	 */
	public static Cost of(ExactTaps taps, Arithmetic arithmetic) {
		long multiplies = 0;
		long adds = 0;
		int depth = 0;
		Set<Integer> stored = new HashSet<>();
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			List<Term> terms = arithmetic.terms(taps, phase);
			int chain = Math.max(terms.size() - 1, 0);
			int folded = (int) terms.stream().filter(Term::isFolded).count();
			multiplies += terms.size();
			adds += chain + folded;
			depth = Math.max(depth, chain + (folded > 0 ? 1 : 0));
			terms.forEach(term -> stored.add(term.tap()));
		}
		if (arithmetic.structure() == Structure.TRANSPOSED) {
			depth = Math.min(depth, 1);
		}
		int interpolation = arithmetic.interpolation();
		int kept = (taps.length() + interpolation - 1) / interpolation - 1;
		Optional<BigFraction> delay = taps.symmetry() == Symmetry.NONE ? Optional.empty()
				: Optional.of(new BigFraction(taps.length() - 1, 2));
		return new Cost(arithmetic.decimation(), interpolation, multiplies, adds, stored.size(), kept, depth, delay);
	}

	/** The cost of filters that run one after the other, each fed by the one before; inputs and outputs are those of the whole. */
	public static Cost cascade(List<Cost> stages) {
		if (stages.isEmpty()) {
			throw new IllegalArgumentException("a cascade needs at least one stage");
		}
		Cost whole = stages.get(0);
		for (Cost stage : stages.subList(1, stages.size())) {
			whole = whole.followedBy(stage);
		}
		return whole;
	}

	// The cycle of the whole is the shortest that is a whole number of cycles of both.
	private Cost followedBy(Cost next) {
		int common = gcd(outputs, next.inputs);
		int mine = next.inputs / common;
		int theirs = outputs / common;
		int in = inputs * mine;
		int out = next.outputs * theirs;
		return new Cost(in, out, multiplies * mine + next.multiplies * theirs, adds * mine + next.adds * theirs,
				coefficientWords + next.coefficientWords, delayWords + next.delayWords,
				Math.max(adderDepth, next.adderDepth), inputs == outputs && next.inputs == next.outputs
						? groupDelay.flatMap(delay -> next.groupDelay.map(delay::add)) : Optional.empty());
	}

	/** Multiplications per output sample. */
	public BigFraction multipliesPerOutput() {
		return new BigFraction(multiplies, (long) outputs);
	}

	/**
	 * Multiplications per second.
	 *
	 * @param inputRate
	 *            input samples per second
	 */
	public double multipliesPerSecond(double inputRate) {
		return multiplies * (inputRate / inputs);
	}

	/**
	 * Additions per second.
	 *
	 * @param inputRate
	 *            input samples per second
	 */
	public double addsPerSecond(double inputRate) {
		return adds * (inputRate / inputs);
	}

	/** Words of memory: coefficients and delay line. */
	public long memoryWords() {
		return coefficientWords + delayWords;
	}

	private static int gcd(int a, int b) {
		return b == 0 ? a : gcd(b, a % b);
	}
}
