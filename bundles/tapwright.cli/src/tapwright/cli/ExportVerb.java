// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

import tapwright.core.InputException;
import tapwright.core.exchange.Drift;
import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.HandOvers;
import tapwright.core.exchange.export.ExportFormat;
import tapwright.core.exchange.export.ExportedFile;
import tapwright.core.portfolio.Sources;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.verify.Effort;
import tapwright.model.io.AtomicFiles;

/** Hands over the coefficients of filters, or tells whether exported files still say what their filters say. */
final class ExportVerb implements Verb {

	@Override
	public String name() {
		return "export";
	}

	@Override
	public String summary() {
		return "writes coefficients for firmware and logic design, or checks exported files";
	}

	@Override
	public String help() {
		String formats = ExportFormat.all().stream()
				.map(format -> "  %-16s %s".formatted(format.name(), format.label()))
				.collect(Collectors.joining("\n"));
		return """
				usage: tapwright export PATH... --as FORMAT[,FORMAT...] [--output DIR] [--check]

				Each PATH is a portfolio or any other folder (all its filters), a NAME.filter file, or an interchange
				JSON file. Every exported file carries a hash of the filter's numbers and one of its own text.

				  --as FORMATS   what to write, see below
				  --output DIR   folder to write to; without it a single file is printed
				  --check        writes nothing and tells whether the files in DIR are as they were exported and match
				                 their filters

				formats:
				%s

				examples:
				  tapwright export marram/wave-lowpass.filter --as c
				  tapwright export marram --as c,vhdl --output build/coefficients
				  tapwright export marram --as c,vhdl --output build/coefficients --check

				exit codes: 0 done, or all files match; 1 a checked file does not match or is missing; 2 bad usage or input,
				nothing was written""".formatted(formats);
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--as", true), new Option("--output", true), new Option("--check", false));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().isEmpty() || !arguments.has("--as")) {
			throw new InputException("", "give files and --as FORMAT; 'tapwright export --help' has examples");
		}
		if (arguments.has("--check") && !arguments.has("--output")) {
			throw new InputException("--check", "needs --output DIR, the folder with the exported files");
		}
		List<ExportFormat> formats = formats(arguments.option("--as").orElseThrow());
		Map<ExportedFile, HandOver> files = files(arguments.operands(), formats, console);
		if (!arguments.has("--output")) {
			if (files.size() != 1) {
				throw new InputException("", files.size() + " files would be written; say where with --output DIR");
			}
			console.out().print(files.keySet().iterator().next().text());
			return Main.OK;
		}
		Path folder = VerifyVerb.path(arguments.option("--output").orElseThrow());
		return arguments.has("--check") ? check(folder, files, console) : write(folder, files, console);
	}

	private static int write(Path folder, Map<ExportedFile, HandOver> files, Console console) throws IOException {
		for (ExportedFile file : files.keySet()) {
			AtomicFiles.write(folder.resolve(file.name()), file.text().getBytes(StandardCharsets.UTF_8));
			console.out().println(folder.resolve(file.name()));
		}
		return Main.OK;
	}

	private static int check(Path folder, Map<ExportedFile, HandOver> files, Console console) throws IOException {
		int code = Main.OK;
		for (Map.Entry<ExportedFile, HandOver> entry : files.entrySet()) {
			Path file = folder.resolve(entry.getKey().name());
			if (!Files.isRegularFile(file)) {
				console.out().println(file + ": is missing; export it");
				code = Main.NOT_MET;
				continue;
			}
			Drift drift = Drift.of(new String(Files.readAllBytes(file), StandardCharsets.UTF_8), entry.getValue());
			console.out().println(file + ": " + drift.words());
			code = drift == Drift.NONE ? code : Main.NOT_MET;
		}
		return code;
	}

	// Everything is made before anything is written.
	private static Map<ExportedFile, HandOver> files(List<String> operands, List<ExportFormat> formats, Console console)
			throws InputException, IOException {
		var paths = new ArrayList<Path>();
		for (String operand : operands) {
			paths.add(VerifyVerb.path(operand));
		}
		VerificationRun run;
		try (var progress = new TerminalProgress(console)) {
			run = VerificationRun.of(Sources.read(paths), new Effort(progress, Effort.STANDARD.timeLimit()));
		}
		var files = new LinkedHashMap<ExportedFile, HandOver>();
		var owners = new HashMap<String, Path>();
		for (Result result : run.results()) {
			if (result.evidence() == null) {
				throw new InputException("", result.source().problem());
			}
			HandOver filter = HandOvers.of(result.source(), result.evidence());
			for (ExportFormat format : formats) {
				for (ExportedFile file : format.write(filter)) {
					Path other = owners.put(file.name(), result.source().file());
					if (other != null && !other.equals(result.source().file())) {
						throw new InputException(file.name(), "would be written for both " + other + " and "
								+ result.source().file()
								+ "; rename one filter");
					}
					files.putIfAbsent(file, filter);
				}
			}
		}
		checkOnce(files);
		return files;
	}

	private static void checkOnce(Map<ExportedFile, HandOver> files) throws InputException {
		var names = new HashMap<String, ExportedFile>();
		for (ExportedFile file : files.keySet()) {
			if (names.put(file.name(), file) != null) {
				throw new InputException("--as", "two of the formats write " + file.name() + "; choose one of them");
			}
		}
	}

	private static List<ExportFormat> formats(String names) throws InputException {
		var formats = new ArrayList<ExportFormat>();
		for (String name : names.split(",", -1)) {
			formats.add(ExportFormat.of(name.strip())
					.orElseThrow(() -> new InputException("--as", "there is no format '" + name
					+ "'; known are " + ExportFormat.all().stream().map(ExportFormat::name)
							.collect(Collectors.joining(", ")))));
		}
		return formats;
	}
}
