// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.List;
import java.util.Optional;
import java.util.Set;

import tapwright.core.problem.Problem;
import tapwright.core.verify.FilterEvidence;

/**
 * One filter file after verification. Immutable.
 *
 * @param path
 *            in the portfolio's folder, with '/' between the parts
 * @param name
 *            of the filter; empty when the file cannot be read
 * @param identity
 *            of the filter; empty when it has none
 * @param parameters
 *            names of the parameters that it uses
 * @param partners
 *            names of the filters that its requirements speak of beside itself
 * @param evidence
 *            nothing when the file cannot be read
 * @param ownProblems
 *            problems that this file alone gives rise to
 */
public record VerifiedFilter(String path, String name, String identity, Set<String> parameters, Set<String> partners,
		Optional<FilterEvidence> evidence, List<Problem> ownProblems) {

	/** Takes copies. */
	public VerifiedFilter {
		parameters = Set.copyOf(parameters);
		partners = Set.copyOf(partners);
		ownProblems = List.copyOf(ownProblems);
	}
}
