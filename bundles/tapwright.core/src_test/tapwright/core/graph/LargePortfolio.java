// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.Random;
import java.util.UUID;

import tapwright.model.EquirippleDesign;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.RealCoefficients;
import tapwright.model.io.ModelFiles;

/** Makes a portfolio of many low-pass filters of 31 to 255 taps, the same for the same seed; all depend on the parameter 'ripple'. */
final class LargePortfolio {

	private static final int SHORTEST = 31;
	private static final int LONGEST = 255;

	private LargePortfolio() {
	}

	/** Writes the portfolio to a new folder. */
	static void write(Path folder, int filters, long seed) throws IOException {
		var random = new Random(seed);
		Files.createDirectories(folder);
		writeRoot(folder, "0.1");
		for (int k = 0; k < filters; k++) {
			int taps = SHORTEST + 2 * random.nextInt((LONGEST - SHORTEST) / 2 + 1);
			double edge = 0.05 + 0.3 * random.nextDouble();
			ModelFiles.save(filter(k, taps, edge, random), file(folder, k));
		}
	}

	/** The file of one filter. */
	static Path file(Path folder, int filter) {
		return folder.resolve("filter-%04d.filter".formatted(filter));
	}

	/** Writes the root file with the given ripple in dB. */
	static void writeRoot(Path folder, String ripple) throws IOException {
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		portfolio.setName("Large");
		Parameter parameter = ModelFactory.eINSTANCE.createParameter();
		parameter.setName("ripple");
		parameter.setValue(ripple);
		portfolio.getParameters().add(parameter);
		ModelFiles.save(portfolio, folder.resolve(ModelFiles.PORTFOLIO_FILE));
	}

	// Ideal low-pass under a Hamming window (R. W. Hamming): pass-band ripple 0.02 dB and stop band -53 dB outside a transition of
	// 3.3 / taps, as handbooks say; the limits leave some of the filters short of them.
	private static Filter filter(int number, int taps, double edge, Random random) {
		double half = 1.7 / taps;
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName("filter-%04d".formatted(number));
		filter.setIdentity(new UUID(random.nextLong(), random.nextLong()).toString());
		filter.setSampleRate("48 kHz");
		filter.getRequirements().add(gain("pass", 0, Math.max(edge - half, 0), "-ripple", "ripple"));
		filter.getRequirements().add(gain("stop", Math.min(edge + half, 0.5), 0.5, null, "-52"));
		EquirippleDesign design = ModelFactory.eINSTANCE.createEquirippleDesign();
		design.setTaps(String.valueOf(taps));
		filter.setDesign(design);
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(Arrays.stream(lowPass(taps, edge)).boxed().toList());
		filter.setCoefficients(coefficients);
		return filter;
	}

	private static GainRequirement gain(String id, double from, double to, String min, String max) {
		GainRequirement gain = ModelFactory.eINSTANCE.createGainRequirement();
		gain.setId(id);
		gain.setFrom(String.format(Locale.ROOT, "%.3f", 48_000 * from));
		gain.setTo(String.format(Locale.ROOT, "%.3f", 48_000 * to));
		gain.setMin(min);
		gain.setMax(max);
		return gain;
	}

	private static double[] lowPass(int taps, double edge) {
		double[] values = new double[taps];
		for (int k = 0; k < taps; k++) {
			int t = k - taps / 2;
			double ideal = t == 0 ? 2 * edge : Math.sin(2 * Math.PI * edge * t) / (Math.PI * t);
			values[k] = ideal * (0.54 - 0.46 * Math.cos(2 * Math.PI * k / (taps - 1)));
		}
		return values;
	}
}
