// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.report.Report;
import tapwright.dsp.verify.Effort;
import tapwright.model.io.AtomicFiles;

/** Writes the review report of a portfolio. */
final class ReportVerb implements Verb {

	@Override
	public String name() {
		return "report";
	}

	@Override
	public String summary() {
		return "writes a review report of a portfolio, with evidence and pictures";
	}

	@Override
	public String help() {
		return """
				usage: tapwright report DIR --output PATH [--format html|markdown]

				DIR is a portfolio or any other folder with filters. The HTML report is a folder of pages that need no network
				and no installation; open its index.html. The Markdown report is one text for a pull request.

				  --output PATH    folder of the HTML report, or file of the Markdown report
				  --format FORMAT  html (the default) or markdown; without --output Markdown is printed

				examples:
				  tapwright report marram --output build/report
				  tapwright report marram --format markdown

				exit codes: 0 written and all met; 1 written, something missed or unproven; 2 bad usage or input""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--output", true), new Option("--format", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().size() != 1) {
			throw new InputException("", "give one folder; 'tapwright report --help' has examples");
		}
		String format = arguments.option("--format").orElse("html");
		if (!format.equals("html") && !format.equals("markdown")) {
			throw new InputException("--format", "there is no format '" + format + "'; known are html, markdown");
		}
		Optional<Path> output = arguments.has("--output")
				? Optional.of(VerifyVerb.path(arguments.option("--output").orElseThrow())) : Optional.empty();
		if (format.equals("html") && output.isEmpty()) {
			throw new InputException("--output", "is missing; give the folder of the report");
		}
		Report report;
		try (var progress = new TerminalProgress(console)) {
			report = Report.of(VerifyVerb.path(arguments.operands().getFirst()),
					new Effort(progress, Effort.STANDARD.timeLimit()));
		}
		if (format.equals("html")) {
			report.write(output.orElseThrow());
			console.out().println(output.orElseThrow().resolve("index.html"));
		} else if (output.isPresent()) {
			AtomicFiles.write(output.get(), report.markdown().getBytes(StandardCharsets.UTF_8));
		} else {
			console.out().print(report.markdown());
		}
		List<String> problems = report.run().problems();
		problems.forEach(problem -> console.err().println("tapwright report: " + problem));
		return problems.isEmpty() ? report.run().allMet() ? Main.OK : Main.NOT_MET : Main.BAD_USAGE;
	}
}
