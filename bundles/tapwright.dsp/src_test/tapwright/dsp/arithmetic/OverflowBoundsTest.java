// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;

import tapwright.dsp.exact.ExactTaps;

class OverflowBoundsTest {

	private static final int CASES = Boolean.getBoolean("tapwright.thorough") ? 20_000 : 400;

	/** The quadratic five-point smoothing weights of A. Savitzky and M. J. E. Golay, Analytical Chemistry 36(8), 1964. */
	private static final ExactTaps SMOOTHING = ExactTaps.ofIntegers(
			List.of(-3, 12, 17, 12, -3).stream().map(BigInteger::valueOf).toList(), new BigFraction(1, 35));

	/** Sums of the positive and of the negative coefficients, worked out by hand. */
	@Test
	void rangeOfASmoothingFilterForSixteenBitSamples() {
		NumberFormat shorts = new NumberFormat(16, 0);
		OverflowBounds bounds = new OverflowBounds(SMOOTHING, arithmetic(Structure.DIRECT, shorts, Optional.empty()));
		NodeRange output = bounds.nodes().getLast();
		assertEquals(BigInteger.valueOf(1540055), output.max());
		assertEquals(BigInteger.valueOf(-1540090), output.min());
		assertTrue(bounds.isFree());
		assertEquals(new BigFraction(47, 35), Gains.of(SMOOTHING).absoluteSum());
		assertEquals(1, Gains.of(SMOOTHING).guardBits());
		assertEquals(new BigFraction(35, 47), Gains.of(SMOOTHING).safeScale());
	}

	/** The worst-case input, run bit for bit, ends exactly at the bound; no random input goes beyond. */
	@Test
	void worstCaseInputReachesTheBoundOfEveryOutput() {
		RandomFilters filters = new RandomFilters(5);
		int reached = 0;
		for (int n = 0; n < CASES; n++) {
			Arithmetic random = filters.arithmetic();
			ExactTaps taps = filters.taps(random.structure());
			OverflowBounds bounds = new OverflowBounds(taps, random);
			for (NodeRange node : bounds.nodes()) {
				if (node.kind() == NodeRange.Kind.OUTPUT && bounds.isFree()) {
					assertEquals(node.max(), last(taps, random, node, bounds.worstInput(node, true)));
					assertEquals(node.min(), last(taps, random, node, bounds.worstInput(node, false)));
					reached++;
				}
			}
			if (bounds.isFree()) {
				NodeRange lowest = bounds.nodes().getLast();
				for (BigInteger output : new BitTrue(taps, random).filter(filters.samples(random.input().get(), 40))) {
					assertTrue(bounds.nodes().stream().filter(node -> node.kind() == NodeRange.Kind.OUTPUT)
							.anyMatch(node -> node.min().compareTo(output) <= 0 && output.compareTo(node.max()) <= 0),
							() -> output + " beyond " + lowest);
				}
			}
		}
		assertTrue(reached > CASES / 20);
	}

	private static BigInteger last(ExactTaps taps, Arithmetic arithmetic, NodeRange node, BigInteger[] samples) {
		BigInteger[] outputs = new BitTrue(taps, arithmetic).filter(samples);
		return outputs[outputs.length - arithmetic.interpolation() + node.phase()];
	}

	/** In an exact filter that ends at the node, the node is the output. */
	@Test
	void worstCaseInputReachesTheBoundOfEverySumOnTheWay() {
		ExactTaps taps = ExactTaps.ofDoubles(3, -5, 7, -1, 2);
		NumberFormat bytes = new NumberFormat(8, 0);
		for (Structure structure : List.of(Structure.DIRECT, Structure.TRANSPOSED)) {
			Arithmetic arithmetic = arithmetic(structure, bytes, Optional.empty());
			OverflowBounds bounds = new OverflowBounds(taps, arithmetic);
			for (NodeRange node : bounds.nodes().stream().filter(each -> each.kind() == NodeRange.Kind.SUM).toList()) {
				double[] all = taps.toDoubles();
				double[] part = structure == Structure.DIRECT ? Arrays.copyOf(all, node.index() + 1)
						: Arrays.copyOfRange(all, node.index(), all.length);
				ExactTaps partial = ExactTaps.ofDoubles(part);
				BigFraction step = arithmetic.stored(partial).unit();
				for (boolean largest : new boolean[] { true, false }) {
					BigInteger[] outputs = new BitTrue(partial, arithmetic).filter(bounds.worstInput(node, largest));
					assertEquals(new BigFraction(largest ? node.max() : node.min()),
							step.multiply(outputs[outputs.length - 1]));
				}
			}
		}
	}

