// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.util.ArrayList;
import java.util.List;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.exact.Symmetry;

/**
 * Equiripple low-pass after a cascaded integrator-comb decimator that makes up for the decimator's droop: in the pass-band it
 * follows one over the decimator's gain (E. B. Hogenauer, An economical class of digital filters for decimation and
 * interpolation, IEEE Transactions on Acoustics, Speech, and Signal Processing 29(2), 1981), with the weight of that gain, so
 * that the error of the product is even. The curve is followed by straight pieces, whose error is far below the ripple.
 *
 * @param taps
 *            number of coefficients at the decimated rate
 * @param sections
 *            of the decimator, 1 to 12
 * @param rate
 *            by which it decimates, at least 2; the differential delay is one sample
 * @param passEdge
 *            in cycles per sample of the decimated rate
 * @param stopEdge
 *            above {@code passEdge}, below 0.5
 * @param stopWeight
 *            of the stop-band's error against the pass-band's, positive
 */
public record CicCompensator(int taps, int sections, int rate, double passEdge, double stopEdge, double stopWeight) implements Design {

	private static final int PIECES = 64;

	/** Checks the numbers. */
	public CicCompensator {
		if (sections < 1 || sections > 12 || rate < 2) {
			throw new IllegalArgumentException("a decimator of " + sections + " sections by " + rate
					+ "; give 1 to 12 sections and a rate of at least 2");
		}
		if (!(passEdge > 0 && passEdge < stopEdge && stopEdge < 0.5)) {
			throw new IllegalArgumentException("band edges " + passEdge + " and " + stopEdge
					+ " (cycles per sample of the decimated rate) must rise and lie between 0 and 0.5");
		}
		new Equiripple(taps, Symmetry.EVEN, List.of(new Band(0, passEdge, 1, 1), new Band(stopEdge, 0.5, 0, stopWeight)));
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		List<Band> bands = new ArrayList<>();
		for (int k = 0; k < PIECES; k++) {
			double from = passEdge * k / PIECES;
			double to = passEdge * (k + 1) / PIECES;
			bands.add(new Band(from, to, 1 / gain(from), 1 / gain(to), gain(from), gain(to)));
		}
		bands.add(new Band(stopEdge, 0.5, 0, stopWeight));
		return new Equiripple(taps, Symmetry.EVEN, bands).compute(progress);
	}

	/** Gain of the decimator at a frequency in cycles per sample of the decimated rate, 1 at frequency 0. */
	public double gain(double frequency) {
		double turns = frequency / rate;
		return frequency == 0 ? 1 : Math.pow(Math.sin(Math.PI * frequency) / (rate * Math.sin(Math.PI * turns)), sections);
	}
}
