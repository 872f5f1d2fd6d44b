// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

import tapwright.core.load.Loads;
import tapwright.core.path.PathVerification;
import tapwright.core.path.VerifiedPath;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Subject;
import tapwright.model.Portfolio;
import tapwright.model.SignalPath;

/** What concerns several filters at once, verified after each of them: processors and signal paths. Confined to one thread. */
record PortfolioWide(Portfolio portfolio, Expression.Names parameters, Collection<VerifiedFilter> filters) {

	Loads loads() {
		return Loads.of(portfolio.getProcessors(), filters.stream().flatMap(filter -> filter.demands().stream()).toList(),
				new Numbers(parameters));
	}

	/**
	 * Verifies the paths.
	 *
	 * @param before
	 *            as they were while the root file was the same; empty when it may have changed
	 * @param touched
	 *            names of filters that may be others than before
	 */
	List<VerifiedPath> paths(List<VerifiedPath> before, Set<String> touched, Function<FilterQuestion, FilterEvidence> answer) {
		var paths = new ArrayList<VerifiedPath>();
		for (int k = 0; k < portfolio.getPaths().size(); k++) {
			SignalPath path = portfolio.getPaths().get(k);
			boolean same = k < before.size() && Collections.disjoint(before.get(k).filters(), touched);
			paths.add(same ? before.get(k) : PathVerification.verify(path, parameters, this::subject, answer));
		}
		return paths;
	}

	private Optional<Subject> subject(String name) {
		List<VerifiedFilter> found = filters.stream().filter(filter -> filter.name().equals(name)).toList();
		return found.size() == 1 ? found.getFirst().subject() : Optional.empty();
	}
}
