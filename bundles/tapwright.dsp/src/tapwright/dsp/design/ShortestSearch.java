// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

import tapwright.dsp.Progress;
import tapwright.dsp.design.ShortestFilter.Found;
import tapwright.dsp.design.ShortestFilter.Trial;
import tapwright.dsp.verify.Verdict;

/**
 * Searches the smallest number of coefficients that are <i>proven</i> to meet all requirements: from an estimate up or
 * down with growing steps until the answer is bracketed, then by halving, for odd and even numbers apart. Nothing
 * guarantees that a longer filter is better (rounding to a coefficient format, window designs), so some lengths below
 * the answer are tried too, and the notes say what was tried and what is proven.
 */
public final class ShortestSearch {

	/** Lengths of the same parity that are tried below an answer that nothing proves to be the shortest. */
	private static final int GUARDS = 3;
	private static final int TRIALS_BEFORE_DOUBLING = 3;

	private final Acceptance acceptance;
	private final int longest;
	private final Progress progress;

	/** Says whether coefficients meet all requirements. */
	@FunctionalInterface
	public interface Acceptance {

		/**
		 * The verdict over all requirements: met when each is proven to be met, missed when one is proven to be missed.
		 * The coefficients may be rounded to a format first; then the verdict is on the rounded ones.
		 */
		Verdict judge(double[] taps);
	}

	/**
	 * A search.
	 *
	 * @param longest
	 *            the greatest number of coefficients to try, at least 1
	 */
	public ShortestSearch(Acceptance acceptance, int longest, Progress progress) {
		if (longest < 1) {
			throw new IllegalArgumentException("the greatest number of coefficients is " + longest
					+ "; it must be at least 1");
		}
		this.acceptance = acceptance;
		this.longest = longest;
		this.progress = progress;
	}

