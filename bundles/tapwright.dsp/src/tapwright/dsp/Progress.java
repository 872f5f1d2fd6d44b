// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp;

import java.util.concurrent.CancellationException;

/**
 * Lets long work report how far it is and be cancelled, without knowing who waits for it. Called on the working thread; an
 * implementation that is asked from several threads must be thread-safe.
 */
public interface Progress {

	/** Ignores reports and never cancels. */
	Progress NONE = new Progress() {
	};

	/**
	 * Tells what is being done.
	 *
	 * @param message
	 *            one short line for a person
	 * @param fraction
	 *            work done, 0 to 1, or a negative number when it cannot be known
	 */
	default void report(String message, double fraction) {
	}

	/** Whether the work should stop as soon as it can. */
	default boolean isCancelled() {
		return Thread.currentThread().isInterrupted();
	}

	/**
	 * Call this in every loop that can take longer than some tens of milliseconds.
	 *
	 * @throws CancellationException
	 *             when the work should stop
	 */
	default void checkCancelled() {
		if (isCancelled()) {
			throw new CancellationException("cancelled");
		}
	}
}
