// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * Windows without a parameter. Unless said otherwise the coefficients are those of F. J. Harris, On the use of windows
 * for harmonic analysis with the discrete Fourier transform, Proceedings of the IEEE 66(1), 1978.
 */
public enum CommonWindow implements Window {

	/** All ones. */
	RECTANGULAR(1),
	/**
	 * A triangle that is zero at both ends (M. S. Bartlett, Periodogram analysis and continuous spectra, Biometrika 37,
	 * 1950).
	 */
	BARTLETT,
	/** One period of a raised cosine; zero at both ends. */
	HANN(0.5, 0.5),
	/** Hamming with the usual rounded coefficients 0.54 and 0.46. */
	HAMMING(0.54, 0.46),
	/** Hamming with 25/46 and 21/46, which put a zero exactly on the first side lobe of the Hann window. */
	HAMMING_EXACT(25.0 / 46, 21.0 / 46),
	/** Blackman with the usual rounded coefficients 0.42, 0.5 and 0.08. */
	BLACKMAN(0.42, 0.5, 0.08),
	/** Blackman with 7938, 9240 and 1430 over 18608, which put zeros exactly on the third and fourth side lobes. */
	BLACKMAN_EXACT(7938.0 / 18608, 9240.0 / 18608, 1430.0 / 18608),
	/** Four-term Blackman-Harris, side lobes at -92 dB. */
	BLACKMAN_HARRIS(0.35875, 0.48829, 0.14128, 0.01168),
	/**
	 * Four terms with the lowest side lobes, -98 dB (A. H. Nuttall, Some windows with very good sidelobe behavior, IEEE
	 * Transactions on Acoustics, Speech, and Signal Processing 29(1), 1981).
	 */
	NUTTALL(0.3635819, 0.4891775, 0.1365995, 0.0106411),
	/**
	 * Five-term flat top: scalloping loss near 0.01 dB; negative near its ends (G. D'Antona and A. Ferrero, Digital
	 * signal processing for measurement systems, 2006).
	 */
	FLAT_TOP(0.21557895, 0.41663158, 0.277263158, 0.083578947, 0.006947368);

	private final double[] cosines;

	CommonWindow(double... cosines) {
		this.cosines = cosines;
	}

	@Override
	public double[] firstHalf(int length) {
		double[] half = new double[(length + 1) / 2];
		for (int k = 0; k < half.length; k++) {
			half[k] = this == BARTLETT ? 2.0 * k / (length - 1) : cosineSum(2 * Math.PI * k / (length - 1));
		}
		return half;
	}

	private double cosineSum(double angle) {
		double sum = 0;
		for (int i = cosines.length - 1; i >= 0; i--) {
			sum += (i % 2 == 0 ? cosines[i] : -cosines[i]) * Math.cos(i * angle);
		}
		return sum;
	}
}
