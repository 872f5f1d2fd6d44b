// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.List;

/**
 * Coefficients that a method found.
 *
 * @param taps
 *            h[0..N-1]; do not change the array
 * @param notes
 *            what a person should know of this result, in whole sentences; often empty
 */
public record DesignResult(double[] taps, List<String> notes) {

	/** A result without remarks. */
	public DesignResult(double... taps) {
		this(taps, List.of());
	}
}
