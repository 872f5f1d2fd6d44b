// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.special;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.exact.ExactTaps;

/** A design whose coefficients are rational numbers. */
public interface ExactDesign extends Design {

	/** The greatest number of coefficients of designs that are computed in exact rationals. */
	int LONGEST = 2001;

	/** The coefficients, exactly. */
	ExactTaps exact(Progress progress);

	/** The coefficients rounded to nearest doubles. */
	@Override
	default DesignResult compute(Progress progress) {
		return new DesignResult(exact(progress).toDoubles());
	}

	/** Refuses a number of coefficients outside 1 to {@link #LONGEST}. */
	static void checkLength(long taps) {
		if (taps < 1 || taps > LONGEST) {
			throw new IllegalArgumentException("a design of " + taps + " coefficients was asked for; ask for 1 to " + LONGEST);
		}
	}
}
