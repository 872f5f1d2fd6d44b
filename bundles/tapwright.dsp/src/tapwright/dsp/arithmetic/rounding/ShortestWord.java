// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.math.BigInteger;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * Looks for the shortest coefficient word for which some rounding is proven to do.
 *
 * @param ideal
 *            coefficients before rounding
 * @param judge
 *            guides the methods
 * @param proven
 *            decides whether rounded coefficients do
 * @param bands
 *            guide the methods that work on the amplitude; empty when there is none
 * @param seed
 *            of all random choices
 * @param perWord
 *            longest search for one word length
 */
public record ShortestWord(ExactTaps ideal, Judge judge, Predicate<ExactTaps> proven, List<Band> bands, long seed,
		Duration perWord) {

	/**
	 * What was found for one word length.
	 *
	 * @param format
	 *            word and fraction bits
	 * @param rounded
	 *            the proven rounding, or the best that was found
	 * @param proven
	 *            whether it is proven to do
	 */
	public record Attempt(NumberFormat format, Rounded rounded, boolean proven) {
	}

	/** Copies the list. */
	public ShortestWord {
		bands = List.copyOf(bands);
	}

	/**
	 * The signed format of a word length with the most fraction bits in which no coefficient exceeds the range.
	 *
	 * @throws IllegalArgumentException
	 *             when all coefficients are zero, which fit any format
	 */
	public static NumberFormat format(ExactTaps taps, int word) {
		int fraction = -NumberFormat.MAX_FRACTION;
		BigInteger largest = BigInteger.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			largest = largest.max(taps.integer(k).abs());
		}
		if (largest.signum() == 0) {
			throw new IllegalArgumentException("all coefficients are zero; there is nothing to round");
		}
		// Leading bit of the largest coefficient, give or take one: the loop below settles it.
		int top = largest.bitLength() + taps.unit().getNumerator().bitLength() - taps.unit().getDenominator().bitLength();
		fraction = Math.max(fraction, word - top - 3);
		while (fraction < NumberFormat.MAX_FRACTION && holds(new NumberFormat(word, fraction + 1), taps)) {
			fraction++;
		}
		return new NumberFormat(word, fraction);
	}

	private static boolean holds(NumberFormat format, ExactTaps taps) {
		for (int k = 0; k < taps.length(); k++) {
			if (!format.contains(format.steps(taps.tap(k), Rounding.HALF_EVEN))) {
				return false;
			}
		}
		return true;
	}

	/**
	 * Tries word lengths: first, from the shortest up, nearest steps alone; then, from the word before the first success down,
	 * all methods, until two lengths in a row fail. That no shorter word could do is not proven.
	 *
	 * @param shortest
	 *            bits, at least 2
	 * @param longest
	 *            bits
	 * @return what was tried, by rising word length; the first proven one is the shortest
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public List<Attempt> find(int shortest, int longest, Progress progress) {
		if (shortest < 2 || longest < shortest || longest > NumberFormat.MAX_WORD) {
			throw new IllegalArgumentException("word lengths " + shortest + " to " + longest + "; they must rise from at least 2 to at most "
					+ NumberFormat.MAX_WORD);
		}
		List<Attempt> attempts = new ArrayList<>();
		int word = shortest;
		for (boolean done = false; !done && word <= longest; word++) {
			progress.checkCancelled();
			progress.report("nearest steps in " + word + " bits", -1);
			Attempt attempt = nearest(word);
			done = attempt.proven();
			if (done) {
				attempts.add(attempt);
			}
		}
		int failures = 0;
		int next = attempts.isEmpty() ? longest : attempts.get(0).format().word() - 1;
		for (; next >= shortest && failures < 2; next--) {
			progress.report("best rounding in " + next + " bits", -1);
			Attempt attempt = thorough(next, progress);
			attempts.add(0, attempt);
			failures = attempt.proven() ? 0 : failures + 1;
		}
		return List.copyOf(attempts);
	}

	/** The shortest proven word among attempts. */
	public static Optional<Attempt> shortest(List<Attempt> attempts) {
		return attempts.stream().filter(Attempt::proven).findFirst();
	}

	private Attempt nearest(int word) {
		NumberFormat format = format(ideal, word);
		ExactTaps taps = format.nearest(ideal);
		return new Attempt(format, new Rounded(taps, judge.loss(taps), false), proven.test(taps));
	}

	private Attempt thorough(int word, Progress progress) {
		NumberFormat format = format(ideal, word);
		RoundingTask task = new RoundingTask(ideal, format, judge, bands);
		Search search = new Search(seed, perWord.dividedBy(methods().size()), progress, rounded -> proven.test(rounded.taps()));
		Rounded best = null;
		for (RoundingMethod method : methods()) {
			Rounded rounded = method.round(task, search);
			if (proven.test(rounded.taps())) {
				return new Attempt(format, rounded, true);
			}
			best = best == null || rounded.loss() < best.loss() ? rounded : best;
		}
		return new Attempt(format, best, false);
	}

	private List<RoundingMethod> methods() {
		return bands.isEmpty() || ideal.symmetry() == Symmetry.NONE
				? List.of(RoundingMethod.ERROR_FEEDBACK, RoundingMethod.GAIN, RoundingMethod.PAIRS)
				: List.of(RoundingMethod.ERROR_FEEDBACK, RoundingMethod.GAIN, RoundingMethod.LATTICE, RoundingMethod.PAIRS);
	}
}
