// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import java.io.StringWriter;
import java.util.List;

import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;

import tapwright.core.verify.RequirementEvidence;
import tapwright.core.verify.VerificationRun;
import tapwright.core.verify.VerificationRun.Result;
import tapwright.dsp.verify.Verdict;

/**
 * JUnit XML as build servers read it: a suite for each filter, a case for each requirement; missed is a failure, unproven and
 * anything unreadable is an error.
 */
final class JUnitFormat implements EvidenceFormat {

	@Override
	public String name() {
		return "junit";
	}

	@Override
	public String write(VerificationRun run) {
		var text = new StringWriter();
		try {
			XMLStreamWriter xml = XMLOutputFactory.newInstance().createXMLStreamWriter(text);
			xml.writeStartDocument("UTF-8", "1.0");
			line(xml, 0);
			xml.writeStartElement("testsuites");
			xml.writeAttribute("name", Tool.NAME);
			for (Result result : run.results()) {
				suite(xml, result);
			}
			line(xml, 0);
			xml.writeEndElement();
			xml.writeEndDocument();
		} catch (XMLStreamException e) {
			throw new IllegalStateException("writing to memory", e);
		}
		return text.append('\n').toString();
	}

	private static void suite(XMLStreamWriter xml, Result result) throws XMLStreamException {
		List<RequirementEvidence> requirements = result.evidence() == null ? List.of() : result.evidence().requirements();
		List<String> problems = result.problems();
		String file = result.source().file().toString();
		line(xml, 1);
		xml.writeStartElement("testsuite");
		xml.writeAttribute("name", clean(file));
		xml.writeAttribute("tests", String.valueOf(requirements.size() + problems.size()));
		xml.writeAttribute("failures", String.valueOf(count(requirements, Verdict.MISSED)));
		xml.writeAttribute("errors", String.valueOf(count(requirements, Verdict.UNPROVEN) + problems.size()));
		for (RequirementEvidence requirement : requirements) {
			String outcome = switch (requirement.proof().verdict()) {
			case MET -> "";
			case MISSED -> "failure";
			case UNPROVEN -> "error";
			};
			testCase(xml, file, requirement.id(), outcome, requirement.message());
		}
		for (int k = 0; k < problems.size(); k++) {
			testCase(xml, file, "problem " + (k + 1), "error", problems.get(k));
		}
		line(xml, 1);
		xml.writeEndElement();
	}

	private static void testCase(XMLStreamWriter xml, String file, String name, String outcome, String message)
			throws XMLStreamException {
		line(xml, 2);
		xml.writeStartElement("testcase");
		xml.writeAttribute("classname", clean(file));
		xml.writeAttribute("name", clean(name));
		xml.writeAttribute("time", "0");
		if (!outcome.isEmpty()) {
			line(xml, 3);
			xml.writeEmptyElement(outcome);
			xml.writeAttribute("message", clean(message));
			line(xml, 2);
		}
		xml.writeEndElement();
	}

	private static long count(List<RequirementEvidence> requirements, Verdict verdict) {
		return requirements.stream().filter(requirement -> requirement.proof().verdict() == verdict).count();
	}

	private static void line(XMLStreamWriter xml, int depth) throws XMLStreamException {
		xml.writeCharacters("\n" + "  ".repeat(depth));
	}

	// XML 1.0 has no way to write most control characters.
	private static String clean(String text) {
		return text.replaceAll("[^\\x20-\\uD7FF\\uE000-\\uFFFD\\x{10000}-\\x{10FFFF}\\t]", " ");
	}
}
