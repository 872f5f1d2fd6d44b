// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.BufferedInputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.OptionalDouble;

import tapwright.core.InputException;

/** Reads words of whole bytes, the lowest byte first: the samples of a WAV file, or all of a raw file. */
final class WordReader implements SignalReader {

	private final Path file;
	private final InputStream input;
	private final WavHeader words;
	private final boolean wav;
	private long left;
	private byte[] bytes = new byte[0];

	private WordReader(Path file, InputStream input, WavHeader words, boolean wav) {
		this.file = file;
		this.input = input;
		this.words = words;
		this.wav = wav;
		this.left = words.dataBytes();
	}

	static WordReader wav(Path file) throws InputException, IOException {
		var input = new BufferedInputStream(Files.newInputStream(file));
		try {
			return new WordReader(file, input, WavHeader.read(new DataInputStream(input), file.toString()), true);
		} catch (InputException | IOException e) {
			input.close();
			throw e;
		}
	}

	/** One channel; the length of a word is rounded up to whole bytes. */
	static WordReader raw(Path file, int bits, boolean real) throws IOException {
		var words = new WavHeader(1, 1, (bits + 7) / 8 * 8, real, Long.MAX_VALUE);
		return new WordReader(file, new BufferedInputStream(Files.newInputStream(file)), words, false);
	}

	@Override
	public int channels() {
		return words.channels();
	}

	@Override
	public OptionalDouble sampleRate() {
		return wav ? OptionalDouble.of(words.sampleRate()) : OptionalDouble.empty();
	}

	@Override
	public int fullScaleBits() {
		return wav && !words.real() ? words.bits() : 0;
	}

	@Override
	public boolean isNormalised() {
		return wav && words.real();
	}

	@Override
	public int read(double[][] block) throws InputException, IOException {
		int frame = words.frameBytes();
		int wanted = (int) Math.min((long) block[0].length * frame, left);
		if (bytes.length < wanted) {
			bytes = new byte[wanted];
		}
		int read = input.readNBytes(bytes, 0, wanted);
		if (read < wanted && wav) {
			throw new InputException(file.toString(), "ends " + (left - read)
					+ " bytes before the samples that it states");
		}
		if (read % frame != 0) {
			throw new InputException(file.toString(), "does not end with a whole sample of " + frame + " bytes");
		}
		left -= wav ? read : 0;
		for (int n = 0; n < read / frame; n++) {
			for (int channel = 0; channel < channels(); channel++) {
				block[channel][n] = sample(n * frame + channel * words.bits() / 8);
			}
		}
		return read / frame;
	}

	private double sample(int at) throws InputException {
		long word = 0;
		int size = words.bits() / 8;
		for (int k = size - 1; k >= 0; k--) {
			word = word << 8 | bytes[at + k] & 0xff;
		}
		if (words.real()) {
			double value = size == Float.BYTES ? Float.intBitsToFloat((int) word) : Double.longBitsToDouble(word);
			if (!Double.isFinite(value)) {
				throw new InputException(file.toString(), "a sample is " + value);
			}
			return value;
		}
		int unused = Long.SIZE - words.bits();
		return wav && size == 1 ? word - 128 : word << unused >> unused; // WAV stores 8 bits without sign
	}

	@Override
	public void close() throws IOException {
		input.close();
	}
}
