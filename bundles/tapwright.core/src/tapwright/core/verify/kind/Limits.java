// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify.kind;

import tapwright.core.quantity.Words;

/** A lower and an upper limit in words; either may be infinite. */
final class Limits {

	private Limits() {
	}

	static String words(double min, double max, String unit) {
		if (min == max) {
			return "exactly " + Words.exactly(max, unit);
		}
		if (min == Double.NEGATIVE_INFINITY) {
			return "at most " + Words.exactly(max, unit);
		}
		if (max == Double.POSITIVE_INFINITY) {
			return "at least " + Words.exactly(min, unit);
		}
		return min == -max ? "within ±" + Words.exactly(max, unit)
				: "between " + Words.exactly(min, unit) + " and " + Words.exactly(max, unit);
	}
}
