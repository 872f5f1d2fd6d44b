// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import static org.junit.jupiter.api.Assertions.fail;

import java.util.function.BooleanSupplier;

import org.eclipse.swt.widgets.Display;

/** Lets the window work. UI thread. */
final class Waiting {

	private static final long LONGEST_WAIT_MS = 60_000;

	private Waiting() {
	}

	/** Until something is so; fails when it never comes. */
	static void until(String what, BooleanSupplier condition) {
		Display display = Display.getCurrent();
		long end = System.nanoTime() + LONGEST_WAIT_MS * 1_000_000;
		while (!condition.getAsBoolean()) {
			if (System.nanoTime() > end) {
				fail("never came: " + what);
			}
			display.timerExec(20, () -> {
				// wakes the display, since conditions may come true on other threads
			});
			if (!display.readAndDispatch()) {
				display.sleep();
			}
		}
	}

	/** For a while, so that what was asked for is drawn. */
	static void forDrawing(int milliseconds) {
		boolean[] over = new boolean[1];
		Display.getCurrent().timerExec(milliseconds, () -> over[0] = true);
		until("the time for drawing", () -> over[0]);
	}
}
