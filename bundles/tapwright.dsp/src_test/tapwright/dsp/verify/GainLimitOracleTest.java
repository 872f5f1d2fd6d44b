// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/**
 * Verdicts and enclosures of gain limits, judged by root isolation in exact arithmetic. A few filters on every build,
 * many with {@code -Dtapwright.thorough=true}.
 */
class GainLimitOracleTest {

	private static final int FILTERS = Integer.getInteger("tapwright.filters",
			Boolean.getBoolean("tapwright.thorough") ? 1000 : 16);
	private static final long SEED = Long.getLong("tapwright.seed", 20260);

	@Test
	void noVerdictIsWrongAndNoTruthLiesOutsideItsEnclosure() {
		GainJudge judge = new GainJudge(SEED);
		for (int k = 0; k < FILTERS; k++) {
			judge.judge();
		}
		assertTrue(judge.met > 0 && judge.missed > 0, "both verdicts must occur");
		assertEquals(0, judge.unproven, "unproven of " + judge.pairs);
	}
}
