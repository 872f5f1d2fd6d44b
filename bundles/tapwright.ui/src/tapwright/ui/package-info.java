// SPDX-License-Identifier: EPL-2.0
/** The window's parts for portfolios and filters: editor, views, wizards. Models are changed by commands alone. */
package tapwright.ui;
