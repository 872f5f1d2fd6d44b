// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * Filters that run one after the other, bit for bit: each output, as a value, is rounded and limited to the input format of the
 * next stage by that stage's rounding and overflow. Keeps the delay lines between calls; to be used from one thread at a time.
 */
public final class Cascade {

	/**
	 * One filter of a cascade.
	 *
	 * @param taps
	 *            coefficients
	 * @param arithmetic
	 *            with a stated input format
	 */
	public record Stage(ExactTaps taps, Arithmetic arithmetic) {
	}

	private final List<BitTrue> filters = new ArrayList<>();
	/** From the outputs of one filter to the inputs of the next. */
	private final List<Requantizer> links = new ArrayList<>();

	/**
	 * A cascade at rest.
	 *
	 * @throws IllegalArgumentException
	 *             when there is no stage, or one cannot run
	 */
	public Cascade(List<Stage> stages) {
		if (stages.isEmpty()) {
			throw new IllegalArgumentException("a cascade needs at least one stage");
		}
		for (Stage stage : stages) {
			BitTrue filter = new BitTrue(stage.taps(), stage.arithmetic());
			if (!filters.isEmpty()) {
				Arithmetic arithmetic = stage.arithmetic();
				NumberFormat input = arithmetic.input().orElseThrow();
				links.add(new Requantizer(outputStep().divide(input.step()), arithmetic.rounding(), Optional.of(input),
						arithmetic.overflow()));
			}
			filters.add(filter);
		}
	}

	/** What one step of the outputs is worth. */
	public BigFraction outputStep() {
		return filters.getLast().outputStep();
	}

	/** Empties all delay lines. */
	public void reset() {
		filters.forEach(BitTrue::reset);
	}

	/**
	 * Filters a block of samples.
	 *
	 * @param samples
	 *            integers of the first stage's input format
	 * @return the outputs that became complete, in steps of {@link #outputStep()}
	 * @throws IllegalArgumentException
	 *             when a sample is not in the range of the input format; nothing has been filtered then
	 */
	public BigInteger[] filter(BigInteger... samples) {
		BigInteger[] block = filters.getFirst().filter(samples);
		for (int n = 0; n < links.size(); n++) {
			BigInteger[] next = new BigInteger[block.length];
			for (int k = 0; k < next.length; k++) {
				next[k] = links.get(n).apply(block[k]);
			}
			block = filters.get(n + 1).filter(next);
		}
		return block;
	}
}
