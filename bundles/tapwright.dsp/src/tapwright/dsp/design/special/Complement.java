// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * The filter that together with a given one makes a pure delay: a unit impulse in the middle less the given coefficients. Turns
 * a low-pass into a high-pass; the gains add up to 1 at every frequency. Common practice, no source.
 *
 * @param other
 *            gives an odd number of symmetric coefficients
 */
public record Complement(Design other) implements Design {

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		double[] taps = other.compute(progress).taps().clone();
		if (taps.length % 2 == 0 || ExactTaps.ofDoubles(taps).symmetry() != Symmetry.EVEN) {
			throw new DesignException("the other filter has " + taps.length
					+ " coefficients; a complement needs an odd number of symmetric ones");
		}
		for (int k = 0; k < taps.length; k++) {
			taps[k] = (k == taps.length / 2 ? 1 : 0) - taps[k];
		}
		return new DesignResult(taps);
	}
}
