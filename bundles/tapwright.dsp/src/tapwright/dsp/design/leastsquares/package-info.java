// SPDX-License-Identifier: EPL-2.0
/**
 * Least squares with linear phase, freely or within limits, and the quadratic programs behind it.
 * <p>
 * A symmetric filter is its amplitude's coefficients a[k] for harmonics v[k] (see
 * {@link tapwright.dsp.design.LinearPhaseType}). The weighted squared error is quadratic in them, with a matrix whose
 * entries are integrals of products of two cosines, known in closed form; limits on the amplitude, its slope, the impulse
 * or the step response are linear in them.
 */
package tapwright.dsp.design.leastsquares;
