// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;

/** Files with random damage end in coefficients or in a clear error, never in an exception that nobody expects, and always end. */
class MutationTest {

	private static final int FILES = Boolean.getBoolean("tapwright.thorough") ? 10_000 : 1_000;
	private static final String SIGNS = "{}[]()=,;+-*/<>\"'#\\\n\0 \t0189.eExXfLpP_@:?%\u00ff";

	private record Seed(String name, byte[] content) {
	}

	@Test
	void damagedFilesEndInCoefficientsOrInAClearError() {
		List<Seed> seeds = seeds();
		var random = new Random(20);
		int refused = 0;
		for (int k = 0; k < FILES; k++) {
			Seed seed = seeds.get(k % seeds.size());
			byte[] damaged = damage(seed.content(), random);
			String what = seed.name() + " " + k;
			refused += assertTimeoutPreemptively(Duration.ofSeconds(20), () -> refuses(seed.name(), damaged), what) ? 1
					: 0;
		}
		assertTrue(refused > FILES / 10 && refused < FILES, refused + " refused");
	}

	private static boolean refuses(String name, byte[] content) {
		try {
			ImportedFile.read(name, content, ImportOptions.NONE).tables().forEach(ImportedTable::symmetry);
			return false;
		} catch (InputException e) {
			assertFalse(e.getMessage().isBlank());
			assertTrue(e.place().startsWith(name), e.describe());
			return true;
		}
	}

	private static byte[] damage(byte[] content, Random random) {
		var bytes = new ArrayList<Byte>();
		for (byte value : content) {
			bytes.add(value);
		}
		int wounds = 1 + random.nextInt(6);
		for (int k = 0; k < wounds && !bytes.isEmpty(); k++) {
			int at = random.nextInt(bytes.size());
			switch (random.nextInt(6)) {
			case 0 -> bytes.remove(at);
			case 1 -> bytes.set(at, (byte) random.nextInt(256));
			case 2 -> bytes.add(at, (byte) SIGNS.charAt(random.nextInt(SIGNS.length())));
			case 3 -> bytes.subList(at, Math.min(bytes.size(), at + random.nextInt(20))).clear();
			case 4 -> bytes.addAll(at, List.copyOf(bytes.subList(at, Math.min(bytes.size(), at + random.nextInt(40)))));
			default -> bytes.subList(at, bytes.size()).clear();
			}
		}
		byte[] result = new byte[bytes.size()];
		for (int k = 0; k < result.length; k++) {
			result[k] = bytes.get(k);
		}
		return result;
	}

	private static List<Seed> seeds() {
		var seeds = new ArrayList<Seed>();
		ImportedFileTest.sources().forEach(source -> seeds.add(text("a.c", source)));
		seeds.add(text("b.h", "#define A 1\n#define B (A+A)*A\n#define C B+B\nconst long h[3] = { C, -C, (short) 0x8000 };\n"));
		seeds.add(text("a.csv", "# comment\nindex,integer,value\n0,100,0.5\n1,-3,2e-3\n"));
		seeds.add(text("b.tsv", "0,5;1,25;\n-1,5;2;\n"));
		seeds.add(text("a.json", "{\"a\": [1, 2.5, -3e-2], \"b\": {\"integers\": [1, 2], \"scale\": \"2^-15\", \"sampleRate\": 8}}"));
		seeds.add(text("b.json", "{\"format\": \"tapwright-filter/1\", \"coefficients\": {\"values\": [1, 2]}, \"requirements\": [{\"id\": \"a\", \"kind\": \"null\", \"at\": 50}]}"));
		seeds.add(text("a.hex", "// words of 16 bits\n@10\n0064 FFFE 8000\n"));
		seeds.add(text("b.hex", ":040000006400FEFF9B\n:00000001FF\n"));
		seeds.add(new Seed("a.bin", new byte[] { 0, 1, 2, 3, (byte) 255, 127 }));
		seeds.add(new Seed("a.wav", WavFiles.of(16, false, 1, 8000, new byte[] { 1, 0, (byte) 0xff, 0x7f })));
		seeds.add(new Seed("b.wav", WavFiles.of(32, true, 1, 8000, new byte[] { 0, 0, (byte) 0x80, 0x3f })));
		return seeds;
	}

	private static Seed text(String name, String content) {
		return new Seed(name, content.getBytes(StandardCharsets.UTF_8));
	}
}
