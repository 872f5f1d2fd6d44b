// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

import javax.xml.parsers.DocumentBuilderFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.core.interchange.JsonTree;

class MainTest {

	private static final String MET = """
			{"format": "tapwright-filter/1", "sampleRate": 1000, "coefficients": {"values": [0.25, 0.5, 0.25]},
			 "requirements": [{"id": "stop", "kind": "gain", "from": 400, "to": 500, "max": -20}],
			 "design": {"method": "equiripple", "taps": 31}}
			""";

	private final ByteArrayOutputStream out = new ByteArrayOutputStream();
	private final ByteArrayOutputStream err = new ByteArrayOutputStream();

	@TempDir
	Path folder;

	@Test
	void listsVerbsWhenAskedForHelp() {
		assertEquals(Main.OK, run("--help"));
		assertTrue(out().contains("verify") && out().contains("exit codes"), out());
		assertEquals(Main.OK, run("verify", "--help"));
		assertTrue(out().contains("examples:"), out());
	}

	@Test
	void namesAnUnknownVerb() {
		assertEquals(Main.BAD_USAGE, run("frobnicate"));
		assertTrue(err().contains("'frobnicate'"), err());
		assertEquals("", out());
	}

	@Test
	void exitsWithZeroWhenAllIsMet() throws IOException {
		assertEquals(Main.OK, run("verify", file("a.json", MET)));
		assertTrue(out().contains("1 met, 0 missed"), out());
	}

	@Test
	void exitsWithOneWhenSomethingIsMissed() throws IOException {
		assertEquals(Main.NOT_MET, run("verify", file("a.json", MET.replace("-20", "-30"))));
		assertTrue(out().contains("missed  stop"), out());
	}

	@Test
	void exitsWithTwoOnAMalformedFilterAndLeavesItUntouched() throws IOException {
		String content = "<?xml version=\"1.0\"?>\n<filter>\n";
		String file = file("broken.filter", content);
		assertEquals(Main.BAD_USAGE, run("verify", file, file("a.json", MET)));
		assertTrue(out().contains("broken.filter:") && out().contains("1 met"), out());
		assertEquals(content, Files.readString(Path.of(file)));
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "verify | give at least one", "verify nowhere | no such file", "verify . --format x | known are",
			"verify . --frmt table | no such option", "verify . --format | needs a value", "verify . --shard 3/2 | I/N",
			"verify . --shard 0/2 | I/N", "verify . --time-limit soon | seconds", "verify --format=json --format=json . | twice",
			"design | give one file" })
	void explainsBadUsage(String line, String reason) {
		assertEquals(Main.BAD_USAGE, run(line.split(" ")));
		assertTrue(err().contains(reason), err());
		assertEquals("", out());
	}

	@Test
	void saysThatAFolderHoldsNoFilter() {
		assertEquals(Main.BAD_USAGE, run("verify", folder.toString()));
		assertTrue(err().contains("holds no filter"), err());
	}

	@Test
	void writesEvidenceAsJson() throws IOException, InputException {
		assertEquals(Main.NOT_MET, run("verify", "--format", "json", workspace()));
		Map<?, ?> evidence = (Map<?, ?>) JsonTree.parse(out());
		assertEquals("tapwright-evidence/1", evidence.get("format"));
		Set<Object> verdicts = new TreeSet<>();
		for (Object filter : (List<?>) evidence.get("filters")) {
			for (Object requirement : (List<?>) ((Map<?, ?>) filter).get("requirements")) {
				Map<?, ?> members = (Map<?, ?>) requirement;
				verdicts.add(members.get("verdict"));
				assertTrue(members.keySet().containsAll(Set.of("id", "kind", "worst", "margin")), members::toString);
				assertEquals(2, ((List<?>) members.get("margin")).size());
			}
		}
		assertEquals(Set.of("met", "missed"), verdicts);
	}

	@Test
	void writesOneJUnitCaseForEachRequirement() throws Exception {
		Path file = folder.resolve("sub/result.xml");
		assertEquals(Main.NOT_MET, run("verify", "--format", "junit", "--output", file.toString(), workspace()));
		assertEquals("", out());
		var document = DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(file.toFile());
		run("verify", workspace());
		int requirements = Integer.parseInt(out().replaceFirst("(?s).*, (\\d+) requirements: .*", "$1"));
		assertEquals(requirements, document.getElementsByTagName("testcase").getLength());
		assertTrue(document.getElementsByTagName("failure").getLength() >= 2);
	}

	@Test
	void sharesTheWorkWithoutLossOrRepetition() throws InputException {
		var shared = new TreeSet<String>();
		int count = 0;
		for (int part = 1; part <= 3; part++) {
			out.reset();
			run("verify", "--format", "json", "--shard", part + "/3", workspace());
			for (Object filter : (List<?>) ((Map<?, ?>) JsonTree.parse(out())).get("filters")) {
				shared.add((String) ((Map<?, ?>) filter).get("file"));
				count++;
			}
		}
		out.reset();
		run("verify", "--format", "json", workspace());
		assertEquals(((List<?>) ((Map<?, ?>) JsonTree.parse(out())).get("filters")).size(), count);
		assertEquals(count, shared.size());
	}

	@Test
	void designsWithoutTouchingTheFileUnlessAsked() throws IOException {
		String designable = MET.replace("\"requirements\": [",
				"\"requirements\": [{\"id\": \"pass\", \"kind\": \"gain\", \"from\": 0, \"to\": 100, \"min\": -1, \"max\": 1}, ");
		String file = file("a.json", designable);
		assertEquals(Main.OK, run("design", file), err());
		assertEquals(designable, Files.readString(Path.of(file)));
		String printed = out();
		assertEquals(Main.OK, run("design", file, "--write"));
		assertEquals(printed, Files.readString(Path.of(file)));
		assertTrue(printed.contains("designHash"));
	}

	@Test
	void leavesTheFileAloneWhenTheDesignFails() throws IOException {
		String impossible = MET.replace("31", "0");
		String file = file("a.json", impossible);
		assertEquals(Main.BAD_USAGE, run("design", file, "--write"));
		assertEquals(impossible, Files.readString(Path.of(file)));
		assertFalse(err().isBlank());
	}

	private int run(String... args) {
		return Main.run(List.of(args), new Console(print(out), print(err), false));
	}

	private String out() {
		return out.toString(StandardCharsets.UTF_8);
	}

	private String err() {
		return err.toString(StandardCharsets.UTF_8);
	}

	private String file(String name, String content) throws IOException {
		return Files.writeString(folder.resolve(name), content).toString();
	}

	private static String workspace() {
		Path above = Path.of("").toAbsolutePath();
		while (!Files.isDirectory(above.resolve("sample-workspace"))) {
			above = above.getParent();
		}
		return above.resolve("sample-workspace").toString();
	}

	private static PrintStream print(ByteArrayOutputStream bytes) {
		return new PrintStream(bytes, true, StandardCharsets.UTF_8);
	}
}
