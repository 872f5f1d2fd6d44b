// SPDX-License-Identifier: EPL-2.0
/**
 * Pictures of curves with limits and marks. A {@link tapwright.charts.Plot} is plain data; {@link tapwright.charts.PlotView}
 * shows it, the writers turn it into files. Nothing here knows what a filter is.
 */
package tapwright.charts;
