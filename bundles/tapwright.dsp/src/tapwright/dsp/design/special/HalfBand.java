// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.util.List;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.exact.Symmetry;

/**
 * Equiripple half-band filter: every other coefficient is exactly zero but the middle one, which is exactly one half, so the
 * deviations of pass- and stop-band are equal. Found from a filter of half the length with one band (P. P. Vaidyanathan and
 * T. Q. Nguyen, A trick for the design of FIR half-band filters, IEEE Transactions on Circuits and Systems 34(3), 1987;
 * recalled). Turned into a Hilbert transformer, the odd coefficients alternate in sign and double.
 *
 * @param taps
 *            number of coefficients, 4 J - 1
 * @param passEdge
 *            in cycles per sample, below a quarter; the stop-band begins at half a cycle less this
 * @param hilbert
 *            whether to give the Hilbert transformer from {@code 0.25 - passEdge} to {@code 0.25 + passEdge}
 */
public record HalfBand(int taps, double passEdge, boolean hilbert) implements Design {

	/** Checks the parameters. */
	public HalfBand {
		if (taps < 3 || taps % 4 != 3 || taps > 2 * Equiripple.LONGEST) {
			throw new IllegalArgumentException("a half-band filter of " + taps
					+ " coefficients; the number must be 3, 7, 11, ..., up to " + (2 * Equiripple.LONGEST - 1));
		}
		if (!(passEdge > 0 && passEdge < 0.25)) {
			throw new IllegalArgumentException("a pass-band up to " + passEdge
					+ " cycles per sample; it must end between 0 and 0.25, a quarter of the sample rate");
		}
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		double[] half = new Equiripple((taps + 1) / 2, Symmetry.EVEN, List.of(new Band(0, 2 * passEdge, 1, 1))).compute(progress).taps();
		double[] h = new double[taps];
		int middle = taps / 2;
		for (int k = 0; k < half.length; k++) {
			int distance = 2 * k - middle;
			double turned = Math.floorMod(distance, 4) == 1 ? half[k] : -half[k];
			h[2 * k] = hilbert ? turned : half[k] / 2;
		}
		h[middle] = hilbert ? 0 : 0.5;
		return new DesignResult(h);
	}
}
