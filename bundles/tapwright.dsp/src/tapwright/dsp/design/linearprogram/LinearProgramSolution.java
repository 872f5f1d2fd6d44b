// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.linearprogram;

/**
 * Coefficients and how good they are.
 *
 * @param taps
 *            h[0..N-1]; do not change the array
 * @param error
 *            largest weighted error over the bands
 * @param lower
 *            no filter whose amplitude factors add up to at most {@link LinearProgram#LARGEST_FACTORS} in absolute value has
 *            a smaller one; from the multipliers, up to rounding errors
 */
public record LinearProgramSolution(double[] taps, double error, double lower) {
}
