// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.model.Coefficients;
import tapwright.model.ModelFactory;
import tapwright.model.RealCoefficients;

/** Reads coefficients from text that was copied elsewhere: numbers divided by spaces, commas, semicolons, tabs or line ends. */
final class PastedNumbers {

	private PastedNumbers() {
	}

	/**
	 * New coefficients with the numbers of a text, stored as real numbers.
	 *
	 * @throws InputException
	 *             when there are none, or something is no number; says which
	 */
	static Coefficients read(String text) throws InputException {
		List<Double> values = new ArrayList<>();
		for (String word : text.strip().split("[\\s,;{}\\[\\]]+")) {
			if (!word.isEmpty()) {
				values.add(number(word, values.size()));
			}
		}
		if (values.isEmpty()) {
			throw new InputException("", "The clipboard holds no numbers.");
		}
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(values);
		return coefficients;
	}

	private static double number(String word, int before) throws InputException {
		try {
			double value = word.startsWith("0x") || word.startsWith("0X") ? new BigInteger(word.substring(2), 16).doubleValue()
					: new BigDecimal(word.replaceFirst("[fFlL]$", "")).doubleValue();
			if (Double.isFinite(value)) {
				return value;
			}
			throw new InputException("", "'" + word + "' is too large.");
		} catch (NumberFormatException e) {
			throw new InputException("", "'" + word + "' after " + before + " numbers is no number.");
		}
	}
}
