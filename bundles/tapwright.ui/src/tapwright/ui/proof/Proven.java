// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.proof;

import tapwright.core.verify.FilterEvidence;

/**
 * A filter with its evidence. Immutable.
 *
 * @param snapshot
 *            the filter at one moment
 * @param evidence
 *            what was proven of it
 * @param stale
 *            whether the evidence is of an earlier moment than the snapshot
 */
public record Proven(FilterSnapshot snapshot, FilterEvidence evidence, boolean stale) {
}
