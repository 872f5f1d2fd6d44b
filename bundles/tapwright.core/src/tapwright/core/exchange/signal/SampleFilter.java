// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.util.Optional;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.BitTrue;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.verify.Subject;

/** One channel of a filter over blocks of samples: bit-true, or in double precision where formats are not stated. */
sealed interface SampleFilter {

	/** Outputs that became complete. */
	double[] filter(double[] samples, int count);

	/** A bit-true filter over integers of its input format. */
	record Exact(BitTrue filter) implements SampleFilter {

		@Override
		public double[] filter(double[] samples, int count) {
			long[] integers = new long[count];
			for (int n = 0; n < count; n++) {
				integers[n] = (long) samples[n];
			}
			long[] outputs = filter.filter(integers);
			double[] result = new double[outputs.length];
			for (int n = 0; n < result.length; n++) {
				result[n] = outputs[n];
			}
			return result;
		}
	}

	/** A filter in double precision, with the rate change of its structure. */
	final class Real implements SampleFilter {

		private final double[] taps;
		private final int decimation;
		private final int interpolation;
		private final double[] line;
		private int wait;

		Real(Subject filter) {
			taps = filter.taps().toDoubles();
			Optional<Arithmetic> arithmetic = filter.arithmetic();
			decimation = arithmetic.map(Arithmetic::decimation).orElse(1);
			interpolation = arithmetic.map(Arithmetic::interpolation).orElse(1);
			line = new double[(taps.length - 1) / interpolation + 1];
		}

		@Override
		public double[] filter(double[] samples, int count) {
			double[] outputs = new double[((count + decimation - 1 - wait) / decimation) * interpolation];
			int written = 0;
			for (int n = 0; n < count; n++) {
				System.arraycopy(line, 0, line, 1, line.length - 1);
				line[0] = samples[n];
				if (wait > 0) {
					wait--;
					continue;
				}
				wait = decimation - 1;
				for (int phase = 0; phase < interpolation; phase++) {
					double sum = 0;
					for (int k = phase, delay = 0; k < taps.length; k += interpolation, delay++) {
						sum += taps[k] * line[delay];
					}
					outputs[written++] = sum;
				}
			}
			return outputs;
		}
	}

	/** A number of steps as an integer of a format; saturates, as a converter does. */
	static double convert(double steps, NumberFormat format, Rounding rounding) {
		double floor = Math.floor(steps);
		double above = steps - floor;
		boolean up = above > 0 && switch (rounding) {
		case TOWARD_ZERO -> steps < 0;
		case FLOOR -> false;
		case HALF_UP -> above >= 0.5;
		case HALF_EVEN -> above > 0.5 || above == 0.5 && floor % 2 != 0;
		case HALF_AWAY -> above > 0.5 || above == 0.5 && steps > 0;
		};
		return Math.clamp(up ? floor + 1 : floor, format.min().doubleValue(), format.max().doubleValue());
	}
}
