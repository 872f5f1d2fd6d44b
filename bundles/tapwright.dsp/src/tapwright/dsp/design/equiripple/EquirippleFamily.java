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
import tapwright.dsp.exact.Symmetry;

/**
 * Equiripple designs for the same bands with any number of coefficients. Each trial starts from where the error of an
 * earlier one alternates. Not thread-safe.
 */
public final class EquirippleFamily implements FilterFamily {

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
		if (!weightsAreLimits) {
			return false;
		}
		if (!lowerBounds.containsKey(taps)) {
			try {
				compute(design(taps), progress);
			} catch (DesignException e) {
				return false;
			}
		}
		return lowerBounds.get(taps) > 1;
	}
}
