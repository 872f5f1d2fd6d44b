// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.DataInput;
import java.io.EOFException;
import java.io.IOException;

import tapwright.core.InputException;

/**
 * The format of a RIFF/WAVE file, as in IBM and Microsoft, 'Multimedia Programming Interface and Data Specifications 1.0' (1991),
 * with the extensible header that later files have.
 *
 * @param channels
 *            samples at one moment
 * @param sampleRate
 *            hertz
 * @param bits
 *            of a sample: 8, 16, 24 or 32, or 32 or 64 for real numbers
 * @param real
 *            whether samples are IEEE 754 numbers
 * @param dataBytes
 *            length of the samples as the file states it
 */
public record WavHeader(int channels, long sampleRate, int bits, boolean real, long dataBytes) {

	private static final int PCM = 1;
	private static final int IEEE_FLOAT = 3;
	private static final int EXTENSIBLE = 0xfffe;
	private static final long UNSIGNED = 0xffffffffL;
	private static final int FORMAT_BYTES = 16;
	private static final int EXTENSIBLE_BYTES = 26;

	/** Bytes of all samples at one moment. */
	public int frameBytes() {
		return channels * (bits / 8);
	}

	/**
	 * Reads up to the first sample.
	 *
	 * @param file
	 *            for messages
	 * @throws InputException
	 *             when it is no such file or of a kind that is not known
	 */
	public static WavHeader read(DataInput input, String file) throws InputException, IOException {
		try {
			if (!tag(input).equals("RIFF")) {
				throw new InputException(file, "is no WAV file: it does not begin with RIFF");
			}
			input.readInt();
			if (!tag(input).equals("WAVE")) {
				throw new InputException(file, "is no WAV file: it holds no WAVE");
			}
			WavHeader format = null;
			while (true) {
				String tag = tag(input);
				long length = Integer.reverseBytes(input.readInt()) & UNSIGNED;
				if (tag.equals("data")) {
					if (format == null) {
						throw new InputException(file, "the samples come before their format");
					}
					return new WavHeader(format.channels, format.sampleRate, format.bits, format.real, length);
				}
				if (tag.equals("fmt ")) {
					format = format(input, length, file);
				} else {
					skip(input, length + length % 2);
				}
			}
		} catch (EOFException e) {
			throw new InputException(file, "ends before the first sample");
		}
	}

	private static WavHeader format(DataInput input, long length, String file) throws InputException, IOException {
		if (length < FORMAT_BYTES) {
			throw new InputException(file, "the description of the format is too short");
		}
		int kind = Short.reverseBytes(input.readShort()) & 0xffff;
		int channels = Short.reverseBytes(input.readShort()) & 0xffff;
		long rate = Integer.reverseBytes(input.readInt()) & UNSIGNED;
		skip(input, 6);
		int bits = Short.reverseBytes(input.readShort()) & 0xffff;
		long left = length - FORMAT_BYTES;
		if (kind == EXTENSIBLE && length >= EXTENSIBLE_BYTES) {
			skip(input, 8);
			kind = Short.reverseBytes(input.readShort()) & 0xffff;
			left = length - EXTENSIBLE_BYTES;
		}
		skip(input, left + length % 2);
		boolean known = kind == PCM && (bits == 8 || bits == 16 || bits == 24 || bits == 32)
				|| kind == IEEE_FLOAT && (bits == 32 || bits == 64);
		if (!known || channels == 0 || rate == 0) {
			throw new InputException(file, "has samples of kind " + kind + " with " + bits + " bits, " + channels
					+ " channels at " + rate
					+ " Hz; known are PCM of 8, 16, 24 or 32 bits and floating point of 32 or 64");
		}
		return new WavHeader(channels, rate, bits, kind == IEEE_FLOAT, 0);
	}

	private static String tag(DataInput input) throws IOException {
		var tag = new StringBuilder();
		for (int k = 0; k < 4; k++) {
			tag.append((char) input.readUnsignedByte());
		}
		return tag.toString();
	}

	private static void skip(DataInput input, long bytes) throws IOException {
		for (long left = bytes; left > 0;) {
			int skipped = input.skipBytes((int) Math.min(left, Integer.MAX_VALUE));
			if (skipped == 0) {
				input.readByte(); // throws at the end of the file
				skipped = 1;
			}
			left -= skipped;
		}
	}
}
