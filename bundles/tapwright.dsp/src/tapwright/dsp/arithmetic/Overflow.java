// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

/** What happens to a number outside the range of a format. */
public enum Overflow {
	/** High bits are dropped: modulo 2^word. */
	WRAP,
	/** The nearest end of the range is taken. */
	SATURATE
}
