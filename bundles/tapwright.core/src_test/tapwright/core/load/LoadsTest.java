// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Parameters;
import tapwright.core.verify.FilterQuestion;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.Processor;
import tapwright.model.Severity;

/** All numbers are counted by hand in the comments. */
class LoadsTest {

	private static final Numbers NUMBERS = new Numbers(Parameters.NONE);

	@Test
	void countsWhatTheStructureNeedsForEveryChannelAndCopy() throws InputException {
		// Folded: 3 multiplications for 5 taps; 2 channels * 3 copies * 1000 Hz * 3. Four delays each.
		Demand demand = demand("\"structure\": \"folded\"", "{\"processor\": \"p\", \"channels\": 2, \"copies\": 3}");
		assertEquals(18_000, demand.multiplyAccumulates());
		assertEquals(24, demand.delayWords());
		assertEquals(3, demand.coefficientWords(), "stored once for all channels and copies");
	}

	@Test
	void countsADecimatorAtItsOutputRate() throws InputException {
		// Five taps for every second input sample, and the deployment runs at its own rate: 5 * 400 / 2.
		assertEquals(1000, demand("\"structure\": \"polyphase-decimator\", \"factor\": 2",
				"{\"processor\": \"p\", \"inputRate\": 400}").multiplyAccumulates());
	}

	@Test
	void addsDeploymentsOfOneFilterOnOneProcessor() throws InputException {
		Demands demands = demands("\"structure\": \"direct\"",
				"{\"processor\": \"p\"}, {\"processor\": \"q\"}, {\"processor\": \"p\", \"channels\": 2}");
		assertEquals(List.of("p", "q"), demands.demands().stream().map(Demand::processor).toList());
		assertEquals(15_000, demands.demands().getFirst().multiplyAccumulates());
		assertEquals(5, demands.demands().getFirst().coefficientWords());
	}

	@Test
	void saysInWordsWhatIsTooMuchAndWhichFilterNeedsMost() throws InputException {
		Demand small = demand("\"structure\": \"folded\"", "{\"processor\": \"p\"}");
		var large = new Demand("big", "p", 2_000_000, 7, 9, 0, 0);
		Loads loads = Loads.of(List.of(processor("1000000", "10", "14")), List.of(small, large), NUMBERS);
		ProcessorLoad load = loads.loads().getFirst();
		assertEquals(2_003_000, load.used(Resource.MULTIPLY_ACCUMULATES));
		assertFalse(load.isOverloaded(Resource.COEFFICIENTS), "10 of 10 words");
		assertEquals(List.of(large, small), load.largest(Resource.DELAYS));
		assertFalse(load.isOverloaded(Resource.DELAYS), "13 of 14 words");
		Problem problem = loads.problems().getFirst();
		assertEquals(1, loads.problems().size());
		assertEquals(ProblemKind.OVERLOAD, problem.kind());
		assertEquals("processor p: its filters need 2.003 million multiply-accumulates per second, it has 1 million: "
				+ "1.003 million too many; most of them for big, 2 million", problem.message());
	}

	@Test
	void findsProcessorsThatDoNotExistAndWordsThatDoNotFit() throws InputException {
		Loads loads = Loads.of(List.of(processor("1e9", "1000", "1000")), List.of(), NUMBERS);
		Problem unknown = loads.problems(List.of(new Demand("f", "other", 1, 1, 1, 0, 0))).getFirst();
		assertEquals(Severity.MUST, unknown.severity());
		assertTrue(unknown.message().contains("there are: p"), unknown.message());
		List<Problem> longer = loads.problems(List.of(new Demand("f", "p", 1, 1, 1, 17, 41)));
		assertEquals(List.of(Severity.SHOULD, Severity.SHOULD), longer.stream().map(Problem::severity).toList());
		assertEquals(List.of(), loads.problems(List.of(new Demand("f", "p", 1, 1, 1, 16, 40))));
	}

	@Test
	void saysWhichNumbersMakeNoSense() throws InputException {
		Processor nameless = processor("1", "1", "1");
		nameless.setName("");
		Loads loads = Loads.of(List.of(processor("fast", "1", "1"), nameless), List.of(), NUMBERS);
		assertEquals(2, loads.problems().size());
		assertTrue(loads.problems().getFirst().message().startsWith("processor p: macRate"), loads.problems().getFirst().message());
		assertEquals(1, demands("\"structure\": \"direct\"", "{\"processor\": \"p\", \"channels\": 0}").problems().size());
	}

	private static Processor processor(String rate, String coefficients, String delays) {
		Processor processor = ModelFactory.eINSTANCE.createProcessor();
		processor.setName("p");
		processor.setMacRate(rate);
		processor.setCoefficientMemory(coefficients);
		processor.setDelayMemory(delays);
		processor.setWord("16");
		processor.setAccumulator("40");
		return processor;
	}

	private static Demand demand(String arithmetic, String deployments) throws InputException {
		return demands(arithmetic, deployments).demands().getFirst();
	}

	private static Demands demands(String arithmetic, String deployments) throws InputException {
		Filter filter = FilterJson.read("{\"format\": \"tapwright-filter/1\", \"name\": \"f\", \"sampleRate\": 1000, "
				+ "\"coefficients\": {\"values\": [1, 2, 3, 2, 1]}, \"arithmetic\": {" + arithmetic + "}, \"deployments\": ["
				+ deployments + "]}");
		return Demands.of(filter, "f", FilterQuestion.of(filter, Parameters.NONE).subject().orElseThrow(), NUMBERS);
	}
}
