// SPDX-License-Identifier: EPL-2.0
/** Requirements and their proofs: each verdict is a theorem about exact coefficients. */
package tapwright.dsp.verify;
