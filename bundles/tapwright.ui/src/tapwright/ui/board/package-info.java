// SPDX-License-Identifier: EPL-2.0
/** The view that lists all filters by their worst margin. */
package tapwright.ui.board;