	/**
	 * Searches each family; the answers stand side by side in the order given.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public List<ShortestFilter> searchAll(List<FilterFamily> families) {
		List<ShortestFilter> answers = new ArrayList<>();
		for (FilterFamily family : families) {
			answers.add(search(family));
		}
		return List.copyOf(answers);
	}

	/**
	 * Searches one family.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public ShortestFilter search(FilterFamily family) {
		return new OneFamily(family).search();
	}

	private final class OneFamily {

		private final FilterFamily family;
		private final Map<Integer, Trial> tried = new TreeMap<>();
		private final List<Trial> trials = new ArrayList<>();
		private final List<String> notes = new ArrayList<>();

		OneFamily(FilterFamily family) {
			this.family = family;
		}

		ShortestFilter search() {
			int start = Math.min(Math.max(family.estimate(), 1), longest);
			int first = shortest(start, longest);
			int other = first == 0 ? start < longest ? shortest(start + 1, longest) : 0
					: first == 1 || isImpossible(first - 1) ? 0 : descend(first + 1);
			// Of the other parity only shorter ones are of use: the search for them begins below the first answer.
			int best = first == 0 || other > 0 && other < first ? other : first;
			if (best == 0) {
				notes.add("No length up to " + longest + " that was tried is proven to meet every requirement.");
				return new ShortestFilter(family.name(), Optional.empty(), List.copyOf(trials), List.copyOf(notes));
			}
			return reproduced(best);
		}

		// The answer must not depend on earlier trials, so it is designed and judged once more from its length alone.
		private ShortestFilter reproduced(int taps) {
			Design design = family.design(taps);
			try {
				DesignResult result = design.compute(progress);
				if (acceptance.judge(result.taps()) == Verdict.MET) {
					boolean proven = excluded(taps - 1) && excluded(taps - 2);
					notes.add(proven ? "It is proven that no shorter filter of this symmetry meets every requirement."
							: "Shorter lengths that were tried miss some requirement; others are not excluded.");
					return new ShortestFilter(family.name(), Optional.of(new Found(taps, design, result, proven)),
							List.copyOf(trials), List.copyOf(notes));
				}
				record(new Trial(taps, Verdict.UNPROVEN,
						"designed again from its length alone it no longer meets every requirement"));
			} catch (DesignException e) {
				record(new Trial(taps, Verdict.UNPROVEN, e.getMessage()));
			}
			int next = ascend(taps, 1, longest);
			if (next == 0) {
				notes.add("No length up to " + longest + " that was tried is proven to meet every requirement.");
				return new ShortestFilter(family.name(), Optional.empty(), List.copyOf(trials), List.copyOf(notes));
			}
			return reproduced(next);
		}

		private boolean excluded(int taps) {
			return taps < 1 || family.excludes(taps, progress);
		}

		// Whether the method refuses the length at once, as it does an even number for a high-pass.
		private boolean isImpossible(int taps) {
			try {
				family.design(taps);
				return false;
			} catch (IllegalArgumentException e) {
				return true;
			}
		}

		// The shortest length found among those of the parity of the start, 0 when none meets everything.
		private int shortest(int start, int limit) {
			if (isImpossible(start)) {
				return 0;
			}
			int met = meets(start) ? start : ascend(start, 2, limit);
			if (met == 0) {
				met = scanDown(start);
			}
			return met == 0 ? 0 : descend(met);
		}

		private int ascend(int from, int firstStep, int limit) {
			int step = firstStep;
			int count = 0;
			int at = from;
			while (at + firstStep <= limit) {
				at = Math.min(at + step, limit - (limit - at) % firstStep);
				if (meets(at)) {
					return at;
				}
				if (++count >= TRIALS_BEFORE_DOUBLING) {
					step *= 2;
				}
			}
			return 0;
		}

		// A method can refuse what is too long to be computed; so look below too, roughly.
		private int scanDown(int start) {
			if (tried.get(start).refusal().isEmpty()) {
				return 0;
			}
			for (int at = start - start / 4 / 2 * 2; at >= 1 && at < start; at -= Math.max(2, at / 4 / 2 * 2)) {
				if (meets(at)) {
					return at;
				}
			}
			return 0;
		}

		private int descend(int from) {
			int met = from;
			int missed = -1;
			int step = 2;
			int count = 0;
			while (met - step >= 1) {
				if (!meets(met - step)) {
					missed = met - step;
					break;
				}
				met -= step;
				if (++count >= TRIALS_BEFORE_DOUBLING) {
					step *= 2;
				}
			}
			while (missed < 0 && step > 2 && met > 2) {
				// The last step was too long for what is left.
				step /= 2;
				if (met - step >= 1) {
					if (meets(met - step)) {
						met -= step;
					} else {
						missed = met - step;
					}
				}
			}
			while (missed > 0 && met - missed > 2) {
				int middle = missed + (met - missed) / 4 * 2;
				if (meets(middle)) {
					met = middle;
				} else {
					missed = middle;
				}
			}
			for (int guard = 2; missed > 0 && guard <= GUARDS + 1 && met - 2 * guard >= 1; guard++) {
				if (guard == 2 && family.excludes(missed, progress)) {
					break;
				}
				if (meets(met - 2 * guard)) {
					notes.add("The answers are not monotone: " + missed
							+ " coefficients do not meet every requirement, though "
							+ (met - 2 * guard) + " do.");
					return descend(met - 2 * guard);
				}
			}
			return met;
		}

		private boolean meets(int taps) {
			Trial trial = tried.get(taps);
			if (trial == null) {
				progress.checkCancelled();
				progress.report(family.name() + ": trying " + taps + " coefficients", -1);
				trial = attempt(taps);
				record(trial);
			}
			return trial.verdict() == Verdict.MET;
		}

		private Trial attempt(int taps) {
			try {
				return new Trial(taps, acceptance.judge(family.trial(taps).compute(progress).taps()), "");
			} catch (DesignException | IllegalArgumentException e) {
				return new Trial(taps, Verdict.UNPROVEN, e.getMessage());
			}
		}

		private void record(Trial trial) {
			tried.put(trial.taps(), trial);
			trials.add(trial);
		}
	}
}
