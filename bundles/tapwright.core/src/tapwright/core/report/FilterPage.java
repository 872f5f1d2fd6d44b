// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

import tapwright.core.exchange.HandOver;
import tapwright.core.history.RecordedRevision;
import tapwright.core.history.SignOffs;
import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.verify.Subject;
import tapwright.model.Deployment;
import tapwright.model.Filter;
import tapwright.model.Severity;

/** The page of one filter. */
final class FilterPage {

	static final String CAUTION = "A proof covers the model that was entered: these coefficients in this arithmetic. It covers neither analogue parts, "
			+ "the compiler nor the board. Where filters act in medical, hearing, motor-control or protection equipment, conformity is decided by the "
			+ "applicable standard's own tests, local codes and licensed practice.";

	private static final int MOST_LISTED = 5000;

	private final ReportedFilter filter;
	private final ReportedHistory history;
	private final Html html = new Html();

	private FilterPage(ReportedFilter filter, ReportedHistory history) {
		this.filter = filter;
		this.history = history;
	}

	static String of(ReportedFilter filter, ReportedHistory history, String portfolio) {
		var page = new FilterPage(filter, history);
		page.write(portfolio);
		return Html.page(filter.name() + " – " + portfolio, "../", page.html);
	}

	private void write(String portfolio) {
		html.raw("<nav aria-label=\"Report\"><a href=\"../index.html\">" + Html.escape(portfolio)
				+ "</a></nav>\n<main>");
		html.element("h1", filter.name());
		Optional<Filter> model = filter.result().source().filter();
		html.raw("<p>" + Html.badge(filter.verdict()) + " " + Html.escape(model.map(Filter::getPurpose).orElse(""))
				+ "</p>");
		filter.result().problems().forEach(problem -> html.raw("<p class=\"missed\"><strong>Problem:</strong> "
				+ Html.escape(fileName(problem)) + "</p>"));
		identity();
		requirements();
		filter.subject().ifPresent(this::pictures);
		filter.subject().ifPresent(this::coefficients);
		filter.subject().ifPresent(this::arithmetic);
		model.ifPresent(this::deployments);
		history();
		html.raw("<aside aria-label=\"Caution\"><p>" + Html.escape(CAUTION) + "</p></aside>\n</main>");
	}

	// Folders differ between machines; the report does not.
	private String fileName(String problem) {
		return problem.replace(filter.result().source().file().toString(), filter.result().source().file().getFileName()
				.toString());
	}

	private void identity() {
		html.raw("<dl>");
		html.entry("file", filter.result().source().file().getFileName().toString());
		filter.subject().ifPresent(subject -> {
			html.entry("sample rate", Words.exactly(subject.sampleRate(), "Hz"));
			html.entry("coefficients", subject.taps().length() + symmetry(subject.taps().symmetry()));
		});
		html.entry("revision", history.revisions().isEmpty() ? "none recorded" : history.present().isEmpty()
				? "unrecorded changes" : history.present());
		html.entry("content hash", filter.result().evidence() == null ? "" : filter.result().evidence().hash());
		html.raw("</dl>");
	}

	private static String symmetry(Symmetry symmetry) {
		return symmetry == Symmetry.NONE ? ", no symmetry" : ", " + symmetry.name().toLowerCase(Locale.ROOT)
				+ " symmetry";
	}

	private void requirements() {
		html.element("h2", "Requirements and evidence");
		if (filter.requirements().isEmpty()) {
			html.element("p", "No requirement could be put to the proof.");
			return;
		}
		html.raw("<div class=\"wide\" tabindex=\"0\" role=\"region\" aria-label=\"Requirements and evidence\"><table class=\"sortable\"><thead><tr>");
		for (String head : new String[] { "verdict", "requirement", "what is asked", "what was proven" }) {
			html.raw("<th scope=\"col\">" + head + "</th>");
		}
		html.raw("</tr></thead><tbody>");
		for (RequirementEvidence requirement : filter.requirements()) {
			html.raw("<tr><td>" + Html.badge(requirement.proof().verdict()) + "</td><th scope=\"row\">"
					+ Html.escape(requirement.id())
					+ (requirement.severity() == Severity.SHOULD ? " <span class=\"dim\">(should)</span>" : "")
							+ "</th><td>"
					+ Html.escape(requirement.description()) + "</td><td>" + Html.escape(requirement.result())
							+ "</td></tr>");
		}
		html.raw("</tbody></table></div>");
	}

