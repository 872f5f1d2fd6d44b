// SPDX-License-Identifier: EPL-2.0

/** Programs of the build; nothing here is shipped. */
package tapwright.releng;
