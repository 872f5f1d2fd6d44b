// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;

import tapwright.dsp.verify.Effort;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.RealCoefficients;
import tapwright.model.Unit;
import tapwright.model.io.ModelFiles;

/** A small portfolio with one filter, (1, 2, 1) / 4 at 1 kHz, whose gain at 400 Hz is 20 log10(cos^2(0.4 pi)) = -20.4 dB. */
final class Samples {

	static final Author OWNER = new Author("Owner", "owner@marram.invalid");
	static final Clock NOON = Clock.fixed(Instant.parse("2026-03-01T12:00:00Z"), ZoneOffset.UTC);

	private Samples() {
	}

	static Recorder recorder() {
		return new Recorder(OWNER, NOON, Effort.STANDARD);
	}

	static Path portfolio(Path folder) throws IOException {
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		Parameter rate = ModelFactory.eINSTANCE.createParameter();
		rate.setName("rate");
		rate.setUnit(Unit.HZ);
		rate.setValue("1 kHz");
		portfolio.getParameters().add(rate);
		ModelFiles.save(portfolio, folder.resolve(ModelFiles.PORTFOLIO_FILE));
		ModelFiles.save(filter("-20"), folder.resolve("smooth.filter"));
		return folder.resolve("smooth.filter");
	}

	static Filter filter(String limit) {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName("smooth");
		filter.setSampleRate("rate");
		GainRequirement stop = ModelFactory.eINSTANCE.createGainRequirement();
		stop.setId("stop");
		stop.setFrom("400");
		stop.setTo("500");
		stop.setMax(limit);
		filter.getRequirements().add(stop);
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(List.of(0.25, 0.5, 0.25));
		filter.setCoefficients(coefficients);
		return filter;
	}

	/** Changes the limit in a filter file, as an editor would. */
	static WorkingFilter edit(Path file, String limit) throws Exception {
		Filter filter = ModelFiles.load(file, Filter.class);
		((GainRequirement) filter.getRequirements().getFirst()).setMax(limit);
		ModelFiles.save(filter, file);
		return WorkingFilter.read(file);
	}

	/** Replaces text in a file. */
	static void tamper(Path file, String from, String to) throws IOException {
		String text = Files.readString(file);
		if (!text.contains(from)) {
			throw new IllegalArgumentException(file + " does not hold " + from);
		}
		Files.writeString(file, text.replace(from, to));
	}
}
