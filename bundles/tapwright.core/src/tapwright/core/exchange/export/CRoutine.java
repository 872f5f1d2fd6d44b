// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.exact.Symmetry;

/**
 * C99 header, a portable routine that yields the same bits as the simulation, and a program that checks it with vectors. The
 * routine uses no behaviour that the standard leaves undefined or to the implementation.
 */
final class CRoutine implements ExportFormat {

	@Override
	public String name() {
		return "c-routine";
	}

	@Override
	public String label() {
		return "C99 header, filter routine and self-test";
	}

	@Override
	public List<ExportedFile> write(HandOver filter) throws InputException {
		try {
			return files(filter);
		} catch (InputException e) {
			throw new InputException(filter.name(), e.describe());
		} catch (IllegalArgumentException e) {
			throw new InputException(filter.name(), e.getMessage());
		}
	}

	private static List<ExportedFile> files(HandOver filter) throws InputException {
		Arithmetic arithmetic = filter.arithmetic().orElseThrow(() -> new InputException("",
				"there is no arithmetic; state structure and formats to export a routine, or export the coefficients alone"));
		NumberFormat input = arithmetic.input().orElseThrow(() -> new InputException("",
				"no input format is stated; give the samples' word and fraction bits to export a routine"));
		if (!filter.whole()) {
			throw new InputException("", "the coefficients are real numbers; state a coefficient format to export a routine");
		}
		var path = new CDatapath(filter.taps(), arithmetic);
		Map<String, List<String>> values = Values.of(filter);
		int taps = filter.taps().length();
		if ((long) taps + arithmetic.factor() > Integer.MAX_VALUE) {
			throw new InputException("", "the rate factor " + arithmetic.factor() + " is too large for the routine");
		}
		boolean transposed = arithmetic.structure() == Structure.TRANSPOSED;
		values.put("input-type", List.of(CTypes.type(input, "input samples")));
		values.put("output-type", List.of(path.outputType()));
		values.put("input-format", List.of(input.text()));
		values.put("output-step", List.of(Values.unit(path.outputStep())));
		values.put("input-range", List.of(input.min() + " to " + input.max()));
		values.put("delays", List.of(String.valueOf(-Math.floorDiv(-taps, arithmetic.interpolation()))));
		values.put("factor", List.of(String.valueOf(arithmetic.factor())));
		values.put("outputs", List.of(rate(arithmetic)));
		values.put("product", List.of(path.product()));
		values.put("sum", List.of(path.sum()));
		values.put("output", List.of(path.output()));
		values.put("helpers", helpers(path, arithmetic, values));
		values.put("state", text(transposed ? "c-state-transposed" : arithmetic.decimation() > 1 ? "c-state-decimator"
				: "c-state-line", values));
		values.put("rest", List.of(transposed ? "" : arithmetic.decimation() > 1 ? ", 0, 0" : ", 0"));
		values.put("accept", transposed ? List.of() : text("c-accept", values));
		values.put("body", body(filter, arithmetic, values));
		ExportedFile header = CTable.header(filter, text("c-declarations", values));
		String identifier = values.get("identifier").getFirst();
		return List.of(header, new ExportedFile(identifier + ".c",
				Stamp.seal(Template.named("c-routine").fill(values))),
				selfTest(filter, arithmetic, identifier, values));
	}

	private static ExportedFile selfTest(HandOver filter, Arithmetic arithmetic, String identifier, Map<String,
			List<String>> values) {
		TestVectors vectors = TestVectors.of(filter.taps(), arithmetic);
		List<BigInteger> input = vectors.input();
		List<BigInteger> output = vectors.output();
		values.put("input-count", List.of(String.valueOf(input.size())));
		values.put("output-count", List.of(String.valueOf(output.size())));
		values.put("input-vector", Values.rows(input.size(), 8, k -> CTypes.literal(input.get(k))));
		values.put("output-vector", Values.rows(output.size(), 8, k -> CTypes.literal(output.get(k))));
		return new ExportedFile(identifier + "_selftest.c", Stamp.seal(Template.named("c-selftest").fill(values)));
	}

	private static String rate(Arithmetic arithmetic) {
		return arithmetic.interpolation() > 1 ? arithmetic.factor() + " outputs for each sample"
				: arithmetic.decimation() > 1 ? "one output for the first and every further " + arithmetic.factor()
						+ " samples"
						: "one output for each sample";
	}

	private static List<String> helpers(CDatapath path, Arithmetic arithmetic, Map<String, List<String>> values) {
		var lines = new ArrayList<String>();
		if (path.rounds()) {
			lines.addAll(text("c-round-" + arithmetic.rounding().name().toLowerCase(Locale.ROOT).replace('_', '-'),
					values));
		}
		if (path.saturates()) {
			lines.addAll(text("c-saturate", values));
		}
		if (path.wrapsSigned()) {
			lines.addAll(text("c-wrap-signed", values));
		}
		if (path.wrapsUnsigned()) {
			lines.addAll(text("c-wrap-unsigned", values));
		}
		return lines;
	}

	private static List<String> body(HandOver filter, Arithmetic arithmetic, Map<String, List<String>> values) {
		int taps = filter.taps().length();
		boolean even = filter.taps().symmetry() == Symmetry.EVEN;
		boolean halfBand = arithmetic.structure() == Structure.HALF_BAND;
		// Of a half-band filter the coefficients at even distances from the middle are zero.
		values.put("first", List.of(String.valueOf(halfBand ? (taps / 2 + 1) % 2 : 0)));
		values.put("stride", List.of(halfBand ? "2" : "1"));
		values.put("sign", List.of(even ? "+" : "-"));
		var lines = new ArrayList<String>();
		switch (arithmetic.structure()) {
		case TRANSPOSED, POLYPHASE_INTERPOLATOR -> { /* their loops do it all */ }
		default -> lines.addAll(text(arithmetic.decimation() > 1 ? "c-wait" : "c-ready", values));
		}
		lines.addAll(switch (arithmetic.structure()) {
		case DIRECT, POLYPHASE_DECIMATOR -> text("c-direct", values);
		case TRANSPOSED -> text("c-transposed", values);
		case POLYPHASE_INTERPOLATOR -> text("c-interpolator", values);
		case FOLDED, HALF_BAND -> text(taps % 2 == 1 && even ? "c-folded-middle" : "c-folded", values);
		});
		return lines;
	}

	private static List<String> text(String template, Map<String, List<String>> values) {
		return Template.named(template).fill(values).lines().toList();
	}
}
