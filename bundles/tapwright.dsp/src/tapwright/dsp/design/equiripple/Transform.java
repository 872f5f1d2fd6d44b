// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

/**
 * A complex Fourier transform of a power-of-two length, with a proven error bound. Every stage multiplies by a root of unity that is
 * off by less than 3u (u = 2^-53: each part within one unit in the last place, angles at most pi/4 rounded twice), which with the
 * complex product (sqrt 5 u; R. Brent, C. Percival, P. Zimmermann, Error bounds on complex floating-point multiplication, Mathematics
 * of Computation 76, 2007) and the addition makes less than 7u relative to the sum of moduli of its inputs.
 */
final class Transform {

	private static final double STAGE_ERROR = 7 * 0x1p-53;

	private final int length;
	private final double[] cos;
	private final double[] sin;

	/**
	 * Tables for one length.
	 *
	 * @param length
	 *            a power of two, at least 8
	 */
	Transform(int length) {
		this.length = length;
		cos = new double[length / 2];
		sin = new double[length / 2];
		for (int k = 0; k <= length / 8; k++) {
			double c = Math.cos(2 * Math.PI * k / length);
			double s = Math.sin(2 * Math.PI * k / length);
			set(k, c, s);
			set(length / 4 - k, s, c);
			set(length / 4 + k, -s, c);
			set(length / 2 - k, -c, s);
		}
	}

	private void set(int k, double c, double s) {
		if (k < length / 2) {
			cos[k] = c;
			sin[k] = s;
		}
	}

	/** No output is off by more than this times the sum of |re| + |im| of all inputs. */
	double error() {
		return Integer.numberOfTrailingZeros(length) * STAGE_ERROR * (1 + 1e-9);
	}

	/** Replaces z[k] by the sum over n of z[n] exp(-2 pi i n k / length). */
	void forward(double[] re, double[] im) {
		int shift = Integer.numberOfLeadingZeros(length) + 1;
		for (int k = 0; k < length; k++) {
			int mirror = Integer.reverse(k) >>> shift;
			if (k < mirror) {
				swap(re, k, mirror);
				swap(im, k, mirror);
			}
		}
		for (int half = 1; half < length; half *= 2) {
			stage(re, im, half);
		}
	}

	private void stage(double[] re, double[] im, int half) {
		int step = length / (2 * half);
		double[] wr = new double[half];
		double[] wi = new double[half];
		for (int k = 0; k < half; k++) {
			wr[k] = cos[k * step];
			wi[k] = -sin[k * step];
		}
		for (int start = 0; start < length; start += 2 * half) {
			for (int k = 0; k < half; k++) {
				int upper = start + k;
				int lower = upper + half;
				double tr = wr[k] * re[lower] - wi[k] * im[lower];
				double ti = wr[k] * im[lower] + wi[k] * re[lower];
				re[lower] = re[upper] - tr;
				im[lower] = im[upper] - ti;
				re[upper] += tr;
				im[upper] += ti;
			}
		}
	}

	private static void swap(double[] a, int i, int k) {
		double keep = a[i];
		a[i] = a[k];
		a[k] = keep;
	}
}
