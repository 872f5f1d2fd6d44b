// SPDX-License-Identifier: EPL-2.0
/**
 * The numbers that ship: formats, structures, bit-true simulation and what can be guaranteed of them.
 *
 * <p>
 * What follows defines every output bit; simulation, bounds and generated code all keep to it.
 * <ul>
 * <li><b>Numbers.</b> A sample is an integer of the input format. A coefficient is an integer times the coefficients' common
 * unit. All operations are exact but for the two below.
 * <li><b>Rounding</b> brings a number to whole steps of a format, as the arithmetic's {@link tapwright.dsp.arithmetic.Rounding}
 * says. <b>Overflow</b> then brings the integer into the format's range. Neither happens where no format is stated.
 * <li><b>Product</b> of a coefficient and a sample (folded: and the exact sum or difference of two samples, which may be one bit
 * longer): rounding and overflow to the product format; then rounding, without overflow, to the steps of the accumulator.
 * <li><b>Sum</b>: overflow to the accumulator format after every single addition, the first product included, which is added to
 * zero.
 * <li><b>Output</b>: rounding and overflow of the finished sum to the output format.
 * </ul>
 * Before the first sample all delays hold zero. Orders of addition for the coefficients h[0..N-1] and output n:
 * <ul>
 * <li><b>direct</b>: h[0] x[n], h[1] x[n-1], ..., h[N-1] x[n-N+1].
 * <li><b>folded</b>: h[0] (x[n] ± x[n-N+1]), h[1] (x[n-1] ± x[n-N+2]), ...; last, for even symmetry and odd N, the middle one
 * alone.
 * <li><b>half-band</b>: as folded, zeros left out, the middle one last; with factor 2 only outputs 0, 2, 4, ... exist.
 * <li><b>transposed</b>: registers r[1..N-1] in accumulator format, all zero at first. The sum is r[1] + h[0] x[n]; then, for k =
 * 1..N-1, r[k] becomes r[k+1] + h[k] x[n], where r[N] is zero.
 * <li><b>polyphase decimator</b> by M: as direct, but only outputs 0, M, 2M, ... of the direct structure exist.
 * <li><b>polyphase interpolator</b> by L: input m yields outputs mL + p, p = 0..L-1, each h[p] x[m], h[p+L] x[m-1], ...
 * </ul>
 * A cascade feeds the output of one stage, as a value, to the next, whose input format rounds and limits it.
 */
package tapwright.dsp.arithmetic;
