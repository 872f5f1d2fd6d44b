// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.BufferedOutputStream;
import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

import tapwright.core.InputException;

/** Writes a signal from front to back into a temporary file that takes the place of the target at the end. */
final class SignalWriter implements Closeable {

	private static final int HEADER = 44;
	private static final long LONGEST = 0xffffffffL - HEADER;

	private final Path target;
	private final Path temporary;
	private final OutputStream output;
	private final SignalKind kind;
	private final WavHeader words;
	private long written;
	private boolean finished;

	/**
	 * @param words
	 *            channels, rate, length and kind of the samples; text ignores all but whether they are real
	 */
	SignalWriter(Path target, SignalKind kind, WavHeader words) throws IOException {
		this.target = target.toAbsolutePath();
		this.kind = kind;
		this.words = words;
		Files.createDirectories(this.target.getParent());
		temporary = Files.createTempFile(this.target.getParent(), "." + target.getFileName() + ".", ".tmp");
		output = new BufferedOutputStream(Files.newOutputStream(temporary));
		if (kind == SignalKind.WAV) {
			output.write(new byte[HEADER]); // known at the end
		}
	}

	/** Writes moments; integers are given as whole numbers. */
	void write(double[][] block, int count) throws InputException, IOException {
		if (kind == SignalKind.CSV) {
			var text = new StringBuilder();
			for (int n = 0; n < count; n++) {
				for (int channel = 0; channel < block.length; channel++) {
					text.append(channel > 0 ? "," : "");
					if (words.real()) {
						text.append(block[channel][n]);
					} else {
						text.append((long) block[channel][n]);
					}
				}
				text.append('\n');
			}
			output.write(text.toString().getBytes(StandardCharsets.US_ASCII));
			return;
		}
		int size = words.bits() / 8;
		byte[] bytes = new byte[count * words.frameBytes()];
		int at = 0;
		for (int n = 0; n < count; n++) {
			for (double[] channel : block) {
				long word = !words.real() ? (long) channel[n]
						: size == Float.BYTES ? Float.floatToRawIntBits((float) channel[n])
								: Double.doubleToRawLongBits(channel[n]);
				for (int k = 0; k < size; k++) {
					bytes[at++] = (byte) (word >> 8 * k);
				}
			}
		}
		written += bytes.length;
		if (kind == SignalKind.WAV && written > LONGEST) {
			throw new InputException(target.toString(),
					"the output is longer than a WAV file can be; write .raw or .csv");
		}
		output.write(bytes);
	}

	/** Puts the file in the place of the target. */
	void finish() throws IOException {
		if (kind == SignalKind.WAV && written % 2 != 0) {
			output.write(0); // chunks have an even length
		}
		output.close();
		try (var file = new RandomAccessFile(temporary.toFile(), "rw")) {
			if (kind == SignalKind.WAV) {
				file.write(header());
			}
			file.getFD().sync();
		}
		Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
		finished = true;
	}

	private byte[] header() {
		ByteBuffer header = ByteBuffer.allocate(HEADER).order(ByteOrder.LITTLE_ENDIAN);
		header.put(tag("RIFF")).putInt((int) (written + written % 2 + HEADER - 8)).put(tag("WAVEfmt ")).putInt(16);
		header.putShort((short) (words.real() ? 3 : 1)).putShort((short) words.channels());
		header.putInt((int) words.sampleRate()).putInt((int) (words.sampleRate() * words.frameBytes()));
		header.putShort((short) words.frameBytes()).putShort((short) words.bits()).put(tag("data"))
				.putInt((int) written);
		return header.array();
	}

	private static byte[] tag(String text) {
		return text.getBytes(StandardCharsets.US_ASCII);
	}

	@Override
	public void close() throws IOException {
		if (!finished) {
			output.close();
			Files.deleteIfExists(temporary);
		}
	}
}
