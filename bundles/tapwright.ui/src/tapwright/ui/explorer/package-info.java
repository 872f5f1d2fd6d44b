// SPDX-License-Identifier: EPL-2.0
/** What the Project Explorer shows of portfolios: verdicts at filters, and their requirements below them. */
package tapwright.ui.explorer;
