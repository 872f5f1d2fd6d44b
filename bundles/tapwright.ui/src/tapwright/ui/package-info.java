// SPDX-License-Identifier: EPL-2.0

/** Editors, views and wizards of the window. */
package tapwright.ui;
