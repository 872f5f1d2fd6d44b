// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.Optional;

import tapwright.core.verify.FilterEvidence;
import tapwright.ui.proof.FilterSnapshot;

/**
 * One of the filters in a picture. Immutable.
 *
 * @param snapshot
 *            the filter
 * @param evidence
 *            its evidence, when there is some; the worst places come from it
 */
public record Overlay(FilterSnapshot snapshot, Optional<FilterEvidence> evidence) {
}
