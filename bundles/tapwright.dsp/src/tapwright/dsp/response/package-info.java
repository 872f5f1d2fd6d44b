// SPDX-License-Identifier: EPL-2.0
/** What a filter does, as numbers to draw: fast double-precision evaluation without a claim of proof. */
package tapwright.dsp.response;
