// SPDX-License-Identifier: EPL-2.0
/**
 * Requirements and their proofs: each verdict is a theorem about exact coefficients.
 * <p>
 * <b>What is proven.</b> Coefficients are rationals, band edges, sample rates and limits are the rationals that their
 * doubles are. A gain limit L dB asks that |H| is at most (at least) 10^(L/20) times a reference on a closed band.
 * The <i>load</i> of a place is gain over limit for an upper limit and limit over gain for a lower one; a limit is
 * kept where the load is at most 1, and the margin is -20 log10 of the largest load. All arguments below enclose the
 * largest load.
 * <p>
 * Notation: N coefficients h, c = (N-1)/2, v = k - c, u = 2^-53, and e^(jwc) H(w) = E(w) + j O(w) with real E and O;
 * one of them is zero when h is symmetric or antisymmetric, and the other is then called the amplitude.
 *
 * <h2>Fast search in double precision</h2>
 * <p>
 * <b>Theorem 1 (truncation).</b> On a cell of half-width d around w0, with s = (w - w0)/d in [-1, 1], the polynomial
 * of the first K = 12 terms of Taylor's series of e^(jwc) H differs from it by at most the sum of |h[k]| (|v| d)^K /
 * K!. <i>Proof:</i> Lagrange's remainder for each e^(-jvw), whose derivatives are bounded by powers of |v|. There are
 * M &gt;= 4N - 4 cells around the circle, so |v| d &lt;= pi/8.
 * <p>
 * <b>Theorem 2 (coefficients).</b> Let g[m][k] = h[k] (v d)^m / m! and |g[m]| the sum over k of its moduli. The
 * computed g[m][k] are off by at most (6m+6) u of themselves: each power needs a product by (v d) (off by 2.5 u), a
 * reciprocal (u) and two products (2u), and the coefficient itself is off by u. Four sequences (symmetric case) or
 * two (general case) share one complex transform, whose outputs are off by at most e = (factor of {@link
 * tapwright.dsp.response.Fft}) times the sum of their |g|. Separation into two spectra X and Y maps the errors a, b
 * of two outputs to (a + b*)/2 and (a - b*)/2j, whose squared moduli add up to (|a|^2 + |b|^2)/2; so |error of X| +
 * |error of Y| &lt;= sqrt(2) e, and the sums of moduli of their real and imaginary parts are at most 2 e. The turn by
 * half a cell's angle for even N adds less than 7u, separation u, both below the 8u that are added to e. The sum of
 * all these over m, plus theorem 1's bound, is {@link tapwright.dsp.verify.TaylorCells#error()}: at every point of a
 * cell the magnitude of the computed polynomial (evaluated exactly) differs by no more from |H|, or from the
 * amplitude up to sign.
 * <p>
 * <b>Theorem 3 (rounding of polynomials).</b> Let B be the sum of absolute coefficients of a cell's polynomial of n
 * terms. Evaluation by W. G. Horner's rule in [-1, 1] errs by at most 2n u B, moving to a part of the cell by at most
 * 3n u B (the absolute polynomial at |centre| + radius &lt;= 1 bounds all intermediate values), sums of coefficients
 * by n u B. For n = 12 that is below 2e-14 B with room for the gaps of at most 2u between neighbouring parts, in
 * which a polynomial changes by at most n B 2u. Squares have n = 23 terms computed as sums of at most 24 products,
 * each off by 25 u; with B the square of the sums of the factors' absolute coefficients, everything together is below
 * 6e-14 B. Multiplying by a series of 12 terms for a sloping limit gives n = 34 and at most 100 u times the product
 * of both sums.
 * <p>
 * <b>Theorem 4 (largest value of a polynomial).</b> On [-1, 1]: (a) p &lt;= max(c0 + c1 s + c2 s^2) + sum of |c[m]|,
 * m &gt;= 3. (b) If 2 c2 + sum of m (m-1) |c[m]| over m &gt;= 3 is negative, p is concave and lies below each of its
 * tangents, so p &lt;= p(t) + max(p'(t)(1-t), p'(t)(-1-t)) for every t; Newton's method only makes the bound tight.
 * (c) If p is convex, or |c1| exceeds the sum of m |c[m]| over m &gt;= 2 so that p is monotone, the largest value is
 * at an end. Otherwise (d) p &lt;= c0 + sum of the others' absolute values, and the cell is halved. Smallest values
 * follow from -p.
 * <p>
 * <b>Theorem 5 (coverage).</b> Places are computed in units of cells with an error below M 2^-53; searched stretches
 * are widened by M 2^-51 to each side, so every point of every closed band lies in a searched part and the maximum of
 * the parts' upper bounds is one for the load. Lower bounds are taken only at points at least M 2^-51 inside the
 * band, or at one frequency with the slope counted. So lo &lt;= largest load &lt;= hi. If an amplitude is certainly
 * positive at one point and certainly negative at another one of the same band, it vanishes between them, and a lower
 * limit is missed there with an infinite load.
 * <p>
 * <b>Theorem 6 (limits).</b> The factor 10^(-L/20) is off by at most (4 + 8 |L/20|) u relatively, since {@link
 * StrictMath#pow} errs by one unit in the last place; sloping limits by {@link
 * tapwright.dsp.verify.LocalSlope#doubt}. Both ends of the bracket are moved by twice that. Logarithms for decibels
 * err by one unit in the last place and are moved by four. The verdict is <i>met</i> when hi &lt;= 1, <i>missed</i>
 * when lo &gt; 1.
 *
 * <h2>Exact search</h2>
 * <p>
 * When the bracket contains 1, or is wider than a millionth of a decibel, the parts that may hold the largest load
 * (those with an upper bound above lo, reduced by twice the doubt about limits) are searched by {@link
 * tapwright.dsp.verify.ExactSearch}.
 * <p>
 * <b>Theorem 7.</b> With integers q = h / unit, Taylor coefficients of E and O are sums of exact integers q v'^m
 * times cosines and sines, where v' = 2v. Cosines of v w0 come from a rotation in fixed point whose error grows by at
 * most (1 + r) a + r per step, a the error so far, r the error of the rotation plus rounding; the sums of |q v'^m|
 * times this error bound the sums' errors, all in integers. Everything else (factor (pi r)^m / m!, squares, limits,
 * quotient) is interval arithmetic of {@link tapwright.dsp.exact.FixedPoint}. Theorem 4 applies with intervals for
 * coefficients. Stretches have rational ends, cover the band without gaps, and points of evaluation are rationals
 * inside it. So every enclosure contains the largest load, whatever the precision; precision only decides whether it
 * is narrow enough.
 * <p>
 * <b>Theorem 8 (touching).</b> If a constant limit is rational (a whole multiple of 20 dB) and |H|^2 equals it at w0
 * in {0, pi/3, pi/2, 2 pi/3, pi}, the first derivative of |H|^2 there that is not zero decides the sign of the
 * difference within a radius given by Lagrange's remainder; see {@link tapwright.dsp.verify.Touch}. Outside these
 * radii the exact search must find no load above 1.
 * <p>
 * <b>Theorem 9 (one frequency).</b> Whether a gain is exactly zero, or exactly a stated double, at a rational part of
 * the sample rate is divisibility by a cyclotomic polynomial; see {@link tapwright.dsp.verify.UnitRoot}. This always
 * decides.
 * <p>
 * <b>Theorem 10 (delay).</b> Group delay at most T is a sign of a sum of cosines; see {@link
 * tapwright.dsp.verify.DelayCurve}. Signs of amplitudes are proven by theorems 1 to 5 and 7, exact zeros by theorem
 * 8.
 *
 * <h2>What stays unproven</h2>
 * <p>
 * Only a largest load within 2^-88 of 1 (gains within one part in 1e25 of a limit) that is no touching of theorem 8,
 * or one for which the time limit ended; the note of the proof says which. Results do not depend on threads: work
 * space holds no state between proofs.
 */
package tapwright.dsp.verify;
