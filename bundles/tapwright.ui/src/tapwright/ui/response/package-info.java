// SPDX-License-Identifier: EPL-2.0
/** The view that draws what is selected. */
package tapwright.ui.response;
