// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.exact.Symmetry;

/**
 * Random problems solved with scipy 1.17.1; make_equiripple_values.py beside made the values and says what they mean.
 */
class EquirippleReferenceTest {

	private record Row(String method, int taps, Symmetry symmetry, List<Band> bands, double error) {
	}

	@Test
	void randomProblemsAgreeWithTheExchangeOfTheReferenceLibrary() throws DesignException {
		int compared = 0;
		int near = 0;
		for (Row row : rows("remez")) {
			EquirippleSolution solution = new Equiripple(row.taps(), row.symmetry(), row.bands()).solve(Progress.NONE);
			assertTrue(solution.excess() <= 1e-4, row::toString);
			// The error on a grid with 120 or more points per ripple misses less than 1e-4 of the true one.
			assertTrue(solution.lowerBound() <= row.error() * (1 + 1e-4), row::toString);
			assertTrue(solution.upperBound() <= row.error() * (1 + 2e-4), row::toString);
			near += solution.lowerBound() >= row.error() * 0.99 ? 1 : 0;
			compared++;
		}
		assertEquals(200, compared);
		// The reference's grid is finite, and a few of its answers are well above the optimum.
		assertTrue(near >= 190, "only " + near + " are near");
	}

	@Test
	void slopedTargetsAgreeWithLinearProgrammingOfTheReferenceLibrary() throws DesignException {
		int compared = 0;
		for (Row row : rows("linprog")) {
			EquirippleSolution solution = new Equiripple(row.taps(), row.symmetry(), row.bands()).solve(Progress.NONE);
			assertTrue(solution.excess() <= 1e-4, () -> row + " " + solution);
			// The optimum on a grid is not above the optimum, but for the solver's own tolerance, and only a little
			// below.
			assertTrue(solution.upperBound() >= row.error() - 1e-7, row::toString);
			assertEquals(row.error(), solution.lowerBound(), 2e-3 * row.error(), row::toString);
			compared++;
		}
		assertEquals(40, compared);
	}

	private static List<Row> rows(String method) {
		try (var in = EquirippleReferenceTest.class.getResourceAsStream("equiripple-values.csv")) {
			return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().map(EquirippleReferenceTest::row)
					.filter(row -> row.method().equals(method)).toList();
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
	}

	private static Row row(String line) {
		String[] cells = line.split(";");
		List<Band> bands = Arrays.stream(cells[3].split(" ")).map(text -> {
			double[] v = Arrays.stream(text.split(",")).mapToDouble(Double::parseDouble).toArray();
			return new Band(v[0], v[1], v[2], v[3], v[4], v[5]);
		}).toList();
		return new Row(cells[0], Integer.parseInt(cells[1]), Symmetry.valueOf(cells[2]), bands,
				Double.parseDouble(cells[4]));
	}
}
