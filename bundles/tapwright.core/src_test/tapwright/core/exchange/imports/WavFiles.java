// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;

/** WAV files for tests, byte by byte. */
public final class WavFiles {

	private WavFiles() {
	}

	/** A file with the plain header. */
	public static byte[] of(int bits, boolean real, int channels, int rate, byte[] samples) {
		ByteBuffer file = ByteBuffer.allocate(44 + samples.length).order(ByteOrder.LITTLE_ENDIAN);
		file.put(ascii("RIFF")).putInt(36 + samples.length).put(ascii("WAVEfmt ")).putInt(16);
		file.putShort((short) (real ? 3 : 1)).putShort((short) channels).putInt(rate)
				.putInt(rate * channels * bits / 8);
		file.putShort((short) (channels * bits / 8)).putShort((short) bits).put(ascii("data")).putInt(samples.length)
				.put(samples);
		return file.array();
	}

	private static byte[] ascii(String text) {
		return text.getBytes(StandardCharsets.US_ASCII);
	}
}
