// SPDX-License-Identifier: EPL-2.0
/**
 * Weighted minimax design by exchange, with its proof.
 * <p>
 * The exchange works in x = cos(2 pi f): a reference of L + 1 points fixes the sum of cosines P whose weighted error
 * has one size and alternating signs there; the points move to the extrema of that error until it has this size
 * everywhere. Then the coefficients are recovered, and only what these coefficients do is reported: an upper bound of
 * the largest weighted error, from Taylor cells that cover all bands, and a lower bound for every filter of the same
 * length and symmetry, from C. J. de la Vallee Poussin's theorem (Sur la methode de l'approximation minimum, 1910):
 * when the error alternates in sign at L + 1 points, no other filter can have a largest error below the smallest of
 * these errors.
 */
package tapwright.dsp.design.equiripple;
