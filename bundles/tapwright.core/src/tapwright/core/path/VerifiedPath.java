// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import java.util.List;
import java.util.Optional;
import java.util.Set;

import tapwright.core.problem.Problem;
import tapwright.core.verify.FilterEvidence;

/**
 * A signal path after verification. Immutable.
 *
 * @param name
 *            of the path
 * @param filters
 *            names of its filters
 * @param rates
 *            sample rate at the input and after each stage in Hz; empty when it cannot be told
 * @param chain
 *            the path as one filter; nothing when it is not complete, or equal to no single filter
 * @param evidence
 *            what was proven of that filter; nothing without it
 * @param problems
 *            to be shown at the portfolio's root file
 */
public record VerifiedPath(String name, Set<String> filters, List<Double> rates, Optional<SignalChain> chain,
		Optional<FilterEvidence> evidence, List<Problem> problems) {

	/** Takes copies. */
	public VerifiedPath {
		filters = Set.copyOf(filters);
		rates = List.copyOf(rates);
		problems = List.copyOf(problems);
	}
}
