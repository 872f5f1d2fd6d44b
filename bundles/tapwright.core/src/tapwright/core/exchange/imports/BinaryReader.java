// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;

/** Words one after the other: integers of whole bytes, or IEEE 754 numbers. */
final class BinaryReader {

	private static final int USUAL_WORD = 16;

	private BinaryReader() {
	}

	static List<ImportedTable> read(String file, byte[] content, ImportOptions options) throws InputException {
		int bits = options.word().orElse(options.real() ? Double.SIZE : USUAL_WORD);
		int bytes = (bits + 7) / 8;
		if (options.real() && bits != Float.SIZE && bits != Double.SIZE) {
			throw new InputException(file, "real numbers have 32 or 64 bits, not " + bits);
		}
		if (content.length == 0) {
			return List.of();
		}
		if (content.length % bytes != 0) {
			throw new InputException(file, "has " + content.length + " bytes, which is no whole number of words of "
					+ bytes
					+ " bytes; state another word length");
		}
		if (content.length / bytes > ImportedTable.MOST) {
			throw new InputException(file, "has more than " + ImportedTable.MOST + " words");
		}
		return List.of(options.real() ? reals(file, content, bits, options.bigEndian())
				: ImportedTable.whole("", 0, integers(content, bits, options),
						Optional.of(new NumberFormat(bits, 0, options.signed()))));
	}

	private static ImportedTable reals(String file, byte[] content, int bits, boolean bigEndian) throws InputException {
		ByteBuffer buffer = ByteBuffer.wrap(content).order(bigEndian ? ByteOrder.BIG_ENDIAN : ByteOrder.LITTLE_ENDIAN);
		var values = new ArrayList<Double>();
		while (buffer.hasRemaining()) {
			int at = buffer.position();
			double value = bits == Float.SIZE ? buffer.getFloat() : buffer.getDouble();
			if (!Double.isFinite(value)) {
				throw new InputException(file, "the number at byte " + at + " is " + value
						+ "; is the word length or the order of bytes another?");
			}
			values.add(value);
		}
		return ImportedTable.real("", 0, values);
	}

	private static List<BigInteger> integers(byte[] content, int bits, ImportOptions options) {
		int bytes = (bits + 7) / 8;
		var integers = new ArrayList<BigInteger>();
		byte[] word = new byte[bytes];
		for (int at = 0; at < content.length; at += bytes) {
			for (int k = 0; k < bytes; k++) {
				word[k] = content[options.bigEndian() ? at + k : at + bytes - 1 - k];
			}
			integers.add(options.signed() ? new BigInteger(word) : new BigInteger(1, word));
		}
		return integers;
	}
}
