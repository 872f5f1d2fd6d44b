// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.List;
import java.util.Optional;

import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.design.Design;

/**
 * What one method can do for a filter: its shortest design that is proven, or why there is none.
 *
 * @param method
 *            name of the method, as in interchange files
 * @param solution
 *            the shortest proven design
 * @param notes
 *            what was tried and what is proven, in whole sentences
 */
public record Candidate(String method, Optional<Solution> solution, List<String> notes) {

	/**
	 * A proven design.
	 *
	 * @param taps
	 *            h[0..N-1] as the method gives them; do not change the array
	 * @param design
	 *            gives exactly these coefficients again
	 * @param provenShortest
	 *            whether it is proven that no shorter filter of the same symmetry meets everything, whatever the method
	 * @param evidence
	 *            the proof
	 * @param multiplies
	 *            multiplications for each output sample in the filter's structure, direct when it states none
	 */
	public record Solution(double[] taps, Design design, boolean provenShortest, FilterEvidence evidence, long multiplies) {

		/** Delay of the middle of the coefficients, in samples. */
		public double delay() {
			return (taps.length - 1) / 2.0;
		}
	}
}
