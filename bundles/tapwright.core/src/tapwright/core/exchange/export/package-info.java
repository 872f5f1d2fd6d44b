// SPDX-License-Identifier: EPL-2.0
/**
 * Coefficients for firmware and logic design. Texts are written by the plain files in the folder 'templates'; the same filter
 * gives the same bytes everywhere.
 */
package tapwright.core.exchange.export;
