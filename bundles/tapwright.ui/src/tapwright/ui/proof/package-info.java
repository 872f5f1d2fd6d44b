// SPDX-License-Identifier: EPL-2.0
/** Proofs of filters that are being edited: asked on the window's thread, answered in the background, shown when they arrive. */
package tapwright.ui.proof;
