// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.core.interchange.JsonTree;

class HistoryVerbsTest {

	private static final String FILTER = """
			<?xml version="1.0" encoding="UTF-8"?>
			<tapwright:Filter xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI"
			    xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance" xmlns:tapwright="urn:tapwright:1"
			    name="smooth" sampleRate="1000">
			  <requirements xsi:type="tapwright:GainRequirement" id="stop" from="400" to="500" max="-20"/>
			  <coefficients xsi:type="tapwright:RealCoefficients">
			    <values>0.25</values>
			    <values>0.5</values>
			    <values>0.25</values>
			  </coefficients>
			</tapwright:Filter>
			""";
	private static final String PORTFOLIO = """
			<?xml version="1.0" encoding="UTF-8"?>
			<tapwright:Portfolio xmi:version="2.0" xmlns:xmi="http://www.omg.org/XMI" xmlns:tapwright="urn:tapwright:1" name="buoy"/>
			""";

	private final ByteArrayOutputStream out = new ByteArrayOutputStream();
	private final ByteArrayOutputStream err = new ByteArrayOutputStream();

	@TempDir
	Path folder;
	private String file;

	@BeforeEach
	void makePortfolio() throws IOException {
		Files.writeString(folder.resolve("portfolio.tapwright"), PORTFOLIO);
		file = Files.writeString(folder.resolve("smooth.filter"), FILTER).toString();
	}

	@Test
	void recordsListsAndRefusesWhatHasNotChanged() {
		assertEquals(Main.OK, record("first"), err());
		assertEquals(Main.BAD_USAGE, record("again"));
		assertTrue(err().contains("has not changed"), err());
		assertEquals(Main.OK, run("history", file), err());
		assertTrue(out().contains("* 1  ") && out().contains("  met  ") && out().contains("Owner  first"), out());
	}

	@Test
	void namesADamagedRevision() throws IOException {
		record("first");
		Path revision;
		try (var files = Files.list(folder.resolve("revisions/smooth"))) {
			revision = files.findFirst().orElseThrow();
		}
		Files.writeString(revision, Files.readString(revision).replace("-20", "-21"));
		assertEquals(Main.NOT_MET, run("history", file));
		assertTrue(err().contains(revision.toString()) && err().contains("edited"), err());
		assertEquals(Main.BAD_USAGE, run("compare", file, "1"));
	}

	@Test
	void comparesTheHeadWithThePresentState() throws Exception {
		record("first");
		assertEquals(Main.OK, run("compare", file));
		edit("<values>0.5</values>", "<values>0.5000000000000001</values>");
		edit("max=\"-20\"", "max=\"-18\"");
		assertEquals(Main.NOT_MET, run("compare", file));
		assertTrue(out().contains("stop: max: -20 dB -> -18 dB"), out());
		// 0.5000000000000001 is the double next to 0.5 above, by Java's Math.nextUp
		assertTrue(out().contains("1  0.5 -> 0.5000000000000001  1"), out());
		assertEquals(Main.NOT_MET, run("compare", file, "head", "--format", "json"));
		Map<?, ?> json = (Map<?, ?>) JsonTree.parse(out());
		assertEquals("tapwright-comparison/1", json.get("format"));
		assertEquals(1, ((List<?>) json.get("changes")).size());
	}

	@Test
	void freezesOnlyWhatIsRecordedAndListsRegressionsAgainstIt() throws IOException {
		assertEquals(Main.BAD_USAGE, run("baseline", "r1", folder.toString()));
		assertTrue(err().contains("never recorded"), err());
		record("first");
		assertEquals(Main.OK, run("baseline", "r1", folder.toString(), "--author", "Owner"), err());
		assertEquals(Main.BAD_USAGE, run("baseline", "r1", folder.toString()));
		assertEquals(Main.OK, run("verify", folder.toString(), "--against", "r1"), err());
		assertTrue(out().contains("nothing regressed"), out());
		edit("max=\"-20\"", "max=\"-30\"");
		assertEquals(Main.NOT_MET, run("verify", folder.toString(), "--against", "r1"));
		assertTrue(out().contains("was met, is missed now"), out());
		assertEquals(Main.BAD_USAGE, run("baseline", "r2", folder.toString()));
		assertTrue(err().contains("not recorded"), err());
		record("stricter");
		run("baseline", "r2", folder.toString(), "--author", "Owner");
		assertEquals(Main.NOT_MET, run("baseline", "r1", "r2", folder.toString(), "--difference"));
		assertTrue(out().startsWith("changed  smooth  ") && out().contains("(met) -> "), out());
	}

	@Test
	void reportsAMarginThatShrank() throws IOException {
		edit("max=\"-20\"", "max=\"-19\"");
		record("roomy");
		run("baseline", "r1", folder.toString());
		edit("max=\"-19\"", "max=\"-20\"");
		assertEquals(Main.NOT_MET, run("verify", folder.toString(), "--against", "r1"));
		assertTrue(out().contains("eroded") && out().contains("shrank by 1 dB"), out());
	}

	@Test
	void explainsWhatBaselinesAndCommitsNeed() {
		assertEquals(Main.BAD_USAGE, run("verify", folder.toString(), "--against", "none"));
		assertTrue(err().contains("no such baseline"), err());
		assertEquals(Main.BAD_USAGE, run("verify", file, "--since", "HEAD"));
		assertTrue(err().contains("needs one portfolio"), err());
		assertEquals(Main.BAD_USAGE, run("verify", folder.toString(), "--since", "HEAD"));
		assertTrue(err().contains("no git work tree"), err());
	}

	private int record(String message) {
		return run("record", file, "-m", message, "--author", "Owner");
	}

	private void edit(String from, String to) throws IOException {
		Files.writeString(Path.of(file), Files.readString(Path.of(file)).replace(from, to));
	}

	private int run(String... args) {
		out.reset();
		err.reset();
		return Main.run(List.of(args), new Console(new PrintStream(out, true, StandardCharsets.UTF_8),
				new PrintStream(err, true, StandardCharsets.UTF_8), false));
	}

	private String out() {
		return out.toString(StandardCharsets.UTF_8);
	}

	private String err() {
		return err.toString(StandardCharsets.UTF_8);
	}
}
