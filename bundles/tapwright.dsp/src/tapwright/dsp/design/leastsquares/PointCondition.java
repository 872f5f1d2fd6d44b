// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.ArrayList;
import java.util.List;

/**
 * An exact demand on the amplitude at one frequency. Met up to the rounding of the coefficients.
 *
 * @param frequency
 *            in cycles per sample, 0 to 0.5
 * @param derivative
 *            which derivative by 2 pi f, 0 for the amplitude itself
 * @param value
 *            what it shall be
 */
public record PointCondition(double frequency, int derivative, double value) {

	private static final int HIGHEST = 40;

	/** Checks the numbers. */
	public PointCondition {
		if (!(frequency >= 0 && frequency <= 0.5)) {
			throw new IllegalArgumentException("a condition at " + frequency
					+ " cycles per sample; the frequency must lie between 0 and 0.5, half the sample rate");
		}
		if (derivative < 0 || derivative > HIGHEST) {
			throw new IllegalArgumentException("a condition on derivative " + derivative + "; it must be 0 to " + HIGHEST);
		}
		if (!Double.isFinite(value)) {
			throw new IllegalArgumentException("the condition at " + frequency + " asks for " + value + ", not a finite number");
		}
	}

	/** The amplitude at a frequency. */
	public static PointCondition gain(double frequency, double value) {
		return new PointCondition(frequency, 0, value);
	}

	/** A zero of the amplitude of the given multiplicity. */
	public static List<PointCondition> zero(double frequency, int multiplicity) {
		return derivatives(frequency, 0, multiplicity - 1);
	}

	/** Derivatives 1 to {@code order} of the amplitude are zero. */
	public static List<PointCondition> flat(double frequency, int order) {
		return derivatives(frequency, 1, order);
	}

	private static List<PointCondition> derivatives(double frequency, int first, int last) {
		List<PointCondition> conditions = new ArrayList<>();
		for (int order = first; order <= last; order++) {
			conditions.add(new PointCondition(frequency, order, 0));
		}
		return conditions;
	}

	/** The left side for {@link #scaledValue}. */
	double[] row(LinearPhaseBasis basis) {
		return basis.row(frequency, derivative);
	}

	/** The right side for {@link #row}. */
	double scaledValue(LinearPhaseBasis basis) {
		return value / Math.pow(basis.slopeScale(), derivative);
	}
}
