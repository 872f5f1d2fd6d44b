// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;

import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;

/** Says how good rounded coefficients are. Implementations are deterministic. */
@FunctionalInterface
public interface Judge {

	/** What is to be made small; infinite for coefficients that are of no use at all. */
	double loss(ExactTaps taps);

	/**
	 * The largest weighted error of a linear-phase amplitude over bands: a proven upper bound, less than a millionth above the
	 * true one in usual cases.
	 */
	static Judge peakError(List<Band> bands) {
		PeakError error = new PeakError(bands);
		return taps -> error.of(taps).hi();
	}
}
