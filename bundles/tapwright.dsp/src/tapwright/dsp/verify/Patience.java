// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import tapwright.dsp.Progress;

/** How long one proof may still go on: the clock started when this object was made. */
final class Patience {

	private final Progress progress;
	private final long start = System.nanoTime();
	private final long nanos;
	private boolean over;

	Patience(Effort effort) {
		progress = effort.progress();
		nanos = effort.timeLimit().compareTo(java.time.Duration.ofDays(1000)) > 0 ? Long.MAX_VALUE
				: effort.timeLimit().toNanos();
	}

	/** Whether the time limit has passed; once true, true for ever. */
	boolean isOver() {
		over |= System.nanoTime() - start > nanos;
		return over;
	}

	/** Whether the proof was once told that the time limit has passed. */
	boolean wasOver() {
		return over;
	}

	void checkCancelled() {
		progress.checkCancelled();
	}
}
