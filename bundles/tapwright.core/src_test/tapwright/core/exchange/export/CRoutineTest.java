// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.BitTrue;
import tapwright.dsp.arithmetic.NodeRange;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.OverflowBounds;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;

/** Compiles exported routines with the C compiler of the machine, strictly and with checks for undefined behaviour, and runs them. */
class CRoutineTest {

	private static final int FILTERS = Boolean.getBoolean("tapwright.thorough") ? 600 : 24;
	private static final List<String> FLAGS = List.of("-std=c99", "-pedantic", "-Wall", "-Wextra", "-Werror", "-O1",
			"-fsanitize=undefined", "-fno-sanitize-recover=all");

	// Reads and writes 64-bit words of this machine.
	private static final String DRIVER = """
			#include <stdio.h>
			#include <stdlib.h>
			#include "probe.h"
			static probe_state state;
			int main(void)
			{
				int64_t word;
				INPUT *input = malloc(1000000 * sizeof *input);
				OUTPUT *output = malloc(1000000 * sizeof *output);
				size_t count = 0, done, written = 0, n;
				while (fread(&word, sizeof word, 1, stdin) == 1) {
					input[count++] = (INPUT) word;
				}
				probe_reset(&state);
				for (done = 0; done < count; done += n) {
					n = 1 + done * 7 % 50 < count - done ? 1 + done * 7 % 50 : count - done;
					written += probe_run(&state, input + done, n, output + written);
				}
				for (n = 0; n < written; n++) {
					word = (int64_t) output[n];
					fwrite(&word, sizeof word, 1, stdout);
				}
				return 0;
			}
			""";

	@TempDir
	Path folder;

	@BeforeAll
	static void needsACompiler() throws InterruptedException {
		boolean found = true;
		try {
			found = new ProcessBuilder("gcc", "--version").redirectOutput(ProcessBuilder.Redirect.DISCARD).start()
					.waitFor() == 0;
		} catch (IOException e) {
			found = false;
		}
		assumeTrue(found, "no gcc on this machine: exported C is not compiled");
	}

	@Test
	void everyRoutineYieldsTheBitsOfTheSimulation() throws Exception {
		int compared = 0;
		for (int seed = 0; seed < FILTERS; seed++) {
			var random = new Random(seed);
			HandOver filter = filter(Structure.values()[seed % Structure.values().length], random);
			try {
				compare(filter, random, "seed " + seed + " " + filter.arithmetic());
				compared++;
			} catch (InputException refused) {
				assertTrue(refused.getMessage().contains("64"), refused.describe());
			}
		}
		assertTrue(compared > FILTERS / 2, compared + " of " + FILTERS + " fit 64 bits");
	}

