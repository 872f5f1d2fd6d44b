// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;

class BitTrueTest {

	private static final int CASES = Boolean.getBoolean("tapwright.thorough") ? 100_000 : 1_000;

	/** Reference: the package's description carried out in rational numbers, independently. */
	@Test
	void equalsTheDescriptionOnRandomStructuresAndFormats() {
		RandomFilters filters = new RandomFilters(20);
		int fast = 0;
		for (int n = 0; n < CASES; n++) {
			Arithmetic arithmetic = filters.arithmetic();
			ExactTaps taps = filters.taps(arithmetic.structure());
			BigInteger[] samples = filters.samples(arithmetic.input().orElseThrow(), 1 + filters.nextInt(30));
			List<BigFraction> expected = new ReferenceSimulation(taps, arithmetic, samples).outputs();
			BitTrue simulation = new BitTrue(taps, arithmetic);
			fast += simulation.isFast() ? 1 : 0;
			List<BigFraction> found = new ArrayList<>();
			int cut = filters.nextInt(samples.length + 1);
			for (BigInteger[] block : List.of(Arrays.copyOf(samples, cut), Arrays.copyOfRange(samples, cut, samples.length))) {
				for (BigInteger output : simulation.filter(block)) {
					found.add(simulation.outputStep().multiply(output));
				}
			}
			int index = n;
			assertEquals(expected, found, () -> "case " + index + ": " + arithmetic + " " + taps);
		}
		assertTrue(fast > CASES / 2 && fast < CASES, "both ways of computing were taken, fast " + fast + " times");
	}

	@Test
	void blocksOfAnySizeGiveTheSameOutputs() {
		Arithmetic arithmetic = new Arithmetic(Structure.POLYPHASE_DECIMATOR, Optional.empty(),
				Optional.of(new NumberFormat(16, 15)), Optional.empty(), Optional.of(new NumberFormat(40, 30)),
				Optional.of(new NumberFormat(16, 15)), Rounding.HALF_EVEN, Overflow.SATURATE, 3);
		double[] values = new Random(3).doubles(50, -0.1, 0.1).toArray();
		ExactTaps taps = new NumberFormat(16, 15).nearest(ExactTaps.ofDoubles(values));
		long[] samples = new Random(4).longs(20_000, -32768, 32768).toArray();
		long[] whole = new BitTrue(taps, arithmetic).filter(samples);
		BitTrue simulation = new BitTrue(taps, arithmetic);
		assertTrue(simulation.isFast());
		long[] parts = new long[0];
		for (int from = 0, size = 1; from < samples.length; from += size, size = size * 3 % 1009) {
			long[] next = simulation.filter(Arrays.copyOfRange(samples, from, Math.min(samples.length, from + size)));
			int before = parts.length;
			parts = Arrays.copyOf(parts, before + next.length);
			System.arraycopy(next, 0, parts, before, next.length);
		}
		assertArrayEquals(whole, parts);
		simulation.reset();
		assertArrayEquals(whole, simulation.filter(samples));
	}

	/** Identity: the response to a unit impulse is the set of coefficients. */
	@Test
	void impulseResponseIsTheCoefficients() {
		ExactTaps taps = ExactTaps.ofDoubles(1, -2, 3, 3, -2, 1);
		for (Structure structure : List.of(Structure.DIRECT, Structure.FOLDED, Structure.TRANSPOSED)) {
			BitTrue simulation = new BitTrue(taps, new Arithmetic(structure, Optional.empty(),
					Optional.of(new NumberFormat(8, 0)), Optional.empty(), Optional.empty(), Optional.empty(),
					Rounding.FLOOR, Overflow.WRAP));
			assertArrayEquals(new long[] { 1, -2, 3, 3, -2, 1, 0 }, simulation.filter(1, 0, 0, 0, 0, 0, 0));
		}
	}

	@Test
	void wideNumbersAreComputedInLongerIntegers() {
		Arithmetic arithmetic = new Arithmetic(Structure.DIRECT, Optional.empty(), Optional.of(new NumberFormat(100, 0)),
				Optional.empty(), Optional.empty(), Optional.empty(), Rounding.FLOOR, Overflow.WRAP);
		BitTrue simulation = new BitTrue(ExactTaps.ofDoubles(3, 1), arithmetic);
		assertFalse(simulation.isFast());
		BigInteger sample = BigInteger.ONE.shiftLeft(98);
		assertArrayEquals(new BigInteger[] { sample.multiply(BigInteger.valueOf(3)) }, simulation.filter(sample));
		assertThrows(ArithmeticException.class, () -> simulation.filter(Long.MAX_VALUE));
	}

	@Test
	void refusesSamplesOutsideTheInputFormat() {
		Arithmetic arithmetic = new Arithmetic(Structure.DIRECT, Optional.empty(), Optional.of(new NumberFormat(8, 7)),
				Optional.empty(), Optional.empty(), Optional.empty(), Rounding.FLOOR, Overflow.WRAP);
		BitTrue simulation = new BitTrue(ExactTaps.ofDoubles(1), arithmetic);
		String message = assertThrows(IllegalArgumentException.class, () -> simulation.filter(1, 128)).getMessage();
		assertEquals("sample 1 is 128; the input format (8 bits, 7 after the point) holds -128 to 127", message);
		assertThrows(IllegalArgumentException.class,
				() -> new BitTrue(ExactTaps.ofDoubles(1), Arithmetic.exact(Structure.DIRECT, 1)));
	}
}
