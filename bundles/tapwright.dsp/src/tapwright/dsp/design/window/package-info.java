// SPDX-License-Identifier: EPL-2.0
/**
 * Window functions with their published sources, and the design by windows: the inverse transform of a piecewise-linear
 * target, in closed form, times a window.
 */
package tapwright.dsp.design.window;
