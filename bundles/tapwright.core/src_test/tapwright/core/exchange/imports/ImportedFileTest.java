// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.LongStream;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.export.ExportFormat;
import tapwright.core.exchange.export.ExportedFile;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Rounding;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

class ImportedFileTest {

	private static final String SOURCE = """
			/* band splitter { 1, 2 } */
			#include <stdint.h>
			#define N 4
			#define GAIN (1.0 / 4)
			#define LONG_ONE \\
			  0x10
			#ifdef __cplusplus
			extern "C" {
			#endif
			enum { FIRST = 1, SECOND };
			static const char *names[] = { "a", "b" };
			int add(int a) { return a + 1; }
			struct state rest = { 0, 1 };
			// real numbers
			const float low[N] = { 0.1f, -.5, 1e-3F, +GAIN, };
			static const double exact[] = { 0x1.8p-3, 2 * GAIN, 1.0/3, (double) 7 };
			static const int16_t q15[5] __attribute__((aligned(4))) = {
				0x7FFF, 0xFFFE, -3, LONG_ONE, (1 << 4)
			};
			const std::array<int32_t, 2> modern = {{ 1'000'000, 0b101 }};
			std::vector<double> also{ 1.5, 2.5 };
			const unsigned char two[2][3] = { { 1, 2, 3 }, { 4, 5, 010 } };
			const short padded[4] = { 1 };
			#ifdef __cplusplus
			}
			#endif
			""";

