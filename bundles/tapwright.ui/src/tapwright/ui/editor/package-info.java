// SPDX-License-Identifier: EPL-2.0
/** The filter editor: one file, one command stack, a page for each question that a person asks of a filter. */
package tapwright.ui.editor;
