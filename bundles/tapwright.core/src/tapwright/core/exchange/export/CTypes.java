// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;

/** Types and literals of C99 (ISO/IEC 9899:1999, clauses 7.18.1.1 and 7.18.4.1). */
final class CTypes {

	static final int LONGEST = Long.SIZE;

	private CTypes() {
	}

	/** The exact-width type that holds the format. */
	static String type(NumberFormat format, String what) throws InputException {
		for (int bits = 8; bits <= LONGEST; bits *= 2) {
			if (format.word() <= bits) {
				return (format.signed() ? "int" : "uint") + bits + "_t";
			}
		}
		throw new InputException("", what + " of " + format.word()
				+ " bits are longer than the longest type of portable C, which has "
				+ LONGEST);
	}

	/** An integer constant; the smallest one has no literal of its own. */
	static String literal(BigInteger value) {
		if (value.equals(BigInteger.valueOf(Long.MIN_VALUE))) {
			return "(-INT64_C(9223372036854775807) - 1)";
		}
		return value.bitLength() >= Long.SIZE ? "UINT64_C(" + value + ")" : value.bitLength() < Integer.SIZE
				? value.toString()
				: value.signum() < 0 ? "-INT64_C(" + value.negate() + ")" : "INT64_C(" + value + ")";
	}
}
