// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

import tapwright.core.exchange.HandOver;
import tapwright.core.exchange.Stamp;

/** Comma-separated values (RFC 4180) with a header line, after comment lines that begin with '#'. */
record TableText(String name, String label, String suffix) implements ExportFormat {

	@Override
	public List<ExportedFile> write(HandOver filter) {
		Map<String, List<String>> values = Values.of(filter);
		double[] taps = filter.taps().toDoubles();
		if (filter.whole()) {
			List<BigInteger> integers = filter.integers();
			values.put("columns", List.of("index,integer,value"));
			values.put("rows", rows(taps, integers));
		} else {
			values.put("columns", List.of("index,value"));
			values.put("rows", IntStream.range(0, taps.length).mapToObj(k -> k + "," + taps[k]).toList());
		}
		return List.of(new ExportedFile(values.get("identifier").getFirst() + suffix,
				Stamp.seal(Template.named("csv").fill(values))));
	}

	private static List<String> rows(double[] taps, List<BigInteger> integers) {
		return IntStream.range(0, taps.length).mapToObj(k -> k + "," + integers.get(k) + "," + taps[k]).toList();
	}
}
