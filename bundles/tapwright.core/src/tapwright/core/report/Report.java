// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

import tapwright.core.InputException;
import tapwright.core.format.Tool;
import tapwright.core.load.Loads;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.core.portfolio.Sources;
import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Portfolio;
import tapwright.model.io.AtomicFiles;

/** The review report of a portfolio or any other folder with filters. Confined to the thread that made it. */
public final class Report {

	private final String name;
	private final String description;
	private final VerificationRun run;
	private final List<ReportedFilter> filters = new ArrayList<>();
	private Loads loads = Loads.NONE;

	private Report(String name, String description, VerificationRun run) {
		this.name = name;
		this.description = description;
		this.run = run;
		var taken = new HashSet<String>();
		for (Result result : run.results()) {
			String stem = FilePartners.nameOf(result.source().file().getFileName().toString()).toLowerCase(Locale.ROOT)
					.replaceAll("[^a-z0-9]+", "-");
			String page = stem + ".html";
			for (int k = 2; !taken.add(page); k++) {
				page = stem + "-" + k + ".html";
			}
			filters.add(ReportedFilter.of(result, page));
		}
		filters.sort(Comparator.comparingInt(filter -> rank(filter.verdict()))); // what needs attention comes first
	}

	/**
	 * Verifies the filters of a folder.
	 *
	 * @throws InputException
	 *             when it holds no filter
	 * @throws IOException
	 *             when the root file of the portfolio cannot be read
	 */
	public static Report of(Path folder, Effort effort) throws InputException, IOException {
		if (!Files.isDirectory(folder)) {
			throw new InputException(folder.toString(), "there is no such folder");
		}
		VerificationRun run = VerificationRun.of(Sources.read(List.of(folder)), effort);
		String name = folder.toAbsolutePath().normalize().getFileName().toString();
		if (!PortfolioFolder.isPortfolio(folder)) {
			return new Report(name, "", run);
		}
		Portfolio portfolio = PortfolioFolder.read(folder);
		var report = new Report(portfolio.getName() == null ? name : portfolio.getName(),
				portfolio.getDescription() == null ? "" : portfolio.getDescription(), run);
		report.loads = LoadSection.loads(portfolio, report.filters);
		return report;
	}

	/** What the report rests on. */
	public VerificationRun run() {
		return run;
	}

	/**
	 * Writes the folder of HTML pages; {@code index.html} is the first.
	 *
	 * @throws IOException
	 *             when a file cannot be read or written
	 */
	public void write(Path folder) throws InputException, IOException {
		for (Map.Entry<String, byte[]> file : files().entrySet()) {
			AtomicFiles.write(folder.resolve(file.getKey()), file.getValue());
		}
	}

	// All pages are complete before the first is written.
	private Map<String, byte[]> files() throws InputException, IOException {
		var files = new TreeMap<String, byte[]>();
		for (String resource : List.of("report.css", "report.js")) {
			try (InputStream stream = Report.class.getResourceAsStream(resource)) {
				files.put(resource, stream.readAllBytes());
			}
		}
		var histories = new ArrayList<ReportedHistory>();
		for (ReportedFilter filter : filters) {
			boolean readable = filter.result().source().filter().isPresent();
			ReportedHistory history = readable ? ReportedHistory.of(filter.result().source().file())
					: ReportedHistory.NONE;
			histories.add(history);
			files.put("filters/" + filter.page(), FilterPage.of(filter, history, name)
					.getBytes(StandardCharsets.UTF_8));
		}
		files.put("index.html", index(histories).getBytes(StandardCharsets.UTF_8));
		return files;
	}

	private String index(List<ReportedHistory> histories) {
		var html = new Html();
		html.raw("<main>").element("h1", name + ": digital filters").element("p", description);
		html.raw("<ul class=\"counts\" aria-label=\"Summary\">");
		count(html, filters.size(), "filters");
		for (Verdict verdict : Verdict.values()) {
			count(html, filters.stream().filter(filter -> filter.verdict() == verdict).count(),
					ReportedFilter.word(verdict));
		}
		count(html, filters.stream().mapToLong(filter -> filter.requirements().size()).sum(), "requirements");
		html.raw("</ul>");
		html.element("h2", "Filters");
		html.raw("<div class=\"wide\" tabindex=\"0\" role=\"region\" aria-label=\"Filters\"><table class=\"sortable\"><thead><tr>");
		for (String head : List.of("filter", "verdict", "look at first", "response", "sample rate", "taps", "word",
				"revision")) {
			html.raw("<th scope=\"col\"" + (List.of("sample rate", "taps", "word").contains(head) ? " class=\"number\""
					: "") + ">" + head + "</th>");
		}
		html.raw("</tr></thead><tbody>");
		for (int k = 0; k < filters.size(); k++) {
			row(html, filters.get(k), histories.get(k));
		}
		html.raw("</tbody></table></div>");
		LoadSection.write(html, loads);
		html.raw("<aside aria-label=\"Caution\"><p>" + Html.escape(FilterPage.CAUTION) + "</p></aside>");
		html.raw("</main>\n<footer><p class=\"dim\">" + Tool.NAME
				+ ". Met and missed are proven for exactly the numbers stored; unproven means that neither was.</p></footer>");
		return Html.page(name + ": digital filters", "", html);
	}

