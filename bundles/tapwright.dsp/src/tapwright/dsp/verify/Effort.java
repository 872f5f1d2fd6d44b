// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.time.Duration;
import java.util.Objects;

import tapwright.dsp.Progress;

/**
 * How hard a proof tries.
 *
 * @param progress
 *            can cancel the proof
 * @param timeLimit
 *            after this time a proof answers 'unproven' and says so
 */
public record Effort(Progress progress, Duration timeLimit) {

	/** Ten seconds per requirement, no cancelling. */
	public static final Effort STANDARD = new Effort(Progress.NONE, Duration.ofSeconds(10));

	/** Checks the limit. */
	public Effort {
		Objects.requireNonNull(progress);
		if (timeLimit.isNegative()) {
			throw new IllegalArgumentException("the time limit is negative");
		}
	}
}
