// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Arrays;

import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.response.Fft;

/**
 * Taylor polynomials of a frequency response in cells of equal width that cover 0 to half the sample rate, all at
 * once by fast Fourier transforms in double precision, with a proven bound on what rounding and truncation leave out.
 * Work space of one thread: loaded again for every filter.
 * <p>
 * Cell j has its centre at j / M cycles per sample and the local variable s, -1 &lt;= s &lt;= 1, at (j + s/2) / M.
 * With symmetric coefficients a cell's polynomial is the real amplitude A of {@link
 * tapwright.dsp.design.LinearPhaseType}, otherwise the square of the magnitude.
 */
public final class TaylorCells {

	/** Number of Taylor coefficients. */
	public static final int TERMS = 12;
	/** Number of coefficients of a squared magnitude. */
	static final int SQUARE_TERMS = 2 * TERMS - 1;

	private static final double UNIT = 0x1p-53;
	private static final int SMALLEST = 16;
	/** Above this transform size the work space is not worth keeping. */
	private static final int LARGEST_KEPT = 1 << 15;

	private static final double[] RECIPROCAL = new double[TERMS + 1];
	static {
		for (int m = 1; m <= TERMS; m++) {
			RECIPROCAL[m] = 1.0 / m;
		}
	}

	private final double errorFactor;
	private double[][] re = {};
	private double[][] im = {};
	// cosine and sine of half a cell's angle, for middles between two coefficients
	private double[] turns = {};
	private Fft fft;
	private int size;
	private int blocks;
	private Symmetry symmetry;
	private boolean halfIndex;
	private double error;
	private double sum;
	private final double[] evenPart = new double[TERMS];
	private final double[] oddPart = new double[TERMS];
	private final double[] norms = new double[TERMS + 1];

	/** Work space. */
	public TaylorCells() {
		this(1);
	}

	/** Work space whose error bound is multiplied by a factor: below 1 the bounds are wrong,
			so that tests can see it. */
	TaylorCells(double errorFactor) {
		this.errorFactor = errorFactor;
	}

	/** Twice the number of cells M: the number of cells around the whole circle. */
	public int size() {
		return size;
	}

	/** Whether polynomials are squared magnitudes, otherwise amplitudes. */
	boolean isSquared() {
		return symmetry == Symmetry.NONE;
	}

	/** Bound on the error of the magnitude anywhere in a cell, rounding of the polynomial itself not counted. */
	public double error() {
		return error;
	}

	/** Sum of the absolute coefficients, rounded. */
	double sum() {
		return sum;
	}

	/** Whether the work space is small enough to be kept for another filter. */
	boolean isWorthKeeping() {
		return size <= LARGEST_KEPT;
	}

	/**
	 * Takes a filter.
	 *
	 * @param taps
	 *            within 2^-53 of the true coefficients, relatively, up to errors of 2^-1074
	 * @param symmetry
	 *            the exact symmetry of the true coefficients
	 */
	public void load(double[] taps, Symmetry symmetry) {
		this.symmetry = symmetry;
		int n = taps.length;
		halfIndex = n % 2 == 0;
		int wanted = Math.max(SMALLEST, 4 * n - 4);
		int needed = Integer.highestOneBit(wanted - 1) << 1;
		blocks = symmetry == Symmetry.NONE ? TERMS / 2 : TERMS / 4;
		prepare(needed);
		Arrays.fill(norms, 0);
		double step = Math.PI / size;
		if (symmetry == Symmetry.NONE) {
			loadGeneral(taps, step);
		} else {
			loadSymmetric(taps, step);
		}
		for (int b = 0; b < blocks; b++) {
			fft.transform(re[b], im[b]);
		}
		bound(n);
	}

	private void prepare(int needed) {
		if (needed != size || blocks > re.length) {
			size = needed;
			fft = Fft.ofSize(size);
			re = new double[blocks][size];
			im = new double[blocks][size];
			turns = new double[0];
		} else {
			for (int b = 0; b < blocks; b++) {
				Arrays.fill(re[b], 0);
				Arrays.fill(im[b], 0);
			}
		}
		if (halfIndex && turns.length == 0) {
			turns = new double[size + 2];
			for (int cell = 0; cell <= size / 2; cell++) {
				turns[2 * cell] = Fft.cos(cell, 2 * size);
				turns[2 * cell + 1] = Fft.cos(cell + 3L * size / 2, 2 * size);
			}
		}
	}

