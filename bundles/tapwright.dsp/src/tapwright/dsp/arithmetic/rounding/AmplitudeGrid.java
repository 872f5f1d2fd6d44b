// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.design.Band;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * The weighted error of a linear-phase filter at many frequencies as a linear function of its free integers: error[i] = target[i]
 * - sum over k of row[i][k] q[k]. The free integers are the coefficients from the middle outwards.
 */
final class AmplitudeGrid {

	/** Grid points per coefficient over half the sample rate; what lies between is left to the judge. */
	private static final int DENSITY = 10;

	final int length;
	final LinearPhaseType type;
	final BigFraction unit;
	final double[][] rows;
	final double[] targets;
	final int unknowns;

	/**
	 * A grid over the bands.
	 *
	 * @param unit
	 *            what one step of the integers is worth
	 */
	AmplitudeGrid(List<Band> bands, int length, LinearPhaseType type, BigFraction unit) {
		this.length = length;
		this.type = type;
		this.unit = unit;
		unknowns = type.unknowns(length);
		double step = Rationals.nearest(unit);
		List<double[]> points = new ArrayList<>();
		List<Double> wanted = new ArrayList<>();
		for (Band band : bands) {
			int count = (int) Math.ceil((band.to() - band.from()) * 2 * DENSITY * length) + 2;
			for (int i = 0; i < count; i++) {
				// The last point is the edge itself, free of rounding.
				double f = i == count - 1 ? band.to() : band.from() + (band.to() - band.from()) * i / (count - 1);
				points.add(row(f, band.weight(f) * step));
				wanted.add(band.weight(f) * band.desired(f));
			}
		}
		rows = points.toArray(double[][]::new);
		targets = wanted.stream().mapToDouble(Double::doubleValue).toArray();
	}

	private double[] row(double frequency, double factor) {
		double[] row = new double[unknowns];
		for (int k = 0; k < unknowns; k++) {
			double angle = 2 * Math.PI * frequency * (type.firstHarmonic() + k);
			boolean middle = type == LinearPhaseType.I && k == 0;
			row[k] = factor * (type.zeroAtZero() ? 2 * Math.sin(angle) : middle ? 1 : 2 * Math.cos(angle));
		}
		return row;
	}

	/** The largest error on the grid. */
	double peak(long[] integers) {
		double peak = 0;
		for (double error : errors(integers)) {
			peak = Math.max(peak, Math.abs(error));
		}
		return peak;
	}

	/** All errors. */
	double[] errors(long[] integers) {
		double[] errors = targets.clone();
		for (int i = 0; i < errors.length; i++) {
			for (int k = 0; k < unknowns; k++) {
				errors[i] -= rows[i][k] * integers[k];
			}
		}
		return errors;
	}

	/** The filter that has these free integers. */
	ExactTaps taps(long[] integers) {
		BigInteger[] all = new BigInteger[length];
		Arrays.fill(all, BigInteger.ZERO);
		for (int k = 0; k < unknowns; k++) {
			BigInteger integer = BigInteger.valueOf(integers[k]);
			all[index(k)] = integer;
			all[length - 1 - index(k)] = type.zeroAtZero() ? integer.negate() : integer;
		}
		return ExactTaps.ofIntegers(List.of(all), unit);
	}

	// Position in the first half of the filter.
	private int index(int k) {
		int middle = type.oddLength() ? length / 2 : length / 2 - 1;
		return middle - (type == LinearPhaseType.III ? k + 1 : k);
	}
}
