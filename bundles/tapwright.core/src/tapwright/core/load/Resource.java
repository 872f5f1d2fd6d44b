// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import java.util.OptionalDouble;

/** What filters share on a processor. */
public enum Resource {

	/** Multiplications, each with the addition to a sum, per second. */
	MULTIPLY_ACCUMULATES("multiply-accumulates per second"),
	/** Words of memory for coefficients. */
	COEFFICIENTS("words of coefficients"),
	/** Words of memory for delay lines. */
	DELAYS("words of delay lines");

	private final String words;

	Resource(String words) {
		this.words = words;
	}

	/** What is counted, for a sentence. */
	public String words() {
		return words;
	}

	double of(Demand demand) {
		return switch (this) {
		case MULTIPLY_ACCUMULATES -> demand.multiplyAccumulates();
		case COEFFICIENTS -> demand.coefficientWords();
		case DELAYS -> demand.delayWords();
		};
	}

	OptionalDouble of(Budget budget) {
		return switch (this) {
		case MULTIPLY_ACCUMULATES -> budget.multiplyAccumulates();
		case COEFFICIENTS -> budget.coefficientWords();
		case DELAYS -> budget.delayWords();
		};
	}
}
