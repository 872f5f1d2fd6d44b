// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;

import org.junit.jupiter.api.Test;

class DecimationTest {

	private static final int POINTS = 10_000;
	private static final int COLUMNS = 500;

	private static Curve spiky(double... spikes) {
		double[] x = new double[POINTS];
		double[] y = new double[POINTS];
		for (int k = 0; k < POINTS; k++) {
			x[k] = k + 1;
			y[k] = Math.sin(0.01 * k);
		}
		for (double spike : spikes) {
			y[(int) spike] = 100;
		}
		return new Curve("spiky", x, y, Curve.Style.LINE);
	}

	@Test
	void keepsEveryPeakOfALongCurve() {
		Curve reduced = Decimation.reduce(spiky(17, 5000, 9981), 1, POINTS, COLUMNS, false);
		assertEquals(3, Arrays.stream(reduced.y()).filter(value -> value == 100).count());
		assertTrue(reduced.x().length <= 4 * (COLUMNS + 2), reduced.x().length + " points");
	}

	@Test
	void keepsThePlacesAscendingAlsoWithLogarithmicColumns() {
		Curve reduced = Decimation.reduce(spiky(9000), 1, POINTS, COLUMNS, true);
		for (int k = 1; k < reduced.x().length; k++) {
			assertTrue(reduced.x()[k - 1] < reduced.x()[k], "at " + k);
		}
		assertEquals(1, Arrays.stream(reduced.y()).filter(value -> value == 100).count());
	}

	@Test
	void leavesAShortCurveAsItIs() {
		var curve = new Curve("short", new double[] { 1, 2, 3 }, new double[] { 4, 5, 6 }, Curve.Style.LINE);
		assertSame(curve, Decimation.reduce(curve, 0, 10, COLUMNS, false));
	}

	@Test
	void keepsTheNeighboursOutsideTheWindowSoThatLinesReachItsEdges() {
		Curve reduced = Decimation.reduce(spiky(), 100.5, 200.5, COLUMNS, false);
		assertTrue(reduced.x()[0] <= 100.5 && reduced.x()[reduced.x().length - 1] >= 200.5);
		assertTrue(reduced.x().length < 110);
	}
}
