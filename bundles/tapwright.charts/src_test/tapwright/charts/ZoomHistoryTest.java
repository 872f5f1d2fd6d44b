// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;

import org.junit.jupiter.api.Test;

class ZoomHistoryTest {

	private final Window a = new Window(0, 1, 0, 1);
	private final Window b = new Window(0, 2, 0, 2);
	private final Window c = new Window(0, 3, 0, 3);

	@Test
	void goesBackInReverseOrderAndForwardAgain() {
		var history = new ZoomHistory();
		history.leave(a);
		history.leave(b);
		assertEquals(Optional.of(b), history.back(c));
		assertEquals(Optional.of(a), history.back(b));
		assertTrue(history.back(a).isEmpty());
		assertEquals(Optional.of(b), history.forward(a));
		assertEquals(Optional.of(c), history.forward(b));
	}

	@Test
	void forgetsTheWayForwardAfterANewZoom() {
		var history = new ZoomHistory();
		history.leave(a);
		history.back(b);
		history.leave(c);
		assertTrue(history.forward(a).isEmpty());
	}
}
