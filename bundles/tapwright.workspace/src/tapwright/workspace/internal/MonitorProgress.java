// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.SubMonitor;

import tapwright.dsp.Progress;

/** Shows progress in a monitor. Thread-safe; only the thread that made it writes to the monitor. */
final class MonitorProgress implements Progress {

	private static final int STEPS = 1000;
	private static final long POLL_NANOS = TimeUnit.MILLISECONDS.toNanos(20);

	private final Thread owner = Thread.currentThread();
	private final SubMonitor monitor;
	private final BooleanSupplier mustYield;
	private int shown;
	private volatile boolean cancelled;
	private volatile long lastPoll = System.nanoTime();

	/**
	 * @param mustYield
	 *            asked now and then, on any thread, whether others wait for this work to end
	 */
	MonitorProgress(IProgressMonitor monitor, BooleanSupplier mustYield) {
		this.monitor = SubMonitor.convert(monitor, "Verifying", STEPS);
		this.mustYield = mustYield;
	}

	@Override
	public void report(String message, double fraction) {
		if (Thread.currentThread() == owner && fraction >= 0) {
			monitor.subTask(message);
			int reached = (int) (fraction * STEPS);
			monitor.worked(Math.max(0, reached - shown));
			shown = Math.max(shown, reached);
		}
	}

	@Override
	public boolean isCancelled() {
		if (!cancelled && (monitor.isCanceled() || Thread.currentThread().isInterrupted() || pollYield())) {
			cancelled = true;
		}
		return cancelled;
	}

	// Asking takes locks, and proofs ask very often.
	private boolean pollYield() {
		long now = System.nanoTime();
		if (now - lastPoll < POLL_NANOS) {
			return false;
		}
		lastPoll = now;
		return mustYield.getAsBoolean();
	}
}
