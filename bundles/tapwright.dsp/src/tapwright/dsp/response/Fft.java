// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;

/**
 * The discrete Fourier transform X[f] = sum of x[k] exp(-2 pi i f k / size) for sizes that are powers of two, with a
 * proven error bound. Immutable and thread-safe; one instance per size is kept.
 * <p>
 * Method: decimation in frequency with radix 4 and one last stage of radix 2 when needed, after W. M. Gentleman and
 * G. Sande, Fast Fourier transforms for fun and profit, AFIPS Fall Joint Computer Conference, 1966.
 * <p>
 * Error bound, with u = 2^-53. A stage of radix 4 makes each of its outputs from four inputs by two additions
 * (relative error u each, against the sum of moduli) and one product with a table entry. Entries are off by at most
 * 3u: the angle, at most pi/4 after exact reduction, is off by 1.6u of itself, and {@link StrictMath} errs by at most
 * one unit in the last place, that is u below 1. The product adds at most sqrt(5) u (R. Brent, C. Percival, P.
 * Zimmermann, Error bounds on complex floating-point multiplication, Mathematics of Computation 76, 2007). Altogether
 * a stage errs by less than 9u times the sum of the moduli of the inputs that reach an output, the last stage by less
 * than 2u, and since every output is reached by every input once with a factor of modulus 1, after all stages an
 * output errs by at most {@link #errorFactor()} times the sum of the moduli of all inputs.
 */
public final class Fft {

	private static final ConcurrentMap<Integer, Fft> INSTANCES = new ConcurrentHashMap<>();
	private static final double UNIT = 0x1p-53;
	private static final int LARGEST = 1 << 26;

	private final int size;
	private final int[] order;
	private final double[][] twiddles;
	private final double errorFactor;

	private Fft(int size) {
		this.size = size;
		this.order = order(size);
		int stages = (31 - Integer.numberOfLeadingZeros(size)) / 2;
		this.twiddles = new double[stages][];
		for (int stage = 0, block = size; stage < stages; stage++, block /= 4) {
			double[] table = new double[block / 4 * 6];
			for (int j = 0; j < block / 4; j++) {
				for (int m = 1; m <= 3; m++) {
					table[6 * j + 2 * m - 2] = cos((long) m * j, block);
					table[6 * j + 2 * m - 1] = -cos((long) m * j + 3L * block / 4, block);
				}
			}
			twiddles[stage] = table;
		}
		this.errorFactor = (9 * stages + 3) * UNIT * (1 + 1e-9);
	}

	/**
	 * The transform of a size.
	 *
	 * @param size
	 *            a power of two from 4 to 2^26
	 * @throws IllegalArgumentException
	 *             for other sizes
	 */
	public static Fft ofSize(int size) {
		if (size < 4 || size > LARGEST || Integer.bitCount(size) != 1) {
			throw new IllegalArgumentException("a transform of size " + size
					+ "; the size must be a power of two from 4 to 2^26");
		}
		return INSTANCES.computeIfAbsent(size, Fft::new);
	}

	/** Number of points. */
	public int size() {
		return size;
	}

	/** Largest error of an output's modulus over the sum of the moduli of the inputs. */
	public double errorFactor() {
		return errorFactor;
	}

	/** Where {@link #transform} leaves the output for frequency f. */
	public int position(int f) {
		return order[f];
	}

	/**
	 * Transforms in place; the output for frequency f is at {@link #position}(f).
	 *
	 * @param re
	 *            real parts, at least {@link #size()}
	 * @param im
	 *            imaginary parts
	 */
	public void transform(double[] re, double[] im) {
		int block = size;
		for (double[] table : twiddles) {
			int quarter = block / 4;
			for (int start = 0; start < size; start += block) {
				stage(re, im, start, quarter, table);
			}
			block = quarter;
		}
		if (block == 2) {
			for (int k = 0; k < size; k += 2) {
				double r = re[k] - re[k + 1];
				double i = im[k] - im[k + 1];
				re[k] += re[k + 1];
				im[k] += im[k + 1];
				re[k + 1] = r;
				im[k + 1] = i;
			}
		}
	}

	private static void stage(double[] re, double[] im, int start, int quarter, double[] table) {
		for (int j = 0; j < quarter; j++) {
			int a = start + j;
			int b = a + quarter;
			int c = b + quarter;
			int d = c + quarter;
			double sumR = re[a] + re[c];
			double sumI = im[a] + im[c];
			double difR = re[a] - re[c];
			double difI = im[a] - im[c];
			double otherSumR = re[b] + re[d];
			double otherSumI = im[b] + im[d];
			double otherDifR = re[b] - re[d];
			double otherDifI = im[b] - im[d];
			re[a] = sumR + otherSumR;
			im[a] = sumI + otherSumI;
			double r1 = difR + otherDifI;
			double i1 = difI - otherDifR;
			double r2 = sumR - otherSumR;
			double i2 = sumI - otherSumI;
			double r3 = difR - otherDifI;
			double i3 = difI + otherDifR;
			int t = 6 * j;
			double wr = table[t];
			double wi = table[t + 1];
			re[b] = r1 * wr - i1 * wi;
			im[b] = r1 * wi + i1 * wr;
			wr = table[t + 2];
			wi = table[t + 3];
			re[c] = r2 * wr - i2 * wi;
			im[c] = r2 * wi + i2 * wr;
			wr = table[t + 4];
			wi = table[t + 5];
			re[d] = r3 * wr - i3 * wi;
			im[d] = r3 * wi + i3 * wr;
		}
	}

	/** The cosine of 2 pi k / n within 3 * 2^-53, the angle reduced exactly; the sine is the cosine of k + 3n/4. */
	public static double cos(long k, int n) {
		// In eighths of a turn; all integers stay exact.
		long j = 8 * Math.floorMod(k, (long) n);
		long octant = j / n;
		long rest = j % n;
		double step = Math.PI / 4 / n;
		double low = rest * step;
		double high = (n - rest) * step;
		return switch ((int) octant) {
			case 0 -> StrictMath.cos(low);
			case 1 -> StrictMath.sin(high);
			case 2 -> -StrictMath.sin(low);
			case 3 -> -StrictMath.cos(high);
			case 4 -> -StrictMath.cos(low);
			case 5 -> -StrictMath.sin(high);
			case 6 -> StrictMath.sin(low);
			default -> StrictMath.cos(high);
		};
	}

	private static int[] order(int size) {
		int[] order = new int[size];
		for (int f = 0; f < size; f++) {
			int position = 0;
			int rest = f;
			int block = size;
			while (block >= 4) {
				block /= 4;
				position += (rest & 3) * block;
				rest >>= 2;
			}
			order[f] = position + rest;
		}
		return order;
	}
}
