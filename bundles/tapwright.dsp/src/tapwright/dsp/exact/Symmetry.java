// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.exact;

/** Exact symmetry of a coefficient set about its middle. */
public enum Symmetry {
	/** h[k] = h[N-1-k] for every k: types I (odd length) and II (even length). */
	EVEN,
	/** h[k] = -h[N-1-k] for every k: types III (odd length) and IV (even length). */
	ODD,
	/** Neither. */
	NONE
}
