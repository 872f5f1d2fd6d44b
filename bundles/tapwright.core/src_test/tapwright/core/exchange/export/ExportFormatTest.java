// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.exchange.Drift;
import tapwright.core.exchange.HandOver;
import tapwright.core.interchange.JsonTree;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;

class ExportFormatTest {

	private static final NumberFormat Q11 = new NumberFormat(12, 11);

	@Test
	void theSameFilterGivesTheSameBytes() throws InputException {
		for (ExportFormat format : ExportFormat.all()) {
			assertEquals(format.write(filter(100)), format.write(filter(100)), format.name());
		}
	}

	@Test
	void everyFileSaysWhatItIs() throws InputException {
		for (ExportFormat format : ExportFormat.all()) {
			for (ExportedFile file : format.write(filter(100))) {
				assertTrue(Stream.of("wave low-pass", "0123456789ab", filter(100).numbersHash())
						.allMatch(file.text()::contains), file.text());
			}
			assertTrue(format.write(filter(100)).getFirst().text().contains("met: stop: gain"), format.name());
		}
	}

	@Test
	void driftIsToldFromHandEdits() throws InputException {
		for (ExportFormat format : ExportFormat.all()) {
			for (ExportedFile file : format.write(filter(100))) {
				String text = file.text();
				String edited = text.replaceFirst("wave low-pass", "wave LOW-pass");
				assertEquals(Drift.NONE, Drift.of(text, filter(100)), file.name());
				assertEquals(Drift.NONE, Drift.of(text.replace("\n", "\r\n"), filter(100)), file.name());
				assertEquals(Drift.OUTDATED, Drift.of(text, filter(101)), file.name());
				assertEquals(Drift.EDITED, Drift.of(edited, filter(100)), file.name());
				assertEquals(Drift.EDITED_AND_OUTDATED, Drift.of(edited, filter(101)), file.name());
			}
		}
		assertEquals(Drift.UNKNOWN, Drift.of("static const short h[] = { 1 };", filter(100)));
	}

	@Test
	void wordsAreTwosComplement() throws InputException {
		assertTrue(text("hex").endsWith("\n064\nF9C\n7FF\n800\n"), text("hex"));
		assertTrue(text("vhdl").contains("\t\t0 => 12x\"064\", -- 100\n\t\t1 => 12x\"F9C\", -- -100\n"), text("vhdl"));
		assertTrue(text("vhdl").contains("\t\t3 => 12x\"800\" -- -2048\n"), text("vhdl"));
		assertTrue(text("systemverilog").contains("\t\t12'shF9C, // -100\n"), text("systemverilog"));
		assertTrue(text("csv").contains("\nindex,integer,value\n0,100,0.048828125\n1,-100,-0.048828125\n"),
				text("csv"));
		assertTrue(text("c").contains("static const int16_t wave_low_pass_coefficients[WAVE_LOW_PASS_TAPS] = {\n\t100, -100, 2047, -2048\n};"), text("c"));
	}

	@Test
	void jsonHoldsIntegersWithTheirScale() throws InputException {
		var members = (Map<?, ?>) JsonTree.parse(text("json"));
		assertEquals("2^-11", members.get("scale"));
		assertEquals(new JsonTree.NumberLiteral("-2048"), ((List<?>) members.get("integers")).get(3));
	}

	@Test
	void realCoefficientsHaveNoWords() {
		var real = new HandOver("x", "", List.of(), ExactTaps.ofDoubles(0.1), 1, Optional.empty(), false);
		for (String format : List.of("hex", "vhdl", "systemverilog")) {
			var refused = assertThrows(InputException.class, () -> ExportFormat.of(format).orElseThrow().write(real));
			assertTrue(refused.describe().contains("state a coefficient format"), refused.describe());
		}
	}

	@Test
	void namesBecomeIdentifiers() {
		assertEquals("wave_low_pass", Values.identifier("Wave low-pass"));
		assertEquals("filter_50_hz", Values.identifier("50 Hz"));
		assertEquals("filter", Values.identifier("±"));
	}

	private static String text(String format) throws InputException {
		return ExportFormat.of(format).orElseThrow().write(filter(100)).getFirst().text();
	}

	private static HandOver filter(int first) {
		List<BigInteger> integers = Stream.of(first, -100, 2047, -2048).map(BigInteger::valueOf).toList();
		var arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(Q11), Optional.of(Q11), Optional.empty(),
				Optional.empty(),
				Optional.of(Q11), Rounding.HALF_EVEN, Overflow.SATURATE);
		return new HandOver("wave low-pass", "0123456789ab", List.of("met: stop: gain from 8 to 24 kHz at most -80 dB"),
				ExactTaps.ofIntegers(integers, Q11.step()), 48000, Optional.of(arithmetic), true);
	}
}
