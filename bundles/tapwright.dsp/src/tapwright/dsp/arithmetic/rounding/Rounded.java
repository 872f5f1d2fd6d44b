// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import tapwright.dsp.exact.ExactTaps;

/**
 * Coefficients that were rounded to a format.
 *
 * @param taps
 *            numbers of the format
 * @param loss
 *            what the judge says of them
 * @param optimal
 *            whether it is proven that no coefficients of the format with the same length and symmetry have a largest weighted
 *            error over the task's bands that is smaller by more than a millionth of it
 */
public record Rounded(ExactTaps taps, double loss, boolean optimal) {
}
