// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;

/** Exported packages as the simulators of the machine read them. */
class HardwareTest {

	@TempDir
	Path folder;

	@ParameterizedTest
	@CsvSource({ "12, true", "18, true", "9, false", "1, false" })
	void theVhdlPackageHoldsTheIntegers(int word, boolean signed) throws Exception {
		assumeTrue(found("ghdl"), "no ghdl on this machine: the VHDL package is not analysed");
		NumberFormat format = new NumberFormat(word, word - 1, signed);
		HandOver filter = filter(format);
		write("vhdl", filter);
		Files.writeString(folder.resolve("bench.vhd"), """
				library ieee;
				use ieee.numeric_std.all;
				use work.probe_coefficients.all;
				entity bench is end;
				architecture a of bench is
				begin
					process begin
						assert TAPS = 3 and to_integer(COEFFICIENTS(0)) = %s and to_integer(COEFFICIENTS(1)) = %s
							and to_integer(COEFFICIENTS(2)) = %s severity failure;
						wait;
					end process;
				end;
				""".formatted(filter.integers().toArray()));
		run("ghdl", "-a", "--std=08", "probe_coefficients.vhd", "bench.vhd");
		run("ghdl", "--elab-run", "--std=08", "bench");
	}

	@Test
	void theSystemVerilogPackageIsAccepted() throws Exception {
		assumeTrue(found("verilator"), "no verilator on this machine: the SystemVerilog package is not read");
		write("systemverilog", filter(new NumberFormat(18, 17)));
		run("verilator", "--lint-only", "probe_coefficients.sv");
	}

	private static HandOver filter(NumberFormat format) {
		List<BigInteger> integers = Stream.of(format.min(), BigInteger.ONE.min(format.max()), format.max()).toList();
		var arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(format), Optional.empty(), Optional.empty(),
				Optional.empty(), Optional.empty(),
				Rounding.HALF_EVEN, Overflow.SATURATE);
		return new HandOver("probe", "", List.of("met: within ±1 dB"), ExactTaps.ofIntegers(integers, format.step()), 1,
				Optional.of(arithmetic), true);
	}

	private void write(String format, HandOver filter) throws InputException, IOException {
		for (ExportedFile file : ExportFormat.of(format).orElseThrow().write(filter)) {
			Files.writeString(folder.resolve(file.name()), file.text());
		}
	}

	private static boolean found(String program) throws InterruptedException {
		try {
			return new ProcessBuilder(program, "--version").redirectOutput(ProcessBuilder.Redirect.DISCARD).start()
					.waitFor() == 0;
		} catch (IOException e) {
			return false; // the machine does not have it
		}
	}

	private void run(String... command) throws IOException, InterruptedException {
		Process process = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).start();
		String output = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
		assertEquals(0, process.waitFor(), output);
	}
}
