// SPDX-License-Identifier: EPL-2.0
/** Quick fixes of our problems: changes whose outcome is proven before a person chooses one, and that can be undone in the editor. */
package tapwright.ui.fix;
