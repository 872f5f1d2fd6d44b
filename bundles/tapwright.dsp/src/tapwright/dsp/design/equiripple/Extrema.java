// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.Arrays;

/**
 * Local extrema of the weighted error in all bands: samples between the points of the reference, then a parabola in
 * angle through each sample that sticks out. The points of the reference are samples themselves, so the error
 * alternates at least as often as it does there.
 */
final class Extrema {

	/** A refined parabola is this part as wide as the one before. */
	private static final double NARROWING = 1.0 / 16;
	/**
	 * Parts of a step at which samples near a band's edges lie too: a sloped target can have an extremum just beside
	 * its edge.
	 */
	private static final double[] NEAR_EDGE = { 0x1p-12, 0x1p-8, 0x1p-4 };

	private final Target target;
	private final Interpolant approximation;
	private final int unknowns;
	private final int stepsPerGap;
	private final int polish;

	private double[] angle;
	private double[] x;
	private int[] band;
	private int count;
	private double[] desired = new double[0];
	private double[] weight = new double[0];
	private double[] values = new double[0];

	/**
	 * A search.
	 *
	 * @param stepsPerGap
	 *            samples between neighbouring points of the reference, plus one
	 * @param polish
	 *            how many more times each extremum is refined
	 */
	Extrema(Target target, Interpolant approximation, int unknowns, int stepsPerGap, int polish) {
		this.target = target;
		this.approximation = approximation;
		this.unknowns = unknowns;
		this.stepsPerGap = stepsPerGap;
		this.polish = polish;
	}

	/** The extrema in rising frequency, each of the other sign than its neighbours. */
	Peaks find(Reference reference) {
		sample(reference);
		double[] error = errors(x, band, count);
		Peaks peaks = new Peaks(count);
		int[] sample = new int[count];
		for (int i = 0; i < count; i++) {
			double e = Math.abs(error[i]);
			double sign = Math.signum(error[i]);
			if (e > 0 && (isFirst(i) || sign * error[i - 1] <= e) && (isLast(i) || sign * error[i + 1] < e)) {
				sample[peaks.count] = i;
				peaks.add(x[i], band[i], error[i]);
			}
		}
		refine(peaks, sample, error);
		return peaks.alternating();
	}

	private boolean isFirst(int i) {
		return i == 0 || band[i - 1] != band[i];
	}

	private boolean isLast(int i) {
		return i == count - 1 || band[i + 1] != band[i];
	}

	// Moves each peak inside a band to the vertex of the parabola through it and its neighbours when that is higher.
	private void refine(Peaks peaks, int[] sample, double[] error) {
		int n = peaks.count;
		double[] at = new double[n];
		double[] reach = new double[n];
		double[] vertex = new double[n];
		for (int i = 0; i < n; i++) {
			int k = sample[i];
			at[i] = angle[k];
			vertex[i] = at[i];
			if (!isFirst(k) && !isLast(k)) {
				reach[i] = Math.min(at[i] - angle[k - 1], angle[k + 1] - at[i]);
				vertex[i] = vertex(angle[k - 1], error[k - 1], at[i], error[k], angle[k + 1], error[k + 1]);
			}
		}
		accept(peaks, at, vertex);
		for (int round = 0; round < polish; round++) {
			double[] left = new double[n];
			double[] right = new double[n];
			for (int i = 0; i < n; i++) {
				reach[i] *= NARROWING;
				left[i] = Math.cos(at[i] - reach[i]);
				right[i] = Math.cos(at[i] + reach[i]);
			}
			double[] leftError = errors(left, peaks.band, n);
			double[] rightError = errors(right, peaks.band, n);
			for (int i = 0; i < n; i++) {
				vertex[i] = reach[i] == 0 ? at[i]
						: vertex(at[i] - reach[i], leftError[i], at[i], peaks.error[i], at[i] + reach[i],
						rightError[i]);
			}
			accept(peaks, at, vertex);
		}
	}

