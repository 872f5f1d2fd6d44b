// SPDX-License-Identifier: EPL-2.0
/**
 * Rounding of coefficients that keeps what the filter was designed for: several methods behind
 * {@link tapwright.dsp.arithmetic.rounding.RoundingMethod}, and the shortest word that can be proven.
 */
package tapwright.dsp.arithmetic.rounding;
