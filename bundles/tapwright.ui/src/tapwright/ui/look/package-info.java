// SPDX-License-Identifier: EPL-2.0
/** Icons, and the words and shapes of verdicts. */
package tapwright.ui.look;
