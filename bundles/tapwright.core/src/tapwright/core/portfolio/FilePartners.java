// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.IOException;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.Partners;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Subject;
import tapwright.model.Filter;
import tapwright.model.io.ModelFiles;

/**
 * Finds partners among the filter files of a portfolio, by the names of the files.
 *
 * @param content
 *            the files
 * @param parameters
 *            of the portfolio
 */
public record FilePartners(PortfolioContent content, Expression.Names parameters) implements Partners {

	@Override
	public ExactTaps shipped(String name) throws InputException {
		try {
			List<String> files = content.filters().stream().filter(file -> nameOf(file).equals(name)).toList();
			if (files.size() != 1) {
				throw new InputException("partner", files.isEmpty() ? "the portfolio has no filter '" + name + "'"
						: "the portfolio has several filters '" + name + "'");
			}
			Filter filter = ModelFiles.parse(content.read(files.getFirst()), files.getFirst(), Filter.class);
			return FilterQuestion.of(filter, parameters).subject().map(Subject::taps)
					.orElseThrow(() -> new InputException("partner", "'" + name + "' has no usable coefficients"));
		} catch (IOException e) {
			throw new InputException("partner", "'" + name + "' cannot be read: " + e.getMessage());
		}
	}

	/** The name by which a filter file is found: that of the file without folder and extension. */
	public static String nameOf(String path) {
		String name = path.substring(path.lastIndexOf('/') + 1);
		int dot = name.lastIndexOf('.');
		return dot > 0 ? name.substring(0, dot) : name;
	}
}
