// SPDX-License-Identifier: EPL-2.0
/**
 * Exact numbers: coefficients as the rationals that they are, intervals that contain a true value, and precision beyond double.
 */
package tapwright.dsp.exact;