	private void accept(Peaks peaks, double[] at, double[] vertex) {
		int n = peaks.count;
		double[] points = new double[n];
		for (int i = 0; i < n; i++) {
			points[i] = vertex[i] == at[i] ? peaks.x[i] : Math.cos(vertex[i]);
		}
		double[] error = errors(points, peaks.band, n);
		for (int i = 0; i < n; i++) {
			if (Math.abs(error[i]) > Math.abs(peaks.error[i]) && error[i] * peaks.error[i] > 0) {
				at[i] = vertex[i];
				peaks.x[i] = points[i];
				peaks.error[i] = error[i];
			}
		}
	}

	// Top of the parabola, at most as far away as its farther outer point.
	private static double vertex(double a, double ea, double b, double eb, double c, double ec) {
		double p = (b - a) * (eb - ec);
		double q = (b - c) * (eb - ea);
		double at = b - 0.5 * ((b - a) * p - (b - c) * q) / (p - q);
		return Double.isNaN(at) ? b : Math.min(Math.max(at, a), c);
	}

	private void sample(Reference reference) {
		int n = reference.x().length;
		x = new double[stepsPerGap * (n + 3 * target.bands())];
		angle = new double[x.length];
		band = new int[x.length];
		count = 0;
		int next = 0;
		for (int b = 0; b < target.bands(); b++) {
			add(Math.acos(target.xFrom(b)), target.xFrom(b), b);
			for (; next < n && reference.band()[next] == b; next++) {
				gap(reference.x()[next], b);
			}
			gap(target.xTo(b), b);
		}
	}

	// Samples evenly in angle from the last sample up to and including the end of a gap.
	private void gap(double to, int b) {
		double from = x[count - 1];
		if (to >= from) {
			return;
		}
		double start = angle[count - 1];
		double end = Math.acos(to);
		int steps = stepsPerGap * (int) Math.max(1, Math.rint((end - start) * unknowns / Math.PI));
		double step = (end - start) / steps;
		double turnCos = Math.cos(step);
		double turnSin = Math.sin(step);
		double c = from;
		double s = Math.sqrt((1 - from) * (1 + from));
		if (from == target.xFrom(b)) {
			for (double part : NEAR_EDGE) {
				addInside(start + step * part, Math.cos(start + step * part), to, b);
			}
		}
		for (int i = 1; i < steps; i++) {
			double turned = c * turnCos - s * turnSin;
			s = s * turnCos + c * turnSin;
			c = turned;
			addInside(start + i * step, c, to, b);
		}
		if (to == target.xTo(b)) {
			for (int i = NEAR_EDGE.length - 1; i >= 0; i--) {
				addInside(end - step * NEAR_EDGE[i], Math.cos(end - step * NEAR_EDGE[i]), to, b);
			}
		}
		add(end, to, b);
	}

	private void addInside(double atAngle, double at, double to, int b) {
		if (at < x[count - 1] && at > to) {
			add(atAngle, at, b);
		}
	}

	private void add(double atAngle, double at, int b) {
		if (count == x.length) {
			x = Arrays.copyOf(x, 2 * count);
			angle = Arrays.copyOf(angle, 2 * count);
			band = Arrays.copyOf(band, 2 * count);
		}
		angle[count] = atAngle;
		x[count] = at;
		band[count++] = b;
	}

	private double[] errors(double[] at, int[] in, int n) {
		if (values.length < n) {
			values = new double[n];
			desired = new double[n];
			weight = new double[n];
		}
		approximation.evaluate(at, n, values);
		for (int from = 0; from < n;) {
			int to = from + 1;
			while (to < n && in[to] == in[from]) {
				to++;
			}
			target.fill(in[from], at, from, to, desired, weight);
			from = to;
		}
		double[] result = new double[n];
		for (int i = 0; i < n; i++) {
			result[i] = weight[i] * (values[i] - desired[i]);
		}
		return result;
	}
}
