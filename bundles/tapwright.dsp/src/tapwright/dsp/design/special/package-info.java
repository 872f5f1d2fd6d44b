// SPDX-License-Identifier: EPL-2.0
/**
 * Designs in closed form and filters for one purpose. Where the coefficients are rational they are offered exactly, see
 * {@link tapwright.dsp.design.special.ExactDesign}.
 */
package tapwright.dsp.design.special;
