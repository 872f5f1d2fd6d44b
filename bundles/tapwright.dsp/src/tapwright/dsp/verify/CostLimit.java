// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.util.Objects;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.Rationals;

/**
 * The filter needs no more than this of a processor or circuit. Counts follow {@link Cost}; without stated arithmetic
 * a plain delay line is counted. The proof has no place.
 *
 * @param resource
 *            what is counted
 * @param max
 *            most that is allowed, not negative
 */
public record CostLimit(Resource resource, double max) implements Requirement {

	/** What can be counted. */
	public enum Resource {
		/** Number of coefficients. */
		TAPS,
		/** Multiplications per output sample. */
		MULTIPLIES,
		/** Additions per output sample. */
		ADDS,
		/** Words of memory for coefficients and delay line. */
		MEMORY,
		/** Multiplications per second. */
		MULTIPLIES_PER_SECOND
	}

	/** Checks the limit. */
	public CostLimit {
		Objects.requireNonNull(resource);
		Exactly.checkLimit("the limit of the cost", max);
	}

	@Override
	public Proof prove(Subject subject, Effort effort) {
		if (resource == Resource.TAPS) {
			return Exactly.atMost(new BigFraction(subject.taps().length()), max, Double.NaN, "");
		}
		Cost cost = Cost.of(subject.taps(), subject.arithmetic().orElseGet(() -> Arithmetic.exact(Structure.DIRECT,
				1)));
		BigFraction need = switch (resource) {
			case TAPS -> throw new AssertionError();
			case MULTIPLIES -> cost.multipliesPerOutput();
			case ADDS -> new BigFraction(cost.adds(), (long) cost.outputs());
			case MEMORY -> new BigFraction(cost.memoryWords());
			case MULTIPLIES_PER_SECOND -> new BigFraction(cost.multiplies(), (long) cost.inputs())
					.multiply(Rationals.exact(subject.sampleRate()));
		};
		return Exactly.atMost(need, max, Double.NaN, "");
	}
}
