// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

/**
 * Tells quickly that the error somewhere on the grid is too large. Points that refused a vector are asked first for the next
 * one, so that most vectors are refused by the first few.
 */
final class LeafTest {

	private final double[][] rows;
	private final double[] targets;

	LeafTest(AmplitudeGrid grid, Lattice lattice) {
		int n = grid.unknowns;
		rows = new double[grid.rows.length][n];
		targets = grid.targets.clone();
		for (int i = 0; i < rows.length; i++) {
			for (int k = 0; k < n; k++) {
				for (int l = 0; l < n; l++) {
					rows[i][k] += grid.rows[i][l] * lattice.basis[k][l];
				}
			}
		}
	}

	/** Whether the error of a vector, given in coordinates of the basis, is below the bound at all points. */
	boolean isBelow(long[] z, double bound) {
		for (int i = 0; i < rows.length; i++) {
			double error = targets[i];
			double[] row = rows[i];
			for (int k = 0; k < z.length; k++) {
				error -= row[k] * z[k];
			}
			if (Math.abs(error) >= bound) {
				moveForward(i);
				return false;
			}
		}
		return true;
	}

	private void moveForward(int i) {
		int to = i / 2;
		double[] row = rows[i];
		double target = targets[i];
		rows[i] = rows[to];
		targets[i] = targets[to];
		rows[to] = row;
		targets[to] = target;
	}
}
