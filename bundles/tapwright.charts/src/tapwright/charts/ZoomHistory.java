// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/** The windows that a person has looked through, so that each zoom can be taken back. */
final class ZoomHistory {

	private static final int LONGEST = 50;

	private final Deque<Window> back = new ArrayDeque<>();
	private final Deque<Window> forward = new ArrayDeque<>();

	/** Remembers the window that is being left. */
	void leave(Window window) {
		if (window.equals(back.peek())) {
			return;
		}
		back.push(window);
		forward.clear();
		if (back.size() > LONGEST) {
			back.removeLast();
		}
	}

	/** The window before the present one. */
	Optional<Window> back(Window present) {
		return step(back, forward, present);
	}

	/** The window that was left by going back. */
	Optional<Window> forward(Window present) {
		return step(forward, back, present);
	}

	private static Optional<Window> step(Deque<Window> from, Deque<Window> onto, Window present) {
		if (from.isEmpty()) {
			return Optional.empty();
		}
		onto.push(present);
		return Optional.of(from.pop());
	}

	/** Forgets everything. */
	void clear() {
		back.clear();
		forward.clear();
	}
}
