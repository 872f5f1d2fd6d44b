// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.PrintStream;

/**
 * Where a verb writes.
 *
 * @param out
 *            results
 * @param err
 *            progress and errors
 * @param interactive
 *            whether a person watches, so that progress is worth showing
 */
public record Console(PrintStream out, PrintStream err, boolean interactive) {
}
