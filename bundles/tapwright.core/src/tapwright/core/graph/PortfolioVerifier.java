// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import tapwright.core.InputException;
import tapwright.core.load.Demands;
import tapwright.core.load.Loads;
import tapwright.core.path.VerifiedPath;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioContent;
import tapwright.core.problem.Contradictions;
import tapwright.core.problem.DesignProblems;
import tapwright.core.problem.Problem;
import tapwright.core.problem.Problems;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.Portfolio;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelFiles;

/** Takes a portfolio from one verified state to the next, verifying only what a change can have touched. */
public final class PortfolioVerifier {

	private record Root(Portfolio portfolio, Expression.Names parameters, List<Problem> problems) {
	}

	private final PortfolioContent content;
	private final EvidenceCache cache;

	/**
	 * @param content
	 *            the files
	 * @param cache
	 *            remembers evidence between states
	 */
	public PortfolioVerifier(PortfolioContent content, EvidenceCache cache) {
		this.content = content;
		this.cache = cache;
	}

	/**
	 * The state after a change. Filters are verified on all processors; the result does not depend on their number.
	 *
	 * @param before
	 *            the last state
	 * @param progress
	 *            asked from several threads
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled; evidence that was already found is remembered, the state before stays valid
	 * @throws IOException
	 *             when the folder cannot be listed
	 */
	public VerifiedPortfolio update(VerifiedPortfolio before, Change change, Progress progress) throws IOException {
		Root root = readRoot();
		Collection<String> affected = affected(before, change, root.parameters());
		SortedMap<String, VerifiedFilter> filters = new TreeMap<>();
		if (!change.everything()) {
			before.filters().forEach(filter -> filters.put(filter.path(), filter));
			filters.keySet().removeAll(change.removed());
		}
		for (VerifiedFilter filter : verify(List.copyOf(affected), root.parameters(), progress)) {
			filters.put(filter.path(), filter);
		}
		boolean rootMayDiffer = change.everything() || touches(change, ModelFiles.PORTFOLIO_FILE);
		var portfolio = new PortfolioWide(root.portfolio(), root.parameters(), filters.values());
		Loads loads = portfolio.loads();
		Set<String> touched = Stream.concat(affected.stream(), change.removed().stream())
				.flatMap(path -> Stream.of(before.filter(path), Optional.ofNullable(filters.get(path))))
				.flatMap(Optional::stream).map(VerifiedFilter::name).collect(Collectors.toSet());
		List<VerifiedPath> paths = portfolio.paths(rootMayDiffer ? List.of() : before.paths(), touched, question -> {
			progress.checkCancelled();
			return cache.answer(question, new Effort(progress, Effort.STANDARD.timeLimit()));
		});
		var after = new VerifiedPortfolio(root.parameters(), root.problems(), filters, loads, paths);
		forgetUnused(after, change.everything());
		return after;
	}

	/** The parameters as the root file has them now. */
	public Expression.Names readParameters() {
		return readRoot().parameters();
	}

	private static boolean touches(Change change, String path) {
		return change.changed().contains(path) || change.removed().contains(path);
	}

	private Collection<String> affected(VerifiedPortfolio before, Change change, Expression.Names parameters) throws IOException {
		if (change.everything()) {
			return new TreeSet<>(content.filters());
		}
		var affected = new TreeSet<>(change.changed());
		affected.remove(ModelFiles.PORTFOLIO_FILE);
		for (VerifiedFilter filter : before.filters()) {
			if (lacksSomething(filter) || usesDifference(filter, before.parameters(), parameters)) {
				affected.add(filter.path());
			}
		}
		Set<String> other = Stream.concat(affected.stream(), change.removed().stream()).map(FilePartners::nameOf)
				.collect(Collectors.toSet());
		before.filters().stream().filter(filter -> !Collections.disjoint(filter.partners(), other)).map(VerifiedFilter::path)
				.forEach(affected::add);
		affected.removeAll(change.removed());
		return affected;
	}

