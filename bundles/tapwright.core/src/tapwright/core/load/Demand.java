// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

/**
 * What one filter asks of one processor, all its deployments there together. Immutable. Coefficients are stored once, however many
 * channels and copies use them; every channel of every copy has a delay line of its own.
 *
 * @param filter
 *            its name
 * @param processor
 *            name of the processor
 * @param multiplyAccumulates
 *            per second
 * @param coefficientWords
 *            words of memory for coefficients
 * @param delayWords
 *            words of memory for delay lines
 * @param word
 *            bits of the wider of coefficients and input samples; 0 when neither is stated
 * @param accumulator
 *            bits of the accumulator; 0 when it is not stated
 */
public record Demand(String filter, String processor, double multiplyAccumulates, double coefficientWords, double delayWords,
		int word, int accumulator) {

	/** This demand and that of another deployment of the same filter on the same processor. */
	Demand with(Demand other) {
		return new Demand(filter, processor, multiplyAccumulates + other.multiplyAccumulates, coefficientWords,
				delayWords + other.delayWords, word, accumulator);
	}
}
