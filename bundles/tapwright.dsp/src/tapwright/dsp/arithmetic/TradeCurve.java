// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.IntFunction;

import tapwright.dsp.Progress;

/**
 * What is gained by spending more: some result over a whole number such as the word length or the number of coefficients.
 * Results are kept, so that asking again or for a wider range costs only what is new. Safe for use from several threads.
 *
 * @param <T>
 *            result for one number
 */
public final class TradeCurve<T> {

	/**
	 * Takes results as they become known.
	 *
	 * @param <T>
	 *            result for one number
	 */
	@FunctionalInterface
	public interface Listener<T> {

		/** Called on the computing thread. */
		void found(int number, T result);
	}

	private final IntFunction<T> function;
	private final Map<Integer, T> known = new ConcurrentHashMap<>();

	/**
	 * A curve of which nothing is known yet.
	 *
	 * @param function
	 *            computes one result, never null; deterministic
	 */
	public TradeCurve(IntFunction<T> function) {
		this.function = function;
	}

	/**
	 * Computes all results of a range, ends and middle first, so that a picture takes shape early.
	 *
	 * @return results by number
	 * @throws IllegalArgumentException
	 *             when the range is empty
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled; what is known by then stays known
	 */
	public SortedMap<Integer, T> compute(int from, int to, Progress progress, Listener<T> listener) {
		if (from > to) {
			throw new IllegalArgumentException("a curve from " + from + " to " + to + "; the first must not exceed the last");
		}
		SortedMap<Integer, T> curve = new TreeMap<>();
		int stride = Math.max(1, Integer.highestOneBit(Math.max(to - from, 1)));
		for (; stride >= 1; stride /= 2) {
			for (int number = from; number <= to; number = number < to ? Math.min(number + stride, to) : to + 1) {
				if (!curve.containsKey(number)) {
					progress.checkCancelled();
					progress.report("point " + number, curve.size() / (to - from + 1.0));
					T result = known.computeIfAbsent(number, function::apply);
					curve.put(number, result);
					listener.found(number, result);
				}
			}
		}
		return curve;
	}
}
