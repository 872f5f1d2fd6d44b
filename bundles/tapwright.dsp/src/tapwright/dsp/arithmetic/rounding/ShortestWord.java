// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.math.BigInteger;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
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
	 * Tries word lengths, nearest steps first and then all methods: halves the range as if every word beyond a sufficient one
	 * sufficed, then goes down until two lengths in a row fail. That no shorter word could do is not proven.
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
		SortedMap<Integer, Attempt> attempts = new TreeMap<>();
		int low = shortest;
		int high = longest;
		while (low < high) {
			int middle = (low + high) / 2;
			if (attempt(middle, attempts, progress).proven()) {
				high = middle;
			} else {
				low = middle + 1;
			}
		}
		int failures = 0;
		for (int word = high; word >= shortest && failures < 2; word--) {
			boolean proven = attempt(word, attempts, progress).proven();
			failures = proven || word == high ? 0 : failures + 1;
		}
		return List.copyOf(attempts.values());
	}

	private Attempt attempt(int word, SortedMap<Integer, Attempt> known, Progress progress) {
		progress.checkCancelled();
		progress.report("coefficients of " + word + " bits", -1);
		return known.computeIfAbsent(word, bits -> attempt(bits, progress));
	}

	/** The shortest proven word among attempts. */
	public static Optional<Attempt> shortest(List<Attempt> attempts) {
		return attempts.stream().filter(Attempt::proven).findFirst();
	}

	private Attempt attempt(int word, Progress progress) {
		long end = System.nanoTime() + perWord.toNanos();
		NumberFormat format = format(ideal, word);
		RoundingTask task = new RoundingTask(ideal, format, judge, bands);
		List<RoundingMethod> methods = methods();
		Rounded best = null;
		for (int n = 0; n < methods.size(); n++) {
			// What the quick methods leave of their share goes to those that come after.
			long share = Math.max(0, end - System.nanoTime()) / (methods.size() - n);
			Rounded rounded = methods.get(n).round(task,
					new Search(seed, Duration.ofNanos(share), progress, found -> proven.test(found.taps())));
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
