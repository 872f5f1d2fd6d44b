// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.Optional;

/** A {@link Requantizer} in machine words, for numbers whose range is known. */
final class LongStep {

	/** Numbers up to this size, and sums of two of them, fit a long. */
	static final BigInteger LIMIT = BigInteger.ONE.shiftLeft(62);

	private static final int LONGEST = 62;

	private final int shift;
	private final Rounding rounding;
	private final boolean limited;
	private final boolean saturates;
	private final boolean signed;
	private final long lowest;
	private final long highest;
	private final int unused;

	private LongStep(Requantizer step, boolean limited) {
		shift = step.shift().orElseThrow();
		rounding = step.rounding();
		this.limited = limited;
		saturates = step.overflow() == Overflow.SATURATE;
		signed = limited && step.range().get().signed();
		lowest = limited ? step.range().get().min().longValueExact() : 0;
		highest = limited ? step.range().get().max().longValueExact() : 0;
		unused = limited ? Long.SIZE - step.range().get().word() : 0;
	}

	/**
	 * The same step in machine words.
	 *
	 * @param magnitude
	 *            bound on the size of the numbers that will come
	 * @return nothing when machine words could be too short
	 */
	static Optional<LongStep> of(Requantizer step, BigInteger magnitude) {
		Optional<Integer> shift = step.shift();
		BigInteger after = step.round(magnitude).add(BigInteger.ONE);
		if (shift.isEmpty() || Math.abs(shift.get()) > LONGEST || magnitude.compareTo(LIMIT) > 0
				|| after.compareTo(LIMIT) > 0) {
			return Optional.empty();
		}
		boolean limited = step.range().isPresent() && !isWithin(step.range().get(), after);
		return limited && step.range().get().word() > LONGEST ? Optional.empty() : Optional.of(new LongStep(step, limited));
	}

	private static boolean isWithin(NumberFormat format, BigInteger magnitude) {
		return format.contains(magnitude) && format.contains(magnitude.negate());
	}

	/** Whether nothing but a shift to the left is ever done. */
	boolean isScaling() {
		return shift <= 0 && !limited;
	}

	long apply(long value) {
		long rounded = shift > 0 ? value + bias(value) >> shift : value << -shift;
		if (!limited) {
			return rounded;
		}
		if (saturates) {
			return Math.min(Math.max(rounded, lowest), highest);
		}
		return signed ? rounded << unused >> unused : rounded << unused >>> unused;
	}

	// What to add before the low bits are dropped, without a branch on the value; numbers are small enough for the sum to fit.
	private long bias(long value) {
		long half = 1L << shift - 1;
		return switch (rounding) {
		case FLOOR -> 0;
		case TOWARD_ZERO -> value >> Long.SIZE - 1 & (1L << shift) - 1;
		case HALF_UP -> half;
		case HALF_EVEN -> half - 1 + (value >> shift & 1);
		case HALF_AWAY -> half + (value >> Long.SIZE - 1);
		};
	}
}