	private void pictures(Subject subject) {
		html.element("h2", "Response");
		var response = new ResponsePicture(subject, filter.limits());
		figure(response.whole(filter.name()), "Gain over frequency. Forbidden regions are shaded, limits dashed. The verdicts do not rest on this picture.");
		response.detail(filter.name()).ifPresent(picture -> figure(picture, "The bands with close limits, enlarged."));
		figure(ImpulsePicture.of(filter.name(), subject.taps().toDoubles()),
				"The coefficients, which are the impulse response.");
	}

	private void figure(String picture, String caption) {
		html.raw("<figure>" + picture + "<figcaption>" + Html.escape(caption) + "</figcaption></figure>");
	}

	private void coefficients(Subject subject) {
		html.element("h2", "Coefficients");
		ExactTaps taps = subject.taps();
		boolean words = subject.arithmetic().flatMap(Arithmetic::coefficient).isPresent();
		ExactTaps stored = words ? subject.arithmetic().orElseThrow().stored(taps) : taps;
		double[] values = taps.toDoubles();
		html.raw("<details><summary>" + taps.length()
				+ (words ? " integers in steps of 2^" + -subject.arithmetic().orElseThrow().coefficient().orElseThrow()
				.fraction() : " numbers")
				+ "</summary><ol class=\"coefficients\" start=\"0\">");
		for (int k = 0; k < Math.min(taps.length(), MOST_LISTED); k++) {
			html.raw("<li>" + (words ? stored.integer(k) : values[k]) + "</li>");
		}
		html.raw("</ol></details>");
		if (taps.length() > MOST_LISTED) {
			html.element("p", "The first " + MOST_LISTED + " are shown.");
		}
	}

	private void arithmetic(Subject subject) {
		html.element("h2", "Arithmetic and cost");
		var handed = new HandOver(filter.name(), "", List.of(), subject.taps(), subject.sampleRate(),
				subject.arithmetic(), false);
		if (handed.formats().isEmpty()) {
			html.element("p", "No arithmetic is stated; verdicts are for the stored numbers.");
			return;
		}
		html.raw("<ul>");
		handed.formats().forEach(line -> html.element("li", line));
		Cost cost = Cost.of(subject.taps(), subject.arithmetic().orElseThrow());
		html.element("li", cost.multiplies() + " multiplications and " + cost.adds() + " additions for " + cost.inputs()
				+ (cost.inputs() == 1 ? " input" : " inputs") + " and "
				+ cost.outputs() + (cost.outputs() == 1 ? " output" : " outputs"));
		html.element("li", cost.coefficientWords() + " words for coefficients, " + cost.delayWords()
				+ " for the delay line");
		html.raw("</ul>");
	}

	private void deployments(Filter model) {
		if (model.getDeployments().isEmpty()) {
			return;
		}
		html.element("h2", "Where it runs").raw("<ul>");
		for (Deployment deployment : model.getDeployments()) {
			html.element("li", deployment.getProcessor() + ": channels " + deployment.getChannels() + ", copies "
					+ deployment.getCopies()
					+ (deployment.getInputRate() == null ? "" : ", input rate " + deployment.getInputRate()));
		}
		html.raw("</ul>");
	}

	private void history() {
		html.element("h2", "Revisions and decisions");
		history.problems().forEach(problem -> html.raw("<p class=\"missed\"><strong>Problem:</strong> "
				+ Html.escape(problem) + "</p>"));
		if (history.revisions().isEmpty()) {
			html.element("p", "No revision is recorded.");
			return;
		}
		html.raw("<div class=\"wide\" tabindex=\"0\" role=\"region\" aria-label=\"Revisions\"><table><thead><tr>");
		for (String head : new String[] { "number", "revision", "verdict then", "author", "time", "message",
				"decisions" }) {
			html.raw("<th scope=\"col\">" + head + "</th>");
		}
		html.raw("</tr></thead><tbody>");
		for (RecordedRevision revision : history.revisions()) {
			var decisions = new StringBuilder();
			for (SignOffs.Recorded decision : history.decisions()) {
				if (decision.revision().equals(revision.hash())) {
					decisions.append(decisions.isEmpty() ? "" : "; ").append(decision.decision().getLiteral())
							.append(" by ").append(decision.reviewer().name())
							.append(decision.comment().isEmpty() ? "" : ": " + decision.comment());
				}
			}
			html.raw("<tr><td class=\"number\">" + revision.sequence() + "</td><th scope=\"row\"><code>"
					+ revision.shortHash() + "</code></th><td>"
					+ revision.verdict().getLiteral() + "</td><td>" + Html.escape(revision.author().name())
							+ "</td><td>" + Html.escape(revision.time()) + "</td><td>"
					+ Html.escape(revision.message()) + "</td><td>" + Html.escape(decisions.toString()) + "</td></tr>");
		}
		html.raw("</tbody></table></div>");
	}
}
