// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

/** Breaks the error bound of the fast search on purpose: the judge of the other tests must see it. */
class BoundMutationTest {

	private static final int FILTERS = 20;

	@AfterEach
	void restore() {
		QuickGain.WORK_SPACE.remove();
	}

	@Test
	void theJudgeFindsFaultsWhenErrorsAreNotCounted() {
		QuickGain.WORK_SPACE.set(new QuickSearch(0));
		assertThrows(AssertionError.class, BoundMutationTest::judge);
	}

	@Test
	void theJudgeFindsFaultsWhenErrorsCountTheWrongWay() {
		QuickGain.WORK_SPACE.set(new QuickSearch(-1));
		assertThrows(AssertionError.class, BoundMutationTest::judge);
	}

	@Test
	void theJudgeFindsNoFaultInTheTrueBound() {
		QuickGain.WORK_SPACE.set(new QuickSearch(1));
		assertTrue(judge() > 0);
	}

	private static int judge() {
		GainJudge judge = new GainJudge(7);
		for (int k = 0; k < FILTERS; k++) {
			judge.judge();
		}
		return judge.pairs;
	}
}
