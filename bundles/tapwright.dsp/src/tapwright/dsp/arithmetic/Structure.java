// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

/** The order in which a filter multiplies and adds. The package's description gives each one operation by operation. */
public enum Structure {
	/** Delay line, one multiplier per coefficient, one accumulator. */
	DIRECT,
	/** Like direct, samples that share a coefficient are added before the multiplier; needs symmetric coefficients. */
	FOLDED,
	/** One multiplier per coefficient, delays between the adders. */
	TRANSPOSED,
	/**
	 * Like folded, without the multipliers of the zeros of a half-band filter; needs even symmetry, odd length and zeros at
	 * every even distance from the middle. With a rate factor of 2 only every second output is computed.
	 */
	HALF_BAND,
	/** Like direct, but only every M-th output is computed; M is the rate factor. */
	POLYPHASE_DECIMATOR,
	/** L outputs per input, each from its own branch of every L-th coefficient; L is the rate factor. */
	POLYPHASE_INTERPOLATOR
}
