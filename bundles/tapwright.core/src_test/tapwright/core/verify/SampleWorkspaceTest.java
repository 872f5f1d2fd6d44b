// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

import tapwright.core.InputException;
import tapwright.core.interchange.JsonTree;
import tapwright.core.interchange.JsonTree.NumberLiteral;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.portfolio.Sources;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;

/** The demo portfolio against two independent evaluations: a general-purpose library, and decimal arithmetic to 45 digits. */
class SampleWorkspaceTest {

	private static final MathContext DIGITS = new MathContext(45, RoundingMode.HALF_EVEN);
	// Machin, 1706: pi = 16 arctan(1/5) - 4 arctan(1/239).
	private static final BigDecimal PI = arctanOfInverse(5).multiply(BigDecimal.valueOf(16))
			.subtract(arctanOfInverse(239).multiply(BigDecimal.valueOf(4)));

	private static VerificationRun run;

	@BeforeAll
	static void verify() throws InputException, IOException {
		run = VerificationRun.of(Sources.read(List.of(workspace())), Effort.STANDARD);
	}

	@Test
	void hasAtLeastEightFiltersOfWhichTwoAreWrongOnPurpose() {
		assertTrue(run.results().size() >= 8);
		assertEquals(List.of(), run.problems());
		Set<String> missed = run.results().stream().filter(result -> result.evidence().verdict() == Verdict.MISSED)
				.map(result -> result.evidence().name()).collect(Collectors.toSet());
		assertEquals(Set.of("strain-antialias", "wave-antialias"), missed);
		assertTrue(run.results().stream().noneMatch(result -> result.evidence().verdict() == Verdict.UNPROVEN));
	}

	@TestFactory
	Stream<DynamicTest> agreesWithAGeneralPurposeLibrary() throws IOException, InputException {
		Map<?, ?> fixture = (Map<?, ?>) JsonTree.parse(
				new String(getClass().getResourceAsStream("worst_values.json").readAllBytes(), StandardCharsets.UTF_8));
		return ((List<?>) fixture.get("rows")).stream().map(Map.class::cast).map(row -> {
			String name = row.get("filter") + " " + row.get("requirement");
			return DynamicTest.dynamicTest(name + " (" + fixture.get("library") + ")", () -> {
				RequirementEvidence evidence = evidence((String) row.get("filter"), (String) row.get("requirement"));
				double value = number(row.get("value"));
				// The library works in double precision: about 1e-15 of the gain at 0 dB, hence 1e-10 dB at -90 dB.
				assertEquals(value, evidence.proof().value().middle(), 1e-9);
			});
		});
	}

	@TestFactory
	Stream<DynamicTest> enclosesTheGainAtTheWorstPlaceInDecimalArithmetic() {
		return run.results().stream().flatMap(result -> result.evidence().requirements().stream()
				.filter(evidence -> evidence.kind().equals("gain") && Double.isFinite(evidence.proof().value().lo()))
				.map(evidence -> DynamicTest.dynamicTest(result.evidence().name() + " " + evidence.id(),
						() -> checkAtWorst(result.source(), evidence))));
	}

	private static void checkAtWorst(FilterSource source, RequirementEvidence evidence) {
		var subject = FilterQuestion.of(source.filter().orElseThrow(), source.parameters()).subject().orElseThrow();
		BigDecimal gain = gain(subject.taps(), evidence.proof().worst(), subject.sampleRate());
		double decibel = 10 * Math.log10(gain.multiply(gain, DIGITS).doubleValue());
		// The place is rounded to a double, where the gain differs from the extreme by less than this.
		double slack = 1e-9 + 1e-12 * Math.abs(decibel);
		assertTrue(evidence.proof().value().lo() - slack <= decibel && decibel <= evidence.proof().value().hi() + slack,
				() -> decibel + " is not in " + evidence.proof().value());
	}

	// Magnitude of the sum of h[k] exp(-j 2 pi f k / rate).
	private static BigDecimal gain(ExactTaps taps, double frequency, double rate) {
		BigDecimal step = new BigDecimal(frequency).divide(new BigDecimal(rate), DIGITS).multiply(PI).multiply(BigDecimal.TWO);
		BigDecimal cosine = series(step, 0);
		BigDecimal sine = series(step, 1);
		BigDecimal c = BigDecimal.ONE; // cosine and sine of k steps
		BigDecimal s = BigDecimal.ZERO;
		BigDecimal real = BigDecimal.ZERO;
		BigDecimal imaginary = BigDecimal.ZERO;
		for (int k = 0; k < taps.length(); k++) {
			BigDecimal tap = Rationals.decimal(taps.tap(k), 45);
			real = real.add(tap.multiply(c, DIGITS));
			imaginary = imaginary.subtract(tap.multiply(s, DIGITS));
			BigDecimal next = c.multiply(cosine).subtract(s.multiply(sine)).round(DIGITS);
			s = s.multiply(cosine).add(c.multiply(sine)).round(DIGITS);
			c = next;
		}
		return real.multiply(real).add(imaginary.multiply(imaginary)).sqrt(DIGITS);
	}

	// Power series of the cosine (first = 0) or the sine (first = 1).
	private static BigDecimal series(BigDecimal angle, int first) {
		BigDecimal term = first == 0 ? BigDecimal.ONE : angle;
		BigDecimal sum = term;
		BigDecimal square = angle.multiply(angle, DIGITS);
		for (int n = first + 1; n < 80; n += 2) {
			term = term.multiply(square, DIGITS).divide(BigDecimal.valueOf(-(long) n * (n + 1)), DIGITS);
			sum = sum.add(term, DIGITS);
		}
		return sum;
	}

	private static BigDecimal arctanOfInverse(int denominator) {
		BigDecimal x = BigDecimal.ONE.divide(BigDecimal.valueOf(denominator), DIGITS);
		BigDecimal square = x.multiply(x, DIGITS).negate();
		BigDecimal term = x;
		BigDecimal sum = x;
		for (int n = 3; n < 120; n += 2) {
			term = term.multiply(square, DIGITS);
			sum = sum.add(term.divide(BigDecimal.valueOf(n), DIGITS), DIGITS);
		}
		return sum;
	}

	private static RequirementEvidence evidence(String filter, String requirement) {
		return run.results().stream().filter(result -> result.evidence().name().equals(filter)).findFirst().orElseThrow()
				.evidence().find(requirement).orElseThrow();
	}

	private static double number(Object literal) {
		return Double.parseDouble(((NumberLiteral) literal).text());
	}

	private static Path workspace() {
		Path folder = Path.of("").toAbsolutePath();
		while (!Files.isDirectory(folder.resolve("sample-workspace"))) {
			folder = folder.getParent();
		}
		return folder.resolve("sample-workspace");
	}
}
