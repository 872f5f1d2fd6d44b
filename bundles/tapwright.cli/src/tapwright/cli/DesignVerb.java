// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.design.Adoption;
import tapwright.core.design.Candidate;
import tapwright.core.design.Candidates;
import tapwright.core.design.Designer;
import tapwright.core.format.EvidenceFormat;
import tapwright.core.interchange.FilterJson;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.portfolio.Sources;
import tapwright.core.verify.VerificationRun;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.io.AtomicFiles;
import tapwright.model.io.ModelFiles;

/** Computes the coefficients of one filter by its design. */
final class DesignVerb implements Verb {

	@Override
	public String name() {
		return "design";
	}

	@Override
	public String summary() {
		return "computes the coefficients of a filter by its design and proves them";
	}

	@Override
	public String help() {
		return """
				usage: tapwright design FILE [--shortest] [--write]

				Runs the design of a NAME.filter or interchange JSON file and proves the result against the
				requirements. Without --write the file stays as it is and the designed filter is printed as
				interchange JSON.

				  --shortest  searches the fewest coefficients that are proven to meet every requirement, with each method
				              that fits, lists the candidates, and takes the best one in place of the file's design
				  --write     stores design and coefficients in the file and prints the proof instead

				examples:
				  tapwright design marram/antialias.filter
				  tapwright design marram/antialias.filter --write
				  tapwright design marram/antialias.filter --shortest --write

				exit codes: 0 all met; 1 something missed or unproven; 2 bad usage or input, or no such filter exists""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--shortest", false), new Option("--write", false));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().size() != 1) {
			throw new InputException("", "give one file; 'tapwright design --help' has examples");
		}
		List<FilterSource> sources = Sources.read(List.of(VerifyVerb.path(arguments.operands().getFirst())));
		if (sources.size() != 1) {
			throw new InputException(arguments.operands().getFirst(), "holds " + sources.size() + " filters; give one file");
		}
		FilterSource source = sources.getFirst();
		Filter filter = source.filter().orElseThrow(() -> new InputException("", source.problem()));
		if (arguments.has("--shortest")) {
			takeShortest(filter, source, console);
		} else {
			Designer.Outcome outcome = design(filter, source, console);
			filter.setCoefficients(outcome.coefficients());
			outcome.notes().forEach(note -> console.err().println("tapwright design: " + note));
		}
		VerificationRun run = VerificationRun.of(sources, Effort.STANDARD);
		if (arguments.has("--write")) {
			write(filter, source.file());
			console.out().print(EvidenceFormat.of("table").orElseThrow().write(run));
		} else {
			console.out().print(FilterJson.write(filter));
		}
		run.problems().forEach(problem -> console.err().println("tapwright design: " + problem));
		return run.problems().isEmpty() ? run.allMet() ? Main.OK : Main.NOT_MET : Main.BAD_USAGE;
	}

	private static Designer.Outcome design(Filter filter, FilterSource source, Console console) throws InputException {
		try (var progress = new TerminalProgress(console)) {
			return Designer.of(filter, source.parameters())
					.orElseThrow(() -> new InputException("design", filter.getDesign() == null ? "there is none; add one"
							: "the coefficients were made elsewhere; choose another design"))
					.run(progress);
		} catch (DesignException e) {
			throw new InputException(source.file().toString(), e.getMessage());
		} catch (InputException e) {
			throw new InputException(source.file().toString(), e.describe());
		}
	}

	private static void takeShortest(Filter filter, FilterSource source, Console console) throws InputException {
		try (var progress = new TerminalProgress(console)) {
			var search = Candidates.of(filter, source.parameters());
			var found = new ArrayList<Candidate>();
			for (String method : Candidates.methods()) {
				Candidate candidate = search.search(method, progress);
				progress.close();
				console.err().println("tapwright design: " + describe(candidate));
				if (candidate.solution().isPresent()) {
					found.add(candidate);
				}
			}
			Candidate best = found.stream().min(Comparator.comparing(candidate -> candidate.solution().orElseThrow().taps().length))
					.orElseThrow(() -> new InputException("", "no method found coefficients that are proven to meet every requirement"));
			Adoption.of(filter, source.parameters(), best).apply(filter);
		} catch (DesignException e) {
			throw new InputException(source.file().toString(), e.getMessage());
		} catch (InputException e) {
			throw new InputException(source.file().toString(), e.describe());
		}
	}

	private static String describe(Candidate candidate) {
		return candidate.method() + ": " + candidate.solution()
				.map(solution -> solution.taps().length + " taps, " + solution.multiplies() + " multiplies, delay "
						+ solution.delay() + " samples")
				.orElse("nothing found") + ". " + String.join(" ", candidate.notes());
	}

	private static void write(Filter filter, Path file) throws IOException {
		if (file.toString().endsWith("." + Sources.INTERCHANGE_EXTENSION)) {
			AtomicFiles.write(file, FilterJson.write(filter).getBytes(StandardCharsets.UTF_8));
		} else {
			ModelFiles.save(filter, file);
		}
	}
}
