// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;

import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.problem.DesignProblems;
import tapwright.core.quantity.Parameters;
import tapwright.dsp.Progress;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;

class DesignAgainTest {

	@Test
	void yieldsCoefficientsThatAreNotStaleWithWhatIsProvenOfThem() throws InputException, DesignException {
		Filter filter = lowPass();
		Filter twin = EcoreUtil.copy(filter);
		Remedy remedy = DesignAgain.of(filter, Parameters.NONE, Progress.NONE).orElseThrow();
		assertEquals(Verdict.MET, remedy.outcome().verdict());
		assertTrue(remedy.preview().startsWith("met, pass: gain from 0 to 100 Hz"), remedy.preview());
		assertEquals(2, remedy.preview().lines().count());
		assertNull(filter.getCoefficients(), "nothing is changed before it is applied");
		remedy.on(twin, filter).apply();
		assertNull(filter.getCoefficients(), "only the twin is changed");
		assertEquals(List.of(), DesignProblems.of(twin, "f", Parameters.NONE));
	}

	@Test
	void findsTheEditedRequirementOfAnEqualFilter() throws InputException {
		Filter filter = lowPass();
		Filter twin = EcoreUtil.copy(filter);
		var requirement = filter.getRequirements().get(1);
		new Edit(requirement, requirement.eClass().getEStructuralFeature("max"), "-20").on(twin, filter).apply();
		assertEquals("-20", twin.getRequirements().get(1).eGet(requirement.eClass().getEStructuralFeature("max")));
		assertEquals("-30", requirement.eGet(requirement.eClass().getEStructuralFeature("max")));
	}

	@Test
	void hasNothingForGivenCoefficients() throws InputException, DesignException {
		Filter filter = lowPass();
		filter.setDesign(ModelFactory.eINSTANCE.createGivenDesign());
		assertEquals(Optional.empty(), DesignAgain.of(filter, Parameters.NONE, Progress.NONE));
	}

	private static Filter lowPass() throws InputException {
		return FilterJson.read("""
				{"format": "tapwright-filter/1", "name": "f", "sampleRate": 1000,
				 "design": {"method": "equiripple", "taps": 15},
				 "requirements": [{"id": "pass", "kind": "gain", "from": 0, "to": 100, "min": -1, "max": 1},
				                  {"id": "stop", "kind": "gain", "from": 250, "to": 500, "max": -30}]}""");
	}
}
