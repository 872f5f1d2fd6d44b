// SPDX-License-Identifier: EPL-2.0
/**
 * What a filter does, as numbers to draw: fast double-precision evaluation without a claim of proof. The transform
 * that proofs use is here too, with its own bound.
 */
package tapwright.dsp.response;
