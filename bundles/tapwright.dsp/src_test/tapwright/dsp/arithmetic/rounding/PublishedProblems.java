// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.util.List;

import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.design.Band;
import tapwright.dsp.exact.ExactTaps;

/**
 * Finite-word-length problems of D. M. Kodek, Performance limit of finite wordlength FIR digital filters, IEEE Transactions on
 * Signal Processing 53(7), 2005, and N. Brisebarre, S.-I. Filip, G. Hanrot, A lattice basis reduction approach for the design of
 * finite wordlength FIR filters, IEEE Transactions on Signal Processing 66(10), 2018. Specifications recalled from memory. The
 * optima were computed with the mixed-integer solver HiGHS of scipy and certified over whole bands.
 */
enum PublishedProblems {
	A35_8('A', 35, 8, 0.030013716),
	A45_8('A', 45, 8, 0.029627507),
	B35_9('B', 35, 9, 0.077172473),
	B45_9('B', 45, 9, 0.056809279),
	C35_8('C', 35, 8, 0.017870836),
	C45_8('C', 45, 8, 0.016096268),
	D35_9('D', 35, 9, 0.0325433),
	D45_9('D', 45, 9, 0.026122542),
	E35_8('E', 35, 8, 0.032998078),
	E45_8('E', 45, 8, 0.02887703);

	private final char specification;
	private final int length;
	private final int bits;
	private final double optimum;

	PublishedProblems(char specification, int length, int bits, double optimum) {
		this.specification = specification;
		this.length = length;
		this.bits = bits;
		this.optimum = optimum;
	}

	/** The least largest weighted error. */
	double optimum() {
		return optimum;
	}

	List<Band> bands() {
		return switch (specification) {
		case 'A' -> List.of(new Band(0, 0.2, 1, 1), new Band(0.25, 0.5, 0, 1));
		case 'B' -> List.of(new Band(0, 0.2, 1, 1), new Band(0.25, 0.5, 0, 10));
		case 'C' -> List.of(new Band(0, 0.12, 1, 1), new Band(0.2, 0.34, 0, 1), new Band(0.42, 0.5, 1, 1));
		case 'D' -> List.of(new Band(0, 0.12, 1, 1), new Band(0.2, 0.34, 0, 10), new Band(0.42, 0.5, 1, 1));
		default -> List.of(new Band(0.01, 0.21, 1, 1), new Band(0.26, 0.49, 0, 1));
		};
	}

	/** Coefficients are integers times 2^-(bits-1); the range is one bit wider than the problems state, which changes nothing. */
	RoundingTask task() {
		return new RoundingTask(LeastSquares.fit(bands(), length), new NumberFormat(bits + 1, bits - 1), bands());
	}

	/** The integers times 2^-(bits-1), from the middle outwards. */
	ExactTaps taps(int... half) {
		double[] taps = new double[length];
		for (int k = 0; k < half.length; k++) {
			taps[length / 2 + k] = taps[length / 2 - k] = Math.scalb((double) half[k], 1 - bits);
		}
		return ExactTaps.ofDoubles(taps);
	}
}
