// SPDX-License-Identifier: EPL-2.0
/**
 * Exact numbers: coefficients as the rationals that they are, intervals that contain a true value, and precision
 * beyond double.
 * <p>
 * Elementary functions of {@link tapwright.dsp.exact.FixedPoint} are power series on small arguments, reached by
 * exact reduction: cosine and sine by quarter turns of a rational, exponential and logarithm by powers of two. Each
 * term is an interval rounded outward; the rest after the last term is bounded by a geometric series and added. So
 * enclosures hold by construction, at any precision.
 */
package tapwright.dsp.exact;
