// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.format.Tool;

/** The headless command. Runs as plain Java, with neither an OSGi framework nor a workspace. */
public final class Main {

	/** Exit code: everything asked for was done and is met. */
	public static final int OK = 0;
	/** Exit code: something is missed, unproven or regressed. */
	public static final int NOT_MET = 1;
	/** Exit code: the command line or its input was not understood. */
	public static final int BAD_USAGE = 2;

	private static final List<Verb> VERBS = List.of(
			new VerifyVerb(), new DesignVerb(), new ImportVerb(), new ExportVerb(), new ApplyVerb(),
			new ReportVerb(), new RecordVerb(), new HistoryVerb(), new CompareVerb(), new BaselineVerb());

	private Main() {
	}

	/** Runs the command and ends the virtual machine with its exit code. */
	public static void main(String[] args) {
		var out = new PrintStream(System.out, false, StandardCharsets.UTF_8);
		var err = new PrintStream(System.err, true, StandardCharsets.UTF_8);
		int code = run(List.of(args), new Console(out, err, System.console() != null));
		out.flush();
		if (out.checkError() && code == OK) {
			code = BAD_USAGE; // what was asked for could not be written
		}
		System.exit(code);
	}

	/**
	 * Runs the command.
	 *
	 * @param args
	 *            verb first, then its arguments
	 * @param console
	 *            where results, progress and errors go
	 * @return the exit code
	 */
	public static int run(List<String> args, Console console) {
		String first = args.isEmpty() ? "--help" : args.getFirst();
		switch (first) {
		case "--version" -> console.out().println(Tool.NAME);
		case "--help", "-h", "help" -> help(console);
		default -> {
			return run(first, args.subList(1, args.size()), console);
		}
		}
		return OK;
	}

	private static int run(String name, List<String> args, Console console) {
		Verb verb = VERBS.stream().filter(known -> known.name().equals(name)).findFirst().orElse(null);
		if (verb == null) {
			console.err().println("tapwright: there is no verb '" + name + "'; 'tapwright --help' lists the verbs");
			return BAD_USAGE;
		}
		if (args.contains("--help") || args.contains("-h")) {
			console.out().println(verb.help().strip());
			return OK;
		}
		try {
			return verb.run(Arguments.parse(args, verb.options()), console);
		} catch (InputException e) {
			console.err().println("tapwright " + name + ": " + e.describe());
		} catch (IOException e) {
			console.err().println("tapwright " + name + ": " + e.getMessage());
		}
		return BAD_USAGE;
	}

	private static void help(Console console) {
		console.out().println("""
				tapwright - proves the digital filters of a product against their requirements

				usage: tapwright                     opens the window
				       tapwright VERB ARGUMENTS...   runs a verb without a window
				       tapwright --version

				verbs:""");
		for (Verb verb : VERBS) {
			console.out().printf("  %-10s %s%n", verb.name(), verb.summary());
		}
		console.out().println("""

				'tapwright VERB --help' explains a verb with examples.

				exit codes: 0 all met; 1 something missed, unproven or regressed; 2 bad usage or input""");
	}
}
