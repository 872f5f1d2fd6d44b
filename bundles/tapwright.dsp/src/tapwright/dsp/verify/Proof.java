// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import tapwright.dsp.exact.Enclosure;

/**
 * The result of proving one requirement.
 *
 * @param verdict
 *            met, missed or unproven
 * @param worst
 *            where the margin is smallest (for a missed requirement: a place that breaks it), in hertz, seconds or
 *            samples as the requirement's kind says; NaN when the requirement has no place
 * @param value
 *            encloses the worst value, in the unit of the limit; for a missed requirement the true worst value over
 *            the whole range, as far as it is known
 * @param limit
 *            the limit that the value is compared with, at the worst place
 * @param margin
 *            encloses the signed distance between value and limit, in the unit of the limit; negative means missed
 * @param note
 *            empty, or one sentence for a person: why nothing could be proven, or what the proof rests on
 */
public record Proof(Verdict verdict, double worst, Enclosure value, double limit, Enclosure margin, String note) {
}
