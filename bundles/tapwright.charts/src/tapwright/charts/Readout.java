// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/** Says in one line what the curves of a plot are worth at a place. */
final class Readout {

	private static final int MOST_CURVES = 4;
	private static final int DIGITS = 5;

	private Readout() {
	}

	static String at(Plot plot, double place) {
		var words = new StringBuilder(plot.x().words(place, DIGITS));
		int named = 0;
		for (Curve curve : plot.curves()) {
			int nearest = curve.style() == Curve.Style.GUIDE ? -1 : curve.nearest(place);
			if (nearest < 0 || named++ == MOST_CURVES) {
				continue;
			}
			double value = curve.isLine() ? between(curve, place, nearest) : curve.y()[nearest];
			words.append("    ").append(curve.label()).append(": ").append(plot.y().words(value, DIGITS));
		}
		return words.toString();
	}

	private static double between(Curve curve, double place, int nearest) {
		int other = place < curve.x()[nearest] ? nearest - 1 : nearest + 1;
		if (other < 0 || other >= curve.x().length || curve.x()[other] == curve.x()[nearest]) {
			return curve.y()[nearest];
		}
		double share = (place - curve.x()[nearest]) / (curve.x()[other] - curve.x()[nearest]);
		return curve.y()[nearest] + share * (curve.y()[other] - curve.y()[nearest]);
	}
}
