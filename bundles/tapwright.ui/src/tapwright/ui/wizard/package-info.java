// SPDX-License-Identifier: EPL-2.0
/** Wizards that start portfolios and filters. */
package tapwright.ui.wizard;
