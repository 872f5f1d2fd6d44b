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
 * Bit-true filtering in machine words, for filters whose numbers are proven to fit. Two shortcuts that change no bit:
 * <ul>
 * <li>Where products are not rounded and sums do not saturate, sums are those of integers modulo a power of two, so that their
 * order and the pairing of samples do not matter: every structure is run as direct.
 * <li>Sums that wrap are wrapped once at the end.
 * </ul>
 */
final class LongKernel {

	private static final int BLOCK = 4096;

	private final Arithmetic arithmetic;
	private final List<Term[]> phases = new ArrayList<>();
	private final long[] coefficients;
	/** Per phase the coefficients from the oldest sample to the newest, scaled to the accumulator; empty when not plain. */
	private final long[][] plain;
	private final LongStep product;
	private final LongStep align;
	private final LongStep sum;
	private final LongStep output;
	private final boolean sumsSaturate;
	/** The samples before the present block, then the block. */
	private final long[] line;
	private final int kept;
	private final long[] registers;
	private int wait;

	LongKernel(ExactTaps taps, Arithmetic arithmetic, Datapath path) {
		this.arithmetic = arithmetic;
		Bounds bounds = new Bounds(taps, arithmetic, path);
		product = LongStep.of(path.product(), bounds.exactProduct).orElseThrow();
		align = LongStep.of(path.align(), bounds.product).orElseThrow();
		sum = bounds.sumStep(arithmetic).orElseThrow();
		output = LongStep.of(path.output(), bounds.sum(arithmetic)).orElseThrow();
		sumsSaturate = !bounds.sumsFit(arithmetic) && arithmetic.overflow() == Overflow.SATURATE;
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			phases.add(arithmetic.terms(taps, phase).toArray(Term[]::new));
		}
		coefficients = new long[taps.length()];
		Arrays.setAll(coefficients, k -> taps.integer(k).longValueExact());
		kept = (taps.length() - 1) / arithmetic.interpolation();
		plain = product.isScaling() && align.isScaling() && !sumsSaturate ? plainCoefficients() : new long[0][];
		line = new long[kept + BLOCK];
		registers = new long[taps.length() + 1];
	}

	/** Whether machine words are proven long enough for every number on the way. */
	static boolean isSafe(ExactTaps taps, Arithmetic arithmetic, Datapath path) {
		Bounds bounds = new Bounds(taps, arithmetic, path);
		return path.input().word() < Long.SIZE && bounds.coefficient.bitLength() < Long.SIZE
				&& LongStep.of(path.product(), bounds.exactProduct).isPresent()
				&& LongStep.of(path.align(), bounds.product).isPresent() && bounds.sumStep(arithmetic).isPresent()
				&& LongStep.of(path.output(), bounds.sum(arithmetic)).isPresent();
	}

	void reset() {
		Arrays.fill(line, 0);
		Arrays.fill(registers, 0);
		wait = 0;
	}

	long[] filter(long[] samples) {
		int decimation = arithmetic.decimation();
		int first = Math.min(wait, samples.length);
		int count = (samples.length - first + decimation - 1) / decimation;
		long[] outputs = new long[Math.multiplyExact(count, phases.size())];
		int written = 0;
		for (int from = 0; from < samples.length; from += BLOCK) {
			int length = Math.min(BLOCK, samples.length - from);
			System.arraycopy(samples, from, line, kept, length);
			written = block(length, outputs, written);
			System.arraycopy(line, length, line, 0, kept);
		}
		return outputs;
	}

	private int block(int length, long[] outputs, int from) {
		int written = from;
		if (plain.length == 0 && arithmetic.structure() == Structure.TRANSPOSED) {
			for (int n = 0; n < length; n++) {
				outputs[written++] = output.apply(transposed(line[kept + n]));
			}
			return written;
		}
		int n = wait;
		for (; n < length; n += arithmetic.decimation()) {
			for (int phase = 0; phase < phases.size(); phase++) {
				long total = plain.length > 0 ? dot(plain[phase], kept + n) : sum(phases.get(phase), kept + n);
				outputs[written++] = output.apply(total);
			}
		}
		wait = n - length;
		return written;
	}

	private long dot(long[] reversed, int newest) {
		int oldest = newest - reversed.length + 1;
		long total = 0;
		for (int k = 0; k < reversed.length; k++) {
			total += reversed[k] * line[oldest + k];
		}
		return sum.apply(total);
	}

	private long sum(Term[] terms, int newest) {
		long total = 0;
		for (Term term : terms) {
			long sample = line[newest - term.delay()];
			if (term.sign() != 0) {
				sample += term.sign() * line[newest - term.mirror()];
			}
			total += align.apply(product.apply(coefficients[term.tap()] * sample));
			if (sumsSaturate) {
				total = sum.apply(total);
			}
		}
		return sum.apply(total);
	}

	private long transposed(long sample) {
		long total = sum.apply(registers[1] + align.apply(product.apply(coefficients[0] * sample)));
		for (int k = 1; k < coefficients.length; k++) {
			registers[k] = sum.apply(registers[k + 1] + align.apply(product.apply(coefficients[k] * sample)));
		}
		return total;
	}

	private long[][] plainCoefficients() {
		long[][] rows = new long[phases.size()][];
		for (int phase = 0; phase < rows.length; phase++) {
			int length = (coefficients.length - phase + rows.length - 1) / rows.length;
			rows[phase] = new long[Math.max(length, 0)];
			for (int k = 0; k < rows[phase].length; k++) {
				long coefficient = coefficients[phase + (rows[phase].length - 1 - k) * rows.length];
				rows[phase][k] = align.apply(product.apply(coefficient));
			}
		}
		return rows;
	}

	/** Sizes that numbers on the way cannot exceed. */
	private static final class Bounds {

		private BigInteger coefficient = BigInteger.ZERO;
		private BigInteger exactProduct = BigInteger.ZERO;
		private BigInteger product = BigInteger.ZERO;
		private BigInteger total = BigInteger.ZERO;

		Bounds(ExactTaps taps, Arithmetic arithmetic, Datapath path) {
			BigInteger sample = path.input().max().max(path.input().min().negate());
			List<BigInteger> totals = new ArrayList<>();
			for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
				BigInteger sum = BigInteger.ZERO;
				for (Term term : arithmetic.terms(taps, phase)) {
					BigInteger size = taps.integer(term.tap()).abs();
					BigInteger exact = size.multiply(term.isFolded() ? sample.shiftLeft(1) : sample);
					BigInteger rounded = size(path.product(), exact);
					coefficient = coefficient.max(size);
					exactProduct = exactProduct.max(exact);
					product = product.max(rounded);
					sum = sum.add(size(path.align(), rounded));
				}
				totals.add(sum);
			}
			total = totals.stream().reduce(BigInteger.ZERO, BigInteger::max);
		}

		// A bound after the step: one more than the rounded size, or what the format allows when that does not fit.
		private static BigInteger size(Requantizer step, BigInteger before) {
			BigInteger after = step.isExact() ? step.round(before) : step.round(before).add(BigInteger.ONE);
			return step.range().filter(format -> !fits(format, after)).map(Bounds::largest).orElse(after);
		}

		private static boolean fits(NumberFormat format, BigInteger size) {
			return format.contains(size) && format.contains(size.negate());
		}

		private static BigInteger largest(NumberFormat format) {
			return format.max().max(format.min().negate());
		}

		boolean sumsFit(Arithmetic arithmetic) {
			return arithmetic.accumulator().map(format -> fits(format, total)).orElse(true);
		}

		BigInteger sum(Arithmetic arithmetic) {
			return sumsFit(arithmetic) ? total : largest(arithmetic.accumulator().orElseThrow());
		}

		Optional<LongStep> sumStep(Arithmetic arithmetic) {
			Requantizer step = new Requantizer(BigFraction.ONE, arithmetic.rounding(), arithmetic.accumulator(),
					arithmetic.overflow());
			// A saturated sum and one more product must fit; sums that wrap need no bound beyond that.
			BigInteger largest = sumsFit(arithmetic) ? total
					: largest(arithmetic.accumulator().orElseThrow()).add(total.min(product.add(BigInteger.ONE)));
			return LongStep.of(step, largest);
		}
	}
}
