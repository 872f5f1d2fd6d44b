// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.List;

/**
 * Coefficients of least largest weighted error, with what is proven of them.
 *
 * @param taps
 *            h[0..N-1], exactly symmetric; do not change the array
 * @param lowerBound
 *            proven: no filter of this length and symmetry has a smaller largest weighted error over the bands
 * @param upperBound
 *            proven: these very coefficients have no larger weighted error in any band
 * @param extremes
 *            the frequencies, in cycles per sample, at which the error alternates between its extremes; do not change
 *            the array
 * @param peakOutside
 *            about the largest amplitude between bands; 0 when there is nothing between them
 * @param notes
 *            what a person should know, in whole sentences
 */
public record EquirippleSolution(double[] taps, double lowerBound, double upperBound, double[] extremes,
		double peakOutside,
		List<String> notes) {

	/** How far the largest weighted error can at most be above that of the best filter, relatively. */
	public double excess() {
		return upperBound / lowerBound - 1;
	}
}
