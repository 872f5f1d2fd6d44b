// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.design.Designer;
import tapwright.core.interchange.FilterJson;
import tapwright.core.quantity.Parameters;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.model.EquirippleDesign;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;

class DesignProblemsTest {

	private final Filter filter = lowPass();

	@Test
	void asksForADesignThatNeverRan() {
		assertTrue(only().message().contains("has not run yet"), only().message());
	}

	@Test
	void findsNothingRightAfterTheDesignRan() throws InputException, DesignException {
		run();
		assertEquals(List.of(), problems());
	}

	@Test
	void noticesThatTheDesignChangedSinceItRan() throws InputException, DesignException {
		run();
		((EquirippleDesign) filter.getDesign()).setTaps("13");
		assertTrue(only().message().contains("was changed since"), only().message());
		((EquirippleDesign) filter.getDesign()).setTaps("10 + 1");
		assertEquals(List.of(), problems(), "other words for the same number");
	}

	@Test
	void noticesThatARequirementThatTheDesignFollowsChanged() throws InputException, DesignException {
		run();
		filter.setSampleRate("1100");
		assertEquals(ProblemKind.STALE, only().kind());
	}

	@Test
	void noticesCoefficientsThatNoDesignComputed() throws InputException, DesignException {
		run();
		filter.getCoefficients().setDesignHash(null);
		assertTrue(only().message().contains("do not come from the stated design"), only().message());
		filter.setDesign(ModelFactory.eINSTANCE.createGivenDesign());
		assertEquals(List.of(), problems(), "given coefficients need none");
	}

	@Test
	void saysWhyADesignCannotRun() {
		((EquirippleDesign) filter.getDesign()).setTaps("-3");
		assertTrue(only().message().contains("cannot run as it is stated"), only().message());
	}

	private void run() throws InputException, DesignException {
		filter.setCoefficients(Designer.of(filter, Parameters.NONE).orElseThrow().run(Progress.NONE).coefficients());
	}

	private Problem only() {
		assertEquals(1, problems().size(), problems()::toString);
		return problems().getFirst();
	}

	private List<Problem> problems() {
		return DesignProblems.of(filter, "f", Parameters.NONE);
	}

	private static Filter lowPass() {
		try {
			return FilterJson.read("""
					{"format": "tapwright-filter/1", "name": "f", "sampleRate": 1000,
					 "design": {"method": "equiripple", "taps": 11},
					 "requirements": [{"id": "pass", "kind": "gain", "from": 0, "to": 100, "min": -1, "max": 1},
					                  {"id": "stop", "kind": "gain", "from": 250, "to": 500, "max": -30}]}""");
		} catch (InputException e) {
			throw new AssertionError(e);
		}
	}
}