	@Test
	void initialiserListsOfManyKindsAreFound() throws InputException {
		List<ImportedTable> tables = read("a.cpp", SOURCE).tables();
		assertEquals(List.of("low", "exact", "q15", "modern", "also", "two[0]", "two[1]", "padded"), tables.stream()
				.map(ImportedTable::name).toList());
		assertEquals(List.of((double) 0.1f, -0.5, (double) 1e-3f, 0.25), tables.get(0).values());
		assertEquals(List.of(0.1875, 0.5, 1.0 / 3, 7.0), tables.get(1).values());
		assertEquals(integers(32767, -2, -3, 16, 16), tables.get(2).integers());
		assertEquals(Optional.of(new NumberFormat(16, 15)), tables.get(2).format());
		assertEquals(18, tables.get(2).line());
		assertEquals(integers(1_000_000, 5), tables.get(3).integers());
		assertEquals(List.of(1.5, 2.5), tables.get(4).values());
		assertEquals(integers(4, 5, 8), tables.get(6).integers());
		assertEquals(integers(1, 0, 0, 0), tables.get(7).integers());
		assertEquals("3 elements without a number are zero", tables.get(7).notes().getFirst());
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', quoteCharacter = '`',
			value = { "float h[] = {1.0, 2.0 3.0}; | a.c:1:23 | ',' is missing",
			"float h[] = {1.0, x}; | a.c:1:19 | no macro", "int8_t h[] = {1, 300}; | a.c:1:18 | not in the range",
			"int h[] = {1, 0.5}; | a.c:1:15 | lose its fraction", "float h[2] = {1, 2, 3}; | a.c:1:15 | has 2 elements",
			"float h[] = {1, 2 | a.c:1:18 | file ends", "/* float h[] = {1}; | a.c:1:1 | does not end",
			"float h[] = {1, , 2}; | a.c:1:17 | missing before", "float h[] = {1, 1/0}; | a.c:1:18 | division by zero",
			"int h[] = {1, 09}; | a.c:1:15 | not a number that C knows" })
	void whatIsWrongInASourceIsNamedWithItsPlace(String source, String place, String reason) {
		var error = assertThrows(InputException.class, () -> read("a.c", source));
		assertEquals(place, error.place());
		assertTrue(error.getMessage().contains(reason), error.getMessage());
	}

	@Test
	void aMacroThatStandsForItselfIsAnError() {
		var error = assertThrows(InputException.class,
				() -> read("a.c", "#define A B\n#define B A\nfloat h[] = { A };\n"));
		assertTrue(error.describe().contains("stands for itself"), error.describe());
	}

	@Test
	void textHasManySeparators() throws InputException {
		assertEquals(List.of(0.5, -1.0), read("a.csv", "# h\n0.5\n-1.0\n").tables().getFirst().values());
		assertEquals(integers(1, -2, 3), read("a.csv", "1,-2,3\n").tables().getFirst().integers());
		assertEquals(List.of(0.5, 1.5), read("a.csv", "k;h\n0;0,5\n1;1,5\n").tables().getFirst().values());
		assertEquals(2, read("a.tsv", "1\t2.5\n3\t4\n").tables().size());
		assertEquals(5, read("x", "1 2 3\n4 5\n").tables().getFirst().length());
		assertEquals(6, read("x", "1, 2, 3,\n4, 5, 6,\n").tables().getFirst().length());
		assertEquals("h", read("a.csv", "index,h\n0,1\n1,2\n").tables().getFirst().name());
	}

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "1,2\\n3,x\\n | a.csv:2:3", "a,b\\n1,2\\n3\\n | a.csv:3:1",
			"1\\nNaN\\n | a.csv:2:1", "1,,2 | a.csv:1:3",
			"1e999 | a.csv:1:1" })
	void whatIsNoNumberInATextIsNamedWithItsPlace(String text, String place) {
		var error = assertThrows(InputException.class,
				() -> read("a.csv", (text.strip() + "\n").replace("\\n", "\n").replace("1e999", "1\n1e999")));
		assertEquals(text.startsWith("1e999") ? "a.csv:2:1" : place, error.place());
	}

	@Test
	void arraysOfJsonAreFoundWhereverTheyStand() throws InputException {
		assertEquals(integers(1, 2, 1), read("a.json", "[1, 2, 1]").tables().getFirst().integers());
		var tables = read("a.json", "{\"bank\": {\"low\": [0.5, 0.5], \"high\": [0.5, -0.5]}, \"note\": \"x\"}")
				.tables();
		assertEquals(List.of("low", "high"), tables.stream().map(ImportedTable::name).toList());
		assertEquals(List.of(Symmetry.EVEN, Symmetry.ODD), tables.stream().map(ImportedTable::symmetry).toList());
		assertThrows(InputException.class, () -> read("a.json", "[1, \"x\"]"));
		assertTrue(read("a.json", "{\"format\": \"tapwright-filter/1\", \"coefficients\": {\"values\": [1]}}").filter()
				.isPresent());
	}

	@Test
	void memoryImagesHaveWordsAndAnOrderOfBytes() throws InputException {
		byte[] bytes = { 1, 0, (byte) 0xfe, (byte) 0xff };
		assertEquals(integers(1, -2), ImportedFile.read("a.bin", bytes, ImportOptions.NONE).tables().getFirst()
				.integers());
		var big = new ImportOptions(Optional.of(ImportFormat.BINARY), OptionalInt.of(16), OptionalInt.of(8), false,
				true, false, OptionalDouble.of(8000));
		assertEquals(integers(256, 65279), ImportedFile.read("a.bin", bytes, big).tables().getFirst().integers());
		assertEquals(Optional.of(new NumberFormat(16, 8, false)), ImportedFile.read("a.bin", bytes, big).tables()
				.getFirst().format());
		var real = new ImportOptions(Optional.of(ImportFormat.BINARY), OptionalInt.of(32), OptionalInt.empty(), true,
				false, true, OptionalDouble.empty());
		byte[] floats = ByteBuffer.allocate(8).order(ByteOrder.LITTLE_ENDIAN).putFloat(0.1f).putFloat(-2).array();
		assertEquals(List.of((double) 0.1f, -2.0), ImportedFile.read("a.bin", floats, real).tables().getFirst()
				.values());
		assertThrows(InputException.class, () -> ImportedFile.read("a.bin", new byte[] { 0, 1, 2 },
				ImportOptions.NONE));
	}

	@Test
	void hexadecimalWordsAreTwosComplement() throws InputException {
		assertEquals(integers(100, -2, -32768), read("a.hex", "// table\n@0\n0064 FFFE\n8000\n").tables().getFirst()
				.integers());
		// Check sums computed by hand: the bytes of a record add up to 0 modulo 256.
		assertEquals(integers(100, -2), read("a.hex", ":040000006400FEFF9B\n:00000001FF\n").tables().getFirst()
				.integers());
		assertTrue(assertThrows(InputException.class, () -> read("a.hex", ":040000006400FEFF9C\n:00000001FF\n"))
				.describe()
				.equals("a.hex:1:1: the check sum of the record is wrong"));
		assertEquals("a.hex:2:3", assertThrows(InputException.class, () -> read("a.hex", "00 11\n  zz\n")).place());
	}

	@Test
	void whatWasExportedComesBack() throws InputException {
		NumberFormat word = new NumberFormat(12, 11);
		var arithmetic = new Arithmetic(Structure.DIRECT, Optional.of(word), Optional.of(word), Optional.empty(),
				Optional.empty(), Optional.empty(),
				Rounding.HALF_EVEN, Overflow.SATURATE);
		var filter = new HandOver("wave", "", List.of(),
				ExactTaps.ofIntegers(integers(100, -100, 2047, -2048), word.step()), 50, Optional.of(arithmetic), true);
		for (String format : List.of("c", "csv", "json", "hex")) {
			ExportedFile file = ExportFormat.of(format).orElseThrow().write(filter).getFirst();
			ImportedTable table = read(file.name(), file.text()).tables().getFirst();
			assertEquals(filter.integers(), table.integers(), format);
			assertEquals(filter.taps(), table.taps(), format);
		}
	}

	@Test
	void formatsAreGuessedFromContentAndName() {
		assertEquals(ImportFormat.C, guess("x", "float h[] = {1};"));
		assertEquals(ImportFormat.JSON, guess("x", " [1, 2]"));
		assertEquals(ImportFormat.HEX, guess("x", "00FF\n0a10\n"));
		assertEquals(ImportFormat.TEXT, guess("x", "1 2 3"));
		assertEquals(ImportFormat.BINARY, guess("x.txt", "\0\1"));
		assertEquals(ImportFormat.WAV, guess("x", "RIFF\0\0\0\0WAVEfmt "));
	}

	private static ImportFormat guess(String name, String content) {
		return ImportFormat.guess(name, content.getBytes(StandardCharsets.ISO_8859_1));
	}

	private static ImportedFile read(String name, String text) throws InputException {
		return ImportedFile.read(name, text.getBytes(StandardCharsets.UTF_8), ImportOptions.NONE);
	}

	private static List<BigInteger> integers(long... values) {
		return LongStream.of(values).mapToObj(BigInteger::valueOf).toList();
	}

	static Stream<String> sources() {
		return Stream.of(SOURCE);
	}
}
