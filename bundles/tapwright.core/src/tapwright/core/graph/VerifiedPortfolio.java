// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

import tapwright.core.load.Loads;
import tapwright.core.load.ProcessorLoad;
import tapwright.core.path.VerifiedPath;
import tapwright.core.problem.Duplicates;
import tapwright.core.problem.Problem;
import tapwright.core.quantity.Expression;
import tapwright.model.io.ModelFiles;

/** A portfolio after verification: one state, immutable, readable from any thread. */
public final class VerifiedPortfolio {

	/** No files. */
	public static final VerifiedPortfolio EMPTY = new VerifiedPortfolio(Expression.Names.NONE, List.of(), new TreeMap<>(),
			Loads.NONE, List.of());

	private final Expression.Names parameters;
	private final List<Problem> portfolioProblems;
	private final SortedMap<String, VerifiedFilter> filters;
	private final Loads loads;
	private final List<VerifiedPath> paths;
	private final Map<String, List<Problem>> problems;

	VerifiedPortfolio(Expression.Names parameters, List<Problem> portfolioProblems, SortedMap<String, VerifiedFilter> filters,
			Loads loads, List<VerifiedPath> paths) {
		this.parameters = parameters;
		this.portfolioProblems = List.copyOf(portfolioProblems);
		this.filters = Collections.unmodifiableSortedMap(filters);
		this.loads = loads;
		this.paths = List.copyOf(paths);
		this.problems = collect();
	}

	/** Values of the parameters; asking for one that has none says why. */
	public Expression.Names parameters() {
		return parameters;
	}

	/** All filter files in the order of their paths. */
	public Collection<VerifiedFilter> filters() {
		return filters.values();
	}

	/** The filter file with the given path. */
	public Optional<VerifiedFilter> filter(String path) {
		return Optional.ofNullable(filters.get(path));
	}

	/** Paths of the filters that use a parameter by name. */
	public List<String> usersOf(String parameter) {
		return filters.values().stream().filter(filter -> filter.parameters().contains(parameter)).map(VerifiedFilter::path).toList();
	}

	/** Every processor with what its filters ask of it, in the order of the portfolio. */
	public List<ProcessorLoad> loads() {
		return loads.loads();
	}

	/** All signal paths in the order of the portfolio. */
	public List<VerifiedPath> paths() {
		return paths;
	}

	/** The problems of a file: of a filter, or of the portfolio's root file. */
	public List<Problem> problems(String path) {
		return problems.getOrDefault(path, List.of());
	}

	/** All problems, by the path of the file that they are shown at. */
	public Map<String, List<Problem>> problems() {
		return problems;
	}

	private Map<String, List<Problem>> collect() {
		var collected = new TreeMap<String, List<Problem>>();
		var ofRoot = new ArrayList<Problem>(portfolioProblems);
		ofRoot.addAll(loads.problems());
		paths.forEach(path -> ofRoot.addAll(path.problems()));
		if (!ofRoot.isEmpty()) {
			collected.put(ModelFiles.PORTFOLIO_FILE, ofRoot);
		}
		var claims = new ArrayList<Duplicates.Claim>();
		for (VerifiedFilter filter : filters.values()) {
			var ofFilter = new ArrayList<Problem>(filter.ownProblems());
			ofFilter.addAll(loads.problems(filter.demands()));
			if (!ofFilter.isEmpty()) {
				collected.put(filter.path(), ofFilter);
			}
			if (filter.evidence().isPresent()) {
				claims.add(new Duplicates.Claim(filter.path(), filter.name(), filter.identity()));
			}
		}
		Duplicates.among(claims)
				.forEach((path, found) -> collected.computeIfAbsent(path, unused -> new ArrayList<>()).addAll(found));
		collected.replaceAll((path, found) -> List.copyOf(found));
		return Collections.unmodifiableMap(collected);
	}
}
