// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.PrintStream;
import java.util.List;

/** The headless command. Runs as plain Java, with neither an OSGi framework nor a workspace. */
public final class Main {

	/** Exit code: everything asked for was done and is met. */
	public static final int OK = 0;

	/** Exit code: the command line or its input was not understood; nothing was done. */
	public static final int BAD_USAGE = 2;

	private Main() {
	}

	/** Runs the command and ends the virtual machine with its exit code. */
	public static void main(String[] args) {
		System.exit(run(List.of(args), System.out, System.err));
	}

	/**
	 * Runs the command.
	 *
	 * @param args verb first, then its arguments
	 * @param out  where results go
	 * @param err  where progress and errors go
	 * @return the exit code
	 */
	public static int run(List<String> args, PrintStream out, PrintStream err) {
		var verb = args.isEmpty() ? "--help" : args.get(0);
		switch (verb) {
		case "--version" -> out.println("Tapwright 0.1.0");
		case "--help" -> out.println("usage: tapwright --help | --version");
		default -> {
			err.println("tapwright: unknown verb '" + verb + "'. 'tapwright --help' lists the verbs.");
			return BAD_USAGE;
		}
		}
		return OK;
	}
}
