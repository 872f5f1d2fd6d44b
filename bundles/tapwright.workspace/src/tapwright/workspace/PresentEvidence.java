// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import tapwright.core.verify.FilterEvidence;

/**
 * The newest evidence of a filter file.
 *
 * @param evidence
 *            the results
 * @param stale
 *            whether the file, or the portfolio's root file, has other content by now
 */
public record PresentEvidence(FilterEvidence evidence, boolean stale) {
}
