// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** The exact step response, in units of the coefficients and with the sign that makes its final value positive. */
final class StepResponse {

	private static final int PERCENT = 100;

	private final BigInteger[] values;

	StepResponse(ExactTaps taps) {
		values = new BigInteger[taps.length()];
		BigInteger sum = BigInteger.ZERO;
		for (int n = 0; n < values.length; n++) {
			sum = sum.add(taps.integer(n));
			values[n] = sum;
		}
		if (sum.signum() == 0) {
			throw new IllegalArgumentException("the step response ends at zero, so nothing can be stated relative to its "
					+ "final "
					+ "value; step requirements suit filters that pass 0 Hz");
		}
		if (sum.signum() < 0) {
			for (int n = 0; n < values.length; n++) {
				values[n] = values[n].negate();
			}
		}
	}

	int length() {
		return values.length;
	}

	/** Value less the final value, in per cent of the final value. */
	BigFraction error(int n) {
		BigInteger last = values[values.length - 1];
		return new BigFraction(values[n].subtract(last).multiply(BigInteger.valueOf(PERCENT)), last);
	}

	/** Index of the largest value. */
	int highest() {
		int place = 0;
		for (int n = 1; n < values.length; n++) {
			place = values[n].compareTo(values[place]) > 0 ? n : place;
		}
		return place;
	}

	/** Index of the smallest value. */
	int lowest() {
		int place = 0;
		for (int n = 1; n < values.length; n++) {
			place = values[n].compareTo(values[place]) < 0 ? n : place;
		}
		return place;
	}
}
