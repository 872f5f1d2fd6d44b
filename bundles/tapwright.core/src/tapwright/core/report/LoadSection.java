// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.load.Demand;
import tapwright.core.load.Demands;
import tapwright.core.load.Loads;
import tapwright.core.load.ProcessorLoad;
import tapwright.core.load.Resource;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Parameters;
import tapwright.core.quantity.Words;
import tapwright.model.Portfolio;

/** What the filters ask of the processors of a portfolio, and what those have. */
final class LoadSection {

	private LoadSection() {
	}

	/** Sums up the loads. */
	static Loads loads(Portfolio portfolio, List<ReportedFilter> filters) {
		var numbers = new Numbers(new Parameters(portfolio.getParameters()));
		var demands = new ArrayList<Demand>();
		for (ReportedFilter filter : filters) {
			if (filter.subject().isPresent()) {
				demands.addAll(Demands.of(filter.result().source().filter().orElseThrow(), filter.name(),
						filter.subject().get(), numbers).demands());
			}
		}
		return Loads.of(portfolio.getProcessors(), demands, numbers);
	}

	/** Writes the table; nothing without processors. */
	static void write(Html html, Loads loads) {
		if (loads.loads().isEmpty() && loads.problems().isEmpty()) {
			return;
		}
		html.element("h2", "Processors");
		loads.problems().forEach(problem -> html.raw("<p class=\"missed\"><strong>Problem:</strong> "
				+ Html.escape(problem.message()) + "</p>"));
		html.raw("<div class=\"wide\" tabindex=\"0\" role=\"region\" aria-label=\"Processors\"><table><thead><tr>");
		for (String head : List.of("processor", "resource", "used", "available", "share")) {
			boolean number = !head.equals("processor") && !head.equals("resource");
			html.raw("<th scope=\"col\"" + (number ? " class=\"number\"" : "") + ">" + head + "</th>");
		}
		html.raw("</tr></thead><tbody>");
		for (ProcessorLoad load : loads.loads()) {
			for (Resource resource : Resource.values()) {
				row(html, load, resource);
			}
		}
		html.raw("</tbody></table></div>");
	}

	private static void row(Html html, ProcessorLoad load, Resource resource) {
		OptionalDouble available = load.available(resource);
		double used = load.used(resource);
		String share = available.isEmpty() ? "" : Words.of(100 * used / available.getAsDouble(), "%", 3);
		html.raw("<tr><th scope=\"row\">" + Html.escape(load.budget().processor()) + "</th><td>" + resource.words()
				+ "</td><td class=\"number\">" + Words.of(used, "1", 6) + "</td><td class=\"number\">"
				+ (available.isEmpty() ? "not stated" : Words.of(available.getAsDouble(), "1", 6))
				+ "</td><td class=\"number\">" + (load.isOverloaded(resource) ? "<span class=\"badge missed\">"
						+ "<span aria-hidden=\"true\">✗</span> " + share + "</span>" : share) + "</td></tr>");
	}
}
