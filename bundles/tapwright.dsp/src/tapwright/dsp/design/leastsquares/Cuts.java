// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.ArrayList;
import java.util.List;

import tapwright.dsp.Progress;

/**
 * Finds where a filter exceeds limits that hold for whole stretches of frequency, as rows for a {@link QuadraticProgram}: the
 * local maxima of the excess on a dense grid, refined. For one thread.
 */
public final class Cuts {

	/** Grid points per unknown over the whole axis. */
	private static final int DENSITY = 16;
	private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;
	private static final int STEPS = 18;

	private final LinearPhaseBasis basis;
	private final List<Grid> grids = new ArrayList<>();

	private record Grid(Side side, double[] frequencies, double[][] rows) {
	}

	/** A row: sign times the amplitude's row, with its bound and its room for t. */
	public record Cut(double[] row, double bound, double room, double excess) {
	}

	/** Prepares the grids. */
	public Cuts(LinearPhaseBasis basis, List<Side> sides, Progress progress) {
		this.basis = basis;
		for (Side side : sides) {
			progress.checkCancelled();
			int count = 8 + (int) Math.ceil(2 * DENSITY * basis.size() * (side.to() - side.from()));
			double[] frequencies = new double[count + 1];
			double[][] rows = new double[count + 1][];
			Grid alike = grids.stream().filter(grid -> sameRows(grid.side, side)).findFirst().orElse(null);
			for (int i = 0; i <= count && alike == null; i++) {
				frequencies[i] = i == count ? side.to() : side.from() + (side.to() - side.from()) * i / count;
				rows[i] = basis.row(frequencies[i], side.derivative());
			}
			grids.add(alike == null ? new Grid(side, frequencies, rows) : new Grid(side, alike.frequencies, alike.rows));
		}
	}

	/** A few rows of every side to begin with, whatever their excess. */
	public List<Cut> start() {
		List<Cut> cuts = new ArrayList<>();
		for (Grid grid : grids) {
			int step = Math.max(1, DENSITY / 4);
			for (int i = 0; i < grid.frequencies.length; i += step) {
				cuts.add(cut(grid.side, grid.frequencies[i], new double[basis.size()], 0));
			}
			cuts.add(cut(grid.side, grid.side.to(), new double[basis.size()], 0));
		}
		return cuts;
	}

	/**
	 * Where limits are exceeded.
	 *
	 * @param x
	 *            the amplitude's factors; more entries are ignored
	 * @param t
	 *            value of the further unknown
	 * @param tolerance
	 *            excess that is let pass
	 */
	public List<Cut> exceeded(double[] x, double t, double tolerance) {
		List<Cut> cuts = new ArrayList<>();
		for (Grid grid : grids) {
			int count = grid.frequencies.length;
			double[] excess = new double[count];
			for (int i = 0; i < count; i++) {
				excess[i] = excess(grid.side, grid.frequencies[i], grid.rows[i], x, t);
			}
			for (int i = 0; i < count; i++) {
				boolean peak = (i == 0 || excess[i] >= excess[i - 1]) && (i == count - 1 || excess[i] > excess[i + 1]);
				double reach = Math.max(excess[i] - excess[Math.max(i - 1, 0)], excess[i] - excess[Math.min(i + 1, count - 1)]);
				if (peak && excess[i] + reach > tolerance) {
					Cut cut = highest(grid, i, x, t);
					if (cut.excess > tolerance) {
						cuts.add(cut);
					}
				}
			}
		}
		return cuts;
	}

	private static boolean sameRows(Side one, Side other) {
		return one.from() == other.from() && one.to() == other.to() && one.derivative() == other.derivative();
	}

	// Golden section between the neighbours of a sample; a parabola is too coarse beside a steep transition.
	private Cut highest(Grid grid, int i, double[] x, double t) {
		double low = grid.frequencies[Math.max(i - 1, 0)];
		double high = grid.frequencies[Math.min(i + 1, grid.frequencies.length - 1)];
		Cut best = cut(grid.side, grid.frequencies[i], x, t);
		for (int step = 0; step < STEPS; step++) {
			Cut left = cut(grid.side, high - (high - low) * GOLDEN, x, t);
			Cut right = cut(grid.side, low + (high - low) * GOLDEN, x, t);
			if (left.excess > right.excess) {
				high -= (high - low) * (1 - GOLDEN);
				best = left.excess > best.excess ? left : best;
			} else {
				low += (high - low) * (1 - GOLDEN);
				best = right.excess > best.excess ? right : best;
			}
		}
		return best;
	}

	private Cut cut(Side side, double frequency, double[] x, double t) {
		double[] row = basis.row(frequency, side.derivative());
		double excess = excess(side, frequency, row, x, t);
		for (int k = 0; k < row.length; k++) {
			row[k] *= side.sign();
		}
		return new Cut(row, side.bound().applyAsDouble(frequency), side.room().applyAsDouble(frequency), excess);
	}

	private static double excess(Side side, double frequency, double[] row, double[] x, double t) {
		double sum = 0;
		for (int k = 0; k < row.length; k++) {
			sum += row[k] * x[k];
		}
		return side.sign() * sum - side.bound().applyAsDouble(frequency) - side.room().applyAsDouble(frequency) * t;
	}
}
