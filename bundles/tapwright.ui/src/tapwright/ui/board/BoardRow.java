// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.board;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.swt.graphics.Image;

import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Verdict;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.workspace.PortfolioProject.FileEvidence;
import tapwright.workspace.PresentEvidence;

/**
 * A filter on the board with its worst requirement: a missed one before an unproven one before a met one, then the smaller margin
 * in comparison with its limit, since decibels, seconds and words cannot be compared as they are.
 */
final class BoardRow {

	private static final List<Verdict> GRAVITY = List.of(Verdict.MISSED, Verdict.UNPROVEN, Verdict.MET);

	static final Comparator<BoardRow> WORST_FIRST = Comparator
			.<BoardRow>comparingInt(row -> GRAVITY.indexOf(row.evidence().verdict()))
			.thenComparingDouble(BoardRow::marginValue).thenComparing(BoardRow::name);

	private final String portfolio;
	private final IFile file;
	private final PresentEvidence present;
	private final Optional<RequirementEvidence> worst;

	private BoardRow(String portfolio, IFile file, PresentEvidence present) {
		this.portfolio = portfolio;
		this.file = file;
		this.present = present;
		this.worst = present.evidence().requirements().stream()
				.min(Comparator.<RequirementEvidence>comparingInt(found -> GRAVITY.indexOf(found.proof().verdict()))
						.thenComparingDouble(BoardRow::relativeMargin));
	}

	static BoardRow of(String portfolio, FileEvidence found) {
		return new BoardRow(portfolio, found.file(), found.evidence());
	}

	private static double relativeMargin(RequirementEvidence found) {
		if (Verdicts.isExact(found)) {
			return Double.POSITIVE_INFINITY; // it has no margin that could wear away
		}
		double margin = found.proof().margin().middle();
		double limit = Math.abs(found.proof().limit());
		return limit > 0 && Double.isFinite(limit) ? margin / limit : margin;
	}

	IFile file() {
		return file;
	}

	private FilterEvidence evidence() {
		return present.evidence();
	}

	String name() {
		return evidence().name();
	}

	String portfolio() {
		return portfolio;
	}

	Image image() {
		return present.stale() ? Icons.get(Icons.STALE) : Verdicts.image(evidence().verdict());
	}

	String summary() {
		return present.stale() ? "proving" : Verdicts.summary(evidence());
	}

	double marginValue() {
		return worst.map(BoardRow::relativeMargin).orElse(Double.POSITIVE_INFINITY);
	}

	String margin() {
		return worst.map(Verdicts::margin).orElse("");
	}

	String requirement() {
		return worst.map(RequirementEvidence::id).orElse("");
	}

	String place() {
		return worst.map(Verdicts::place).orElse("");
	}

	String statement() {
		return worst.map(RequirementEvidence::description).orElse("");
	}
}
