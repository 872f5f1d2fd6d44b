// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Bands;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;

/**
 * Linear-phase design by a window: the impulse response of the ideal target, truncated and multiplied by a window. The
 * target is piecewise linear, so its inverse transform is in closed form. Weights of the bands are not used.
 *
 * @param taps
 *            number of coefficients, 1 to {@link Window#LONGEST}
 * @param symmetry
 *            even, or odd for differentiators and Hilbert transformers
 * @param bands
 *            desired amplitude in rising bands; they may touch. The target stays constant below the first and above the
 *            last band
 * @param gaps
 *            what the target does between bands
 * @param window
 *            the window
 * @param unityAt
 *            frequency in cycles per sample at which the gain is scaled to exactly the desired amplitude there, up to
 *            rounding
 */
public record WindowDesign(int taps, Symmetry symmetry, List<Band> bands, Gaps gaps, Window window,
		OptionalDouble unityAt)
		implements Design {

	/** What the target does between two bands. */
	public enum Gaps {
		/** A step in the middle of the gap; the window makes the transition. This is what Kaiser's formulas assume. */
		STEP,
		/** A straight line across the gap. */
		LINE
	}

	/** Checks the parameters. */
	public WindowDesign {
		if (taps < 1 || taps > Window.LONGEST) {
			throw new IllegalArgumentException("a design of " + taps + " coefficients was asked for; ask for 1 to "
					+ Window.LONGEST);
		}
		Objects.requireNonNull(gaps);
		Objects.requireNonNull(window);
		bands = Bands.rising(bands, true);
		LinearPhaseType.of(taps, symmetry).refuseImpossible(bands);
		if (unityAt.isPresent() && desiredAt(bands, unityAt.getAsDouble()) == 0) {
			throw new IllegalArgumentException("the gain cannot be scaled at " + unityAt.getAsDouble()
					+ " cycles per sample: no band with a desired amplitude other than 0 contains that frequency");
		}
	}

	/** A step target without scaling. */
	public WindowDesign(int taps, Symmetry symmetry, List<Band> bands, Window window) {
		this(taps, symmetry, bands, Gaps.STEP, window, OptionalDouble.empty());
	}

	/** Low-pass with the step at {@code cutoff} cycles per sample, scaled to gain 1 at frequency 0. */
	public static WindowDesign lowPass(int taps, double cutoff, Window window) {
		return scaled(taps, List.of(new Band(0, cutoff, 1, 1), new Band(cutoff, 0.5, 0, 1)), window, 0);
	}

	/**
	 * High-pass with the step at {@code cutoff}, scaled to gain 1 at half the sample rate; needs an odd number of
	 * coefficients.
	 */
	public static WindowDesign highPass(int taps, double cutoff, Window window) {
		return scaled(taps, List.of(new Band(0, cutoff, 0, 1), new Band(cutoff, 0.5, 1, 1)), window, 0.5);
	}

	/** Band-pass from {@code low} to {@code high}, scaled to gain 1 in the middle of the band. */
	public static WindowDesign bandPass(int taps, double low, double high, Window window) {
		return scaled(taps, List.of(new Band(0, low, 0, 1), new Band(low, high, 1, 1), new Band(high, 0.5, 0, 1)),
				window,
				(low + high) / 2);
	}

	/**
	 * Band-stop from {@code low} to {@code high}, scaled to gain 1 at frequency 0; needs an odd number of coefficients.
	 */
	public static WindowDesign bandStop(int taps, double low, double high, Window window) {
		return scaled(taps, List.of(new Band(0, low, 1, 1), new Band(low, high, 0, 1), new Band(high, 0.5, 1, 1)),
				window, 0);
	}

	private static WindowDesign scaled(int taps, List<Band> bands, Window window, double unityAt) {
		return new WindowDesign(taps, Symmetry.EVEN, bands, Gaps.STEP, window, OptionalDouble.of(unityAt));
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		double[] h = new double[taps];
		double[] samples = window.symmetric(taps);
		List<Band> target = target();
		double sign = symmetry == Symmetry.ODD ? -1 : 1;
		for (int k = 0; k < (taps + 1) / 2; k++) {
			if (k % 256 == 0) {
				progress.checkCancelled();
			}
			double value = IdealResponse.sample(target, symmetry, (taps - 1) / 2.0 - k) * samples[k];
			h[k] = value;
			h[taps - 1 - k] = sign * value;
		}
		if (symmetry == Symmetry.ODD && taps % 2 != 0) {
			h[taps / 2] = 0;
		}
		if (unityAt.isPresent()) {
			scale(h);
		}
		return new DesignResult(h);
	}

	private void scale(double[] h) throws DesignException {
		double at = unityAt.getAsDouble();
		double wanted = desiredAt(bands, at);
		double gain = 0;
		for (int k = 0; k < taps; k++) {
			double angle = 2 * Math.PI * at * ((taps - 1) / 2.0 - k);
			gain += h[k] * (symmetry == Symmetry.ODD ? Math.sin(angle) : Math.cos(angle));
		}
		if (!(Math.abs(gain) > 1e-3 * Math.abs(wanted))) {
			throw new DesignException("the gain of the unscaled design is only " + gain + " at " + at
					+ " cycles per sample, too little to scale it to " + wanted
					+ "; use more coefficients or another frequency");
		}
		for (int k = 0; k < taps; k++) {
			h[k] *= wanted / gain;
		}
	}

	// The whole axis as touching straight lines.
	private List<Band> target() {
		List<Band> target = new ArrayList<>();
		Band first = bands.get(0);
		if (first.from() > 0) {
			target.add(new Band(0, first.from(), first.desiredFrom(), 1));
		}
		for (int k = 0; k < bands.size(); k++) {
			Band band = bands.get(k);
			target.add(band);
			double end = k + 1 < bands.size() ? bands.get(k + 1).from() : 0.5;
			if (band.to() < end) {
				fill(target, band, end, k + 1 < bands.size() ? bands.get(k + 1).desiredFrom() : band.desiredTo());
			}
		}
		return target;
	}

	private void fill(List<Band> target, Band before, double end, double desiredAtEnd) {
		double middle = (before.to() + end) / 2;
		if (gaps == Gaps.STEP && before.to() < middle && middle < end) {
			target.add(new Band(before.to(), middle, before.desiredTo(), 1));
			target.add(new Band(middle, end, desiredAtEnd, 1));
		} else {
			target.add(new Band(before.to(), end, before.desiredTo(), desiredAtEnd, 1, 1));
		}
	}

	// Zero when no band contains the frequency.
	private static double desiredAt(List<Band> bands, double frequency) {
		for (Band band : bands) {
			if (frequency >= band.from() && frequency <= band.to() && band.desired(frequency) != 0) {
				return band.desired(frequency);
			}
		}
		return 0;
	}
}
