// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

/**
 * Something in a filter that keeps it from being verified.
 *
 * @param requirement
 *            id of the requirement that it stands in; empty when it concerns the filter as a whole
 * @param message
 *            what is wrong and what to do
 */
public record InputProblem(String requirement, String message) {

	/** Place and message in one line. */
	public String describe() {
		return requirement.isEmpty() ? message : requirement + ": " + message;
	}
}
