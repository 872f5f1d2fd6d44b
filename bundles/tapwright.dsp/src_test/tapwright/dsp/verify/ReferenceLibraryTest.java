// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;

/** Worst gains against scipy 1.17.1 with numpy 2.4.6; {@code make_gain_fixture.py} beside the fixture made it. */
class ReferenceLibraryTest {

	/** What a double-precision evaluation and a one-dimensional minimiser leave of a decibel at -100 dB. */
	private static final double TOLERANCE = 1e-7;

	@Test
	void worstGainsAreThoseOfTheReferenceLibrary() throws IOException {
		List<String> lines;
		try (BufferedReader reader = new BufferedReader(new InputStreamReader(
				ReferenceLibraryTest.class.getResourceAsStream("gain-fixture.csv"), StandardCharsets.UTF_8))) {
			lines = reader.lines().toList();
		}
		assertEquals(21, lines.size());
		for (String line : lines) {
			String[] fields = line.split(",");
			double[] numbers = Arrays.stream(fields).skip(1).mapToDouble(Double::parseDouble).toArray();
			ExactTaps taps = ExactTaps.ofDoubles(Arrays.copyOfRange(numbers, 4, numbers.length));
			GainLimit limit = fields[0].equals("upper") ? GainLimit.atMost(numbers[1], numbers[2], 0)
					: GainLimit.atLeast(numbers[1], numbers[2], -100);
			Proof proof = limit.prove(new Subject(taps, numbers[0]), Effort.STANDARD);
			assertEquals(numbers[3], proof.value().middle(), TOLERANCE, line.substring(0, 60));
		}
	}
}
