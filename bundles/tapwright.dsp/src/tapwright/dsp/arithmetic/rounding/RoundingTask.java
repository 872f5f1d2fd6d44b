// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;
import java.util.Objects;

import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;

/**
 * Coefficients to be rounded.
 *
 * @param ideal
 *            before rounding; their symmetry is kept
 * @param format
 *            of the rounded coefficients
 * @param judge
 *            says which rounding is better
 * @param bands
 *            desired amplitude and weight, which guide the methods that work on the amplitude; empty when there is none
 */
public record RoundingTask(ExactTaps ideal, NumberFormat format, Judge judge, List<Band> bands) {

	/** Copies the list. */
	public RoundingTask {
		Objects.requireNonNull(ideal);
		Objects.requireNonNull(format);
		Objects.requireNonNull(judge);
		bands = List.copyOf(bands);
	}

	/** A task that is judged by the largest weighted error over the bands. */
	public RoundingTask(ExactTaps ideal, NumberFormat format, List<Band> bands) {
		this(ideal, format, Judge.peakError(bands), bands);
	}
}
