// SPDX-License-Identifier: EPL-2.0
package tapwright.core.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

import javax.xml.parsers.DocumentBuilderFactory;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.xml.sax.InputSource;

import tapwright.core.InputException;
import tapwright.dsp.verify.Effort;

class ReportTest {

	private static final String FILTER = """
			{"format": "tapwright-filter/1", "name": "%s", "purpose": "%s", "sampleRate": 1000, "coefficients": {"values": [0.25, 0.5, 0.25]},
			 "requirements": [{"id": "pass", "kind": "gain", "from": 0, "to": 10, "min": -1, "max": 1},
			  {"id": "stop", "kind": "gain", "points": [[400, -10], [500, %s]], "side": "max", "interpolate": "log"}],
			 "arithmetic": {"structure": "folded", "coefficient": {"word": 16, "fraction": 15}}}
			""";

	@TempDir
	Path folder;

	@BeforeEach
	void makeFilters() throws IOException {
		Files.writeString(folder.resolve("a.json"), FILTER.formatted("a <b>&|", "x < y", "-20"));
		Files.writeString(folder.resolve("b.json"), FILTER.formatted("b", "", "-400"));
		Files.writeString(folder.resolve("c.json"), "{\"format\": \"tapwright-filter/1\", \"oops\": 1}");
	}

	@Test
	void everyPageIsWellFormedAndNeedsNothingFromOutside() throws Exception {
		Report.of(folder, Effort.STANDARD).write(folder.resolve("out"));
		List<Path> pages = pages();
		assertEquals(4, pages.size());
		for (Path page : pages) {
			String text = Files.readString(page);
			// XML has no void elements and no boolean attributes; the rest of these pages is the same in both.
			String xml = text.replace("<!DOCTYPE html>", "").replaceAll("<(meta|link)([^>]*)>", "<$1$2/>")
					.replace(" defer>", " defer=\"\">");
			DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(xml)));
			Matcher link = Pattern.compile("(?:href|src)=\"([^\"]+)\"").matcher(text);
			while (link.find()) {
				assertTrue(Files.exists(page.resolveSibling(link.group(1))), page + " " + link.group(1));
			}
			assertFalse(text.contains("http"), page.toString());
			assertFalse(text.contains(folder.toString()), "a folder of this machine in " + page);
		}
	}

	@Test
	void whatNeedsAttentionComesFirstAndNothingIsLeftOut() throws Exception {
		Report.of(folder, Effort.STANDARD).write(folder.resolve("out"));
		String index = Files.readString(folder.resolve("out/index.html"));
		assertTrue(index.indexOf("filters/b.html") < index.indexOf("filters/c.html")
				&& index.indexOf("filters/c.html") < index.indexOf("filters/a.html"), index);
		assertTrue(index.contains("a &lt;b&gt;&amp;|"), index);
		String page = Files.readString(folder.resolve("out/filters/b.html"));
		for (String expected : List.of("✗", "class=\"forbidden\"", "Detail: gain", "<li>16384</li>", "steps of 2^-15",
				"structure folded", "conformity is decided")) {
			assertTrue(page.contains(expected), expected);
		}
		assertTrue(Files.readString(folder.resolve("out/filters/c.html")).contains("oops"));
	}

	@Test
	void theSameFiltersGiveTheSameBytes() throws Exception {
		Report.of(folder, Effort.STANDARD).write(folder.resolve("out"));
		var first = pages().stream().map(ReportTest::bytes).toList();
		Report.of(folder, Effort.STANDARD).write(folder.resolve("out"));
		var second = pages().stream().map(ReportTest::bytes).toList();
		for (int k = 0; k < first.size(); k++) {
			assertArrayEquals(first.get(k), second.get(k));
		}
	}

	@Test
	void markdownListsWhatIsNotMet() throws Exception {
		String text = Report.of(folder, Effort.STANDARD).markdown();
		assertTrue(text.contains("3 filters: 1 met, 1 missed, 1 unproven."), text);
		assertTrue(text.contains("- **b** missed stop: gain from 400 to 500 Hz"), text);
		assertTrue(text.contains("| a \\<b\\>&\\| | met | 2 | 0 | 0 |"), text);
	}

	@Test
	void processorsAreListedWithWhatTheirFiltersUse() throws Exception {
		Files.writeString(folder.resolve("portfolio.tapwright"), """
				<?xml version="1.0" encoding="UTF-8"?>
				<tapwright:Portfolio xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:tapwright="urn:tapwright:1" name="Buoy">
				  <processors name="Sanderling" macRate="1000" coefficientMemory="100"/>
				</tapwright:Portfolio>
				""");
		Files.writeString(folder.resolve("a.json"), FILTER.formatted("a", "", "-20").replace("\"arithmetic\"",
				"\"deployments\": [{\"processor\": \"Sanderling\"}], \"arithmetic\""));
		Report.of(folder, Effort.STANDARD).write(folder.resolve("out"));
		String index = Files.readString(folder.resolve("out/index.html"));
		// Two multiplications for each of 1000 samples a second; two coefficients of 100 words.
		assertTrue(index.contains("<td class=\"number\">2000</td><td class=\"number\">1000</td>")
				&& index.contains("✗</span> 200 %"), index);
		assertTrue(index.contains("<td class=\"number\">2</td><td class=\"number\">100</td><td class=\"number\">2 %</td>"), index);
		assertTrue(index.contains("<title>Buoy: digital filters</title>"), index);
	}

	@Test
	void aFolderThatIsNotThereIsNamed() {
		assertThrows(InputException.class, () -> Report.of(folder.resolve("nowhere"), Effort.STANDARD));
	}

	@Test
	void ticksAreRoundNumbers() {
		assertEquals(List.of(-100.0, -50.0, 0.0), new Axis(-120, 20, 0, 1).ticks(6));
		assertEquals(List.of(0.0, 5.0, 10.0), new Axis(0, 10, 0, 1).ticks(2));
	}

	private List<Path> pages() throws IOException {
		try (Stream<Path> files = Files.walk(folder.resolve("out"))) {
			return files.filter(file -> file.toString().endsWith(".html")).sorted().toList();
		}
	}

	private static byte[] bytes(Path file) {
		try {
			return Files.readAllBytes(file);
		} catch (IOException e) {
			throw new AssertionError(file.toString(), e);
		}
	}
}
