// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.history.Author;
import tapwright.core.history.Recorder;
import tapwright.core.history.WorkingFilter;
import tapwright.core.history.git.Authors;
import tapwright.dsp.verify.Effort;

/** Records the present state of a filter as a revision. */
final class RecordVerb implements Verb {

	@Override
	public String name() {
		return "record";
	}

	@Override
	public String summary() {
		return "records the present state of a filter as a revision";
	}

	@Override
	public String help() {
		return """
				usage: tapwright record FILE -m MESSAGE [--reconcile] [--author NAME] [--email ADDRESS]

				Adds a file to the folder revisions beside the root file of the portfolio; nothing is ever replaced. The
				filter is verified first; what it misses is recorded with it and warned of.

				  -m MESSAGE       why
				  --reconcile      joins several heads: the revision is made from all of them
				  --author NAME    who records; by default as in the git configuration, else the computer's user
				  --email ADDRESS  address of the author

				examples:
				  tapwright record marram/hydrophone-decimator-1.filter -m "longer, for the new stop band"

				exit codes: 0 recorded; 2 bad usage or input, or nothing has changed""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("-m", true), new Option("--reconcile", false), new Option("--author", true), new Option("--email", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().size() != 1) {
			throw new InputException("", "give one file; 'tapwright record --help' has an example");
		}
		if (!arguments.has("-m")) {
			throw new InputException("-m", "is missing; say why the revision is made");
		}
		Path file = VerifyVerb.path(arguments.operands().getFirst());
		WorkingFilter working = WorkingFilter.read(file);
		var recorder = new Recorder(author(arguments, file), Clock.systemUTC(), Effort.STANDARD);
		String message = arguments.option("-m").orElseThrow();
		Recorder.Recording recording = arguments.has("--reconcile") ? recorder.reconcile(working, message)
				: recorder.record(working, message);
		console.out().println("recorded " + recording.revision().shortHash() + " as " + recording.revision().file());
		recording.warnings().forEach(warning -> console.err().println("tapwright record: " + warning));
		return Main.OK;
	}

	static Author author(Arguments arguments, Path file) throws InputException, IOException {
		Path folder = file.toAbsolutePath().getParent();
		Author known = Authors.of(folder);
		try {
			return new Author(arguments.option("--author").orElse(known.name()),
					arguments.option("--email").orElse(arguments.has("--author") ? "" : known.email()));
		} catch (IllegalArgumentException e) {
			throw new InputException("--author", e.getMessage());
		}
	}
}
