// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;

import org.junit.jupiter.api.Test;

class WordsOfPlotsTest {

	private static Plot plot() {
		var line = new Curve("first, of two", new double[] { 1000, 2000 }, new double[] { -10, -20 }, Curve.Style.LINE);
		var stems = new Curve("second", new double[] { 1500 }, new double[] { 3 }, Curve.Style.STEMS);
		return Plot.of("two curves", new Axis("Frequency", "Hz"), new Axis("Gain", "dB"), List.of(line, stems),
				new Window(0, 3000, -30, 10), "");
	}

	@Test
	void theReadoutGivesTheValueBetweenTwoPointsOfALineAndThePointOfAStem() {
		assertEquals("1.25 kHz    first, of two: −12.5 dB    second: 3 dB", Readout.at(plot(), 1250));
	}

	@Test
	void theTableHasTwoColumnsForEachCurveAndAHeaderWithUnits() {
		assertEquals("""
				Frequency (Hz),"first, of two (dB)",Frequency (Hz),second (dB)
				1000.0,-10.0,1500.0,3.0
				2000.0,-20.0,,
				""", PlotCsv.write(plot(), ','));
	}

	@Test
	void ticksAreRoundNumbersInsideTheRange() {
		assertEquals(List.of(-80.0, -60.0, -40.0, -20.0, 0.0), Ticks.of(-95, 5, 5, false));
		assertEquals(List.of(20.0, 50.0, 100.0, 200.0), Ticks.of(15, 300, 5, true));
	}

	@Test
	void anAxisWritesItsUnitWithThePrefixThatSuitsItsRange() {
		assertEquals("Frequency (kHz)", new Axis("Frequency", "Hz").caption(new Axis("Frequency", "Hz").prefixPower(24_000)));
		assertEquals("1.5 ms", new Axis("Time", "s").words(0.0015, 5));
		assertEquals("0", new Axis("Amplitude", "").words(0, 5));
	}

	@Test
	void theForbiddenSideOfALimitReachesFromTheLineBeyondTheEdgeOfTheWindow() {
		var window = new Window(0, 100, -100, 0);
		var projection = Projection.of(window, false, 0, 0, 100, 100);
		var region = new Region("stop", new double[] { 50, 200 }, new double[] { -60, -60 }, true, false);
		assertArrayEquals(new double[] { 50, -100, 50, 60, 100, 60, 100, -100 }, projection.corners(region, window), 1e-9);
	}

	@Test
	void aLimitOutsideOfTheWindowHasNoCorners() {
		var window = new Window(0, 100, -100, 0);
		var projection = Projection.of(window, false, 0, 0, 100, 100);
		var region = new Region("stop", new double[] { 150, 200 }, new double[] { -60, -60 }, true, false);
		assertEquals(0, projection.corners(region, window).length);
	}
}
