// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.core.InputException;
import tapwright.core.path.Step.Filtering;
import tapwright.core.path.Step.Lowering;
import tapwright.core.path.Step.Raising;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Proof;
import tapwright.dsp.verify.Verdict;

/** The one filter that a chain is equal to, against the chain itself, run sample by sample as its stages say. */
class SignalChainTest {

	private static final double[] FIRST = window(31, 0.1);
	private static final double[] SECOND = window(41, 0.15);
	private static final double[] THIRD = { 0.25, 0.5, 0.25 };
	private static final List<Step> DECIMATOR = List.of(filtering(FIRST), new Lowering(4), filtering(SECOND), new Lowering(3),
			filtering(THIRD));

	@Test
	void foldsEveryAliasingToneOfATwoStageDecimatorAsTheChainDoes() throws InputException {
		SignalChain chain = SignalChain.of(DECIMATOR);
		assertEquals(12, chain.decimation());
		assertEquals(1, chain.expansion());
		double[] taps = chain.taps().toDoubles();
		int tones = 0;
		// All input frequencies that arrive at one of these, in parts of the output rate.
		for (double kept : new double[] { 0, 0.05, 0.2, 0.37, 0.5 }) {
			for (int image = 0; image <= 6; image++) {
				for (int sign : new int[] { 1, -1 }) {
					double input = (image + sign * kept) / 12;
					if (input >= 0 && input <= 0.5) {
						double expected = amplitudeBySimulation(DECIMATOR, input, 1);
						assertEquals(expected, gain(taps, input), 1e-12, "tone at " + input);
						tones++;
					}
				}
			}
		}
		assertTrue(tones > 50, tones + " tones");
	}

	@Test
	void boundsEverythingThatFoldsAtEachDecimation() throws InputException {
		SignalChain chain = SignalChain.of(DECIMATOR);
		assertEquals(List.of(4, 12), chain.foldings().stream().map(SignalChain.Folding::decimation).toList());
		assertEquals(List.of(1, 3), chain.foldings().stream().map(SignalChain.Folding::step).toList());
		double rate = 48_000;
		double kept = 500;
		for (SignalChain.Folding folding : chain.foldings()) {
			List<Step> before = DECIMATOR.subList(0, folding.step() + 1);
			double strongest = 0;
			for (int image = 1; image <= folding.decimation() / 2; image++) {
				for (double offset = -kept; offset <= kept; offset += 25) {
					double frequency = image * rate / folding.decimation() + offset;
					if (frequency <= rate / 2) {
						strongest = Math.max(strongest, amplitudeBySimulation(before, frequency / rate, 1));
					}
				}
			}
			double rejection = -20 * Math.log10(strongest);
			Proof met = folding.prove(rate, kept, rejection - 0.2, Effort.STANDARD);
			assertEquals(Verdict.MET, met.verdict());
			assertTrue(met.value().lo() <= rejection, "no tone that was tried gets through more than is proven");
			assertEquals(Verdict.MISSED, folding.prove(rate, kept, rejection + 0.01, Effort.STANDARD).verdict());
		}
	}

	@Test
	void isEqualSampleBySampleForRateChangesByFractions() throws InputException {
		var random = new Random(1);
		double[] input = random.doubles(200).toArray();
		List<Step> chain = List.of(filtering(THIRD), new Lowering(2), filtering(SECOND), new Raising(3), filtering(FIRST),
				new Lowering(5), filtering(THIRD));
		SignalChain equal = SignalChain.of(chain);
		assertEquals(3, equal.expansion());
		assertEquals(10, equal.decimation());
		double[] expected = run(chain, input);
		double[] taps = equal.taps().toDoubles();
		for (int k = 0; k < taps.length; k++) {
			taps[k] *= 3;
		}
		double[] found = run(List.of(new Raising(3), filtering(taps), new Lowering(10)), input);
		for (int k = 0; k < expected.length; k++) {
			assertEquals(expected[k], found[k], 1e-12);
		}
	}

	@Test
	void givesAToneTheAmplitudeThatItHasAfterInterpolation() throws InputException {
		List<Step> interpolator = List.of(new Raising(4), filtering(FIRST));
		assertEquals(amplitudeBySimulation(interpolator, 0.03, 4), gain(SignalChain.of(interpolator).taps().toDoubles(), 0.03 / 4),
				1e-3);
	}

