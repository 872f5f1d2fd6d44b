// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

/**
 * One difference in what a person wrote.
 *
 * @param part
 *            of the filter
 * @param place
 *            what differs: 'stop: max', 'taps', 'accumulator: word'
 * @param before
 *            empty when it was not there
 * @param after
 *            empty when it is no longer there
 */
public record ContentChange(Part part, String place, String before, String after) {

	/** Parts of a filter, in the order that they are shown in. */
	public enum Part {
		/** Name, purpose, sample rate, deployments. */
		FILTER,
		/** Values of parameters. */
		PARAMETERS,
		/** What is asked. */
		REQUIREMENTS,
		/** Where the coefficients come from. */
		DESIGN,
		/** Structure and number formats. */
		ARITHMETIC
	}

	/** One line for a person: 'stop: max: -80 -> -85'. */
	public String words() {
		if (before.isEmpty()) {
			return place + ": added: " + after;
		}
		return after.isEmpty() ? place + ": removed: " + before : place + ": " + before + " -> " + after;
	}
}
