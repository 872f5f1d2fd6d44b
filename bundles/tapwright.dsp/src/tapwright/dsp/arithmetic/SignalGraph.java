// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.util.ArrayList;
import java.util.List;

import tapwright.dsp.exact.ExactTaps;

/**
 * A structure as a signal-flow graph, ready to be drawn: parts on a coarse raster and lines between them. A decimator's parts are
 * drawn once, its multipliers and adders work for kept outputs only.
 *
 * @param nodes
 *            the parts; a node's place in the list is its number
 * @param edges
 *            the lines
 */
public record SignalGraph(List<Node> nodes, List<Edge> edges) {

	/** Kinds of parts. */
	public enum Kind {
		/** Where samples come in. */
		INPUT,
		/** Keeps a number for one input sample. */
		DELAY,
		/** Multiplies by a coefficient. */
		MULTIPLIER,
		/** Adds two numbers. */
		ADDER,
		/** Keeps every M-th output. */
		RATE_REDUCER,
		/** Puts the outputs of all branches out in turn. */
		COMMUTATOR,
		/** Where samples go out. */
		OUTPUT
	}

	/**
	 * A part.
	 *
	 * @param kind
	 *            what it is
	 * @param index
	 *            coefficient of a multiplier, factor of a change of rate, otherwise 0
	 * @param column
	 *            place on the raster, from the left
	 * @param row
	 *            place on the raster, from the top
	 */
	public record Node(Kind kind, int index, int column, int row) {
	}

	/**
	 * A line along which numbers go.
	 *
	 * @param from
	 *            number of the node it starts at
	 * @param to
	 *            number of the node it ends at
	 * @param negated
	 *            whether the number is subtracted
	 */
	public record Edge(int from, int to, boolean negated) {
	}

	/**
	 * The graph of a filter.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients
	 */
	public static SignalGraph of(ExactTaps taps, Arithmetic arithmetic) {
		Builder builder = new Builder();
		if (arithmetic.structure() == Structure.TRANSPOSED) {
			builder.transposed(arithmetic.terms(taps, 0));
		} else {
			builder.delayLine(taps, arithmetic);
		}
		return new SignalGraph(List.copyOf(builder.nodes), List.copyOf(builder.edges));
	}

	/** How many parts of a kind there are. */
	public long count(Kind kind) {
		return nodes.stream().filter(node -> node.kind() == kind).count();
	}

	private static final class Builder {

		private static final int ROWS_PER_BRANCH = 3;

		private final List<Node> nodes = new ArrayList<>();
		private final List<Edge> edges = new ArrayList<>();

		void delayLine(ExactTaps taps, Arithmetic arithmetic) {
			List<Integer> line = new ArrayList<>(List.of(node(Kind.INPUT, 0, 0, 0)));
			int kept = (taps.length() - 1) / arithmetic.interpolation();
			for (int age = 1; age <= kept; age++) {
				line.add(fed(node(Kind.DELAY, 0, age, 0), line.get(age - 1)));
			}
			List<Integer> sums = new ArrayList<>();
			for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
				List<Term> terms = arithmetic.terms(taps, phase);
				if (!terms.isEmpty()) {
					sums.add(branch(terms, line, 1 + phase * ROWS_PER_BRANCH));
				}
			}
			int column = kept + 1;
			int row = nodes.get(sums.isEmpty() ? 0 : sums.getLast()).row();
			if (arithmetic.interpolation() > 1) {
				int commutator = node(Kind.COMMUTATOR, arithmetic.interpolation(), column++, row);
				sums.forEach(sum -> fed(commutator, sum));
				sums = List.of(commutator);
			} else if (arithmetic.decimation() > 1) {
				int reducer = node(Kind.RATE_REDUCER, arithmetic.decimation(), column++, row);
				sums.forEach(sum -> fed(reducer, sum));
				sums = List.of(reducer);
			}
			int output = node(Kind.OUTPUT, 0, column, row);
			sums.forEach(sum -> fed(output, sum));
		}

		private int branch(List<Term> terms, List<Integer> line, int row) {
			int sum = -1;
			for (Term term : terms) {
				int source = line.get(term.delay());
				if (term.isFolded()) {
					int adder = fed(node(Kind.ADDER, 0, term.delay(), row), source);
					edges.add(new Edge(line.get(term.mirror()), adder, term.sign() < 0));
					source = adder;
				}
				int product = fed(node(Kind.MULTIPLIER, term.tap(), term.delay(), row + 1), source);
				sum = sum < 0 ? product : fed(fed(node(Kind.ADDER, 0, term.delay(), row + 2), sum), product);
			}
			return sum;
		}

		void transposed(List<Term> terms) {
			int input = node(Kind.INPUT, 0, 0, 0);
			int sum = -1;
			int column = 0;
			for (Term term : terms.reversed()) {
				int product = fed(node(Kind.MULTIPLIER, term.tap(), column, 1), input);
				if (sum < 0) {
					sum = product;
				} else {
					int register = fed(node(Kind.DELAY, 0, column - 1, 2), sum);
					sum = fed(fed(node(Kind.ADDER, 0, column, 2), register), product);
				}
				column += 2;
			}
			fed(node(Kind.OUTPUT, 0, column, 2), sum);
		}

		private int node(Kind kind, int index, int column, int row) {
			nodes.add(new Node(kind, index, column, row));
			return nodes.size() - 1;
		}

		private int fed(int node, int from) {
			edges.add(new Edge(from, node, false));
			return node;
		}
	}
}
