// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * Bounds on every sum inside a filter when the input is any single sinusoid, constants included.
 *
 * <p>
 * A sum of some coefficients times e^(-i w d) over delays d up to n, looked at M > n frequencies evenly spread around the circle,
 * is at most 1 / cos(pi n / (2 M)) times its largest size there: turned by its middle delay and by the phase of its peak, its real
 * part is a trigonometric polynomial of degree n in w / 2, for which the factor is that of H. Ehlich and K. Zeller, Schwankung von
 * Polynomen zwischen Gitterpunkten, Mathematische Zeitschrift 86, 1964.
 */
public final class SineBounds {

	private static final int DENSITY = 16;

	private SineBounds() {
	}

	/**
	 * The largest gain from the input to each sum, in the order of {@link OverflowBounds#nodes()} without products and outputs.
	 *
	 * @return upper bounds, at most half a percent too large
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients
	 */
	public static List<Double> gains(ExactTaps taps, Arithmetic arithmetic) {
		List<Double> gains = new ArrayList<>();
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			List<Term> terms = new ArrayList<>(arithmetic.terms(taps, phase));
			if (arithmetic.structure() == Structure.TRANSPOSED) {
				Collections.reverse(terms);
			}
			addGains(taps, terms, gains);
		}
		return gains;
	}

	private static void addGains(ExactTaps taps, List<Term> terms, List<Double> gains) {
		int longest = terms.stream().mapToInt(term -> Math.max(term.delay(), term.mirror())).max().orElse(0);
		int points = DENSITY * Math.max(longest, 1);
		double[] peaks = new double[terms.size()];
		for (int point = 0; point <= points / 2; point++) {
			double real = 0;
			double imaginary = 0;
			for (int n = 0; n < peaks.length; n++) {
				Term term = terms.get(n);
				double tap = Rationals.nearest(taps.tap(term.tap()));
				double angle = angle(point, term.delay(), points);
				real += tap * Math.cos(angle);
				imaginary -= tap * Math.sin(angle);
				if (term.isFolded()) {
					double mirror = angle(point, term.mirror(), points);
					real += term.sign() * tap * Math.cos(mirror);
					imaginary -= term.sign() * tap * Math.sin(mirror);
				}
				peaks[n] = Math.max(peaks[n], Math.hypot(real, imaginary));
			}
		}
		double factor = 1 / Math.cos(Math.PI * longest / (2.0 * points)) * (1 + 1e-12);
		double sizes = 0;
		for (int n = 0; n < peaks.length; n++) {
			sizes += 2 * Math.abs(Rationals.nearest(taps.tap(terms.get(n).tap())));
			// Each of the up to 2 n + 2 products and sums is off by less than 8 units in the last place of all that was added.
			gains.add(peaks[n] * factor + sizes * (2 * n + 2) * 0x1p-49);
		}
	}

	// Reduced exactly before it is rounded.
	private static double angle(int point, int delay, int points) {
		return 2 * Math.PI * ((long) point * delay % points) / points;
	}

	/**
	 * Whether no sum overflows for any sinusoid of the given amplitude that was rounded to the input format.
	 *
	 * @param amplitude
	 *            in steps of the input format, at most its largest number
	 * @return true when that is proven; false when it is not
	 */
	public static boolean isFree(ExactTaps taps, Arithmetic arithmetic, BigInteger amplitude) {
		ExactTaps stored = arithmetic.stored(taps);
		Datapath path = Datapath.of(stored, arithmetic);
		List<Double> gains = gains(stored, arithmetic);
		double toSteps = Rationals.nearest(path.input().step().divide(path.sumStep())) * (1 + 1e-12);
		// Half a step for the rounding of the input, through the sum of all sizes; a step and a half for every rounded product.
		double half = Rationals.nearest(Gains.of(stored).absoluteSum()) / 2;
		double perTerm = (path.product().isExact() ? 0 : Rationals.nearest(path.align().ratio()))
				+ (path.align().isExact() ? 0 : 1);
		int n = 0;
		for (NodeRange node : new OverflowBounds(stored, arithmetic).nodes()) {
			if (node.kind() == NodeRange.Kind.PRODUCT && node.decisive() && !node.fits()) {
				return false;
			}
			if (node.kind() == NodeRange.Kind.SUM) {
				double size = ((gains.get(n) * amplitude.doubleValue() + half) * toSteps + perTerm * stored.length()) * (1 + 1e-9);
				n++;
				boolean fits = node.fits() || node.format().isPresent() && isWithin(node.format().get(), size);
				if (node.decisive() && !fits) {
					return false;
				}
			}
		}
		return true;
	}

	private static boolean isWithin(NumberFormat format, double size) {
		return format.signed() && size <= Math.nextDown(format.max().doubleValue());
	}
}
