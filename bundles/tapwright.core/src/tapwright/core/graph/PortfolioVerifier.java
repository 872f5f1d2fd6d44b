// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Collectors;

import tapwright.core.InputException;
import tapwright.core.problem.Problem;
import tapwright.core.problem.Problems;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;
import tapwright.model.Portfolio;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelFiles;

/** Takes a portfolio from one verified state to the next, verifying only what a change can have touched. */
public final class PortfolioVerifier {

	private record Root(Expression.Names parameters, List<Problem> problems) {
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
		ModelPackage.eINSTANCE.eClass(); // registers the format before several threads read files
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
		Root root = change.everything() || touches(change, ModelFiles.PORTFOLIO_FILE) ? readRoot()
				: new Root(before.parameters(), before.portfolioProblems());
		Collection<String> affected = affected(before, change, root.parameters());
		SortedMap<String, VerifiedFilter> filters = new TreeMap<>();
		if (!change.everything()) {
			before.filters().forEach(filter -> filters.put(filter.path(), filter));
			filters.keySet().removeAll(change.removed());
		}
		for (VerifiedFilter filter : verify(affected, root.parameters(), progress)) {
			filters.put(filter.path(), filter);
		}
		var after = new VerifiedPortfolio(root.parameters(), root.problems(), filters);
		forgetUnused(after, change.everything());
		return after;
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
		if (parameters != before.parameters()) {
			before.filters().stream().filter(filter -> dependsOnDifference(filter, before.parameters(), parameters))
					.map(VerifiedFilter::path).forEach(affected::add);
		}
		affected.removeAll(change.removed());
		return affected;
	}

	private static boolean dependsOnDifference(VerifiedFilter filter, Expression.Names before, Expression.Names after) {
		// A filter with a wrong input may lack a parameter that there is now.
		return filter.evidence().map(FilterEvidence::problems).filter(problems -> !problems.isEmpty()).isPresent()
				|| filter.parameters().stream().anyMatch(name -> !value(before, name).equals(value(after, name)));
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
			return new Root(parameters, Problems.of(parameters));
		} catch (NoSuchFileException e) {
			return new Root(Parameters.NONE, List.of());
		} catch (IOException e) {
			return new Root(name -> {
				throw new InputException("", "the parameter '" + name + "' is not known, because " + ModelFiles.PORTFOLIO_FILE
						+ " cannot be read");
			}, List.of(unreadable(e)));
		}
	}

	private List<VerifiedFilter> verify(Collection<String> paths, Expression.Names parameters, Progress progress) {
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
			return new VerifiedFilter(path, "", "", Set.of(), Optional.empty(), List.of(unreadable(e)));
		}
		if (filter.getName() == null) {
			filter.setName(baseName(path));
		}
		FilterQuestion question = FilterQuestion.of(filter, parameters);
		FilterEvidence evidence = cache.answer(question, effort);
		return new VerifiedFilter(path, question.name(), filter.getIdentity() == null ? "" : filter.getIdentity(),
				question.parameters(), Optional.of(evidence), Problems.of(evidence));
	}

	private void forgetUnused(VerifiedPortfolio state, boolean everything) {
		Set<String> used = state.filters().stream().flatMap(filter -> filter.evidence().stream()).map(FilterEvidence::hash)
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

	private static String baseName(String path) {
		String name = path.substring(path.lastIndexOf('/') + 1);
		int dot = name.lastIndexOf('.');
		return dot > 0 ? name.substring(0, dot) : name;
	}
}
