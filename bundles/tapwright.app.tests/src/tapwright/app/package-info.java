// SPDX-License-Identifier: EPL-2.0
/** Tests of the product as a whole: its start, its window, its screens. */
package tapwright.app;
