// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * Decides exactly how a sum of cosines, r[0] + sum of 2 r[k] cos(kw), or of sines, sum of 2 r[k] sin(kw), behaves
 * near an angle with rational cosine. |H|^2 is such a sum with r the autocorrelation of the coefficients.
 * <p>
 * At w0 = 0, pi/3, pi/2, 2 pi/3 and pi the numbers 2 cos(k w0) are integers and 2 sin(k w0) are integers times 1 or
 * sqrt(3), so all derivatives are known exactly up to that positive factor. The first one that is not zero, d of
 * order m, decides the sign of the difference from the value at w0 by Taylor's theorem with Lagrange's remainder:
 * |difference - d x^m / m!| &lt;= R |x|^(m+1) / (m+1)! with R the sum of 2 |r[k]| k^(m+1), so the sign is that of d
 * x^m for |x| &lt; (m+1) |d| / R.
 */
final class Touch {

	/** The angles, in twelfths of a turn. */
	static final int[] TWELFTHS = { 0, 2, 3, 4, 6 };

	private static final int[] TWO_COS = { 2, 0, 1, 0, -1, 0, -2, 0, -1, 0, 1, 0 };
	private static final int[][] SINES = { { 0 }, {}, { 0, 1, 1, 0, -1, -1 }, { 0, 2, 0, -2 }, { 0, 1, -1 }, {},
			{ 0 } };

	private final BigInteger[] correlation;
	private final boolean ofSines;

	/** A sum of cosines or sines; without r[0] for sines. */
	Touch(BigInteger[] r, boolean sines) {
		this.correlation = r;
		this.ofSines = sines;
	}

	/** The squared magnitude of a filter, in squared units of the coefficients. */
	static Touch squareOf(ExactTaps taps) {
		int n = taps.length();
		BigInteger[] correlation = new BigInteger[n];
		for (int k = 0; k < n; k++) {
			BigInteger sum = BigInteger.ZERO;
			for (int i = 0; i + k < n; i++) {
				sum = sum.add(taps.integer(i).multiply(taps.integer(i + k)));
			}
			correlation[k] = sum;
		}
		return new Touch(correlation, false);
	}

	/** The value at an angle, exactly; for sines up to a positive factor. */
	BigInteger value(int twelfth) {
		BigInteger sum = ofSines ? BigInteger.ZERO : correlation[0];
		for (int k = 1; k < correlation.length; k++) {
			sum = sum.add(correlation[k].multiply(BigInteger.valueOf(derivative(0, k, twelfth))));
		}
		return sum;
	}

	/**
	 * The sign of the sum less its value at an angle, near that angle.
	 *
	 * @param below
	 *            sign at smaller angles
	 * @param above
	 *            sign at larger angles
	 * @param radius
	 *            distance in turns up to which the signs hold; infinite distance is null
	 */
	record Near(int below, int above, BigFraction radius) {
	}

	/** Examines the surroundings of an angle. */
	Near near(int twelfth) {
		int n = correlation.length;
		BigInteger[] weight = correlation.clone();
		for (int m = 1; m <= 2 * n; m++) {
			BigInteger derivative = BigInteger.ZERO;
			BigInteger rest = BigInteger.ZERO;
			for (int k = 1; k < n; k++) {
				BigInteger index = BigInteger.valueOf(k);
				weight[k] = weight[k].multiply(index);
				derivative = derivative.add(weight[k].multiply(BigInteger.valueOf(derivative(m, k, twelfth))));
				rest = rest.add(weight[k].abs().multiply(index));
			}
			if (derivative.signum() != 0) {
				int above = derivative.signum();
				// Half of the radius of the proof; 7 > 2 pi.
				BigFraction radius = new BigFraction(derivative.abs().multiply(BigInteger.valueOf(m + 1)),
						rest.multiply(BigInteger.valueOf(2 * 2 * 7)));
				return new Near(m % 2 == 0 ? above : -above, above, radius);
			}
		}
		// A trigonometric polynomial of degree n - 1 that vanishes 2n times at one place is zero.
		return new Near(0, 0, null);
	}

	// The m-th derivative of 2 cos(k w) or 2 sin(k w) at w0 over k^m, and over sqrt(3) where sines have that factor.
	private int derivative(int m, int k, int twelfth) {
		int cos = TWO_COS[(int) ((long) k * twelfth % 12)];
		int[] sines = SINES[twelfth];
		int sin = sines[k % sines.length];
		// The sine is the third derivative of the cosine.
		return switch (m + (ofSines ? 3 : 0) & 3) {
			case 0 -> cos;
			case 1 -> -sin;
			case 2 -> -cos;
			default -> sin;
		};
	}
}
