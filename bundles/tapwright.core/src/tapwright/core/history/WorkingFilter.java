// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.core.portfolio.Sources;
import tapwright.core.verify.FilterQuestion;
import tapwright.model.Filter;
import tapwright.model.Parameter;
import tapwright.model.Revision;
import tapwright.model.io.ModelFiles;

/**
 * The present state of a filter file. Confined to one thread, like the model objects that it holds.
 *
 * @param file
 *            where it is
 * @param filter
 *            its content
 * @param source
 *            with parameters and partners
 * @param defined
 *            parameters of its portfolio
 */
public record WorkingFilter(Path file, Filter filter, FilterSource source, List<Parameter> defined) {

	/**
	 * Reads a filter file.
	 *
	 * @throws InputException
	 *             when it is no filter file, or cannot be read as one
	 * @throws IOException
	 *             when the root file of the portfolio cannot be read
	 */
	public static WorkingFilter read(Path file) throws InputException, IOException {
		if (!file.getFileName().toString().endsWith("." + ModelFiles.FILTER_EXTENSION)) {
			throw new InputException(file.toString(), "only files that end with ." + ModelFiles.FILTER_EXTENSION + " have revisions");
		}
		FilterSource source = Sources.read(List.of(file)).getFirst();
		Filter filter = source.filter().orElseThrow(() -> new InputException("", source.problem()));
		Optional<Path> root = PortfolioFolder.above(file);
		List<Parameter> defined = root.isEmpty() ? List.of() : PortfolioFolder.read(root.get()).getParameters();
		return new WorkingFilter(file, filter, source, defined);
	}

	/** Where its revisions are. */
	public RevisionStore store() {
		return RevisionStore.of(file);
	}

	/**
	 * Filter and parameters as a revision, without author, time, message and evidence.
	 *
	 * @throws InputException
	 *             when a parameter that the filter mentions has no value
	 */
	public Revision snapshot() throws InputException {
		return Snapshots.of(filter, defined, source.parameters());
	}

	/** All that is asked of it. */
	public FilterQuestion question() {
		return FilterQuestion.of(filter, source.parameters(), source.partners());
	}
}
