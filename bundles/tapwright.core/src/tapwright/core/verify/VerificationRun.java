// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;

import tapwright.core.portfolio.FilterSource;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;

/**
 * The verification of many filter files.
 *
 * @param results
 *            one for each file, in the order of the files
 */
public record VerificationRun(List<Result> results) {

	/**
	 * What came of one file.
	 *
	 * @param source
	 *            the file
	 * @param evidence
	 *            of its filter; null when the file cannot be read
	 */
	public record Result(FilterSource source, FilterEvidence evidence) {

		/** Everything that keeps the filter from being verified, in words, with the file. */
		public List<String> problems() {
			if (evidence == null) {
				return List.of(source.problem());
			}
			return evidence.problems().stream().map(problem -> source.file() + ": " + problem.describe()).toList();
		}
	}

	/**
	 * Verifies all files, on all processors; the results do not depend on their number.
	 *
	 * @param effort
	 *            for each requirement
	 */
	public static VerificationRun of(List<FilterSource> sources, Effort effort) {
		List<FilterQuestion> questions = new ArrayList<>(); // model objects stay on this thread
		for (FilterSource source : sources) {
			questions.add(source.filter().map(filter -> FilterQuestion.of(filter, source.parameters(), source.partners())).orElse(null));
		}
		Progress progress = effort.progress();
		var done = new AtomicInteger();
		List<FilterEvidence> evidence = IntStream.range(0, questions.size()).parallel().mapToObj(k -> {
			FilterQuestion question = questions.get(k);
			FilterEvidence answer = question == null ? null : question.answer(effort);
			int count = done.incrementAndGet();
			progress.report(count + " of " + questions.size() + " filters", (double) count / questions.size());
			return answer;
		}).toList();
		return new VerificationRun(
				IntStream.range(0, sources.size()).mapToObj(k -> new Result(sources.get(k), evidence.get(k))).toList());
	}

	/** Everything that keeps filters from being verified. */
	public List<String> problems() {
		return results.stream().flatMap(result -> result.problems().stream()).toList();
	}

	/** Whether every file could be read and every requirement is met. */
	public boolean allMet() {
		return results.stream().allMatch(result -> result.evidence() != null && result.evidence().verdict() == Verdict.MET);
	}
}
