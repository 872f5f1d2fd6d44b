// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.verify.Verdict;

/** For a person at a terminal: a block for each filter, a line for each requirement, a summary. */
final class TableFormat implements EvidenceFormat {

	@Override
	public String name() {
		return "table";
	}

	@Override
	public String write(VerificationRun run) {
		var text = new StringBuilder();
		for (Result result : run.results()) {
			text.append(verdict(result)).append("  ").append(result.source().file()).append('\n');
			if (result.evidence() != null) {
				rows(result.evidence(), text);
			}
			result.problems().forEach(problem -> text.append("  ! ").append(problem).append('\n'));
		}
		return text.append('\n').append(summary(run)).append('\n').toString();
	}

	private static void rows(FilterEvidence evidence, StringBuilder text) {
		List<String[]> rows = new ArrayList<>();
		for (RequirementEvidence requirement : evidence.requirements()) {
			rows.add(new String[] { word(requirement.proof().verdict()), requirement.id(), requirement.description(),
					requirement.result() });
		}
		int[] widths = new int[4];
		for (String[] row : rows) {
			for (int k = 0; k < row.length; k++) {
				widths[k] = Math.max(widths[k], row[k].length());
			}
		}
		for (String[] row : rows) {
			var line = new StringBuilder("  ");
			for (int k = 0; k < row.length; k++) {
				line.append(row[k]).repeat(' ', widths[k] - row[k].length() + 2);
			}
			text.append(line.toString().stripTrailing()).append('\n');
		}
	}

	private static String summary(VerificationRun run) {
		long requirements = 0;
		long met = 0;
		long missed = 0;
		long unproven = 0;
		for (Result result : run.results()) {
			if (result.evidence() != null) {
				for (RequirementEvidence requirement : result.evidence().requirements()) {
					requirements++;
					met += requirement.proof().verdict() == Verdict.MET ? 1 : 0;
					missed += requirement.proof().verdict() == Verdict.MISSED ? 1 : 0;
					unproven += requirement.proof().verdict() == Verdict.UNPROVEN ? 1 : 0;
				}
			}
		}
		int problems = run.problems().size();
		return count(run.results().size(), "filter") + ", " + count(requirements, "requirement") + ": " + met + " met, " + missed
				+ " missed, " + unproven + " unproven" + (problems == 0 ? "" : "; " + count(problems, "problem"));
	}

	private static String count(long number, String noun) {
		return number + " " + noun + (number == 1 ? "" : "s");
	}

	private static String verdict(Result result) {
		return result.evidence() == null ? "UNREADABLE"
				: word(result.evidence().verdict()).toUpperCase(Locale.ROOT);
	}

	private static String word(Verdict verdict) {
		return verdict.name().toLowerCase(Locale.ROOT);
	}
}
