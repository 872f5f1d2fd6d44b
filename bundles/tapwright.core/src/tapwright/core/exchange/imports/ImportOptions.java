// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * What a person knows of the files and the files do not say.
 *
 * @param format
 *            overrules the guess
 * @param word
 *            bits of a word; of memory images also the length of a word in the file
 * @param fraction
 *            bits after the binary point
 * @param signed
 *            whether words are two's complement
 * @param bigEndian
 *            whether the first byte of a word in a memory image is the highest
 * @param real
 *            whether words of a binary image are IEEE 754 numbers
 * @param sampleRate
 *            hertz
 */
public record ImportOptions(Optional<ImportFormat> format, OptionalInt word, OptionalInt fraction, boolean signed,
		boolean bigEndian, boolean real, OptionalDouble sampleRate) {

	/** Nothing is known. */
	public static final ImportOptions NONE = new ImportOptions(Optional.empty(), OptionalInt.empty(),
			OptionalInt.empty(), true, false,
			false, OptionalDouble.empty());
}
