// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;

/** Finds out which fixed-point format integers are in. */
final class Formats {

	private static final int[] USUAL_WORDS = { 8, 16, 24, 32, 64, NumberFormat.MAX_WORD };

	private Formats() {
	}

	/** The shortest word that holds the integers. */
	static NumberFormat shortest(List<BigInteger> integers, int fraction, boolean signed) {
		int bits = integers.stream().mapToInt(integer -> integer.bitLength() + (signed ? 1 : 0)).max().orElse(1);
		return new NumberFormat(Math.clamp(bits, 1, NumberFormat.MAX_WORD), fraction, signed);
	}

	/**
	 * States the format of a table: what a person says comes first, then what the file says, then what is usual: the shortest
	 * usual word with all bits but the sign behind the point.
	 */
	static ImportedTable settle(ImportedTable table, ImportOptions options, String place) throws InputException {
		if (!table.isWhole()) {
			return table;
		}
		Optional<NumberFormat> found = table.format();
		int word = options.word().orElse(found.map(NumberFormat::word)
				.orElse(usual(table.integers(), options.signed())));
		boolean signed = options.signed() && found.map(NumberFormat::signed).orElse(true);
		boolean stated = options.fraction().isPresent() || found.filter(format -> format.fraction() != 0).isPresent();
		int fraction = options.fraction().orElse(found.map(NumberFormat::fraction).filter(bits -> bits != 0)
				.orElse(signed ? word - 1 : word));
		try {
			var format = new NumberFormat(word, fraction, signed);
			var integers = new ArrayList<BigInteger>();
			for (int k = 0; k < table.length(); k++) {
				BigInteger integer = table.integers().get(k);
				boolean bits = signed && integer.signum() > 0
						&& integer.bitLength() == word; // written without its sign
				BigInteger held = bits ? format.fit(integer, Overflow.WRAP) : integer;
				if (!format.contains(held)) {
					throw new InputException(place, "number " + (k + 1) + " of " + Places.quote(table.name()) + ", "
							+ integer + ", is no number of "
							+ format.text() + "; state another word length");
				}
				integers.add(held);
			}
			var notes = new ArrayList<>(table.notes());
			if (!stated) {
				notes.add("the binary point is a guess: " + format.text());
			}
			return new ImportedTable(table.name(), table.line(), integers, List.of(), Optional.of(format),
					table.sampleRate(), notes);
		} catch (IllegalArgumentException e) {
			throw new InputException(place, e.getMessage());
		}
	}

	private static int usual(List<BigInteger> integers, boolean signed) {
		int bits = shortest(integers, 0, signed).word();
		for (int word : USUAL_WORDS) {
			if (bits <= word) {
				return word;
			}
		}
		return NumberFormat.MAX_WORD;
	}
}
