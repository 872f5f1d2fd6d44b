// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import tapwright.dsp.exact.ExactTaps;

/** The best rounding so far, and whether to go on. */
final class Best {

	private final RoundingTask task;
	private final Search search;
	private final long end;
	private Rounded rounded;
	private boolean enough;

	/** Begins with the nearest steps. */
	Best(RoundingTask task, Search search) {
		this.task = task;
		this.search = search;
		end = System.nanoTime() + search.limit().toNanos();
		ExactTaps nearest = task.format().nearest(task.ideal());
		rounded = new Rounded(nearest, task.judge().loss(nearest), false);
		enough = search.enough().test(rounded);
	}

	Rounded rounded() {
		return rounded;
	}

	long seed() {
		return search.seed();
	}

	/** Keeps the coefficients when they are numbers of the format and the judge finds them better. */
	boolean offer(ExactTaps taps) {
		if (!task.format().contains(taps)) {
			return false;
		}
		double loss = task.judge().loss(taps);
		if (!(loss < rounded.loss())) {
			return false;
		}
		rounded = new Rounded(taps, loss, false);
		enough |= search.enough().test(rounded);
		return true;
	}

	/** Notes that the best is proven to be the optimum. */
	void proven() {
		rounded = new Rounded(rounded.taps(), rounded.loss(), true);
	}

	/**
	 * Whether time is up or the result good enough.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	boolean isOver() {
		search.progress().checkCancelled();
		return enough || System.nanoTime() - end >= 0;
	}
}
