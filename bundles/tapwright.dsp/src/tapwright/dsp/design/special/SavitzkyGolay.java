// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.Progress;
import tapwright.dsp.exact.ExactTaps;

/**
 * Smoothing and differentiation by a polynomial that is fitted to the last samples in the sense of least squares (A. Savitzky and
 * M. J. E. Golay, Smoothing and differentiation of data by simplified least squares procedures, Analytical Chemistry 36(8), 1964), at
 * any position between the samples' ends (P. A. Gorry, General least-squares smoothing and differentiation by the convolution
 * (Savitzky-Golay) method, Analytical Chemistry 62(6), 1990). Computed in exact rationals with the Gram polynomials.
 *
 * @param points
 *            number of samples, odd
 * @param degree
 *            of the polynomial, below {@code points}
 * @param derivative
 *            which derivative, per sample; 0 smooths
 * @param position
 *            where the polynomial is evaluated, in samples from the middle; positive is toward the newest sample
 */
public record SavitzkyGolay(int points, int degree, int derivative, int position) implements ExactDesign {

	/** Checks the numbers. */
	public SavitzkyGolay {
		ExactDesign.checkLength(points);
		if (points % 2 == 0) {
			throw new IllegalArgumentException(points + " points; their number must be odd");
		}
		if (degree < 0 || degree >= points || degree > 50) {
			throw new IllegalArgumentException("a polynomial of degree " + degree + "; with " + points + " points it must be 0 to "
					+ Math.min(points - 1, 50));
		}
		if (derivative < 0 || derivative > degree) {
			throw new IllegalArgumentException("derivative " + derivative + "; a polynomial of degree " + degree + " has 0 to " + degree);
		}
		if (Math.abs(position) > points / 2) {
			throw new IllegalArgumentException("position " + position + " is outside of the " + points + " points; choose -" + points / 2
					+ " to " + points / 2);
		}
	}

	/** At the middle of the points. */
	public SavitzkyGolay(int points, int degree, int derivative) {
		this(points, degree, derivative, 0);
	}

	@Override
	public ExactTaps exact(Progress progress) {
		int m = points / 2;
		BigFraction[] weights = new BigFraction[points];
		Arrays.fill(weights, BigFraction.ZERO);
		// Orthogonal polynomials over -m..m: p[k+1] = t p[k] - c[k] p[k-1]; rows of values, and of the derivatives at the position.
		BigFraction[] before = new BigFraction[points];
		BigFraction[] values = new BigFraction[points];
		Arrays.fill(before, BigFraction.ZERO);
		Arrays.fill(values, BigFraction.ONE);
		BigFraction[] derivativesBefore = zeros();
		BigFraction[] derivatives = zeros();
		derivatives[0] = BigFraction.ONE;
		BigFraction normBefore = BigFraction.ONE;
		for (int k = 0; k <= degree; k++) {
			progress.checkCancelled();
			BigFraction norm = BigFraction.ZERO;
			for (BigFraction value : values) {
				norm = norm.add(value.multiply(value));
			}
			BigFraction factor = derivatives[derivative].divide(norm);
			for (int i = 0; i < points; i++) {
				weights[i] = weights[i].add(values[i].multiply(factor));
			}
			BigFraction c = k == 0 ? BigFraction.ZERO : norm.divide(normBefore);
			BigFraction[] next = new BigFraction[points];
			for (int i = 0; i < points; i++) {
				next[i] = values[i].multiply(i - m).subtract(before[i].multiply(c));
			}
			BigFraction[] nextDerivatives = zeros();
			for (int r = 0; r <= derivative; r++) { // (t p)^(r) = t p^(r) + r p^(r-1)
				BigFraction lower = r == 0 ? BigFraction.ZERO : derivatives[r - 1].multiply(r);
				nextDerivatives[r] = derivatives[r].multiply(position).add(lower).subtract(derivativesBefore[r].multiply(c));
			}
			before = values;
			values = next;
			derivativesBefore = derivatives;
			derivatives = nextDerivatives;
			normBefore = norm;
		}
		return convolution(weights);
	}

	private BigFraction[] zeros() {
		BigFraction[] row = new BigFraction[derivative + 1];
		Arrays.fill(row, BigFraction.ZERO);
		return row;
	}

	// The newest sample meets the first coefficient.
	private static ExactTaps convolution(BigFraction[] weights) {
		BigInteger denominator = BigInteger.ONE;
		for (BigFraction weight : weights) {
			denominator = denominator.divide(denominator.gcd(weight.getDenominator())).multiply(weight.getDenominator());
		}
		List<BigInteger> integers = new ArrayList<>();
		for (int k = weights.length - 1; k >= 0; k--) {
			integers.add(weights[k].getNumerator().multiply(denominator.divide(weights[k].getDenominator())));
		}
		return ExactTaps.ofIntegers(integers, new BigFraction(BigInteger.ONE, denominator));
	}
}
