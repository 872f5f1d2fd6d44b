// SPDX-License-Identifier: EPL-2.0
package tapwright.core.compare;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * The coefficients that ship, side by side.
 *
 * @param unit
 *            what differences are counted in
 * @param rows
 *            one for each index that any of the two has
 */
public record CoefficientTable(Unit unit, List<Row> rows) {

	/** What differences are counted in. */
	public enum Unit {
		/** Steps of the coefficient format, or of the scale, that both have. */
		STEP,
		/** Units of the last place of the larger of the two numbers, as binary64 has it. */
		ULP
	}

	/**
	 * One coefficient.
	 *
	 * @param index
	 *            from 0
	 * @param before
	 *            NaN when there is none
	 * @param after
	 *            NaN when there is none
	 * @param difference
	 *            after minus before, in the table's unit; NaN when one is missing
	 */
	public record Row(int index, double before, double after, double difference) {

		/** Whether anything differs. */
		public boolean changed() {
			return difference != 0;
		}
	}

	/**
	 * Compares coefficients, exactly, and rounds only the difference.
	 *
	 * @param step
	 *            the common step of both; nothing when they have none
	 */
	static CoefficientTable of(Optional<ExactTaps> before, Optional<ExactTaps> after, Optional<BigFraction> step) {
		int old = before.map(ExactTaps::length).orElse(0);
		int young = after.map(ExactTaps::length).orElse(0);
		var rows = new ArrayList<Row>();
		for (int k = 0; k < Math.max(old, young); k++) {
			if (k >= old || k >= young) {
				rows.add(new Row(k, k < old ? Rationals.nearest(before.get().tap(k)) : Double.NaN,
						k < young ? Rationals.nearest(after.get().tap(k)) : Double.NaN, Double.NaN));
			} else {
				rows.add(row(k, before.get().tap(k), after.get().tap(k), step));
			}
		}
		return new CoefficientTable(step.isPresent() ? Unit.STEP : Unit.ULP, List.copyOf(rows));
	}

	/** How many coefficients differ. */
	public long changed() {
		return rows.stream().filter(Row::changed).count();
	}

	private static Row row(int k, BigFraction before, BigFraction after, Optional<BigFraction> step) {
		double old = Rationals.nearest(before);
		double young = Rationals.nearest(after);
		BigFraction unit = step.orElseGet(() -> Rationals.exact(Math.ulp(Math.max(Math.abs(old), Math.abs(young)))));
		return new Row(k, old, young, Rationals.nearest(after.subtract(before).divide(unit)));
	}
}
