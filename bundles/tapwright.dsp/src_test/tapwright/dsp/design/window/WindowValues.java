// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** A line of window-values.csv, made by make_window_values.py with scipy 1.17.1. */
record WindowValues(String name, double parameter, double[] values) {

	static List<WindowValues> read() {
		try (var in = WindowValues.class.getResourceAsStream("window-values.csv")) {
			return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().map(line -> {
				String[] cells = line.split(";");
				return new WindowValues(cells[0], Double.parseDouble(cells[1]),
						Arrays.stream(cells[3].split(" ")).mapToDouble(Double::parseDouble).toArray());
			}).toList();
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
	}

	@Override
	public String toString() {
		return name + " " + parameter + " of " + values.length;
	}
}
