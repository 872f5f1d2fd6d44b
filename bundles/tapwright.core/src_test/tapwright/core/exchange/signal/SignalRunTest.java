// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.LongStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.core.InputException;
import tapwright.core.exchange.imports.WavFiles;
import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.BitTrue;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Subject;

class SignalRunTest {

	private static final ExactTaps TAPS = ExactTaps.ofDoubles(0.25, 0.5, -0.25, 0.375);

	@TempDir
	Path folder;

	@Test
	void aLongWavFileIsFilteredBitForBitInEveryChannel() throws Exception {
		Subject filter = filter(16, 16, Structure.DIRECT, 1);
		short[] samples = new short[2 * 10_001];
		var random = new Random(4);
		ByteBuffer bytes = ByteBuffer.allocate(2 * samples.length).order(ByteOrder.LITTLE_ENDIAN);
		for (int n = 0; n < samples.length; n++) {
			samples[n] = (short) random.nextInt();
			bytes.putShort(samples[n]);
		}
		SignalRun run = run(filter, write("in.wav", WavFiles.of(16, false, 2, 8000, bytes.array())), "out.wav");
		assertEquals(new SignalRun(10_001, 10_001, true), run);
		ByteBuffer output = ByteBuffer.wrap(Files.readAllBytes(folder.resolve("out.wav")))
				.order(ByteOrder.LITTLE_ENDIAN);
		for (int channel = 0; channel < 2; channel++) {
			long[] input = new long[10_001];
			for (int n = 0; n < input.length; n++) {
				input[n] = samples[2 * n + channel];
			}
			long[] expected = new BitTrue(TAPS, filter.arithmetic().orElseThrow()).filter(input);
			for (int n = 0; n < input.length; n++) {
				assertEquals(expected[n], output.getShort(44 + 2 * (2 * n + channel)), "channel " + channel + " sample "
						+ n);
			}
		}
	}

	@Test
	void fullScaleOfTheFileIsFullScaleOfTheFormat() throws Exception {
		Subject filter = new Subject(ExactTaps.ofDoubles(1), 8000, filter(12, 20, Structure.DIRECT, 1).arithmetic());
		// 24 bits to 12: steps of 2^12, ties to even; then 12 bits to 20, and 20 bits into 24.
		byte[] words = { 0, 0, (byte) 0x80, (byte) 0xff, (byte) 0xff, 0x7f, 0, 0x08, 0, 0, 0x18, 0, 1, 0x18, 0 };
		run(filter, write("in.wav", WavFiles.of(24, false, 1, 8000, words)), "out.csv");
		assertEquals("-524288\n524032\n0\n512\n512\n", Files.readString(folder.resolve("out.csv")));
		run(filter, folder.resolve("in.wav"), "out.wav");
		byte[] out = Files.readAllBytes(folder.resolve("out.wav"));
		assertArrayEquals(new byte[] { 0, 0, (byte) 0x80, 0, (byte) 0xf0, 0x7f }, Arrays.copyOfRange(out, 44, 50));
	}

	@Test
	void textAndRawFilesHoldIntegersOfTheFormat() throws Exception {
		Subject filter = filter(16, 16, Structure.POLYPHASE_DECIMATOR, 3);
		long[] input = LongStream.range(0, 5000).map(n -> n * 7919 % 65536 - 32768).toArray();
		long[] expected = new BitTrue(TAPS, filter.arithmetic().orElseThrow()).filter(input);
		Path text = Files.writeString(folder.resolve("in.csv"), "# a comment\nvalue\n" + LongStream.of(input)
				.mapToObj(n -> n + "\n").collect(Collectors.joining()));
		assertEquals(new SignalRun(5000, 1667, true), run(filter, text, "out.csv"));
		assertArrayEquals(expected, Files.readAllLines(folder.resolve("out.csv")).stream().mapToLong(Long::parseLong)
				.toArray());
		ByteBuffer raw = ByteBuffer.allocate(10_000).order(ByteOrder.LITTLE_ENDIAN);
		LongStream.of(input).forEach(n -> raw.putShort((short) n));
		run(filter, write("in.raw", raw.array()), "out.raw");
		ByteBuffer output = ByteBuffer.wrap(Files.readAllBytes(folder.resolve("out.raw")))
				.order(ByteOrder.LITTLE_ENDIAN);
		for (long value : expected) {
			assertEquals(value, output.getShort());
		}
		assertFalse(output.hasRemaining());
	}

	@Test
	void withoutFormatsTheFilterRunsInDoublePrecision() throws Exception {
		var filter = new Subject(TAPS, 100, Optional.of(Arithmetic.exact(Structure.POLYPHASE_INTERPOLATOR, 2)));
		Path text = Files.writeString(folder.resolve("in.csv"), "1,0\n0,2\n0,0\n");
		assertEquals(new SignalRun(3, 6, false), run(filter, text, "out.csv"));
		// Computed by hand: each input at every second place, convolved with the coefficients.
		assertEquals("0.25,0.0\n0.5,0.0\n-0.25,0.5\n0.375,1.0\n0.0,-0.5\n0.0,0.75\n",
				Files.readString(folder.resolve("out.csv")));
	}

	@Test
	void whatCannotBeFilteredLeavesNothingBehind() throws Exception {
		Subject filter = filter(16, 16, Structure.DIRECT, 1);
		refused("in.csv:2:1: 'x' is no number", filter, "1\nx\n");
		refused("is 0.5; the filter runs on integers", filter, "1\n0.5\n");
		refused("is 32768; the input format", filter, "1\n32768\n");
		refused("there are 2 numbers, but 1", filter, "1\n1,2\n");
		assertTrue(assertThrows(InputException.class, () -> run(filter, folder.resolve("in.csv"), "out.ogg")).describe()
				.contains(".wav"));
		byte[] wav = WavFiles.of(16, false, 1, 8000, new byte[10]);
		write("in.wav", Arrays.copyOf(wav, wav.length - 3));
		assertTrue(assertThrows(InputException.class, () -> run(filter, folder.resolve("in.wav"), "out.wav")).describe()
				.contains("ends 3 bytes before"));
		try (var files = Files.list(folder)) {
			assertEquals(2, files.count());
		}
	}

	private void refused(String reason, Subject filter, String content) throws IOException {
		Path text = Files.writeString(folder.resolve("in.csv"), content);
		String described = assertThrows(InputException.class, () -> run(filter, text, "out.csv")).describe();
		assertTrue(described.contains(reason), described);
	}

	private SignalRun run(Subject filter, Path input, String output) throws InputException, IOException {
		return SignalRun.of(filter, input, folder.resolve(output), Progress.NONE);
	}

	private Path write(String name, byte[] content) throws IOException {
		return Files.write(folder.resolve(name), content);
	}

	private static Subject filter(int input, int output, Structure structure, int factor) {
		var arithmetic = new Arithmetic(structure, Optional.of(new NumberFormat(16, 14)),
				Optional.of(new NumberFormat(input, input - 1)),
				Optional.empty(), Optional.empty(), Optional.of(new NumberFormat(output, output - 1)),
						Rounding.HALF_EVEN, Overflow.SATURATE, factor);
		return new Subject(TAPS, 8000, Optional.of(arithmetic));
	}
}
