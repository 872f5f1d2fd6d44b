// SPDX-License-Identifier: EPL-2.0
package tapwright.core.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import tapwright.core.InputException;

class ExpressionTest {

	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "6000 | 6000", "-0.05 | -0.05", "1e-3 | 0.001", "2 + 3 * 4 | 14", "(2 + 3) * 4 | 20",
			"2 - 3 - 4 | -5", "12 / 4 / 3 | 1", "- - 2 | 2", "min(3, 1 + 1, 5) | 2", "max(3) | 3", ".5 | 0.5", "2 * -3 | -6" })
	void followsTheRulesOfArithmetic(String text, double expected) throws InputException {
		Quantity value = Expression.evaluate(text, Expression.Names.NONE);
		assertEquals(expected, value.value().doubleValue(), 0);
		assertEquals(Dimension.NONE, value.dimension());
	}

	@Test
	void isExact() throws InputException {
		assertEquals(BigFraction.ZERO, Expression.evaluate("0.1 + 0.2 - 0.3", Expression.Names.NONE).value());
		assertEquals(new BigFraction(1), Expression.evaluate("1 / 3 * 3", Expression.Names.NONE).value());
	}

	// Factors of the prefixes: International System of Units (SI), 9th edition 2019, table 7.
	@ParameterizedTest
	@CsvSource(delimiter = '|', value = { "8 kHz | 8000 Hz", "0.192MHz | 192000 Hz", "1.5 ms | 0.0015 s", "20 us | 0.00002 s",
			"3 µs | 0.000003 s", "1 / (20 ms) | 50 Hz", "2 * 8 kHz | 16 kHz", "8 kHz / 2 | 4 kHz", "-80 dB | 0 dB - 80 dB",
			"96 kHz / (192 kHz) | 0.5" })
	void understandsUnits(String text, String same) throws InputException {
		assertEquals(Expression.evaluate(same, Expression.Names.NONE), Expression.evaluate(text, Expression.Names.NONE));
	}

	@ParameterizedTest
	@ValueSource(strings = { "", " ", "1 +", "(1", "1)", "2 3", "1 / 0", "8 kHz + 1", "8 kHz - 1 ms", "max(1 dB, 2 Hz)", "sqrt(4)",
			"8 furlong", "1..2", ".", "rate", "1e99999", "1e-9999", "#", "min(1,)", "1,2" })
	void refusesWhatMakesNoSense(String text) {
		assertThrows(InputException.class, () -> Expression.evaluate(text, Expression.Names.NONE));
	}

	@Test
	void quotesTheExpressionInTheMessage() {
		var problem = assertThrows(InputException.class, () -> Expression.evaluate("8 kHz + 1", Expression.Names.NONE));
		assertTrue(problem.getMessage().contains("'8 kHz + 1'") && problem.getMessage().contains("write the unit"),
				problem.getMessage());
	}

	@Test
	void endsOnDeepNestingWithAnError() {
		assertThrows(InputException.class, () -> Expression.evaluate("(".repeat(9_000), Expression.Names.NONE));
		assertThrows(InputException.class, () -> Expression.evaluate("-".repeat(9_000), Expression.Names.NONE));
	}

	@Test
	void readsScalesAsExactNumbers() throws InputException {
		assertEquals(new BigFraction(1, 32768), Expression.scale("2^-15"));
		assertEquals(new BigFraction(1, 35), Expression.scale("1/35"));
		assertEquals(new BigFraction(1, 1000), Expression.scale("0.001"));
		assertThrows(InputException.class, () -> Expression.scale("-1"));
		assertThrows(InputException.class, () -> Expression.scale("2^-99999"));
		assertThrows(InputException.class, () -> Expression.scale("1 Hz"));
	}
}
