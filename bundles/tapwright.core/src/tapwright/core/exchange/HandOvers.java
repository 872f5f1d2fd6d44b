// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange;

import java.io.IOException;
import java.nio.file.Path;

import tapwright.core.InputException;
import tapwright.core.history.RecordedRevision;
import tapwright.core.history.Snapshots;
import tapwright.core.history.WorkingFilter;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.model.Filter;
import tapwright.model.io.ModelFiles;

/** Takes what is handed over from filter files. */
public final class HandOvers {

	private HandOvers() {
	}

	/**
	 * One filter file with its evidence and the recorded revision that has the same content.
	 *
	 * @throws InputException
	 *             when there are no usable coefficients
	 * @throws IOException
	 *             when the revisions cannot be read
	 */
	public static HandOver of(FilterSource source, FilterEvidence evidence) throws InputException, IOException {
		Filter filter = source.filter().orElseThrow(() -> new InputException("", source.problem()));
		return HandOver.of(filter, FilterQuestion.of(filter, source.parameters(), source.partners()), evidence,
				revision(source.file()));
	}

	/** Short hash of the newest recorded revision with the content that the file has now; empty when there is none. */
	public static String revision(Path file) throws InputException, IOException {
		if (!file.toString().endsWith("." + ModelFiles.FILTER_EXTENSION)) {
			return "";
		}
		WorkingFilter working = WorkingFilter.read(file);
		String content = Snapshots.contentHash(working.snapshot());
		return working.store().read().graph().heads().stream().filter(head -> head.content().equals(content))
				.map(RecordedRevision::shortHash).findFirst().orElse("");
	}
}
