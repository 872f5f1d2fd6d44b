// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.BitTrue;
import tapwright.dsp.arithmetic.NodeRange;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.OverflowBounds;
import tapwright.dsp.exact.ExactTaps;

/**
 * Samples that bring a filter to its limits, and what the simulation makes of them: an impulse, the inputs that drive the output
 * to either end of its range, alternating full scale, and noise.
 *
 * @param input
 *            integers of the input format
 * @param output
 *            integers in steps of the output
 */
record TestVectors(List<BigInteger> input, List<BigInteger> output) {

	private static final int NOISE = 256;

	static TestVectors of(ExactTaps taps, Arithmetic arithmetic) {
		NumberFormat format = arithmetic.input().orElseThrow();
		var input = new ArrayList<BigInteger>();
		input.add(format.max());
		pause(taps, input);
		var bounds = new OverflowBounds(taps, arithmetic);
		NodeRange output = bounds.nodes().getLast();
		for (boolean largest : new boolean[] { true, false }) {
			align(arithmetic, input);
			input.addAll(Arrays.asList(bounds.worstInput(output, largest)));
			pause(taps, input);
		}
		for (int n = 0; n < taps.length(); n++) {
			input.add(n % 2 == 0 ? format.max() : format.min());
		}
		var random = new Random(1); // its sequence is specified, so that exported files stay the same
		for (int n = 0; n < NOISE; n++) {
			input.add(new BigInteger(format.word(), random).add(format.min()));
		}
		var filter = new BitTrue(taps, arithmetic);
		return new TestVectors(List.copyOf(input), List.of(filter.filter(input.toArray(BigInteger[]::new))));
	}

	private static void pause(ExactTaps taps, List<BigInteger> input) {
		for (int n = 0; n < taps.length(); n++) {
			input.add(BigInteger.ZERO);
		}
	}

	// A worst input is counted from a sample that a decimator computes an output for.
	private static void align(Arithmetic arithmetic, List<BigInteger> input) {
		while (input.size() % arithmetic.decimation() != 0) {
			input.add(BigInteger.ZERO);
		}
	}
}
