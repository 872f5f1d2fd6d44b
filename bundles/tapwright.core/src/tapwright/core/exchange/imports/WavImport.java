// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.exchange.signal.WavHeader;
import tapwright.dsp.arithmetic.NumberFormat;

/** Impulse responses in WAV files, one for each channel. */
final class WavImport {

	private WavImport() {
	}

	static List<ImportedTable> read(String file, byte[] content) throws InputException {
		var bytes = new ByteArrayInputStream(content);
		try (var input = new DataInputStream(bytes)) {
			WavHeader header = WavHeader.read(input, file);
			int at = content.length - bytes.available();
			long length = Math.min(header.dataBytes(), bytes.available());
			int frames = (int) (length / header.frameBytes());
			if (length < header.dataBytes()) {
				throw new InputException(file, "states " + header.dataBytes() + " bytes of samples, but only " + length
						+ " follow");
			}
			if ((long) frames * header.channels() > ImportedTable.MOST) {
				throw new InputException(file, "has more than " + ImportedTable.MOST + " samples");
			}
			var tables = new ArrayList<ImportedTable>();
			for (int channel = 0; frames > 0 && channel < header.channels(); channel++) {
				String name = header.channels() == 1 ? "" : "channel " + (channel + 1);
				tables.add(channel(file, name, content, at + channel * header.bits() / 8, frames, header));
			}
			return tables;
		} catch (IOException e) {
			throw new UncheckedIOException("reading from memory", e);
		}
	}

	private static ImportedTable channel(String file, String name, byte[] content, int from, int frames,
			WavHeader header) throws InputException {
		ByteBuffer buffer = ByteBuffer.wrap(content).order(ByteOrder.LITTLE_ENDIAN);
		var integers = new ArrayList<BigInteger>();
		var values = new ArrayList<Double>();
		for (int n = 0; n < frames; n++) {
			int at = from + n * header.frameBytes();
			if (header.real()) {
				double value = header.bits() == Float.SIZE ? buffer.getFloat(at) : buffer.getDouble(at);
				if (!Double.isFinite(value)) {
					throw new InputException(file, "sample " + n + " is " + value);
				}
				values.add(value);
			} else {
				integers.add(BigInteger.valueOf(switch (header.bits()) {
				case 8 -> (content[at] & 0xff) - 128; // 8 bits are stored without sign
				case 16 -> buffer.getShort(at);
				case 24 -> (content[at] & 0xff) | (content[at + 1] & 0xff) << 8 | content[at + 2] << 16;
				default -> buffer.getInt(at);
				}));
			}
		}
		ImportedTable table = header.real() ? ImportedTable.real(name, 0, values)
				: ImportedTable.whole(name, 0, integers,
						Optional.of(new NumberFormat(header.bits(), header.bits() - 1)));
		return table.atRate(header.sampleRate());
	}
}
