// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/**
 * The reciprocal of a sloping limit as a Taylor polynomial on a part of a cell, in double precision. Work space of
 * one thread.
 * <p>
 * A limit straight over frequency has an exponential for reciprocal, one straight over its logarithm a power of
 * frequency. The remainder is Lagrange's form of the rest of the exponential or binomial series.
 */
final class LocalSlope {

	private static final double UNIT = 0x1p-53;
	private static final double NEPERS = StrictMath.log(10) / 20;
	private static final int TERMS = TaylorCells.TERMS;
	/** A remainder below this part of the whole is not worth splitting for. */
	private static final double SMALL = 1e-15;

	private final double[] series = new double[TERMS];
	private double relativeRemainder;
	private double remainder;
	private double size;

	/** Bound on the reciprocal's (or its square's) absolute value. */
	double size() {
		return size;
	}

	/** Bound on the truncation error. */
	double remainder() {
		return remainder;
	}

	/** Whether a narrower part would have a much smaller error. */
	boolean isTooWide() {
		return !(relativeRemainder <= SMALL);
	}

	/**
	 * Bound on the relative error of the series' coefficients: from the place, the interpolated level, the power and
	 * the slope, each a few roundings.
	 */
	static double doubt(LimitLine line) {
		double rise = Math.abs(line.toDb() - line.fromDb());
		double largest = Math.max(Math.abs(line.fromDb()), Math.abs(line.toDb()));
		double lever = line.logarithmic() ? 1 + 1 / Math.log(line.to() / line.from()) : line.to() / (line.to()
				- line.from());
		return UNIT * (32 + NEPERS * (16 * rise * lever + 8 * largest));
	}

	/**
	 * Makes the series.
	 *
	 * @param turns
	 *            centre in cycles per sample
	 * @param width
	 *            distance from the centre to the ends in cycles per sample
	 * @param squared
	 *            whether the square is wanted
	 */
	void make(LimitLine line, double sampleRate, double turns, double width, boolean squared) {
		double rise = (squared ? 2 : 1) * NEPERS * (line.toDb() - line.fromDb());
		double level = line.at(turns * sampleRate);
		series[0] = StrictMath.pow(10, -level / (squared ? 10 : 20));
		if (line.logarithmic()) {
			relativeRemainder = power(rise / Math.log(line.to() / line.from()), width / turns);
		} else {
			relativeRemainder = exponential(-rise * (width * sampleRate / (line.to() - line.from())));
		}
		size = 0;
		for (double term : series) {
			size += Math.abs(term);
		}
		remainder = relativeRemainder * size;
		size += remainder;
	}

	private double exponential(double rate) {
		for (int m = 1; m < TERMS; m++) {
			series[m] = series[m - 1] * rate / m;
		}
		double rest = Math.abs(series[TERMS - 1] / series[0] * rate / TERMS);
		return rest * StrictMath.exp(Math.abs(rate)) * 1.001;
	}

	private double power(double exponent, double ratio) {
		for (int m = 1; m < TERMS; m++) {
			series[m] = series[m - 1] * (-exponent - m + 1) * ratio / m;
		}
		if (!(ratio < 0.5)) {
			return Double.POSITIVE_INFINITY;
		}
		double rest = Math.abs(series[TERMS - 1] / series[0] * (-exponent - TERMS + 1) * ratio / TERMS);
		return rest * Math.max(StrictMath.pow(1 - ratio, -exponent - TERMS), StrictMath.pow(1 + ratio, -exponent
				- TERMS)) * 1.001;
	}

	/** Multiplies a polynomial by the series; returns the new number of coefficients. */
	int multiply(double[] c, int n) {
		for (int k = n + TERMS - 2; k >= 0; k--) {
			double value = 0;
			for (int i = Math.max(0, k - TERMS + 1); i <= Math.min(k, n - 1); i++) {
				value += c[i] * series[k - i];
			}
			c[k] = value;
		}
		return n + TERMS - 1;
	}
}
