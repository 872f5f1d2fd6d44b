// SPDX-License-Identifier: EPL-2.0
/** Tests of the window's parts in a running workbench. */
package tapwright.ui;