	@Test
	void saturationNeedsEverySumToFitAndWrappingOnlyTheLast() {
		ExactTaps taps = ExactTaps.ofDoubles(1, 1, -1);
		NumberFormat bytes = new NumberFormat(8, 0);
		// 127 + 127 + 128 needs ten bits; with nine, the last sum overflows either way.
		assertFalse(new OverflowBounds(taps, arithmetic(Structure.DIRECT, bytes, Optional.of(new NumberFormat(9, 0)))).isFree());
		assertTrue(new OverflowBounds(taps, arithmetic(Structure.DIRECT, bytes, Optional.of(new NumberFormat(10, 0)))).isFree());
		assertEquals(new NumberFormat(10, 0),
				new OverflowBounds(taps, arithmetic(Structure.DIRECT, bytes, Optional.empty())).sufficientAccumulator());
		OverflowBounds tight = new OverflowBounds(taps, arithmetic(Structure.DIRECT, bytes, Optional.of(new NumberFormat(9, 0))));
		assertEquals(new BigFraction(255, 382), tight.largestGain().orElseThrow());
	}

	@Test
	void overflowingWorstCaseInputReallyOverflows() {
		Arithmetic narrow = arithmetic(Structure.FOLDED, new NumberFormat(8, 0), Optional.of(new NumberFormat(8, 0)));
		ExactTaps even = ExactTaps.ofDoubles(1, 1, 1);
		OverflowBounds bounds = new OverflowBounds(even, narrow);
		NodeRange first = bounds.overflows().get(0);
		BigInteger[] samples = bounds.worstInput(first, true);
		BigInteger[] outputs = new BitTrue(even, narrow).filter(samples);
		assertEquals(BigInteger.valueOf(127), outputs[outputs.length - 1]);
		assertEquals(BigInteger.valueOf(254), first.max());
	}

	/** A moving average passes a constant with gain 1 and has absolute sum 1: the bounds agree within half a percent. */
	@Test
	void sineBoundsEncloseTheGainOfAMovingAverage() {
		ExactTaps average = ExactTaps.ofDoubles(0.25, 0.25, 0.25, 0.25);
		List<Double> gains = SineBounds.gains(average, Arithmetic.exact(Structure.DIRECT, 1));
		for (int n = 0; n < 4; n++) {
			assertTrue(gains.get(n) >= 0.25 * (n + 1) && gains.get(n) <= 0.25 * (n + 1) * 1.005);
		}
	}

	/** For 1, 1, -1 the squared gain |1 + e^-iw - e^-2iw|^2 is 3 - 2 cos 2w, at most 5. */
	@Test
	void sinusoidsNeedLessRoomThanArbitraryInputs() {
		ExactTaps taps = ExactTaps.ofDoubles(1, 1, -1);
		List<Double> gains = SineBounds.gains(taps, Arithmetic.exact(Structure.DIRECT, 1));
		assertEquals(Math.sqrt(5), gains.get(2), 0.012);
		assertTrue(gains.get(2) >= Math.sqrt(5));
		Arithmetic nine = arithmetic(Structure.DIRECT, new NumberFormat(8, 0), Optional.of(new NumberFormat(9, 0)));
		assertTrue(SineBounds.isFree(taps, nine, BigInteger.valueOf(110)));
		assertFalse(SineBounds.isFree(taps, nine, BigInteger.valueOf(127)));
	}

	@Test
	void partsOfTheGraphAreThoseThatTheCostCounts() {
		RandomFilters filters = new RandomFilters(6);
		for (int n = 0; n < 200; n++) {
			Arithmetic arithmetic = filters.arithmetic();
			ExactTaps taps = filters.taps(arithmetic.structure());
			SignalGraph graph = SignalGraph.of(taps, arithmetic);
			Cost cost = Cost.of(taps, arithmetic);
			assertEquals(cost.multiplies(), graph.count(SignalGraph.Kind.MULTIPLIER));
			assertEquals(cost.adds(), graph.count(SignalGraph.Kind.ADDER));
			assertEquals(cost.delayWords(), graph.count(SignalGraph.Kind.DELAY));
			List<Integer> inputs = new ArrayList<>();
			graph.edges().forEach(edge -> inputs.add(edge.to()));
			for (int node = 0; node < graph.nodes().size(); node++) {
				int number = node;
				long lines = inputs.stream().filter(to -> to == number).count();
				if (graph.nodes().get(node).kind() == SignalGraph.Kind.ADDER) {
					assertEquals(2, lines);
				}
			}
		}
	}

	private static Arithmetic arithmetic(Structure structure, NumberFormat input, Optional<NumberFormat> accumulator) {
		return new Arithmetic(structure, Optional.empty(), Optional.of(input), Optional.empty(), accumulator, Optional.empty(),
				Rounding.FLOOR, Overflow.SATURATE);
	}
}
