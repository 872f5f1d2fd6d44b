// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

import tapwright.dsp.exact.ExactTaps;

/** Bit-true filtering in integers of any size. */
final class WideKernel {

	private final ExactTaps taps;
	private final Arithmetic arithmetic;
	private final Datapath path;
	private final List<List<Term>> phases = new ArrayList<>();
	/** Samples by age, or the registers of a transposed structure. */
	private final BigInteger[] state;
	/** Input samples until the next output is due. */
	private int wait;

	WideKernel(ExactTaps taps, Arithmetic arithmetic, Datapath path) {
		this.taps = taps;
		this.arithmetic = arithmetic;
		this.path = path;
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			phases.add(arithmetic.terms(taps, phase));
		}
		state = new BigInteger[taps.length() + 1];
		reset();
	}

	void reset() {
		Arrays.fill(state, BigInteger.ZERO);
		wait = 0;
	}

	BigInteger[] filter(BigInteger[] samples) {
		Deque<BigInteger> outputs = new ArrayDeque<>();
		for (BigInteger sample : samples) {
			if (arithmetic.structure() == Structure.TRANSPOSED) {
				outputs.add(path.output().apply(transposed(sample)));
			} else {
				System.arraycopy(state, 0, state, 1, state.length - 1);
				state[0] = sample;
				if (wait == 0) {
					phases.forEach(terms -> outputs.add(path.output().apply(sum(terms))));
				}
				wait = (wait + 1) % arithmetic.decimation();
			}
		}
		return outputs.toArray(BigInteger[]::new);
	}

	private BigInteger sum(List<Term> terms) {
		BigInteger sum = BigInteger.ZERO;
		for (Term term : terms) {
			BigInteger first = state[term.delay()];
			BigInteger sample = switch (term.sign()) {
			case 0 -> first;
			case 1 -> first.add(state[term.mirror()]);
			default -> first.subtract(state[term.mirror()]);
			};
			sum = add(sum, product(term.tap(), sample));
		}
		return sum;
	}

	private BigInteger transposed(BigInteger sample) {
		BigInteger sum = add(state[1], product(0, sample));
		for (int k = 1; k < taps.length(); k++) {
			state[k] = add(state[k + 1], product(k, sample));
		}
		return sum;
	}

	private BigInteger product(int tap, BigInteger sample) {
		return path.align().apply(path.product().apply(taps.integer(tap).multiply(sample)));
	}

	private BigInteger add(BigInteger sum, BigInteger product) {
		BigInteger next = sum.add(product);
		Optional<NumberFormat> format = arithmetic.accumulator();
		return format.isPresent() ? format.get().fit(next, arithmetic.overflow()) : next;
	}
}