	// What was not found, a parameter or a partner, may be there now.
	private static boolean lacksSomething(VerifiedFilter filter) {
		return filter.evidence().map(FilterEvidence::problems).filter(problems -> !problems.isEmpty()).isPresent();
	}

	private static boolean usesDifference(VerifiedFilter filter, Expression.Names before, Expression.Names after) {
		return before != after
				&& filter.parameters().stream().anyMatch(name -> !value(before, name).equals(value(after, name)));
	}

	private static Object value(Expression.Names names, String name) {
		try {
			return names.value(name);
		} catch (InputException e) {
			return e.describe();
		}
	}

	private Root readRoot() {
		try {
			Portfolio portfolio = ModelFiles.parse(content.read(ModelFiles.PORTFOLIO_FILE), ModelFiles.PORTFOLIO_FILE,
					Portfolio.class);
			var parameters = new Parameters(portfolio.getParameters());
			return new Root(portfolio, parameters, Problems.of(parameters));
		} catch (NoSuchFileException e) {
			return new Root(ModelFactory.eINSTANCE.createPortfolio(), Parameters.NONE, List.of());
		} catch (IOException e) {
			return new Root(ModelFactory.eINSTANCE.createPortfolio(), name -> {
				throw new InputException("", "the parameter '" + name + "' is not known, because " + ModelFiles.PORTFOLIO_FILE
						+ " cannot be read");
			}, List.of(unreadable(e)));
		}
	}

	private List<VerifiedFilter> verify(List<String> paths, Expression.Names parameters, Progress progress) {
		var effort = new Effort(progress, Effort.STANDARD.timeLimit());
		var done = new AtomicInteger();
		return paths.parallelStream().map(path -> {
			progress.checkCancelled();
			VerifiedFilter filter = verify(path, parameters, effort);
			int count = done.incrementAndGet();
			progress.report(count + " of " + paths.size() + " filters", (double) count / paths.size());
			return filter;
		}).toList();
	}

	// The model object is made, read and dropped on one thread.
	private VerifiedFilter verify(String path, Expression.Names parameters, Effort effort) {
		Filter filter;
		try {
			filter = ModelFiles.parse(content.read(path), path, Filter.class);
		} catch (IOException e) {
			return VerifiedFilter.unreadable(path, unreadable(e));
		}
		if (filter.getName() == null) {
			filter.setName(FilePartners.nameOf(path));
		}
		FilterQuestion question = FilterQuestion.of(filter, parameters, new FilePartners(content, parameters));
		FilterEvidence evidence = cache.answer(question, effort);
		var problems = new ArrayList<>(Problems.of(evidence));
		Set<String> used = new TreeSet<>(question.parameters());
		Expression.Names recorder = name -> {
			used.add(name); // also when it has no value: it may get one
			return parameters.value(name);
		};
		problems.addAll(DesignProblems.of(filter, question.name(), recorder));
		problems.addAll(Contradictions.of(filter, question.name(), new Numbers(parameters)));
		Optional<Demands> demands = question.subject()
				.map(subject -> Demands.of(filter, question.name(), subject, new Numbers(recorder)));
		demands.ifPresent(found -> problems.addAll(found.problems()));
		return new VerifiedFilter(path, question.name(), filter.getIdentity() == null ? "" : filter.getIdentity(), used,
				question.partners(), Optional.of(evidence), question.subject(), demands.map(Demands::demands).orElse(List.of()),
				problems);
	}

	private void forgetUnused(VerifiedPortfolio state, boolean everything) {
		Set<String> used = Stream
				.concat(state.filters().stream().flatMap(filter -> filter.evidence().stream()),
						state.paths().stream().flatMap(path -> path.evidence().stream()))
				.map(FilterEvidence::hash)
				.collect(Collectors.toSet());
		cache.retain(used);
		if (everything) {
			cache.retainStored(used);
		}
	}

	private static Problem unreadable(IOException e) {
		return switch (e) {
		case ModelFileException malformed -> Problems.unreadable(malformed.reason(), malformed.line());
		case NoSuchFileException gone -> Problems.unreadable("it is gone; refresh the project", 0);
		default -> Problems.unreadable(e.getMessage(), 0);
		};
	}
}
