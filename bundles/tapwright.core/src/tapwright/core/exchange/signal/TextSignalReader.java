// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.OptionalDouble;

import tapwright.core.InputException;

/** Reads numbers as text: a line for each moment, channels separated by commas, semicolons, tabs or spaces. */
final class TextSignalReader implements SignalReader {

	private static final String SEPARATOR = "[,;\\s]+";
	private static final int LONGEST_LINE = 1 << 16;

	private final Path file;
	private final BufferedReader reader;
	private double[] next;
	private int line;

	TextSignalReader(Path file) throws InputException, IOException {
		this.file = file;
		reader = Files.newBufferedReader(file, StandardCharsets.ISO_8859_1);
		try {
			next = moment(true);
			if (next == null) {
				throw new InputException(file.toString(), "holds no numbers");
			}
		} catch (InputException | IOException e) {
			reader.close();
			throw e;
		}
	}

	@Override
	public int channels() {
		return next == null ? 0 : next.length;
	}

	@Override
	public OptionalDouble sampleRate() {
		return OptionalDouble.empty();
	}

	@Override
	public int fullScaleBits() {
		return 0;
	}

	@Override
	public boolean isNormalised() {
		return false;
	}

	@Override
	public int read(double[][] block) throws InputException, IOException {
		int count = 0;
		while (next != null && count < block[0].length) {
			if (next.length != block.length) {
				throw new InputException(file + ":" + line, "there are " + next.length + " numbers, but " + block.length
						+ " in the lines before");
			}
			for (int channel = 0; channel < block.length; channel++) {
				block[channel][count] = next[channel];
			}
			count++;
			next = moment(false);
		}
		return count;
	}

	// Comments are passed over, and a first line with the names of the channels.
	private double[] moment(boolean mayBeNames) throws InputException, IOException {
		boolean names = mayBeNames;
		for (String text = reader.readLine(); text != null; text = reader.readLine()) {
			line++;
			if (text.length() > LONGEST_LINE) {
				throw new InputException(file + ":" + line, "the line is longer than " + LONGEST_LINE + " characters");
			}
			String content = text.replaceFirst("[#%].*", "").strip();
			if (content.isEmpty()) {
				continue;
			}
			String[] fields = content.split(SEPARATOR);
			double[] numbers = new double[fields.length];
			boolean named = false;
			for (int k = 0; k < fields.length && !named; k++) {
				if (!fields[k].matches("[-+]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][-+]?\\d{1,3})?")) {
					if (!names) {
						throw new InputException(file + ":" + line + ":" + (text.indexOf(fields[k]) + 1), "'"
								+ fields[k] + "' is no number");
					}
					named = true;
				} else {
					numbers[k] = Double.parseDouble(fields[k]);
				}
			}
			names = false;
			if (!named) {
				return numbers;
			}
		}
		return null;
	}

	@Override
	public void close() throws IOException {
		reader.close();
	}
}
