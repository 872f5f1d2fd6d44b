// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.Partners;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Subject;
import tapwright.model.Filter;
import tapwright.model.io.ModelFiles;

/** Finds partners among the filter files of a portfolio's folder. */
record FolderPartners(Path folder, Parameters parameters) implements Partners {

	@Override
	public ExactTaps shipped(String name) throws InputException {
		try {
			List<Path> files = PortfolioFolder.files(folder, ModelFiles.FILTER_EXTENSION).stream()
					.filter(file -> file.getFileName().toString().equals(name + "." + ModelFiles.FILTER_EXTENSION)).toList();
			if (files.size() != 1) {
				throw new InputException("partner", files.isEmpty() ? "the portfolio has no filter '" + name + "'"
						: "the portfolio has several filters '" + name + "'");
			}
			return FilterQuestion.of(ModelFiles.load(files.getFirst(), Filter.class), parameters).subject().map(Subject::taps)
					.orElseThrow(() -> new InputException("partner", "'" + name + "' has no usable coefficients"));
		} catch (IOException e) {
			throw new InputException("partner", "'" + name + "' cannot be read: " + e.getMessage());
		}
	}
}
