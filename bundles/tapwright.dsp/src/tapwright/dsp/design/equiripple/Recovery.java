// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

/**
 * Coefficients of the sum of cosines that an {@link Interpolant} stands for. Its values at L Chebyshev points go
 * through a cosine transform; but inside wide transitions these values are extrapolated and inaccurate, which the
 * transform would spread over all bands. So the sum that came out is evaluated at the reference, and what is missing
 * there is interpolated and transformed again, until nothing more is gained (iterative refinement).
 */
final class Recovery {

	private static final int ROUNDS = 8;
	private static final int STEPS_PER_START = 32;

	private Recovery() {
	}

	/** p[0..unknowns-1] of p[0] + p[1] cos w + p[2] cos 2w + ... */
	static double[] coefficients(Interpolant approximation, int unknowns) {
		double[] x = approximation.points();
		double[] angle = new double[x.length];
		for (int i = 0; i < x.length; i++) {
			angle[i] = Math.acos(x[i]);
		}
		double[] best = transform(approximation, unknowns);
		double[] missing = missing(best, angle, approximation.values());
		double error = largest(missing);
		for (int round = 0; round < ROUNDS; round++) {
			double[] next = transform(approximation.with(missing), unknowns);
			for (int k = 0; k < unknowns; k++) {
				next[k] += best[k];
			}
			double[] stillMissing = missing(next, angle, approximation.values());
			double nextError = largest(stillMissing);
			if (!(nextError < error)) {
				break;
			}
			boolean slow = nextError > error / 2;
			best = next;
			missing = stillMissing;
			error = nextError;
			if (slow) {
				break;
			}
		}
		return best;
	}

	private static double[] transform(Interpolant approximation, int n) {
		double[] cosines = new double[4 * n];
		for (int k = 0; k < 4 * n; k++) {
			cosines[k] = Math.cos(2 * Math.PI * k / (4 * n));
		}
		double[] nodes = new double[n];
		for (int j = 0; j < n; j++) {
			nodes[j] = cosines[2 * j + 1];
		}
		double[] values = new double[n];
		approximation.evaluate(nodes, n, values);
		double[] p = new double[n];
		for (int k = 0; k < n; k++) {
			double sum = 0;
			int index = k;
			for (int j = 0; j < n; j++) {
				sum += values[j] * cosines[index];
				index += 2 * k;
				if (index >= 4 * n) {
					index -= 4 * n;
				}
			}
			p[k] = sum * (k == 0 ? 1 : 2) / n;
		}
		return p;
	}

	// Wanted values minus the sum of cosines, which is restarted from exact cosines so that its rounding errors do not
	// grow.
	private static double[] missing(double[] p, double[] angle, double[] wanted) {
		int points = angle.length;
		double[] rest = wanted.clone();
		double[] c = new double[points];
		double[] s = new double[points];
		double[] c1 = new double[points];
		double[] s1 = new double[points];
		for (int i = 0; i < points; i++) {
			c1[i] = Math.cos(angle[i]);
			s1[i] = Math.sin(angle[i]);
		}
		for (int start = 0; start < p.length; start += STEPS_PER_START) {
			for (int i = 0; i < points; i++) {
				c[i] = Math.cos(start * angle[i]);
				s[i] = Math.sin(start * angle[i]);
			}
			for (int k = start; k < Math.min(start + STEPS_PER_START, p.length); k++) {
				double pk = p[k];
				for (int i = 0; i < points; i++) {
					rest[i] -= pk * c[i];
					double next = c[i] * c1[i] - s[i] * s1[i];
					s[i] = s[i] * c1[i] + c[i] * s1[i];
					c[i] = next;
				}
			}
		}
		return rest;
	}

	private static double largest(double[] values) {
		double largest = 0;
		for (double value : values) {
			largest = Double.isNaN(value) ? Double.POSITIVE_INFINITY : Math.max(largest, Math.abs(value));
		}
		return largest;
	}
}
