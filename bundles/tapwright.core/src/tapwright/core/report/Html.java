// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import tapwright.dsp.verify.Verdict;

/** A page as it grows. Everything that comes from files is escaped here. */
final class Html {

	private final StringBuilder text = new StringBuilder();

	/** Markup that is meant as such. */
	Html raw(String markup) {
		text.append(markup).append('\n');
		return this;
	}

	/** An element with text. */
	Html element(String name, String content) {
		return raw("<" + name + ">" + escape(content) + "</" + name.split(" ", 2)[0] + ">");
	}

	/** A name and its value in a list of both. */
	Html entry(String name, String value) {
		return value == null || value.isBlank() ? this
				: raw("<dt>" + escape(name) + "</dt><dd>" + escape(value) + "</dd>");
	}

	/** The verdict as sign and word, so that colour is never needed. */
	static String badge(Verdict verdict) {
		String sign = switch (verdict) {
		case MET -> "✓";
		case MISSED -> "✗";
		case UNPROVEN -> "?";
		};
		String word = ReportedFilter.word(verdict);
		return "<span class=\"badge " + word + "\"><span aria-hidden=\"true\">" + sign + "</span> " + word + "</span>";
	}

	static String escape(String text) {
		return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;").replace("\"", "&quot;");
	}

	/** The whole page. */
	static String page(String title, String folder, Html body) {
		return """
				<!DOCTYPE html>
				<html lang="en">
				<head>
				<meta charset="utf-8">
				<meta name="viewport" content="width=device-width, initial-scale=1">
				<title>%s</title>
				<link rel="stylesheet" href="%sreport.css">
				<script src="%sreport.js" defer></script>
				</head>
				<body>
				%s</body>
				</html>
				""".formatted(escape(title), folder, folder, body.text);
	}

	@Override
	public String toString() {
		return text.toString();
	}
}
