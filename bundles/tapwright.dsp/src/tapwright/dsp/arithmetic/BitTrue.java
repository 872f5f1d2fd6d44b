// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.ExactTaps;

/**
 * Runs a filter bit for bit as the package's description defines it, block after block. Machine words are used where the ranges
 * of all numbers on the way prove them sufficient, integers of any size otherwise; the results are the same. Keeps the delay
 * line between calls; to be used from one thread at a time.
 */
public final class BitTrue {

	private final Datapath path;
	private final Arithmetic arithmetic;
	private final WideKernel wide;
	private final LongKernel fast;

	/**
	 * A filter at rest.
	 *
	 * @throws IllegalArgumentException
	 *             when the structure cannot run the coefficients or no input format is stated
	 */
	public BitTrue(ExactTaps taps, Arithmetic arithmetic) {
		this.arithmetic = arithmetic;
		ExactTaps stored = arithmetic.stored(taps);
		path = Datapath.of(stored, arithmetic);
		fast = LongKernel.isSafe(stored, arithmetic, path) ? new LongKernel(stored, arithmetic, path) : null;
		wide = fast == null ? new WideKernel(stored, arithmetic, path) : null;
	}

	/** Whether machine words are used. */
	public boolean isFast() {
		return fast != null;
	}

	/** What one step of the outputs is worth. */
	public BigFraction outputStep() {
		return path.outputStep();
	}

	/** Empties the delay line. */
	public void reset() {
		if (fast != null) {
			fast.reset();
		} else {
			wide.reset();
		}
	}

	/** The most outputs that the next call can yield for a number of input samples. */
	public int maxOutputs(int inputs) {
		return Math.multiplyExact((inputs + arithmetic.decimation() - 1) / arithmetic.decimation(),
				arithmetic.interpolation());
	}

	/**
	 * Filters a block of samples.
	 *
	 * @param samples
	 *            integers of the input format
	 * @return the outputs that became complete, in steps of {@link #outputStep()}
	 * @throws IllegalArgumentException
	 *             when a sample is not in the range of the input format; nothing has been filtered then
	 * @throws ArithmeticException
	 *             when an output does not fit a long; use {@link #filter(BigInteger...)} then
	 */
	public long[] filter(long... samples) {
		if (fast == null) {
			BigInteger[] integers = new BigInteger[samples.length];
			for (int n = 0; n < samples.length; n++) {
				integers[n] = BigInteger.valueOf(samples[n]);
			}
			BigInteger[] outputs = filter(integers);
			long[] result = new long[outputs.length];
			for (int n = 0; n < outputs.length; n++) {
				result[n] = outputs[n].longValueExact();
			}
			return result;
		}
		long lowest = path.input().min().longValueExact();
		long highest = path.input().max().longValueExact();
		for (int n = 0; n < samples.length; n++) {
			if (samples[n] < lowest || samples[n] > highest) {
				throw outside(n, samples[n]);
			}
		}
		return fast.filter(samples);
	}

	/**
	 * Filters a block of samples of any word length.
	 *
	 * @param samples
	 *            integers of the input format
	 * @return the outputs that became complete, in steps of {@link #outputStep()}
	 * @throws IllegalArgumentException
	 *             when a sample is not in the range of the input format; nothing has been filtered then
	 */
	public BigInteger[] filter(BigInteger... samples) {
		for (int n = 0; n < samples.length; n++) {
			if (!path.input().contains(samples[n])) {
				throw outside(n, samples[n]);
			}
		}
		if (fast == null) {
			return wide.filter(samples);
		}
		long[] words = new long[samples.length];
		for (int n = 0; n < words.length; n++) {
			words[n] = samples[n].longValueExact();
		}
		long[] outputs = fast.filter(words);
		BigInteger[] result = new BigInteger[outputs.length];
		for (int n = 0; n < result.length; n++) {
			result[n] = BigInteger.valueOf(outputs[n]);
		}
		return result;
	}

	private IllegalArgumentException outside(int index, Object sample) {
		return new IllegalArgumentException(
				"sample " + index + " is " + sample + "; the input format (" + path.input().text() + ") holds "
						+ path.input().min() + " to " + path.input().max());
	}
}
