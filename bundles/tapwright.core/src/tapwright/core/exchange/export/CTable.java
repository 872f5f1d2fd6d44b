// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;
import tapwright.dsp.exact.ExactTaps;

/** C99 header with the coefficients: integers of the shortest type where there is a format, otherwise double. */
final class CTable implements ExportFormat {

	@Override
	public String name() {
		return "c";
	}

	@Override
	public String label() {
		return "C99 header with the coefficients";
	}

	@Override
	public List<ExportedFile> write(HandOver filter) throws InputException {
		return List.of(header(filter, List.of()));
	}

	/** The header, with declarations behind the table. */
	static ExportedFile header(HandOver filter, List<String> declarations) throws InputException {
		Map<String, List<String>> values = Values.of(filter);
		values.put("declarations", declarations);
		if (filter.whole()) {
			List<BigInteger> integers = filter.integers();
			values.put("type", List.of(type(filter)));
			values.put("table-meaning", List.of("Integers in steps of " + Values.unit(filter.stored().unit()) + "."));
			values.put("coefficients", Values.rows(integers.size(), 8, k -> CTypes.literal(integers.get(k))));
		} else {
			double[] taps = filter.taps().toDoubles();
			values.put("type", List.of("double"));
			values.put("table-meaning", List.of(ExactTaps.ofDoubles(taps).equals(filter.taps())
					? "Hexadecimal literals are exact." : "Each the double nearest to the exact coefficient."));
			values.put("coefficients", Values.elements(taps.length, k -> hexadecimal(taps[k])));
		}
		return new ExportedFile(values.get("identifier").getFirst() + ".h",
				Stamp.seal(Template.named("c-header").fill(values)));
	}

	static String type(HandOver filter) throws InputException {
		return CTypes.type(filter.word(), "coefficients");
	}

	// Java writes the literal of C99, clause 6.4.4.2.
	private static String hexadecimal(double value) {
		return Double.toHexString(value) + " /* " + value + " */";
	}
}
