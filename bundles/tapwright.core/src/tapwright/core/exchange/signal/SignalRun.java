// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.BitTrue;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.verify.Subject;

/**
 * Runs a filter over a signal in a file, block after block, each channel by itself.
 *
 * <p>
 * With input and output formats the filter runs bit for bit. Samples of a WAV file are then placed at the full scale of the
 * input format, rounded as the arithmetic says where they have more bits; numbers of text and raw files are integers of the
 * input format. Outputs are placed at the full scale of the next longer WAV sample, or written as integers. Without both formats
 * the filter runs in double precision, and full scale of a WAV file is 1.
 *
 * @param moments
 *            that were read
 * @param outputs
 *            that were written
 * @param exact
 *            whether the filter ran bit for bit
 */
public record SignalRun(long moments, long outputs, boolean exact) {

	private static final int BLOCK = 4096;
	private static final int LONGEST_WORD = 53;
	private static final int LONGEST_WAV = 32;

	/**
	 * Filters a file into another.
	 *
	 * @throws InputException
	 *             when a file or the filter cannot be used; nothing was written then
	 */
	public static SignalRun of(Subject filter, Path input, Path output, Progress progress) throws InputException,
			IOException {
		if (!Files.isRegularFile(input)) {
			throw new InputException(input.toString(), "there is no such file");
		}
		if (Files.exists(output) && Files.isSameFile(input, output)) {
			throw new InputException(output.toString(), "is the input; give another file");
		}
		Optional<Arithmetic> exact = filter.arithmetic()
				.filter(formats -> formats.input().isPresent() && formats.output().isPresent());
		SignalKind inputKind = SignalKind.of(input);
		SignalKind outputKind = SignalKind.of(output);
		if (exact.isPresent()) {
			checkWord(exact.get().input().orElseThrow(), "input", inputKind);
			checkWord(exact.get().output().orElseThrow(), "output", outputKind);
		}
		try (SignalReader reader = reader(input, inputKind, exact);
				SignalWriter writer = new SignalWriter(output, outputKind, words(filter, exact, reader, outputKind))) {
			SignalRun run = run(filter, exact, reader, writer, outputKind, input, progress);
			writer.finish();
			return run;
		} catch (IllegalArgumentException e) {
			throw new InputException(input.toString(), e.getMessage());
		}
	}

	private static SignalRun run(Subject filter, Optional<Arithmetic> exact, SignalReader reader, SignalWriter writer,
			SignalKind outputKind, Path input, Progress progress) throws InputException, IOException {
		int channels = reader.channels();
		var filters = new SampleFilter[channels];
		for (int channel = 0; channel < channels; channel++) {
			filters[channel] = exact.isPresent() ? new SampleFilter.Exact(new BitTrue(filter.taps(), exact.get()))
					: new SampleFilter.Real(filter);
		}
		double[][] block = new double[channels][BLOCK];
		double[][] outputs = new double[channels][];
		long moments = 0;
		long written = 0;
		for (int count = reader.read(block); count > 0; count = reader.read(block)) {
			progress.checkCancelled();
			progress.report(moments + " samples", 0);
			for (int channel = 0; channel < channels; channel++) {
				take(block[channel], count, exact, reader, input, moments);
				outputs[channel] = filters[channel].filter(block[channel], count);
				give(outputs[channel], exact, outputKind);
			}
			writer.write(outputs, outputs[0].length);
			moments += count;
			written += outputs[0].length;
		}
		return new SignalRun(moments, written, exact.isPresent());
	}

	private static void checkWord(NumberFormat format, String what, SignalKind kind) throws InputException {
		if (format.word() > LONGEST_WORD) {
			throw new InputException("arithmetic: " + what, "words of " + format.word()
					+ " bits cannot be read from files or written; at most "
					+ LONGEST_WORD);
		}
		if (kind == SignalKind.WAV && (!format.signed() || what.equals("output") && format.word() > LONGEST_WAV)) {
			throw new InputException("arithmetic: " + what, format.text()
					+ " does not fit the samples of a WAV file; use .csv or .raw");
		}
	}

	private static SignalReader reader(Path input, SignalKind kind, Optional<Arithmetic> exact) throws InputException,
			IOException {
		return switch (kind) {
		case WAV -> WordReader.wav(input);
		case CSV -> new TextSignalReader(input);
		case RAW -> exact.isPresent() ? WordReader.raw(input, exact.get().input().orElseThrow().word(), false)
				: WordReader.raw(input, Double.SIZE, true);
		};
	}

	private static WavHeader words(Subject filter, Optional<Arithmetic> exact, SignalReader reader,
			SignalKind kind) throws InputException {
		double rate = reader.sampleRate().orElse(filter.sampleRate());
		double outputRate = filter.arithmetic().map(formats -> rate * formats.interpolation() / formats.decimation())
				.orElse(rate);
		long whole = Math.round(outputRate);
		if (kind == SignalKind.WAV && (whole < 1 || whole > Integer.MAX_VALUE)) {
			throw new InputException("", "a WAV file cannot have a sample rate of " + outputRate
					+ " Hz; write .csv or .raw");
		}
		if (exact.isEmpty()) {
			return new WavHeader(reader.channels(), whole, kind == SignalKind.WAV ? Float.SIZE : Double.SIZE, true, 0);
		}
		int word = exact.get().output().orElseThrow().word();
		return new WavHeader(reader.channels(), whole, kind == SignalKind.WAV ? wavBits(word) : (word + 7) / 8 * 8,
				false, 0);
	}

	private static int wavBits(int word) {
		return word <= 16 ? 16 : word <= 24 ? 24 : LONGEST_WAV;
	}

	// From what the file holds to integers of the input format, or to real numbers.
	private static void take(double[] samples, int count, Optional<Arithmetic> exact, SignalReader reader, Path file,
			long before)
			throws InputException {
		boolean scaled = reader.fullScaleBits() > 0;
		if (exact.isEmpty()) {
			for (int n = 0; scaled && n < count; n++) {
				samples[n] = Math.scalb(samples[n], 1 - reader.fullScaleBits());
			}
			return;
		}
		NumberFormat format = exact.get().input().orElseThrow();
		for (int n = 0; n < count; n++) {
			if (scaled || reader.isNormalised()) {
				double steps = Math.scalb(samples[n], format.word() - (scaled ? reader.fullScaleBits() : 1));
				samples[n] = SampleFilter.convert(steps, format, exact.get().rounding());
			} else if (samples[n] != Math.rint(samples[n]) || Math.abs(samples[n]) > Math.scalb(1.0, LONGEST_WORD)) {
				throw new InputException(file.toString(), "sample " + (before + n) + " is " + samples[n]
						+ "; the filter runs on integers of "
						+ format.text());
			}
		}
	}

	private static void give(double[] outputs, Optional<Arithmetic> exact, SignalKind kind) {
		if (exact.isPresent() && kind == SignalKind.WAV) {
			int word = exact.get().output().orElseThrow().word();
			for (int n = 0; n < outputs.length; n++) {
				outputs[n] = Math.scalb(outputs[n], wavBits(word) - word);
			}
		}
	}
}
