// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/**
 * An array of coefficients that was found in a file. Immutable.
 *
 * @param name
 *            in the file; empty when it has none there
 * @param line
 *            where it begins, from 1; 0 when the file has no lines
 * @param integers
 *            the numbers when all are whole; otherwise empty
 * @param values
 *            the numbers when they are real; otherwise empty
 * @param format
 *            of the integers, when the file states it or it was inferred
 * @param sampleRate
 *            hertz, when the file states it
 * @param notes
 *            what a person should check
 */
public record ImportedTable(String name, int line, List<BigInteger> integers, List<Double> values,
		Optional<NumberFormat> format,
		OptionalDouble sampleRate, List<String> notes) {

	/** Most coefficients that are read. */
	public static final int MOST = 1_000_000;

	/** Takes copies. */
	public ImportedTable {
		integers = List.copyOf(integers);
		values = List.copyOf(values);
		notes = List.copyOf(notes);
	}

	static ImportedTable whole(String name, int line, List<BigInteger> integers, Optional<NumberFormat> format) {
		return new ImportedTable(name, line, integers, List.of(), format, OptionalDouble.empty(), List.of());
	}

	static ImportedTable real(String name, int line, List<Double> values) {
		return new ImportedTable(name, line, List.of(), values, Optional.empty(), OptionalDouble.empty(), List.of());
	}

	ImportedTable with(Optional<NumberFormat> stated, List<String> furtherNotes) {
		return new ImportedTable(name, line, integers, values, stated, sampleRate, furtherNotes);
	}

	ImportedTable atRate(double hertz) {
		return new ImportedTable(name, line, integers, values, format, OptionalDouble.of(hertz), notes);
	}

	/** Whether the numbers are integers. */
	public boolean isWhole() {
		return !integers.isEmpty();
	}

	/** Number of coefficients. */
	public int length() {
		return isWhole() ? integers.size() : values.size();
	}

	/** The numbers; integers in steps of their format. */
	public ExactTaps taps() {
		return isWhole() ? ExactTaps.ofIntegers(integers, format.map(NumberFormat::step)
				.orElse(ExactTaps.powerOfTwo(0)))
				: ExactTaps.ofDoubles(values.stream().mapToDouble(Double::doubleValue).toArray());
	}

	/** The exact symmetry. */
	public Symmetry symmetry() {
		return taps().symmetry();
	}
}