	@Test
	void refusesChainsThatAreNoSingleFilter() {
		var e = assertThrows(InputException.class,
				() -> SignalChain.of(List.of(new Lowering(4), filtering(THIRD), new Raising(6))));
		assertTrue(e.getMessage().contains("common divisor"), e.getMessage());
		assertThrows(InputException.class, () -> SignalChain.of(List.of(new Lowering(50_000), filtering(FIRST))));
		assertThrows(InputException.class,
				() -> SignalChain.of(List.of(new Lowering(50_000), new Lowering(50_000), new Lowering(50_000))));
	}

	private static Filtering filtering(double... taps) {
		return new Filtering("f", ExactTaps.ofDoubles(taps));
	}

	/**
	 * Amplitude at the output of a complex tone of amplitude 1, found from cosine and sine as real signals. With images there
	 * (periods above 1), the wanted one is found by correlation over whole periods of the tone.
	 */
	private static double amplitudeBySimulation(List<Step> chain, double frequency, int raised) {
		int length = 2400;
		double[] cosine = new double[length];
		double[] sine = new double[length];
		for (int n = 0; n < length; n++) {
			cosine[n] = Math.cos(2 * Math.PI * frequency * n);
			sine[n] = Math.sin(2 * Math.PI * frequency * n);
		}
		double[] real = run(chain, cosine);
		double[] imaginary = run(chain, sine);
		if (raised == 1) {
			return Math.hypot(real[real.length - 1], imaginary[real.length - 1]); // long after the start
		}
		double a = 0;
		double b = 0;
		int first = 400; // after the start; 9200 samples are whole periods of 4 / 0.03
		int count = 9200;
		for (int n = first; n < first + count; n++) {
			double angle = 2 * Math.PI * frequency / raised * n;
			a += real[n] * Math.cos(angle) + imaginary[n] * Math.sin(angle);
			b += imaginary[n] * Math.cos(angle) - real[n] * Math.sin(angle);
		}
		return Math.hypot(a, b) / count;
	}

	// Straight from the definitions, in double precision; starts at rest.
	private static double[] run(List<Step> chain, double[] input) {
		double[] signal = input;
		for (Step step : chain) {
			signal = switch (step) {
			case Filtering filtering -> filter(filtering.taps().toDoubles(), signal);
			case Lowering lowering -> lower(signal, lowering.factor());
			case Raising raising -> raise(signal, raising.factor());
			};
		}
		return signal;
	}

	private static double[] filter(double[] taps, double[] signal) {
		double[] result = new double[signal.length];
		for (int n = 0; n < signal.length; n++) {
			for (int k = 0; k < taps.length && k <= n; k++) {
				result[n] += taps[k] * signal[n - k];
			}
		}
		return result;
	}

	private static double[] lower(double[] signal, int factor) {
		var kept = new ArrayList<Double>();
		for (int n = 0; n < signal.length; n += factor) {
			kept.add(signal[n]);
		}
		return kept.stream().mapToDouble(Double::doubleValue).toArray();
	}

	private static double[] raise(double[] signal, int factor) {
		double[] result = new double[signal.length * factor];
		for (int n = 0; n < signal.length; n++) {
			result[n * factor] = signal[n];
		}
		return result;
	}

	private static double gain(double[] taps, double frequency) {
		double real = 0;
		double imaginary = 0;
		for (int k = 0; k < taps.length; k++) {
			real += taps[k] * Math.cos(2 * Math.PI * frequency * k);
			imaginary -= taps[k] * Math.sin(2 * Math.PI * frequency * k);
		}
		return Math.hypot(real, imaginary);
	}

	// A low-pass filter; any would do.
	private static double[] window(int length, double edge) {
		double[] taps = new double[length];
		for (int k = 0; k < length; k++) {
			double t = k - (length - 1) / 2.0;
			double ideal = t == 0 ? 2 * edge : Math.sin(2 * Math.PI * edge * t) / (Math.PI * t);
			taps[k] = ideal * (0.54 - 0.46 * Math.cos(2 * Math.PI * k / (length - 1)));
		}
		return taps;
	}
}
