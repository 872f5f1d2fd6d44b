// SPDX-License-Identifier: EPL-2.0
/** What happens when the program is started on a folder of portfolios. */
package tapwright.ui.start;