	private static void count(Html html, long number, String what) {
		html.raw("<li><strong>" + number + "</strong> " + what + "</li>");
	}

	private static void row(Html html, ReportedFilter filter, ReportedHistory history) {
		String first = filter.result().problems().isEmpty() ? filter.first().map(Report::attention)
				.orElse("no requirement") : "cannot be verified completely";
		html.raw("<tr><th scope=\"row\"><a href=\"filters/" + filter.page() + "\">" + Html.escape(filter.name())
				+ "</a></th>");
		html.raw("<td data-key=\"" + rank(filter.verdict()) + "\">" + Html.badge(filter.verdict()) + "</td><td>"
				+ Html.escape(first) + "</td>");
		if (filter.subject().isEmpty()) {
			html.raw("<td></td><td class=\"number\" data-key=\"-1\"></td><td class=\"number\" data-key=\"-1\"></td><td class=\"number\" data-key=\"-1\"></td>");
		} else {
			var subject = filter.subject().get();
			int word = subject.arithmetic().flatMap(Arithmetic::coefficient).map(format -> format.word()).orElse(-1);
			html.raw("<td>" + new ResponsePicture(subject, List.of()).spark() + "</td><td class=\"number\" data-key=\""
					+ subject.sampleRate() + "\">"
					+ Words.exactly(subject.sampleRate(), "Hz") + "</td><td class=\"number\">" + subject.taps().length()
							+ "</td><td class=\"number\" data-key=\"" + word + "\">"
					+ (word < 0 ? "" : word + " bit") + "</td>");
		}
		html.raw("<td>" + (history.revisions().isEmpty() ? "none" : history.present().isEmpty() ? "unrecorded changes"
				: "<code>" + history.present() + "</code>") + "</td></tr>");
	}

	private static String attention(RequirementEvidence requirement) {
		return requirement.id() + ": " + requirement.result();
	}

	private static int rank(Verdict verdict) {
		return switch (verdict) {
		case MISSED -> 0;
		case UNPROVEN -> 1;
		case MET -> 2;
		};
	}

	/** A summary for a pull request: what is not met, then all filters. */
	public String markdown() {
		var text = new StringBuilder("# ").append(markdown(name)).append(": digital filters\n\n");
		text.append(filters.size()).append(" filters");
		for (Verdict verdict : Verdict.values()) {
			text.append(verdict.ordinal() == 0 ? ": " : ", ")
					.append(filters.stream().filter(filter -> filter.verdict() == verdict).count()).append(' ')
					.append(ReportedFilter.word(verdict));
		}
		text.append(".\n");
		var open = new StringBuilder();
		for (ReportedFilter filter : filters) {
			filter.result().problems().forEach(problem -> open.append("- **").append(markdown(filter.name()))
					.append("**: ").append(markdown(problem)).append('\n'));
			filter.requirements().stream().filter(requirement -> requirement.proof().verdict() != Verdict.MET)
					.forEach(requirement -> open.append("- **")
					.append(markdown(filter.name())).append("** ")
							.append(ReportedFilter.word(requirement.proof().verdict())).append(" ")
							.append(markdown(requirement.message())).append('\n'));
		}
		if (!open.isEmpty()) {
			text.append("\n## Needs attention\n\n").append(open);
		}
		text.append("\n## All filters\n\n| filter | verdict | met | missed | unproven | look at first |\n| --- | --- | --: | --: | --: | --- |\n");
		for (ReportedFilter filter : filters) {
			text.append("| ").append(markdown(filter.name())).append(" | ").append(filter.verdictWord());
			for (Verdict verdict : Verdict.values()) {
				text.append(" | ").append(filter.count(verdict));
			}
			text.append(" | ").append(markdown(filter.first().map(Report::attention).orElse(""))).append(" |\n");
		}
		return text.append("\n").append(FilterPage.CAUTION).append('\n').toString();
	}

	private static String markdown(String text) {
		return text.replaceAll("[\\\\`*_\\[\\]<>|#]", "\\\\$0").replace("\n", " ");
	}
}
