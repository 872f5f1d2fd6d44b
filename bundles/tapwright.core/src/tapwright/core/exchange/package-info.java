// SPDX-License-Identifier: EPL-2.0
/** Exact numbers that leave the program or come into it, and whether a file that left still says what its filter says. */
package tapwright.core.exchange;
