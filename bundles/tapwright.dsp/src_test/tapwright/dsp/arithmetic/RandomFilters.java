// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/** Small filters with random structures and formats. */
final class RandomFilters {

	private final Random random;

	RandomFilters(long seed) {
		random = new Random(seed);
	}

	Arithmetic arithmetic() {
		Structure structure = Structure.values()[random.nextInt(Structure.values().length)];
		int factor = switch (structure) {
		case DIRECT, FOLDED, TRANSPOSED -> 1;
		case HALF_BAND -> 1 + random.nextInt(2);
		case POLYPHASE_DECIMATOR, POLYPHASE_INTERPOLATOR -> 1 + random.nextInt(5);
		};
		return new Arithmetic(structure, Optional.empty(), Optional.of(format(12)), maybe(20), maybe(24), maybe(14),
				Rounding.values()[random.nextInt(Rounding.values().length)],
				Overflow.values()[random.nextInt(2)], factor);
	}

	/** Coefficients that the structure can run; now and then with a unit that is no power of two, or very long. */
	ExactTaps taps(Structure structure) {
		boolean symmetric = structure == Structure.FOLDED || structure == Structure.HALF_BAND;
		int length = structure == Structure.HALF_BAND ? 4 * random.nextInt(4) + 3 : 1 + random.nextInt(14);
		int bits = random.nextInt(20) == 0 ? 80 : 1 + random.nextInt(16);
		BigInteger[] integers = new BigInteger[length];
		Arrays.setAll(integers, k -> signed(bits));
		boolean odd = structure == Structure.FOLDED && random.nextBoolean();
		for (int k = 0; symmetric && k < length; k++) {
			int mirror = length - 1 - k;
			boolean zero = structure == Structure.HALF_BAND && k != mirror && (k - mirror) % 4 == 0 || odd && k == mirror;
			integers[k] = zero ? BigInteger.ZERO : k <= mirror ? integers[k] : odd ? integers[mirror].negate() : integers[mirror];
		}
		BigFraction unit = random.nextInt(10) == 0 ? new BigFraction(1, 1 + random.nextInt(40))
				: ExactTaps.powerOfTwo(-random.nextInt(16));
		return ExactTaps.ofIntegers(List.of(integers), unit);
	}

	/** Samples of the format, one in four at an end of the range. */
	BigInteger[] samples(NumberFormat format, int count) {
		BigInteger[] samples = new BigInteger[count];
		Arrays.setAll(samples, n -> switch (random.nextInt(8)) {
		case 0 -> format.min();
		case 1 -> format.max();
		default -> format.min().add(new BigInteger(format.word(), random));
		});
		return samples;
	}

	int nextInt(int bound) {
		return random.nextInt(bound);
	}

	private BigInteger signed(int bits) {
		return new BigInteger(bits + 1, random).subtract(BigInteger.ONE.shiftLeft(bits));
	}

	private Optional<NumberFormat> maybe(int longest) {
		return random.nextInt(3) == 0 ? Optional.empty() : Optional.of(format(longest));
	}

	private NumberFormat format(int longest) {
		int word = random.nextInt(25) == 0 ? 60 + random.nextInt(60) : 1 + random.nextInt(longest);
		return new NumberFormat(word, word - 4 + random.nextInt(8), random.nextInt(5) > 0);
	}
}
