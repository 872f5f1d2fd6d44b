// SPDX-License-Identifier: EPL-2.0
package tapwright.core;

/** Something a person wrote that cannot be used: the message says what, and what to do. */
public class InputException extends Exception {

	private static final long serialVersionUID = 1L;

	private final String place;

	/**
	 * @param place
	 *            what is wrong: an attribute, a parameter, a JSON pointer; empty when the message says it
	 * @param reason
	 *            why, and what to do
	 */
	public InputException(String place, String reason) {
		super(reason);
		this.place = place;
	}

	/** What is wrong; may be empty. */
	public String place() {
		return place;
	}

	/** Place and reason in one line. */
	public String describe() {
		return place.isEmpty() ? getMessage() : place + ": " + getMessage();
	}
}
