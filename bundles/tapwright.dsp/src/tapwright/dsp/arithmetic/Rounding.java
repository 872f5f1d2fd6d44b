// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

/** How a number that lies between two steps of a format is brought to one of them. */
public enum Rounding {
	/** To the step nearer to zero: truncation of the magnitude. */
	TOWARD_ZERO,
	/** To the lower step: truncation of two's complement bits. */
	FLOOR,
	/** To the nearest step, ties upward. */
	HALF_UP,
	/** To the nearest step, ties to the even one. */
	HALF_EVEN,
	/** To the nearest step, ties away from zero. */
	HALF_AWAY
}
