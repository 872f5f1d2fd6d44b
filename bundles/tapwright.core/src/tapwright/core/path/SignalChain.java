// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.InputException;
import tapwright.core.path.Step.Filtering;
import tapwright.core.path.Step.Lowering;
import tapwright.core.path.Step.Raising;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.AliasRejection;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Subject;

/**
 * A chain as one filter: an expansion by {@code expansion}, then the filter, then a decimation by {@code decimation}; exactly equal to
 * the chain but for rounding between its stages. Immutable.
 *
 * @param taps
 *            of the filter, divided by {@code expansion}: so its gain at a frequency is that of a tone's amplitude from end to end
 * @param expansion
 *            the filter runs at this multiple of the input rate
 * @param decimation
 *            one of so many samples is kept at the end
 * @param foldings
 *            what happens at each decimation, from input to output
 */
public record SignalChain(ExactTaps taps, int expansion, int decimation, List<Folding> foldings) {

	/** Beyond, a proof would take hours. */
	private static final int LONGEST = 100_000;

	/**
	 * A decimation with all that comes before it.
	 *
	 * @param step
	 *            its index in the chain
	 * @param taps
	 *            all filters before it as one, likewise divided by {@code expansion}
	 * @param expansion
	 *            that filter runs at this multiple of the input rate
	 * @param decimation
	 *            the factors of this decimation and those before it, multiplied
	 */
	public record Folding(int step, ExactTaps taps, int expansion, int decimation) {

		/**
		 * Proves how far down everything is that this decimation, and those before it, fold to within {@code to} of 0 Hz.
		 *
		 * @param inputRate
		 *            sample rate at the input of the chain in Hz
		 * @param to
		 *            upper edge of the kept band in Hz
		 * @param min
		 *            smallest rejection in dB
		 * @throws IllegalArgumentException
		 *             when the band does not fit into the lowered rate
		 */
		public Proof prove(double inputRate, double to, double min, Effort effort) {
			return new AliasRejection(decimation, to, min).prove(new Subject(taps, inputRate * expansion), effort);
		}
	}

	/** Takes a copy. */
	public SignalChain {
		foldings = List.copyOf(foldings);
	}

	/**
	 * The chain of these steps.
	 *
	 * @throws InputException
	 *             when it is equal to no single filter, or to one that is too long
	 */
	public static SignalChain of(List<Step> steps) throws InputException {
		int expansion = factor(steps, true);
		int decimation = factor(steps, false);
		// Zeros between samples make one tone into that many, each with its part of the amplitude.
		ExactTaps taps = ExactTaps.ofIntegers(List.of(BigInteger.ONE), new BigFraction(1, expansion));
		long lowered = 1;
		long raised = 1;
		var foldings = new ArrayList<Folding>();
		for (int k = 0; k < steps.size(); k++) {
			switch (steps.get(k)) {
			case Filtering filtering -> taps = append(taps, filtering.taps(), expansion / raised * lowered);
			case Lowering lowering -> {
				lowered *= lowering.factor();
				if (lowering.factor() > 1) {
					foldings.add(folding(steps, k, (int) lowered));
				}
			}
			case Raising raising -> {
				raised *= raising.factor();
				checkApart(raising.factor(), lowered);
			}
			}
		}
		return new SignalChain(taps, expansion, decimation, foldings);
	}

	private static Folding folding(List<Step> steps, int step, int lowered) throws InputException {
		SignalChain before = of(steps.subList(0, step));
		return new Folding(step, before.taps, before.expansion, lowered);
	}

	private static ExactTaps append(ExactTaps taps, ExactTaps next, long stretch) throws InputException {
		long length = taps.length() + stretch * (next.length() - 1);
		if (length > LONGEST) {
			throw new InputException("", "as one filter it has " + length + " coefficients or more; " + LONGEST
					+ " is the most that can be proven, so split it");
		}
		return taps.convolve(next.upsample((int) stretch));
	}

	// After 'one of M is kept', zeros between samples only commute when L and M have no common divisor.
	private static void checkApart(int raise, long lowered) throws InputException {
		if (!BigInteger.valueOf(raise).gcd(BigInteger.valueOf(lowered)).equals(BigInteger.ONE)) {
			throw new InputException("", "an expansion by " + raise + " follows decimations by " + lowered
					+ " in all; with a common divisor they make no single filter, so split the path there");
		}
	}

	private static int factor(List<Step> steps, boolean up) throws InputException {
		long product = 1;
		for (Step step : steps) {
			product *= switch (step) {
			case Filtering filtering -> 1;
			case Lowering lowering -> up ? 1 : lowering.factor();
			case Raising raising -> up ? raising.factor() : 1;
			};
			if (product > LONGEST) {
				throw new InputException("", "its rate changes by more than " + LONGEST + " in all; split it");
			}
		}
		return (int) product;
	}
}
