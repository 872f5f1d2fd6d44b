// SPDX-License-Identifier: EPL-2.0
/**
 * Signal paths from end to end. Rate changes are moved past filters until one filter is left, with all expansions before
 * it and all decimations after it: G(z) after a decimation by M equals G(z^M) before it, G(z) before an expansion by L
 * equals G(z^L) after it (the noble identities), and a decimation and an expansion change places when their factors have
 * no common divisor (P. P. Vaidyanathan, Multirate Systems and Filter Banks, 1993). What is proven of that one filter,
 * with exact coefficients, holds for the path: a tone of frequency f at its input leaves it with the gain of the filter
 * at f, be it at the same frequency or, after decimation, folded to another. Rounding between the stages is left out of
 * account.
 */
package tapwright.core.path;
