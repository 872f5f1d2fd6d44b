// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.RealCoefficients;
import tapwright.model.Requirement;

class PublishedMaskTest {

	static List<PublishedMask> masks() {
		return PublishedMask.all();
	}

	@ParameterizedTest
	@MethodSource("masks")
	void givesRequirementsThatCanBeProven(PublishedMask mask) throws InputException {
		for (double rate : new double[] { 8000, 48000, 192000 }) {
			Filter filter = ModelFactory.eINSTANCE.createFilter();
			filter.setSampleRate(Double.toString(rate));
			filter.getRequirements().addAll(mask.requirements(rate, Map.of()));
			RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
			coefficients.getValues().add(1.0);
			filter.setCoefficients(coefficients);
			var evidence = FilterQuestion.of(filter, Expression.Names.NONE).answer(Effort.STANDARD);
			assertEquals(List.of(), evidence.problems());
			assertFalse(mask.source().isBlank());
		}
	}

	// IEC 61672-1, table of frequency weightings (recalled): A-weighting at the exact frequencies 1000 * 10^(n/10), printed to 0.1 dB.
	@ParameterizedTest
	@CsvSource({ "31.5, -15, -39.4", "63, -12, -26.2", "125, -9, -16.1", "250, -6, -8.6", "500, -3, -3.2", "1000, 0, 0", "2000, 3, 1.2",
			"4000, 6, 1.0", "8000, 9, -1.1", "16000, 12, -6.6" })
	void agreesWithThePrintedWeighting(double nominal, int n, double printed) {
		double exact = 1000 * Math.pow(10, n / 10.0);
		assertEquals(nominal, exact, 0.02 * nominal);
		assertEquals(printed, AWeightingMask.weighting(exact), 0.05);
	}

	// IEC 61260:1995, table 1 (recalled): class 1 octave band, relative attenuation at G^x with G = 10^0.3.
	@ParameterizedTest
	@CsvSource({ "0.125, 0.4", "0.25, 0.6", "0.375, 1.3", "-0.125, 0.4", "-0.375, 1.3" })
	void putsTheOctaveBandLimitsAtTheirFrequencies(double octaves, double mostAttenuation) throws InputException {
		GainRequirement inBand = (GainRequirement) new OctaveBandMask(1).requirements(48000, Map.of()).getFirst();
		double frequency = 1000 * Math.pow(10, 0.3 * octaves);
		assertTrue(inBand.getPoints().stream()
				.anyMatch(point -> Math.abs(Double.parseDouble(point.getFrequency()) - frequency) < 1e-9 * frequency
						&& Double.parseDouble(point.getLevel()) == -mostAttenuation));
	}

	// The band edges of a third octave are at G^(1/6), those of an octave at G^(1/2): IEC 61260-1, band-edge frequencies.
	@Test
	void narrowsThirdOctavesToTheirBandEdges() throws InputException {
		List<Requirement> third = new OctaveBandMask(3).requirements(48000, Map.of());
		GainRequirement inBand = (GainRequirement) third.getFirst();
		assertEquals(1000 * Math.pow(10, 0.05), Double.parseDouble(inBand.getPoints().getLast().getFrequency()), 1e-9);
		assertEquals(1000 / Math.pow(10, 0.05), Double.parseDouble(inBand.getPoints().getFirst().getFrequency()), 1e-9);
	}

	@Test
	void endsAtHalfTheSampleRate() throws InputException {
		for (Requirement requirement : new OctaveBandMask(1).requirements(8000, Map.of())) {
			((GainRequirement) requirement).getPoints()
					.forEach(point -> assertTrue(Double.parseDouble(point.getFrequency()) <= 4000));
		}
	}

	@Test
	void refusesChoicesThatMakeNoSense() {
		assertThrows(InputException.class,
				() -> new OctaveBandMask(1).requirements(48000, Map.of("exact mid-band frequency", -1.0)));
		assertThrows(InputException.class,
				() -> new OctaveBandMask(1).requirements(48000, Map.of("exact mid-band frequency", 200_000.0)));
		assertThrows(InputException.class, () -> new AWeightingMask().requirements(48000, Map.of("lowest frequency", 20_000.0)));
	}
}
