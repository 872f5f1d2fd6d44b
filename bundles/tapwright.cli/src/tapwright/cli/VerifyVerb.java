// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

import tapwright.core.InputException;
import tapwright.core.format.EvidenceFormat;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.portfolio.Sources;
import tapwright.core.verify.VerificationRun;
import tapwright.dsp.verify.Effort;
import tapwright.model.io.AtomicFiles;

/** Proves or disproves every requirement of filters. */
final class VerifyVerb implements Verb {

	private static final int MOST_SECONDS = 86_400;

	@Override
	public String name() {
		return "verify";
	}

	@Override
	public String summary() {
		return "proves or disproves every requirement of portfolios, filters or interchange files";
	}

	@Override
	public String help() {
		return """
				usage: tapwright verify PATH... [--format FORMAT] [--output FILE] [--shard I/N] [--time-limit SECONDS]
				                         [--against BASELINE] [--since GITREV]

				Each PATH is a portfolio or any other folder (all its filters), a NAME.filter file, or an interchange
				JSON file. A requirement is met or missed only when that is proven for exactly the numbers stored.

				  --format FORMAT       table (for reading; the default), json, junit or sarif
				  --output FILE         writes there instead of the terminal
				  --shard I/N           verifies only the I-th of N parts, to share the work between machines
				  --time-limit SECONDS  gives up on a requirement after that time and calls it unproven; 10 by default
				  --against BASELINE    also lists what was met in that baseline of the portfolio and stands worse now
				  --since GITREV        the same for the portfolio as that git commit has it; the work tree is not touched

				examples:
				  tapwright verify sample-workspace
				  tapwright verify marram/antialias.filter --format json
				  tapwright verify . --format junit --output target/filters.xml
				  tapwright verify marram --since origin/main

				exit codes: 0 all met; 1 something missed, unproven or regressed; 2 bad usage or input""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--format", true), new Option("--output", true), new Option("--shard", true),
				new Option("--time-limit", true), new Option("--against", true), new Option("--since", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().isEmpty()) {
			throw new InputException("", "give at least one portfolio, folder or file; 'tapwright verify --help' has examples");
		}
		EvidenceFormat format = format(arguments.option("--format").orElse("table"));
		Duration limit = timeLimit(arguments.option("--time-limit"));
		Shard shard = Shard.parse(arguments.option("--shard").orElse("1/1"));
		var paths = new ArrayList<Path>();
		for (String operand : arguments.operands()) {
			paths.add(path(operand));
		}
		Optional<Path> output = Optional.empty();
		if (arguments.has("--output")) {
			output = Optional.of(path(arguments.option("--output").get()));
		}
		var past = new RegressionCheck(arguments, paths);
		List<FilterSource> sources = shard.of(Sources.read(paths));
		VerificationRun run;
		try (var progress = new TerminalProgress(console)) {
			run = VerificationRun.of(sources, new Effort(progress, limit));
		}
		String text = format.write(run);
		if (output.isPresent()) {
			AtomicFiles.write(output.get(), text.getBytes(StandardCharsets.UTF_8));
		} else {
			console.out().print(text);
		}
		List<String> problems = run.problems();
		if (output.isPresent() || !format.name().equals("table")) { // the table shows them itself
			problems.forEach(problem -> console.err().println("tapwright verify: " + problem));
		}
		boolean regressed = past.report(run, output.isEmpty() && format.name().equals("table") ? console.out() : console.err());
		return problems.isEmpty() ? run.allMet() && !regressed ? Main.OK : Main.NOT_MET : Main.BAD_USAGE;
	}

	private static EvidenceFormat format(String name) throws InputException {
		return EvidenceFormat.of(name).orElseThrow(() -> new InputException("--format", "there is no format '" + name
				+ "'; known are " + EvidenceFormat.all().stream().map(EvidenceFormat::name).collect(Collectors.joining(", "))));
	}

	private static Duration timeLimit(Optional<String> seconds) throws InputException {
		if (seconds.isEmpty()) {
			return Effort.STANDARD.timeLimit();
		}
		String text = seconds.get();
		if (!text.matches("\\d{1,5}(\\.\\d{1,3})?") || Double.parseDouble(text) > MOST_SECONDS) {
			throw new InputException("--time-limit", "'" + text + "' is not a number of seconds from 0 to " + MOST_SECONDS);
		}
		return Duration.ofMillis(Math.round(1000 * Double.parseDouble(text)));
	}

	static Path path(String text) throws InputException {
		try {
			return Path.of(text);
		} catch (InvalidPathException e) {
			throw new InputException(text, "is not a path: " + e.getReason());
		}
	}
}
