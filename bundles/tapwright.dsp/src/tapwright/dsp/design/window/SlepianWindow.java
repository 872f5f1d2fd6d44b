// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.window;

/**
 * The discrete prolate spheroidal window of order zero: of all windows of its length the one with the greatest share of
 * its energy between -W and W (D. Slepian, Prolate spheroidal wave functions, Fourier analysis, and uncertainty V: the
 * discrete case, Bell System Technical Journal 57(5), 1978). It is the eigenvector, for the largest eigenvalue, of a
 * symmetric tridiagonal matrix that commutes with the concentration matrix. Scaled so that its largest sample is 1.
 *
 * @param timeBandwidth
 *            N W, length times half bandwidth in cycles per sample; positive, below half the length
 */
public record SlepianWindow(double timeBandwidth) implements Window {

	/** Checks the parameter. */
	public SlepianWindow {
		if (!(timeBandwidth > 0) || Double.isInfinite(timeBandwidth)) {
			throw new IllegalArgumentException("the time-bandwidth product of the Slepian window is " + timeBandwidth
					+ "; it must be a positive number");
		}
	}

	@Override
	public double[] firstHalf(int length) {
		if (timeBandwidth >= length / 2.0) {
			throw new IllegalArgumentException("the time-bandwidth product " + timeBandwidth
					+ " of the Slepian window must be below half its length " + length);
		}
		// The eigenvector is even, so the half of the matrix folded at the middle has it too and is half as large.
		int n = (length + 1) / 2;
		double cosine = Math.cos(2 * Math.PI * timeBandwidth / length);
		double[] diagonal = new double[n];
		double[] beside = new double[n];
		for (int k = 0; k < n; k++) {
			double distance = (length - 1 - 2.0 * k) / 2;
			diagonal[k] = distance * distance * cosine;
			beside[k] = (k + 1.0) * (length - 1.0 - k) / 2;
		}
		if (length % 2 == 0) {
			diagonal[n - 1] += beside[n - 1];
		} else if (n > 1) {
			beside[n - 2] *= Math.sqrt(2);
		}
		double[] vector = TopEigenvector.of(diagonal, beside);
		if (length % 2 != 0) {
			vector[n - 1] *= Math.sqrt(2);
		}
		double largest = 0;
		for (double value : vector) {
			largest = Math.max(largest, Math.abs(value));
		}
		double scale = Math.copySign(largest, vector[n - 1]);
		for (int k = 0; k < n; k++) {
			vector[k] /= scale;
		}
		return vector;
	}
}
