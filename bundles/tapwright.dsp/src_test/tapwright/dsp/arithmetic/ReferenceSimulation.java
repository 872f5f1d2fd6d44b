// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * The package's description of the operations taken literally, in rational numbers, on the whole signal at once. Shares no code
 * with the simulation under test: rounding is that of {@link BigDecimal}.
 */
final class ReferenceSimulation {

	private final ExactTaps taps;
	private final Arithmetic arithmetic;
	private final List<BigFraction> x = new ArrayList<>();

	ReferenceSimulation(ExactTaps taps, Arithmetic arithmetic, BigInteger[] samples) {
		this.taps = taps;
		this.arithmetic = arithmetic;
		NumberFormat input = arithmetic.input().orElseThrow();
		for (BigInteger sample : samples) {
			x.add(scale(new BigFraction(sample), -input.fraction()));
		}
	}

	/** All outputs as values. */
	List<BigFraction> outputs() {
		List<BigFraction> outputs = new ArrayList<>();
		int last = taps.length() - 1;
		int factor = arithmetic.factor();
		for (int n = 0; n < x.size(); n++) {
			switch (arithmetic.structure()) {
			case DIRECT -> outputs.add(finish(direct(n)));
			case FOLDED -> outputs.add(finish(folded(n, last)));
			case HALF_BAND -> {
				if (n % factor == 0) {
					outputs.add(finish(folded(n, last)));
				}
			}
			case POLYPHASE_DECIMATOR -> {
				if (n % factor == 0) {
					outputs.add(finish(direct(n)));
				}
			}
			case TRANSPOSED -> outputs.add(finish(register(n, 0)));
			case POLYPHASE_INTERPOLATOR -> {
				for (int branch = 0; branch < factor; branch++) {
					BigFraction sum = BigFraction.ZERO;
					for (int j = 0; branch + j * factor <= last; j++) {
						sum = add(sum, product(branch + j * factor, sample(n - j)));
					}
					outputs.add(finish(sum));
				}
			}
			}
		}
		return outputs;
	}

	private BigFraction direct(int n) {
		BigFraction sum = BigFraction.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			sum = add(sum, product(k, sample(n - k)));
		}
		return sum;
	}

	private BigFraction folded(int n, int last) {
		boolean odd = taps.symmetry() == Symmetry.ODD;
		BigFraction sum = BigFraction.ZERO;
		for (int k = 0; 2 * k < last; k++) {
			BigFraction other = sample(n - last + k);
			sum = add(sum, product(k, odd ? sample(n - k).subtract(other) : sample(n - k).add(other)));
		}
		return last % 2 == 0 ? add(sum, product(last / 2, sample(n - last / 2))) : sum;
	}

	// What enters register k (or the output, for k = 0) at time n.
	private BigFraction register(int n, int k) {
		if (n < 0 || k == taps.length()) {
			return BigFraction.ZERO;
		}
		return add(register(n - 1, k + 1), product(k, sample(n)));
	}

	private BigFraction sample(int n) {
		return n < 0 ? BigFraction.ZERO : x.get(n);
	}

	private BigFraction product(int k, BigFraction sample) {
		BigFraction product = taps.tap(k).multiply(sample);
		if (arithmetic.product().isPresent()) {
			product = limit(round(product, arithmetic.product().get()), arithmetic.product().get());
		}
		return arithmetic.accumulator().isPresent() ? round(product, arithmetic.accumulator().get()) : product;
	}

	private BigFraction add(BigFraction sum, BigFraction product) {
		Optional<NumberFormat> format = arithmetic.accumulator();
		BigFraction total = sum.add(product);
		return format.isPresent() ? limit(total, format.get()) : total;
	}

	private BigFraction finish(BigFraction sum) {
		Optional<NumberFormat> format = arithmetic.output();
		return format.isPresent() ? limit(round(sum, format.get()), format.get()) : sum;
	}

	private BigFraction round(BigFraction value, NumberFormat format) {
		BigFraction steps = scale(value, format.fraction());
		BigDecimal numerator = new BigDecimal(steps.getNumerator());
		BigDecimal denominator = new BigDecimal(steps.getDenominator());
		BigDecimal two = BigDecimal.valueOf(2);
		BigDecimal rounded = switch (arithmetic.rounding()) {
		case TOWARD_ZERO -> numerator.divide(denominator, 0, RoundingMode.DOWN);
		case FLOOR -> numerator.divide(denominator, 0, RoundingMode.FLOOR);
		case HALF_UP -> numerator.multiply(two).add(denominator).divide(denominator.multiply(two), 0, RoundingMode.FLOOR);
		case HALF_EVEN -> numerator.divide(denominator, 0, RoundingMode.HALF_EVEN);
		case HALF_AWAY -> numerator.divide(denominator, 0, RoundingMode.HALF_UP);
		};
		return scale(new BigFraction(rounded.toBigIntegerExact()), -format.fraction());
	}

	private BigFraction limit(BigFraction value, NumberFormat format) {
		BigFraction width = scale(new BigFraction(2), format.word() - 1 - format.fraction());
		BigFraction step = scale(BigFraction.ONE, -format.fraction());
		BigFraction low = format.signed() ? width.divide(2).negate() : BigFraction.ZERO;
		BigFraction high = low.add(width).subtract(step);
		if (value.compareTo(low) >= 0 && value.compareTo(high) <= 0) {
			return value;
		}
		if (arithmetic.overflow() == Overflow.SATURATE) {
			return value.compareTo(low) < 0 ? low : high;
		}
		BigInteger turns = round(value.subtract(low).divide(width));
		return value.subtract(width.multiply(turns));
	}

	private static BigInteger round(BigFraction turns) {
		return new BigDecimal(turns.getNumerator()).divide(new BigDecimal(turns.getDenominator()), 0, RoundingMode.FLOOR)
				.toBigIntegerExact();
	}

	private static BigFraction scale(BigFraction value, int exponent) {
		BigInteger power = BigInteger.TWO.pow(Math.abs(exponent));
		return exponent >= 0 ? value.multiply(power) : value.divide(power);
	}
}
