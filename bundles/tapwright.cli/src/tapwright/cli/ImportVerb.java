// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.Collectors;

import tapwright.core.InputException;
import tapwright.core.exchange.imports.ImportFormat;
import tapwright.core.exchange.imports.ImportOptions;
import tapwright.core.exchange.imports.ImportPlan;
import tapwright.core.exchange.imports.ImportPlan.Planned;
import tapwright.core.exchange.imports.ImportedTable;
import tapwright.core.quantity.Words;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.exact.Symmetry;

/** Makes filters from coefficients in files of other programs. */
final class ImportVerb implements Verb {

	@Override
	public String name() {
		return "import";
	}

	@Override
	public String summary() {
		return "makes filters from coefficients in C, text, JSON, memory images or WAV files";
	}

	@Override
	public String help() {
		return """
				usage: tapwright import PATH... [--into DIR] [--as FORMAT] [--word BITS] [--fraction BITS] [--unsigned]
				                       [--big-endian] [--real] [--rate HZ]

				Finds arrays of coefficients and writes a NAME.filter for each of them. A PATH that is a folder gives all files
				in it and below with a usual extension. Either all filters are written or none.

				  --into DIR       folder of the new filters; becomes a portfolio when it belongs to none. Without it only a
				                   preview is printed
				  --as FORMAT      %s; guessed by default
				  --word BITS      length of integers, and of words in a memory image; 16 by default there
				  --fraction BITS  bits of integers behind the binary point; all but the sign by default
				  --unsigned       integers have no sign
				  --big-endian     the first byte of a word is the highest
				  --real           words of a binary image are floating-point numbers, 64 bits or what --word says
				  --rate HZ        sample rate of the filters

				examples:
				  tapwright import firmware/filters.c
				  tapwright import firmware --into marram --rate 48000
				  tapwright import table.bin --as binary --word 24 --fraction 23 --big-endian --into marram

				exit codes: 0 done; 2 bad usage or input, nothing was written"""
				.formatted(Arrays.stream(ImportFormat.values()).map(ImportFormat::key)
						.collect(Collectors.joining(", ")));
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--into", true), new Option("--as", true), new Option("--word", true),
				new Option("--fraction", true),
				new Option("--unsigned", false), new Option("--big-endian", false), new Option("--real", false),
						new Option("--rate", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().isEmpty()) {
			throw new InputException("", "give at least one file or folder; 'tapwright import --help' has examples");
		}
		var paths = new ArrayList<Path>();
		for (String operand : arguments.operands()) {
			paths.add(VerifyVerb.path(operand));
		}
		ImportPlan plan = ImportPlan.of(paths, options(arguments));
		for (Planned planned : plan.filters()) {
			console.out().println(describe(planned));
		}
		plan.skipped().forEach(file -> console.err()
				.println("tapwright import: " + file + ": no array of numbers; skipped"));
		if (arguments.has("--into")) {
			List<Path> written = plan.write(VerifyVerb.path(arguments.option("--into").orElseThrow()));
			console.out().println(written.size() + (written.size() == 1 ? " file" : " files") + " written");
		}
		return Main.OK;
	}

	private static String describe(Planned planned) {
		var line = new StringBuilder(planned.fileName()).append(": from ").append(planned.file());
		if (planned.table().isEmpty()) {
			return line.append(", a filter with all its requirements").toString();
		}
		ImportedTable table = planned.table().get();
		line.append(table.name().isEmpty() ? "" : ", " + table.name()).append(", ").append(table.length())
				.append(" coefficients, ")
				.append(table.isWhole() ? "integers of " + table.format().map(NumberFormat::text).orElse("")
						: "real numbers");
		if (table.symmetry() != Symmetry.NONE) {
			line.append(", ").append(table.symmetry().name().toLowerCase(Locale.ROOT)).append(" symmetry");
		}
		table.sampleRate().ifPresent(rate -> line.append(", ").append(Words.exactly(rate, "Hz")));
		table.notes().forEach(note -> line.append("; ").append(note));
		return line.toString();
	}

	private static ImportOptions options(Arguments arguments) throws InputException {
		Optional<ImportFormat> format = Optional.empty();
		if (arguments.has("--as")) {
			String key = arguments.option("--as").orElseThrow();
			format = Optional.of(ImportFormat.of(key)
					.orElseThrow(() -> new InputException("--as", "there is no format '" + key + "'; known are "
					+ Arrays.stream(ImportFormat.values()).map(ImportFormat::key).collect(Collectors.joining(", ")))));
		}
		return new ImportOptions(format, integer(arguments, "--word"), integer(arguments, "--fraction"),
				!arguments.has("--unsigned"),
				arguments.has("--big-endian"), arguments.has("--real"), rate(arguments));
	}

	private static OptionalInt integer(Arguments arguments, String option) throws InputException {
		if (!arguments.has(option)) {
			return OptionalInt.empty();
		}
		String text = arguments.option(option).orElseThrow();
		if (!text.matches("-?\\d{1,4}")) {
			throw new InputException(option, "'" + text + "' is no number of bits");
		}
		return OptionalInt.of(Integer.parseInt(text));
	}

	private static OptionalDouble rate(Arguments arguments) throws InputException {
		if (!arguments.has("--rate")) {
			return OptionalDouble.empty();
		}
		String text = arguments.option("--rate").orElseThrow();
		if (!text.matches("\\d{1,15}(\\.\\d{1,15})?([eE]\\d{1,2})?") || Double.parseDouble(text) == 0) {
			throw new InputException("--rate", "'" + text + "' is no positive number of hertz");
		}
		return OptionalDouble.of(Double.parseDouble(text));
	}
}
