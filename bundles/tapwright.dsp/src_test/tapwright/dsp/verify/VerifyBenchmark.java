// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.GainLimit.Breakpoint;

/**
 * Times proofs of two-band limits on one thread; run {@code verify_benchmark.py} right before or after to compare.
 * Arguments: number of coefficients (128) and the word {@code general} for coefficients without symmetry.
 */
public final class VerifyBenchmark {

	private static final int FILTERS = 1000;
	private static final int ROUNDS = 60;
	private static final double NONE = Double.NEGATIVE_INFINITY;
	private static final double FREE = Double.POSITIVE_INFINITY;

	private VerifyBenchmark() {
	}

	/** Runs the benchmark. */
	public static void main(String... arguments) {
		int n = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 128;
		boolean general = arguments.length > 1 && arguments[1].equals("general");
		Random random = new Random(1);
		List<double[]> filters = new ArrayList<>();
		List<GainLimit> limits = new ArrayList<>();
		for (int k = 0; k < FILTERS; k++) {
			double cutoff = 0.05 + 0.4 * random.nextDouble();
			double[] taps = HardCases.kaiserSinc(n, cutoff, 5.65);
			for (int i = 0; i < n / 2; i++) {
				taps[i] += 1e-6 * random.nextGaussian();
				taps[n - 1 - i] = general ? taps[n - 1 - i] : taps[i];
			}
			double half = 1.8 / n;
			limits.add(new GainLimit(List.of(new Breakpoint(0, -0.05, 0.05), new Breakpoint(cutoff - half, -0.05, 0.05),
					new Breakpoint(cutoff - half, NONE, FREE), new Breakpoint(cutoff + half, NONE, FREE),
					new Breakpoint(cutoff + half, NONE, -50), new Breakpoint(0.5, NONE, -50)), false,
							GainReference.ABSOLUTE));
			filters.add(taps);
		}
		double best = Double.MAX_VALUE;
		double first = 0;
		int met = 0;
		for (int round = 0; round < ROUNDS; round++) {
			met = 0;
			long start = System.nanoTime();
			for (int k = 0; k < FILTERS; k++) {
				Subject subject = new Subject(ExactTaps.ofDoubles(filters.get(k)), 1);
				met += limits.get(k).prove(subject, Effort.STANDARD).verdict() == Verdict.MET ? 1 : 0;
			}
			double millis = (System.nanoTime() - start) / 1e6;
			first = round == 0 ? millis : first;
			best = Math.min(best, millis);
		}
		System.out.printf("%d filters of %d coefficients%s: cold %.1f ms, warm %.1f ms, %d met%n", FILTERS, n,
				general ? " without symmetry" : "", first, best, met);
	}
}
