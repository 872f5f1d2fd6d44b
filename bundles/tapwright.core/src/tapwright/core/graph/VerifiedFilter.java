// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.List;
import java.util.Optional;
import java.util.Set;

import tapwright.core.load.Demand;
import tapwright.core.problem.Problem;
import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.verify.Subject;

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
 * @param subject
 *            the filter as it ships; nothing when it has no usable coefficients
 * @param demands
 *            what it asks of processors
 * @param ownProblems
 *            problems that this file alone gives rise to
 */
public record VerifiedFilter(String path, String name, String identity, Set<String> parameters, Set<String> partners,
		Optional<FilterEvidence> evidence, Optional<Subject> subject, List<Demand> demands, List<Problem> ownProblems) {

	/** Takes copies. */
	public VerifiedFilter {
		parameters = Set.copyOf(parameters);
		partners = Set.copyOf(partners);
		demands = List.copyOf(demands);
		ownProblems = List.copyOf(ownProblems);
	}

	/** A file that cannot be read. */
	static VerifiedFilter unreadable(String path, Problem problem) {
		return new VerifiedFilter(path, "", "", Set.of(), Set.of(), Optional.empty(), Optional.empty(), List.of(), List.of(problem));
	}
}
