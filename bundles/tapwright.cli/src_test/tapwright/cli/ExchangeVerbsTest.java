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
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ExchangeVerbsTest {

	private static final String FILTER = """
			{"format": "tapwright-filter/1", "name": "smooth", "sampleRate": 1000, "coefficients": {"integers": [8192, 16384, 8192], "scale": "2^-15"},
			 "requirements": [{"id": "stop", "kind": "gain", "from": 400, "to": 500, "max": -20}],
			 "arithmetic": {"coefficient": {"word": 16, "fraction": 15}, "input": {"word": 16, "fraction": 15}, "output": {"word": 16, "fraction": 15}}}
			""";

	private final ByteArrayOutputStream out = new ByteArrayOutputStream();
	private final ByteArrayOutputStream err = new ByteArrayOutputStream();

	@TempDir
	Path folder;

	@Test
	void oneFileIsPrintedAndSeveralAreWritten() throws IOException {
		String file = file("a.json", FILTER);
		assertEquals(Main.OK, run("export", file, "--as", "c"), err::toString);
		assertTrue(out.toString().contains("8192, 16384, 8192"), out.toString());
		assertEquals(Main.BAD_USAGE, run("export", file, "--as", "c,csv"));
		assertTrue(err.toString().contains("--output"), err.toString());
		assertEquals(Main.OK, run("export", file, "--as", "c-routine,csv", "--output", folder.resolve("out")
				.toString()));
		assertEquals(List.of("smooth.c", "smooth.csv", "smooth.h", "smooth_selftest.c"), names("out"));
	}

	@Test
	void aHandEditOfAnExportedFileIsFound() throws IOException {
		String file = file("a.json", FILTER);
		String output = folder.resolve("out").toString();
		assertEquals(Main.OK, run("export", file, "--as", "c", "--output", output));
		assertEquals(Main.OK, run("export", file, "--as", "c", "--output", output, "--check"));
		Path header = folder.resolve("out/smooth.h");
		Files.writeString(header, Files.readString(header).replace("16384,", "16383,"));
		assertEquals(Main.NOT_MET, run("export", file, "--as", "c", "--output", output, "--check"));
		assertTrue(out.toString().contains("was changed by hand"), out.toString());
		Files.delete(header);
		assertEquals(Main.NOT_MET, run("export", file, "--as", "c", "--output", output, "--check"));
		assertTrue(out.toString().contains("is missing"), out.toString());
	}

	@Test
	void aFolderOfSourcesBecomesAPortfolio() throws IOException {
		file("src/a.c", "static const short low[] = { 1, 2, 1 };\nfloat high[2] = { 0.5f, -0.5f };\n");
		file("src/deep/b.csv", "1\n-1\n");
		file("src/readme.txt", "not numbers");
		file("src/empty.h", "#define X 1\n");
		String sources = folder.resolve("src").toString();
		assertEquals(Main.OK, run("import", sources), err::toString);
		assertTrue(out.toString().contains("even symmetry") && out.toString().contains("the binary point is a guess"),
				out.toString());
		assertFalse(Files.exists(folder.resolve("new")));
		assertEquals(Main.OK, run("import", sources, "--into", folder.resolve("new").toString(), "--rate", "8000"),
				err::toString);
		assertEquals(List.of("b.filter", "high.filter", "low.filter", "portfolio.tapwright"), names("new"));
		assertTrue(err.toString().contains("empty.h"), err.toString());
		assertEquals(Main.OK, run("export", folder.resolve("new/low.filter").toString(), "--as", "csv"), err::toString);
		assertTrue(out.toString().contains("1,2,6.103515625E-5"), out.toString());
	}

	@Test
	void nothingIsImportedWhenOneFileIsWrong() throws IOException {
		file("src/a.c", "float good[] = { 1, 2 };\n");
		file("src/b.c", "float bad[] = {\n 1, oops };\n");
		assertEquals(Main.BAD_USAGE, run("import", folder.resolve("src").toString(), "--into", folder.resolve("new")
				.toString()));
		assertTrue(err.toString().contains("b.c:2:5: 'oops' is no macro"), err.toString());
		assertFalse(Files.exists(folder.resolve("new")));
	}

	@Test
	void whatExistsIsNotOverwrittenByAnImport() throws IOException {
		String source = file("a.c", "float h[] = { 1, 2 };\n");
		file("new/h.filter", "kept");
		assertEquals(Main.BAD_USAGE, run("import", source, "--into", folder.resolve("new").toString()));
		assertEquals("kept", Files.readString(folder.resolve("new/h.filter")));
		assertEquals(List.of("h.filter"), names("new"));
	}

	@Test
	void aSignalIsFilteredBitForBit() throws IOException {
		String signal = file("in.csv", "32767\n0\n0\n");
		String output = folder.resolve("out.csv").toString();
		assertEquals(Main.OK, run("apply", file("a.json", FILTER), "--input", signal, "--output", output),
				err::toString);
		// Computed by hand: 32767 / 4 = 8191.75 and 32767 / 2 = 16383.5, which ties to even.
		assertEquals("8192\n16384\n8192\n", Files.readString(Path.of(output)));
		assertTrue(out.toString().contains("bit for bit"), out.toString());
	}

	@Test
	void theReportIsAFolderOrAText() throws IOException {
		file("filters/a.json", FILTER);
		String filters = folder.resolve("filters").toString();
		assertEquals(Main.OK, run("report", filters, "--output", folder.resolve("out").toString()), err::toString);
		assertEquals(List.of("filters", "index.html", "report.css", "report.js"), names("out"));
		assertEquals(Main.OK, run("report", filters, "--format", "markdown"));
		assertTrue(out.toString().contains("1 filters: 1 met"), out.toString());
		file("filters/b.json", FILTER.replace("-20", "-90"));
		assertEquals(Main.NOT_MET, run("report", filters, "--format", "markdown"));
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "export . | --as FORMAT", "export nowhere --as c | no such file",
			"export . --as z | known are",
			"export . --as c --check | --output", "import | at least one file", "import nowhere | no such file",
					"import . --as z | known are",
			"import . --word x | number of bits", "import . --rate 0 | positive", "apply x | --input",
					"report . | --output",
			"report nowhere --output x | no such folder", "report . --format z | known are" })
	void whatIsWrongOnTheCommandLineIsNamed(String arguments, String reason) {
		assertEquals(Main.BAD_USAGE, run(arguments.split(" ")));
		assertTrue(err.toString().contains(reason), err.toString());
	}

	private String file(String name, String content) throws IOException {
		Path file = folder.resolve(name);
		Files.createDirectories(file.getParent());
		return Files.writeString(file, content).toString();
	}

	private List<String> names(String name) throws IOException {
		try (Stream<Path> files = Files.list(folder.resolve(name))) {
			return files.map(file -> file.getFileName().toString()).sorted().toList();
		}
	}

	private int run(String... arguments) {
		out.reset();
		err.reset();
		try (var output = new PrintStream(out, true, StandardCharsets.UTF_8); var error = new PrintStream(err, true,
				StandardCharsets.UTF_8)) {
			return Main.run(List.of(arguments), new Console(output, error, false));
		}
	}
}
