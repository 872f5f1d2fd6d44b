// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * The exact ranges of all nodes of a filter over every input of its input format, and inputs that reach them.
 *
 * <p>
 * Rounding never lets a larger number become the smaller one, so that each product is least and largest at an end of the sample's
 * range. The products of one sum come from different samples, which can take their ends independently; so the range of a sum is
 * from the sum of the least to the sum of the largest products. Both are reached. A node that comes after one that overflows is
 * bounded as if that one had saturated; its bounds are then safe but need not be reached.
 */
public final class OverflowBounds {

	private final ExactTaps taps;
	private final Arithmetic arithmetic;
	private final Datapath path;
	private final List<NodeRange> nodes = new ArrayList<>();

	/**
	 * Computes the ranges.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients or no input format is stated
	 */
	public OverflowBounds(ExactTaps taps, Arithmetic arithmetic) {
		this.taps = arithmetic.stored(taps);
		this.arithmetic = arithmetic;
		path = Datapath.of(taps, arithmetic);
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			addNodes(phase);
		}
	}

	private void addNodes(int phase) {
		List<Term> terms = arithmetic.terms(taps, phase);
		boolean transposed = arithmetic.structure() == Structure.TRANSPOSED;
		BigInteger low = BigInteger.ZERO;
		BigInteger high = BigInteger.ZERO;
		for (int n = 0; n < terms.size(); n++) {
			int index = transposed ? terms.size() - 1 - n : n;
			BigInteger[] ends = exactProduct(terms.get(index));
			BigInteger least = path.product().round(ends[0]);
			BigInteger largest = path.product().round(ends[1]);
			if (arithmetic.product().isPresent()) {
				var product = new NodeRange(NodeRange.Kind.PRODUCT, phase, index, least, largest,
						arithmetic.product().get().step(), arithmetic.product(), true);
				nodes.add(product);
				least = held(product)[0];
				largest = held(product)[1];
			}
			low = low.add(path.align().round(least));
			high = high.add(path.align().round(largest));
			boolean last = n == terms.size() - 1;
			var sum = new NodeRange(NodeRange.Kind.SUM, phase, index, low, high, path.sumStep(), arithmetic.accumulator(),
					last || arithmetic.overflow() == Overflow.SATURATE);
			nodes.add(sum);
			if (last || arithmetic.overflow() == Overflow.SATURATE) {
				low = held(sum)[0];
				high = held(sum)[1];
			}
		}
		nodes.add(new NodeRange(NodeRange.Kind.OUTPUT, phase, 0, path.output().round(low), path.output().round(high),
				path.outputStep(), arithmetic.output(), true));
	}

	// What comes out of a node: its range, or what its format lets through.
	private BigInteger[] held(NodeRange node) {
		if (node.fits()) {
			return new BigInteger[] { node.min(), node.max() };
		}
		NumberFormat format = node.format().orElseThrow();
		return arithmetic.overflow() == Overflow.WRAP ? new BigInteger[] { format.min(), format.max() }
				: new BigInteger[] { format.fit(node.min(), Overflow.SATURATE), format.fit(node.max(), Overflow.SATURATE) };
	}

	private BigInteger[] exactProduct(Term term) {
		BigInteger coefficient = taps.integer(term.tap());
		BigInteger low = path.input().min();
		BigInteger high = path.input().max();
		BigInteger least = term.sign() == 0 ? low : term.sign() > 0 ? low.add(low) : low.subtract(high);
		BigInteger largest = term.sign() == 0 ? high : term.sign() > 0 ? high.add(high) : high.subtract(low);
		return coefficient.signum() >= 0 ? new BigInteger[] { coefficient.multiply(least), coefficient.multiply(largest) }
				: new BigInteger[] { coefficient.multiply(largest), coefficient.multiply(least) };
	}

	/** All nodes in order of computation. */
	public List<NodeRange> nodes() {
		return List.copyOf(nodes);
	}

	/** Whether no input of the input format can make an output wrong by overflow. */
	public boolean isFree() {
		return nodes.stream().allMatch(node -> node.fits() || !node.decisive());
	}

	/** Nodes that overflow for some input and spoil the output. */
	public List<NodeRange> overflows() {
		return nodes.stream().filter(node -> node.decisive() && !node.fits()).toList();
	}

	/**
	 * The shortest signed accumulator of the present step in which no sum overflows.
	 *
	 * @throws IllegalArgumentException
	 *             when the steps of the accumulator are no power of two, or it would exceed the longest word
	 */
	public NumberFormat sufficientAccumulator() {
		int bits = nodes.stream().filter(node -> node.kind() == NodeRange.Kind.SUM && node.decisive())
				.mapToInt(NodeRange::signedBits).max().orElse(1);
		BigFraction step = path.sumStep();
		int shift = new Requantizer(step, Rounding.FLOOR, Optional.empty(), Overflow.WRAP).shift()
				.orElseThrow(() -> new IllegalArgumentException(
						"one step of the sums is " + path.sumStep() + ", no power of two; state an accumulator format"));
		return new NumberFormat(bits, shift);
	}

	/**
	 * The largest factor by which all coefficients could be multiplied, rounding aside, before a decisive node overflows: below 1
	 * when it does already. Empty when nothing limits it.
	 */
	public Optional<BigFraction> largestGain() {
		return nodes.stream().filter(NodeRange::decisive).flatMap(node -> node.format().stream().flatMap(format -> {
			List<BigFraction> gains = new ArrayList<>();
			if (node.max().signum() > 0) {
				gains.add(new BigFraction(format.max(), node.max()));
			}
			if (node.min().signum() < 0) {
				gains.add(new BigFraction(format.min(), node.min()));
			}
			return gains.stream();
		})).min(BigFraction::compareTo);
	}

	/**
	 * Input samples, oldest first, after which the node of a filter at rest is at an end of its range; the last sample is the one
	 * that is being processed.
	 *
	 * @param largest
	 *            the upper end, otherwise the lower
	 */
	public BigInteger[] worstInput(NodeRange node, boolean largest) {
		List<Term> terms = arithmetic.terms(taps, node.phase());
		boolean transposed = arithmetic.structure() == Structure.TRANSPOSED;
		boolean sum = node.kind() == NodeRange.Kind.SUM;
		int from = node.kind() == NodeRange.Kind.PRODUCT || transposed && sum ? node.index() : 0;
		int to = node.kind() == NodeRange.Kind.OUTPUT || transposed && sum ? terms.size() - 1 : node.index();
		int shift = transposed ? from : 0;
		int oldest = 0;
		for (Term term : terms) {
			oldest = Math.max(oldest, Math.max(term.delay(), term.mirror()));
		}
		BigInteger[] samples = new BigInteger[oldest + 1 + padding(oldest)];
		Arrays.fill(samples, BigInteger.ZERO);
		for (Term term : terms.subList(from, Math.min(to + 1, terms.size()))) {
			boolean up = taps.integer(term.tap()).signum() >= 0 == largest;
			samples[samples.length - 1 - term.delay() + shift] = end(up);
			if (term.isFolded()) {
				samples[samples.length - 1 - term.mirror()] = end(up == term.sign() > 0);
			}
		}
		return samples;
	}

	// Leading zeros that make the last sample one that an output is computed for.
	private int padding(int oldest) {
		return Math.floorMod(-oldest, arithmetic.decimation());
	}

	private BigInteger end(boolean upper) {
		return upper ? path.input().max() : path.input().min();
	}
}
