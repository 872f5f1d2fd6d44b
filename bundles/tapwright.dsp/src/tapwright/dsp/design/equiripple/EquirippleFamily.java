// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.FilterFamily;
import tapwright.dsp.design.LengthEstimate;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;

/**
 * Equiripple designs for the same bands with any number of coefficients. Each trial starts from where the error of an
 * earlier one alternates. Not thread-safe.
 */
public final class EquirippleFamily implements FilterFamily {

	/** A rounded product above this is above 1. */
	private static final double ABOVE_ONE = 1 + 0x1p-50;

	private final Symmetry symmetry;
	private final List<Band> bands;
	private final boolean weightsAreLimits;
	private final Map<Integer, Double> lowerBounds = new HashMap<>();
	private Reference warm;

	/**
	 * A family.
	 *
	 * @param weightsAreLimits
	 *            whether the requirements allow the amplitude, sign included, everywhere in the bands at most the
	 *            deviation 1 / weight from what is desired; then a length whose least weighted error is above 1 is
	 *            proven to be too short
	 */
	public EquirippleFamily(Symmetry symmetry, List<Band> bands, boolean weightsAreLimits) {
		this.symmetry = symmetry;
		this.bands = List.copyOf(bands);
		this.weightsAreLimits = weightsAreLimits;
	}

	@Override
	public String name() {
		return "equiripple";
	}

	@Override
	public int estimate() {
		return LengthEstimate.forBands(bands);
	}

	@Override
	public Equiripple design(int taps) {
		return new Equiripple(taps, symmetry, bands);
	}

	@Override
	public Design trial(int taps) {
		Equiripple design = design(taps);
		return progress -> compute(design, progress);
	}

	private DesignResult compute(Equiripple design, Progress progress) throws DesignException {
		Equiripple.Solved solved;
		try {
			solved = design.solve(progress, warm);
		} catch (DesignException e) {
			// Perhaps only the start was bad.
			solved = design.solve(progress, null);
		}
		warm = solved.reference();
		EquirippleSolution solution = solved.solution();
		lowerBounds.put(design.taps(), solution.lowerBound());
		return new DesignResult(solution.taps(), solution.notes());
	}

	@Override
	public boolean excludes(int taps, Progress progress) {
		boolean isNothing = symmetry == Symmetry.ODD && taps == 1;
		return weightsAreLimits && !isNothing && (missesAtForcedZero(taps) || lowerBound(taps, progress) > 1);
	}

	// Whether the bands ask for more than 0 where every filter of this length has gain 0, beyond what the weight
	// allows.
	private boolean missesAtForcedZero(int taps) {
		LinearPhaseType type = LinearPhaseType.of(taps, symmetry);
		Band first = bands.get(0);
		Band last = bands.get(bands.size() - 1);
		return type.zeroAtZero() && first.from() == 0 && Math.abs(first.desiredFrom()) * first.weightFrom() > ABOVE_ONE
				|| type.zeroAtHalf() && last.to() == 0.5 && Math.abs(last.desiredTo()) * last.weightTo() > ABOVE_ONE;
	}

	// 0 when there is none to be had.
	private double lowerBound(int taps, Progress progress) {
		if (!lowerBounds.containsKey(taps)) {
			try {
				compute(design(taps), progress);
			} catch (DesignException | IllegalArgumentException e) {
				return 0;
			}
		}
		return lowerBounds.get(taps);
	}
}
