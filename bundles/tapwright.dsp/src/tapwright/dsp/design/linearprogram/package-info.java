// SPDX-License-Identifier: EPL-2.0
/**
 * Linear-phase design by linear programming: the least weighted peak error under limits on the amplitude, its slope, the
 * impulse response and the step response.
 * <p>
 * A linear program is solved as a sequence of strictly convex quadratic programs, each staying near the last solution (R. T.
 * Rockafellar, Monotone operators and the proximal point algorithm, SIAM Journal on Control and Optimization 14(5), 1976);
 * for a linear program it reaches the solution after finitely many. Limits for whole stretches of frequency become rows
 * where they are exceeded. The multipliers of the last program give a lower bound on what any filter can reach.
 */
package tapwright.dsp.design.linearprogram;
