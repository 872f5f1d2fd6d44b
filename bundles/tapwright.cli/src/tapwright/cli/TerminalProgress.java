// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import tapwright.dsp.Progress;

/** Shows progress on one line of a terminal and takes it away at the end; mute when nobody watches. Thread-safe. */
final class TerminalProgress implements Progress, AutoCloseable {

	private static final long PAUSE_NANOS = 100_000_000;

	private final Console console;
	private long last = System.nanoTime();
	private boolean shown;

	TerminalProgress(Console console) {
		this.console = console;
	}

	@Override
	public synchronized void report(String message, double fraction) {
		long now = System.nanoTime();
		if (console.interactive() && now - last > PAUSE_NANOS) {
			last = now;
			shown = true;
			console.err().print("\r\033[K" + message);
			console.err().flush();
		}
	}

	@Override
	public synchronized void close() {
		if (shown) {
			console.err().print("\r\033[K");
			console.err().flush();
		}
	}
}
