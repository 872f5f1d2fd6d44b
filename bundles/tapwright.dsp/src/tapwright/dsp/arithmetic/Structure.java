// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

/** The order in which a filter multiplies and adds. */
public enum Structure {
	/** Delay line, one multiplier per coefficient, one accumulator. */
	DIRECT,
	/** Like direct, samples that share a coefficient are added before the multiplier; needs symmetric coefficients. */
	FOLDED,
	/** One multiplier per coefficient, delays between the adders. */
	TRANSPOSED
}
