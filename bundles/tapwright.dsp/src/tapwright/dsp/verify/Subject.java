// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Objects;
import java.util.Optional;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.exact.ExactTaps;

/**
 * The filter that a proof speaks of. Immutable.
 *
 * @param taps
 *            the exact coefficients; those that ship, so already rounded to the coefficient format when there is one
 * @param sampleRate
 *            input sample rate in hertz, exactly this double; positive and finite
 * @param arithmetic
 *            structure and number formats that the filter runs in, when they are stated
 */
public record Subject(ExactTaps taps, double sampleRate, Optional<Arithmetic> arithmetic) {

	/** Checks the rate. */
	public Subject {
		Objects.requireNonNull(taps);
		Objects.requireNonNull(arithmetic);
		if (!(sampleRate > 0) || Double.isInfinite(sampleRate)) {
			throw new IllegalArgumentException("the sample rate is " + sampleRate
					+ " Hz; it must be a positive number");
		}
	}

	/** A filter without stated arithmetic. */
	public Subject(ExactTaps taps, double sampleRate) {
		this(taps, sampleRate, Optional.empty());
	}
}
