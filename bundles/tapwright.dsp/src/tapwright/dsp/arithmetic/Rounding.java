// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;

/** How a number that lies between two steps of a format is brought to one of them. */
public enum Rounding {
	/** To the step nearer to zero: truncation of the magnitude. */
	TOWARD_ZERO,
	/** To the lower step: truncation of two's complement bits. */
	FLOOR,
	/** To the nearest step, ties upward. */
	HALF_UP,
	/** To the nearest step, ties to the even one. */
	HALF_EVEN,
	/** To the nearest step, ties away from zero. */
	HALF_AWAY;

	/**
	 * The integer that numerator / denominator is rounded to, exactly.
	 *
	 * @param denominator
	 *            positive
	 * @throws IllegalArgumentException
	 *             when the denominator is not positive
	 */
	public BigInteger divide(BigInteger numerator, BigInteger denominator) {
		if (denominator.signum() <= 0) {
			throw new IllegalArgumentException("the divisor is " + denominator + "; it must be positive");
		}
		BigInteger[] quotient = numerator.divideAndRemainder(denominator);
		BigInteger floor = quotient[1].signum() < 0 ? quotient[0].subtract(BigInteger.ONE) : quotient[0];
		BigInteger above = numerator.subtract(floor.multiply(denominator));
		if (above.signum() == 0) {
			return floor;
		}
		int half = above.shiftLeft(1).compareTo(denominator);
		return roundsUp(half, numerator.signum() < 0, floor.testBit(0)) ? floor.add(BigInteger.ONE) : floor;
	}

	// For a number strictly between two steps: 'half' compares its distance from the lower one with half a step.
	private boolean roundsUp(int half, boolean negative, boolean floorIsOdd) {
		return switch (this) {
		case TOWARD_ZERO -> negative;
		case FLOOR -> false;
		case HALF_UP -> half >= 0;
		case HALF_EVEN -> half > 0 || half == 0 && floorIsOdd;
		case HALF_AWAY -> half > 0 || half == 0 && !negative;
		};
	}
}
