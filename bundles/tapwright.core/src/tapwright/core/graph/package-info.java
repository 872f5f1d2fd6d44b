// SPDX-License-Identifier: EPL-2.0
/**
 * What depends on what in a portfolio, and what has to be verified again after a change. A filter depends on its own file, on the
 * values of the parameters that it uses and on the filters that its requirements name; a state of the portfolio is immutable, and a change makes the next one from it.
 */
package tapwright.core.graph;
