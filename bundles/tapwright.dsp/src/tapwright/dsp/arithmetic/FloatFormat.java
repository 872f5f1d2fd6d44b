// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** The finite numbers of a binary interchange format of IEEE 754-2019, clause 3.6, subnormal ones included. */
public enum FloatFormat implements Format {
	/** binary16. */
	HALF(16, 11, 15),
	/** binary32. */
	SINGLE(32, 24, 127),
	/** binary64. */
	DOUBLE(64, 53, 1023);

	private final int word;
	private final int precision;
	private final int maxExponent;

	FloatFormat(int word, int precision, int maxExponent) {
		this.word = word;
		this.precision = precision;
		this.maxExponent = maxExponent;
	}

	@Override
	public int word() {
		return word;
	}

	/** Bits of the significand, the hidden one included. */
	public int precision() {
		return precision;
	}

	@Override
	public BigFraction minValue() {
		return maxValue().negate();
	}

	@Override
	public BigFraction maxValue() {
		BigInteger significand = BigInteger.ONE.shiftLeft(precision).subtract(BigInteger.ONE);
		return ExactTaps.powerOfTwo(maxExponent - precision + 1).multiply(significand);
	}

	/** The distance between numbers of the format around the value. */
	public BigFraction step(BigFraction value) {
		return ExactTaps.powerOfTwo(stepExponent(value));
	}

	/**
	 * {@inheritDoc}
	 *
	 * @throws IllegalArgumentException
	 *             when the value is out of range and asked to wrap, which floating point cannot do
	 */
	@Override
	public BigFraction represent(BigFraction value, Rounding rounding, Overflow overflow) {
		int exponent = stepExponent(value);
		BigInteger numerator = value.getNumerator();
		BigInteger denominator = value.getDenominator();
		BigInteger significand = exponent >= 0 ? rounding.divide(numerator, denominator.shiftLeft(exponent))
				: rounding.divide(numerator.shiftLeft(-exponent), denominator);
		BigFraction rounded = ExactTaps.powerOfTwo(exponent).multiply(significand);
		if (rounded.abs().compareTo(maxValue()) <= 0) {
			return rounded;
		}
		if (overflow == Overflow.WRAP) {
			throw new IllegalArgumentException("a number beyond the range of " + word
					+ "-bit floating point cannot wrap; let it saturate or scale the filter");
		}
		return value.getNumerator().signum() < 0 ? minValue() : maxValue();
	}

	@Override
	public ExactTaps nearest(ExactTaps taps) {
		int exponent = Integer.MAX_VALUE;
		List<BigFraction> rounded = new ArrayList<>(taps.length());
		for (int k = 0; k < taps.length(); k++) {
			rounded.add(represent(taps.tap(k), Rounding.HALF_EVEN, Overflow.SATURATE));
			exponent = Math.min(exponent, stepExponent(rounded.get(k)));
		}
		BigFraction unit = ExactTaps.powerOfTwo(exponent);
		return ExactTaps.ofIntegers(rounded.stream().map(tap -> tap.divide(unit).getNumerator()).toList(), unit);
	}

	private int stepExponent(BigFraction value) {
		int lowest = 2 - maxExponent - precision;
		if (value.getNumerator().signum() == 0) {
			return lowest;
		}
		BigInteger magnitude = value.getNumerator().abs();
		int exponent = magnitude.bitLength() - value.getDenominator().bitLength();
		// 2^(exponent-1) < |value| < 2^(exponent+1): one comparison settles the exponent of the leading bit.
		if (value.abs().compareTo(ExactTaps.powerOfTwo(exponent)) < 0) {
			exponent--;
		}
		return Math.max(lowest, exponent - precision + 1);
	}
}
