// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.List;

/**
 * Estimates of the number of coefficients that a low-pass needs. Estimates only: start a search from them. Deviations
 * are linear, transitions in cycles per sample; the results are not whole numbers.
 */
public final class LengthEstimate {

	private LengthEstimate() {
	}

	/**
	 * For equiripple designs (J. F. Kaiser, Nonrecursive digital filter design using the I0-sinh window function,
	 * Proceedings of the IEEE International Symposium on Circuits and Systems, 1974).
	 */
	public static double kaiser(double passDeviation, double stopDeviation, double transition) {
		check(passDeviation, stopDeviation, transition);
		return (-10 * Math.log10(passDeviation * stopDeviation) - 13) / (14.6 * transition) + 1;
	}

	/**
	 * For equiripple designs, more accurate (O. Herrmann, L. R. Rabiner, D. S. K. Chan, Practical design rules for
	 * optimum finite impulse response low-pass digital filters, Bell System Technical Journal 52(6), 1973; constants
	 * from memory). The formula is meant for a stop-band deviation that is not the larger one, so deviations are
	 * swapped when needed.
	 */
	public static double herrmann(double passDeviation, double stopDeviation, double transition) {
		check(passDeviation, stopDeviation, transition);
		double l1 = Math.log10(Math.max(passDeviation, stopDeviation));
		double l2 = Math.log10(Math.min(passDeviation, stopDeviation));
		double d = (5.309e-3 * l1 * l1 + 7.114e-2 * l1 - 0.4761) * l2 - (2.66e-3 * l1 * l1 + 0.5941 * l1 + 0.4278);
		return d / transition - (11.01217 + 0.51244 * (l1 - l2)) * transition + 1;
	}

	/**
	 * The simplest one (M. Bellanger, Digital Processing of Signals, 1984; from memory).
	 */
	public static double bellanger(double passDeviation, double stopDeviation, double transition) {
		check(passDeviation, stopDeviation, transition);
		return -2.0 / 3 * Math.log10(10 * passDeviation * stopDeviation) / transition;
	}

	/**
	 * Herrmann's estimate for bands whose weights are one over the allowed deviation: the largest over all transitions;
	 * at least 3.
	 */
	public static int forBands(List<Band> bands) {
		double most = 3;
		for (int k = 1; k < bands.size(); k++) {
			Band before = bands.get(k - 1);
			Band after = bands.get(k);
			double step = Math.max(Math.abs(before.desiredTo()), Math.abs(after.desiredFrom()));
			double transition = after.from() - before.to();
			if (transition > 0 && step > 0) {
				double one = Math.min(1 / (before.weightTo() * step), 0.5);
				double other = Math.min(1 / (after.weightFrom() * step), 0.5);
				most = Math.max(most, herrmann(one, other, transition));
			}
		}
		return (int) Math.min(Math.rint(most), Integer.MAX_VALUE / 2);
	}

	private static void check(double passDeviation, double stopDeviation, double transition) {
		if (!(passDeviation > 0 && passDeviation < 1 && stopDeviation > 0 && stopDeviation < 1)) {
			throw new IllegalArgumentException("the deviations are " + passDeviation + " and " + stopDeviation
					+ "; they must be above 0 and below 1");
		}
		if (!(transition > 0 && transition < 0.5)) {
			throw new IllegalArgumentException("the transition is " + transition
					+ " cycles per sample wide; it must be above 0 and below 0.5, half the sample rate");
		}
	}
}
