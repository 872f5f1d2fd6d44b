// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.stream.IntStream;

/** Makes the largest error on a grid smaller by steps along given integer vectors, one, two or three at a time. */
final class Descent {

	private final AmplitudeGrid grid;
	private final List<long[]> steps = new ArrayList<>();
	private final List<double[]> changes = new ArrayList<>();
	private double[] errors;
	private double peak;
	private int[] order;

	/**
	 * Takes the vectors of a reduced basis and the unit vectors as steps, in both directions.
	 */
	Descent(AmplitudeGrid grid, Lattice lattice) {
		this.grid = grid;
		int n = grid.unknowns;
		for (int k = 0; k < n; k++) {
			add(lattice.basis[k]);
			long[] unit = new long[n];
			unit[k] = 1;
			if (Arrays.stream(lattice.basis).noneMatch(vector -> Arrays.equals(vector, unit))) {
				add(unit);
			}
		}
	}

	private void add(long[] step) {
		for (int sign = -1; sign <= 1; sign += 2) {
			long[] signed = step.clone();
			for (int k = 0; k < signed.length; k++) {
				signed[k] *= sign;
			}
			steps.add(signed);
			double[] change = new double[grid.rows.length];
			for (int i = 0; i < change.length; i++) {
				for (int k = 0; k < signed.length; k++) {
					change[i] += grid.rows[i][k] * signed[k];
				}
			}
			changes.add(change);
		}
	}

	/**
	 * Goes down from a starting point until no combination of up to {@code depth} steps helps.
	 *
	 * @param start
	 *            is changed to the result
	 * @return the largest error on the grid at the end
	 */
	double run(long[] start, int depth, BooleanSupplier stop) {
		errors = grid.errors(start);
		rank();
		while (!stop.getAsBoolean()) {
			int[] found = find(depth, stop);
			if (found.length == 0) {
				break;
			}
			for (int step : found) {
				for (int k = 0; k < start.length; k++) {
					start[k] += steps.get(step)[k];
				}
				for (int i = 0; i < errors.length; i++) {
					errors[i] -= changes.get(step)[i];
				}
			}
			rank();
		}
		return peak;
	}

	private void rank() {
		peak = 0;
		for (double error : errors) {
			peak = Math.max(peak, Math.abs(error));
		}
		order = IntStream.range(0, errors.length).boxed().sorted(Comparator.comparingDouble(i -> -Math.abs(errors[i])))
				.mapToInt(Integer::intValue).toArray();
	}

	private int[] find(int depth, BooleanSupplier stop) {
		double limit = peak * (1 - 1e-9);
		int count = steps.size();
		for (int a = 0; a < count; a++) {
			if (helps(limit, changes.get(a))) {
				return new int[] { a };
			}
		}
		for (int a = 0; depth > 1 && a < count; a++) {
			double[] first = minus(errors, changes.get(a));
			for (int b = a + 1; b < count; b++) {
				if (helps(first, limit, changes.get(b))) {
					return new int[] { a, b };
				}
			}
		}
		for (int a = 0; depth > 2 && a < count; a++) {
			double[] first = minus(errors, changes.get(a));
			for (int b = a + 1; b < count && !stop.getAsBoolean(); b++) {
				double[] second = minus(first, changes.get(b));
				for (int c = b + 1; c < count; c++) {
					if (helps(second, limit, changes.get(c))) {
						return new int[] { a, b, c };
					}
				}
			}
		}
		return new int[0];
	}

	private boolean helps(double limit, double[] change) {
		return helps(errors, limit, change);
	}

	// The points with the largest present errors come first: most steps fail at one of them.
	private boolean helps(double[] from, double limit, double[] change) {
		for (int i : order) {
			if (Math.abs(from[i] - change[i]) >= limit) {
				return false;
			}
		}
		return true;
	}

	private static double[] minus(double[] a, double[] b) {
		double[] difference = a.clone();
		for (int i = 0; i < a.length; i++) {
			difference[i] -= b[i];
		}
		return difference;
	}
}
