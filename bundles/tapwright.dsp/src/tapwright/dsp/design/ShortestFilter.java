// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.List;
import java.util.Optional;

import tapwright.dsp.verify.Verdict;

/**
 * What a search for the shortest filter of a family found.
 *
 * @param family
 *            name of the family
 * @param found
 *            the shortest filter whose coefficients are proven to meet everything, if there is one
 * @param trials
 *            all lengths that were tried, in this order
 * @param notes
 *            what is known of shorter lengths, in whole sentences
 */
public record ShortestFilter(String family, Optional<Found> found, List<Trial> trials, List<String> notes) {

	/**
	 * A filter proven to meet everything.
	 *
	 * @param taps
	 *            number of coefficients
	 * @param design
	 *            the design that gives exactly these coefficients again
	 * @param result
	 *            the coefficients
	 * @param provenShortest
	 *            whether it is proven that no shorter filter of the same symmetry meets everything, whatever the method
	 */
	public record Found(int taps, Design design, DesignResult result, boolean provenShortest) {
	}

	/**
	 * One length that was tried.
	 *
	 * @param taps
	 *            number of coefficients
	 * @param verdict
	 *            over all requirements; unproven when there are no coefficients
	 * @param refusal
	 *            why the method gave no coefficients; empty when it did
	 */
	public record Trial(int taps, Verdict verdict, String refusal) {
	}
}
