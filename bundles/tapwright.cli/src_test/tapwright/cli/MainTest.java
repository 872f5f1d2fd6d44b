// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

import org.junit.jupiter.api.Test;

class MainTest {

	private final ByteArrayOutputStream err = new ByteArrayOutputStream();

	@Test
	void anUnknownVerbIsNamedAndNothingIsDone() {
		var out = new ByteArrayOutputStream();
		var code = Main.run(List.of("frobnicate"), print(out), print(err));
		assertEquals(Main.BAD_USAGE, code);
		assertTrue(err.toString(StandardCharsets.UTF_8).contains("'frobnicate'"), err::toString);
		assertEquals(0, out.size());
	}

	private static PrintStream print(ByteArrayOutputStream bytes) {
		return new PrintStream(bytes, true, StandardCharsets.UTF_8);
	}
}
