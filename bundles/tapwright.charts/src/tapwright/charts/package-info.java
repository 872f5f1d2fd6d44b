// SPDX-License-Identifier: EPL-2.0

/** Plots of plain data; they know nothing of filters. */
package tapwright.charts;
