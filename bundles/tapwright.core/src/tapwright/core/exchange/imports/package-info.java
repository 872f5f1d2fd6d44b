// SPDX-License-Identifier: EPL-2.0
/**
 * Coefficients from files that other programs made. Readers are strict: what is not understood is an error with file, line and
 * column, since a number that is silently lost or misread would be proven of the wrong filter.
 */
package tapwright.core.exchange.imports;