	// g[m] = tap (v step)^m / m!; the pair of real sequences g[m] + g[m+1], one even and one odd, needs one transform.
	private void loadSymmetric(double[] taps, double step) {
		int n = taps.length;
		double mirror = symmetry == Symmetry.EVEN ? 1 : -1;
		for (int k = n / 2; k < n; k++) {
			double index = k - (n - 1) / 2.0;
			int plus = k - (n - 1) / 2;
			int minus = (halfIndex ? 1 - plus : -plus) & size - 1;
			double t = index * step;
			double both = index == 0 ? 1 : 2;
			double g = taps[k];
			int m = 0;
			for (int b = 0; b < blocks; b++, m += 4) {
				double g1 = g * (t * RECIPROCAL[m + 1]);
				double g2 = g1 * (t * RECIPROCAL[m + 2]);
				double g3 = g2 * (t * RECIPROCAL[m + 3]);
				norms[m] += both * Math.abs(g);
				norms[m + 1] += both * Math.abs(g1);
				norms[m + 2] += both * Math.abs(g2);
				norms[m + 3] += both * Math.abs(g3);
				if (index != 0) {
					re[b][minus] = mirror * (g - g1);
					im[b][minus] = mirror * (g2 - g3);
				}
				re[b][plus] = g + g1;
				im[b][plus] = g2 + g3;
				g = g3 * (t * RECIPROCAL[m + 4]);
			}
			norms[TERMS] += both * Math.abs(g);
		}
	}

	private void loadGeneral(double[] taps, double step) {
		int n = taps.length;
		for (int k = 0; k < n; k++) {
			double t = (k - (n - 1) / 2.0) * step;
			double g = taps[k];
			int m = 0;
			for (int b = 0; b < blocks; b++, m += 2) {
				double g1 = g * (t * RECIPROCAL[m + 1]);
				norms[m] += Math.abs(g);
				norms[m + 1] += Math.abs(g1);
				re[b][k] = g;
				im[b][k] = g1;
				g = g1 * (t * RECIPROCAL[m + 2]);
			}
			norms[TERMS] += Math.abs(g);
		}
	}

	// See the package's theorem 2.
	private void bound(int n) {
		int perBlock = TERMS / blocks;
		double transform = fft.errorFactor() + 8 * UNIT;
		double total = norms[TERMS];
		for (int b = 0; b < blocks; b++) {
			double block = 0;
			for (int m = b * perBlock; m < (b + 1) * perBlock; m++) {
				total += (6 * m + 6) * UNIT * norms[m];
				block += norms[m];
			}
			total += 2 * transform * block;
		}
		error = errorFactor * (total * (1 + 1e-6) + n * 0x1p-1000);
		sum = norms[0];
	}

	/** Writes the polynomial of a cell, lowest power first; returns the number of coefficients. */
	public int polynomial(int cell, double[] target) {
		int a = fft.position(cell);
		int b = fft.position(-cell & size - 1);
		if (symmetry == Symmetry.NONE) {
			square(a, b, target);
			return SQUARE_TERMS;
		}
		double rotationCos = 1;
		double rotationSin = 0;
		if (halfIndex) {
			rotationCos = turns[2 * cell];
			rotationSin = turns[2 * cell + 1];
		}
		for (int k = 0, m = 0; k < blocks; k++, m += 4) {
			double[] r = re[k];
			double[] i = im[k];
			double xr = (r[a] + r[b]) / 2;
			double xi = (i[a] - i[b]) / 2;
			double yr = (i[a] + i[b]) / 2;
			double yi = (r[b] - r[a]) / 2;
			if (halfIndex) {
				double turned = xr * rotationCos - xi * rotationSin;
				xi = xr * rotationSin + xi * rotationCos;
				xr = turned;
				turned = yr * rotationCos - yi * rotationSin;
				yi = yr * rotationSin + yi * rotationCos;
				yr = turned;
			}
			if (symmetry == Symmetry.EVEN) {
				target[m] = xr;
				target[m + 1] = xi;
				target[m + 2] = -yr;
				target[m + 3] = -yi;
			} else {
				target[m] = xi;
				target[m + 1] = -xr;
				target[m + 2] = -yi;
				target[m + 3] = yr;
			}
		}
		return TERMS;
	}

	private void square(int a, int b, double[] target) {
		for (int k = 0, m = 0; k < blocks; k++, m += 2) {
			double[] r = re[k];
			double[] i = im[k];
			double sign = m % 4 == 0 ? 0.5 : -0.5;
			evenPart[m] = sign * (r[a] + r[b]);
			oddPart[m] = sign * (i[a] - i[b]);
			// times -j: real part becomes minus imaginary, imaginary becomes real
			evenPart[m + 1] = sign * (r[b] - r[a]);
			oddPart[m + 1] = -sign * (i[a] + i[b]);
		}
		for (int k = 0; k < SQUARE_TERMS; k++) {
			double value = 0;
			for (int i = Math.max(0, k - TERMS + 1), j = k - i; i < j; i++, j--) {
				value += evenPart[i] * evenPart[j] + oddPart[i] * oddPart[j];
			}
			value *= 2;
			if (k % 2 == 0) {
				value += evenPart[k / 2] * evenPart[k / 2] + oddPart[k / 2] * oddPart[k / 2];
			}
			target[k] = value;
		}
	}

	/** Sum of the absolute Taylor coefficients of the real and imaginary part of the cell last written as a square,
			squared. */
	double squareSize() {
		double even = 0;
		double odd = 0;
		for (int m = 0; m < TERMS; m++) {
			even += Math.abs(evenPart[m]);
			odd += Math.abs(oddPart[m]);
		}
		return even * even + odd * odd;
	}
}
