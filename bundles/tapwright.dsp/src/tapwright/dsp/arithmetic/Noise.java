// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;

/**
 * What rounding inside a filter adds to its output, in the output's unit; overflow is left aside.
 *
 * <p>
 * Every rounding error reaches the output undelayed or delayed, but with gain 1. The bound adds the largest possible errors; it
 * holds for every input. Mean and variance are those of the usual model, in which the bits that are dropped are uniformly
 * distributed and independent of each other and of sign and parity: B. Widrow, A study of rough amplitude quantization by means of
 * Nyquist sampling theory, IRE Transactions on Circuit Theory 3(4), 1956. Where products are rounded toward zero the model is
 * poor, since their errors follow the signs of the products.
 *
 * @param bound
 *            no output differs by more than this from exact arithmetic
 * @param mean
 *            expected error
 * @param variance
 *            expected square of the error less its mean's square
 */
public record Noise(BigFraction bound, BigFraction mean, BigFraction variance) {

	/** No noise at all. */
	public static final Noise NONE = new Noise(BigFraction.ZERO, BigFraction.ZERO, BigFraction.ZERO);

	/**
	 * The rounding noise of a filter; of an interpolator, that of the noisiest branch.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients or no input format is stated
	 */
	public static Noise of(ExactTaps taps, Arithmetic arithmetic) {
		ExactTaps stored = arithmetic.stored(taps);
		Datapath path = Datapath.of(stored, arithmetic);
		Noise worst = NONE;
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			Noise noise = ofBranch(stored, arithmetic, path, arithmetic.terms(stored, phase));
			worst = noise.power().compareTo(worst.power()) > 0 ? noise : worst;
		}
		return worst;
	}

	private static Noise ofBranch(ExactTaps taps, Arithmetic arithmetic, Datapath path, List<Term> terms) {
		Rounding rounding = arithmetic.rounding();
		BigFraction exactStep = taps.unit().multiply(path.input().step());
		BigFraction productStep = arithmetic.product().map(NumberFormat::step).orElse(exactStep);
		Noise noise = NONE;
		BigFraction sumStep = BigFraction.ZERO;
		for (Term term : terms) {
			BigInteger coefficient = taps.integer(term.tap());
			if (coefficient.signum() != 0) {
				// The product of a coefficient with trailing zeros has so many bits less to drop.
				BigFraction step = exactStep.multiply(coefficient.abs());
				noise = noise.plus(rounded(step, productStep, rounding, arithmetic.product()));
				BigFraction then = arithmetic.product().isPresent() && !isMultiple(step, productStep) ? productStep : step;
				noise = noise.plus(rounded(then, path.sumStep(), rounding, arithmetic.accumulator()));
				sumStep = common(sumStep, isMultiple(then, path.sumStep()) ? then : path.sumStep());
			}
		}
		return sumStep.equals(BigFraction.ZERO) ? noise
				: noise.plus(rounded(sumStep, path.outputStep(), rounding, arithmetic.output()));
	}

	// The largest step of which both are multiples.
	private static BigFraction common(BigFraction a, BigFraction b) {
		BigInteger left = a.getNumerator().multiply(b.getDenominator());
		BigInteger right = b.getNumerator().multiply(a.getDenominator());
		return new BigFraction(left.gcd(right), a.getDenominator().multiply(b.getDenominator()));
	}

	private static boolean isMultiple(BigFraction step, BigFraction of) {
		return step.divide(of).getDenominator().equals(BigInteger.ONE);
	}

	// Rounding of multiples of one step to multiples of another.
	private static Noise rounded(BigFraction from, BigFraction to, Rounding rounding, Optional<NumberFormat> format) {
		BigInteger parts = from.divide(to).getDenominator();
		return format.isEmpty() || parts.equals(BigInteger.ONE) ? NONE : uniform(parts, rounding).times(to);
	}

	/**
	 * The error of rounding numbers that lie on any of {@code parts} equally likely places in a step to whole steps, in steps.
	 *
	 * @param parts
	 *            at least 1
	 */
	static Noise uniform(BigInteger parts, Rounding rounding) {
		BigFraction one = BigFraction.ONE;
		BigFraction part = new BigFraction(BigInteger.ONE, parts);
		BigFraction squaredPart = part.multiply(part);
		BigFraction half = new BigFraction(1, 2);
		BigFraction twelfth = new BigFraction(1, 12);
		BigFraction base = one.subtract(squaredPart).multiply(twelfth);
		boolean ties = !parts.testBit(0);
		BigFraction nearest = ties ? half : half.subtract(part.multiply(half));
		return switch (rounding) {
		case FLOOR -> new Noise(one.subtract(part), one.subtract(part).multiply(half).negate(), base);
		// The mean square of floor; the sign of the number makes the mean zero.
		case TOWARD_ZERO -> new Noise(one.subtract(part), BigFraction.ZERO,
				base.add(one.subtract(part).multiply(half).multiply(one.subtract(part).multiply(half))));
		case HALF_UP -> new Noise(nearest, ties ? part.multiply(half) : BigFraction.ZERO, base);
		case HALF_EVEN, HALF_AWAY -> new Noise(nearest, BigFraction.ZERO,
				ties ? base.add(squaredPart.multiply(new BigFraction(1, 4))) : base);
		};
	}

	/** Expected power: variance and square of the mean. */
	public BigFraction power() {
		return variance.add(mean.multiply(mean));
	}

	/** Expected power in decibels relative to a square wave between plus and minus full scale; negative infinity for none. */
	public double decibels(BigFraction fullScale) {
		return 10 * Math.log10(Rationals.nearest(power().divide(fullScale.multiply(fullScale))));
	}

	/** Bound on the power of every input's error in decibels relative to a square wave of full scale. */
	public double boundDecibels(BigFraction fullScale) {
		return 20 * Math.log10(Rationals.nearest(bound.divide(fullScale)));
	}

	/** Noise from two independent sources. */
	public Noise plus(Noise other) {
		return new Noise(bound.add(other.bound), mean.add(other.mean), variance.add(other.variance));
	}

	/** This noise after a filter, where every sample of it counts as independent of the others. */
	public Noise through(ExactTaps taps) {
		BigFraction sum = BigFraction.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			sum = sum.add(taps.tap(k));
		}
		Gains gains = Gains.of(taps);
		return new Noise(bound.multiply(gains.absoluteSum()), mean.multiply(sum), variance.multiply(gains.energy()));
	}

	private Noise times(BigFraction step) {
		return new Noise(bound.multiply(step), mean.multiply(step), variance.multiply(step).multiply(step));
	}
}
