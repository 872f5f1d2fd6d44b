// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

/** A design that has no solution, or none that can be computed reliably. The message says why and what to do. */
public class DesignException extends Exception {

	private static final long serialVersionUID = 1L;

	/** With a sentence for a person. */
	public DesignException(String message) {
		super(message);
	}
}
