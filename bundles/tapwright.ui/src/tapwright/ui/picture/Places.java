// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

/** Places to evaluate a curve at. */
final class Places {

	private Places() {
	}

	/** Evenly spread places from one to another, both included, or evenly spread in their logarithm. */
	static double[] between(double from, double to, int count, boolean logarithmic) {
		double[] places = new double[count];
		for (int k = 0; k < count; k++) {
			double share = (double) k / (count - 1);
			places[k] = logarithmic ? from * Math.pow(to / from, share) : from + share * (to - from);
		}
		places[count - 1] = to;
		return places;
	}
}