	@Test
	void theSelfTestOfTheRoutinePassesAndFailsWhenACoefficientIsChanged() throws Exception {
		HandOver filter = filter(Structure.FOLDED, new Random(5));
		List<ExportedFile> files = new CRoutine().write(filter);
		write(files);
		run(command("probe.c", "probe_selftest.c", "selftest"), new byte[0]);
		assertEquals("probe: passed\n", new String(run(List.of("./selftest"), new byte[0]), StandardCharsets.UTF_8));
		String header = files.getFirst().text();
		int table = header.indexOf('{', header.indexOf("_coefficients["));
		String changed = header.substring(0, table) + header.substring(table).replaceFirst("-?\\d+,", "1,");
		Files.writeString(folder.resolve("probe.h"), changed);
		run(command("probe.c", "probe_selftest.c", "selftest"), new byte[0]);
		var process = new ProcessBuilder("./selftest").directory(folder.toFile()).redirectErrorStream(true).start();
		assertTrue(new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).contains("differs"));
		assertFalse(process.waitFor() == 0);
	}

	@Test
	void theTableOfRealCoefficientsIsExact() throws Exception {
		var random = new Random(3);
		double[] taps = random.doubles(40, -1, 1).toArray();
		taps[7] = Double.MIN_VALUE;
		taps[8] = -Double.MAX_VALUE;
		taps[9] = -0.0;
		var filter = new HandOver("probe", "", List.of("met: a */ comment ±1 /* end"), ExactTaps.ofDoubles(taps), 1000,
				Optional.empty(), false);
		write(new CTable().write(filter));
		Files.writeString(folder.resolve("print.c"), """
				#include <stdio.h>
				#include "probe.h"
				int main(void)
				{
					return fwrite(probe_coefficients, sizeof probe_coefficients, 1, stdout) == 1 ? 0 : 1;
				}
				""");
		run(command("print.c", "print"), new byte[0]);
		double[] printed = new double[taps.length];
		ByteBuffer.wrap(run(List.of("./print"), new byte[0])).order(ByteOrder.nativeOrder()).asDoubleBuffer()
				.get(printed);
		for (int k = 0; k < taps.length; k++) {
			assertEquals(0, Double.compare(taps[k] + 0.0, printed[k] + 0.0), "coefficient " + k);
		}
	}

	@Test
	void whatDoesNotFitIsRefusedInWords() {
		var wide = new NumberFormat(40, 39);
		var arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(wide), Optional.of(wide), Optional.empty(),
				Optional.empty(),
				Optional.empty(), Rounding.HALF_EVEN, Overflow.SATURATE);
		var taps = ExactTaps.ofIntegers(List.of(wide.max()), wide.step());
		var filter = new HandOver("probe", "", List.of(), taps, 1, Optional.of(arithmetic), true);
		var refused = assertThrows(InputException.class, () -> new CRoutine().write(filter));
		assertEquals("probe: a product may need 79 bits; the routine computes with 64", refused.describe());
		var bare = new HandOver("probe", "", List.of(), taps, 1, Optional.empty(), true);
		assertTrue(assertThrows(InputException.class, () -> new CRoutine().write(bare)).describe()
				.contains("no arithmetic"));
	}

	private void compare(HandOver filter, Random random, String what) throws Exception {
		write(new CRoutine().write(filter));
		Arithmetic arithmetic = filter.arithmetic().orElseThrow();
		NumberFormat format = arithmetic.input().orElseThrow();
		String input = CTypes.type(format, "");
		String output = arithmetic.output().isPresent() ? CTypes.type(arithmetic.output().get(), "") : "int64_t";
		Files.writeString(folder.resolve("driver.c"), DRIVER);
		var compile = new ArrayList<>(command("probe.c", "driver.c", "driver"));
		compile.addAll(List.of("-DINPUT=" + input, "-DOUTPUT=" + output));
		run(compile, new byte[0]);
		BigInteger[] samples = signal(filter, format, random);
		long[] expected = Arrays.stream(new BitTrue(filter.taps(), arithmetic).filter(samples))
				.mapToLong(BigInteger::longValue).toArray();
		ByteBuffer bytes = ByteBuffer.allocate(8 * samples.length).order(ByteOrder.nativeOrder());
		for (BigInteger sample : samples) {
			bytes.putLong(sample.longValueExact());
		}
		ByteBuffer result = ByteBuffer.wrap(run(List.of("./driver"), bytes.array())).order(ByteOrder.nativeOrder());
		long[] actual = new long[result.remaining() / 8];
		result.asLongBuffer().get(actual);
		assertArrayEquals(expected, actual, what);
		run(command("probe.c", "probe_selftest.c", "selftest"), new byte[0]);
		run(List.of("./selftest"), new byte[0]);
	}

	/** An impulse, both ends of full scale, inputs that overflow each node, noise. */
	private static BigInteger[] signal(HandOver filter, NumberFormat format, Random random) {
		var samples = new ArrayList<BigInteger>();
		samples.add(format.max());
		for (int n = 0; n < filter.taps().length(); n++) {
			samples.add(BigInteger.ZERO);
		}
		for (int n = 0; n < 100; n++) {
			samples.add(n % 40 < 20 ? format.max() : format.min());
		}
		var bounds = new OverflowBounds(filter.taps(), filter.arithmetic().orElseThrow());
		for (NodeRange node : bounds.nodes()) {
			samples.addAll(Arrays.asList(bounds.worstInput(node, true)));
			samples.addAll(Arrays.asList(bounds.worstInput(node, false)));
		}
		for (int n = 0; n < 2000; n++) {
			samples.add(new BigInteger(format.word(), random).add(format.min()));
		}
		return samples.toArray(BigInteger[]::new);
	}

	private static HandOver filter(Structure structure, Random random) {
		int word = 4 + random.nextInt(21);
		int fraction = random.nextInt(word + 4);
		int length = 1 + random.nextInt(structure == Structure.DIRECT ? 3 : 30);
		if (structure == Structure.HALF_BAND) {
			length = 3 + 4 * random.nextInt(6);
		}
		BigInteger[] taps = new BigInteger[length];
		int sign = structure == Structure.FOLDED && random.nextBoolean() ? -1 : 1;
		for (int k = 0; k < length; k++) {
			taps[k] = new BigInteger(word, random).subtract(BigInteger.ONE.shiftLeft(word - 1))
					.max(BigInteger.ONE.shiftLeft(word - 1).negate().add(BigInteger.ONE));
			boolean symmetric = structure == Structure.FOLDED || structure == Structure.HALF_BAND;
			if (symmetric && k >= (length + 1) / 2) {
				taps[k] = taps[length - 1 - k].multiply(BigInteger.valueOf(sign));
			}
			if (sign < 0 && length % 2 == 1 && k == length / 2
					|| structure == Structure.HALF_BAND && k != length / 2 && (length / 2 - k) % 2 == 0) {
				taps[k] = BigInteger.ZERO;
			}
		}
		int factor = switch (structure) {
		case DIRECT, FOLDED, TRANSPOSED -> 1;
		case HALF_BAND -> 1 + random.nextInt(2);
		case POLYPHASE_DECIMATOR, POLYPHASE_INTERPOLATOR -> 1 + random.nextInt(5);
		};
		int inputWord = 4 + random.nextInt(25);
		int inputFraction = random.nextInt(inputWord);
		int full = fraction + inputFraction;
		int product = full - random.nextInt(8);
		int accumulator = (random.nextInt(3) == 0 ? product - random.nextInt(6) : product) + random.nextInt(2);
		Optional<NumberFormat> products = random.nextInt(3) > 0 ? Optional.empty()
				: Optional.of(new NumberFormat(word + inputWord - random.nextInt(8), product));
		Optional<NumberFormat> sums = random.nextInt(4) == 0 ? Optional.empty()
				: Optional.of(new NumberFormat(Math.min(62, word + inputWord + random.nextInt(10) - 5), accumulator));
		Optional<NumberFormat> outputs = random.nextInt(4) == 0 ? Optional.empty()
				: Optional.of(new NumberFormat(3 + random.nextInt(30), accumulator - random.nextInt(20),
						random.nextInt(5) > 0));
		var arithmetic = new Arithmetic(structure, Optional.of(new NumberFormat(word, fraction)),
				Optional.of(new NumberFormat(inputWord, inputFraction, random.nextInt(4) > 0)), products, sums, outputs,
				Rounding.values()[random.nextInt(Rounding.values().length)], Overflow.values()[random.nextInt(2)],
						factor);
		BigFraction unit = ExactTaps.powerOfTwo(-fraction);
		return new HandOver("probe", "", List.of(), ExactTaps.ofIntegers(List.of(taps), unit), 1000,
				Optional.of(arithmetic), true);
	}

	private void write(List<ExportedFile> files) throws IOException {
		for (ExportedFile file : files) {
			Files.writeString(folder.resolve(file.name()), file.text());
		}
	}

	private static List<String> command(String... sourcesAndTarget) {
		var command = new ArrayList<String>();
		command.add("gcc");
		command.addAll(FLAGS);
		List<String> names = List.of(sourcesAndTarget);
		command.addAll(names.subList(0, names.size() - 1));
		command.addAll(List.of("-o", names.getLast()));
		return command;
	}

	private byte[] run(List<String> command, byte[] input) throws IOException, InterruptedException {
		Path in = folder.resolve("stdin");
		Path out = folder.resolve("stdout");
		Path err = folder.resolve("stderr");
		Files.write(in, input);
		int code = new ProcessBuilder(command).directory(folder.toFile()).redirectInput(in.toFile())
				.redirectOutput(out.toFile())
				.redirectError(err.toFile()).start().waitFor();
		assertEquals(0, code, () -> String.join(" ", command) + "\n" + read(err) + read(out));
		return Files.readAllBytes(out);
	}

	private static String read(Path file) {
		try {
			return new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1);
		} catch (IOException e) {
			return e.toString();
		}
	}
}
