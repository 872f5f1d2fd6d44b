// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WordsTest {

	@ParameterizedTest
	@CsvSource({ "8013.2, Hz, 8.013 kHz", "-79.624, dB, -79.62 dB", "0.0015, s, 1.5 ms", "0, Hz, 0 Hz", "50, Hz, 50 Hz",
			"0.25, Hz, 250 mHz", "192000, Hz, 192 kHz", "3e-6, s, 3 µs", "12, s, 12 s", "5000000, 1, 5000000", "5, %, 5 %",
			"9999.96, Hz, 10 kHz" })
	void usePrefixesThatFit(double value, String unit, String expected) {
		assertEquals(expected, Words.of(value, unit));
	}

	@Test
	void shareTheUnitOfABand() {
		assertEquals("from 8 to 24 kHz", Words.band(8000, 24000));
		assertEquals("from 0 to 6 kHz", Words.band(0, 6000));
		assertEquals("from 800 Hz to 1.2 kHz", Words.band(800, 1200));
	}

	@Test
	void nameInfinities() {
		assertEquals("-infinity dB", Words.of(Double.NEGATIVE_INFINITY, "dB"));
	}
}
