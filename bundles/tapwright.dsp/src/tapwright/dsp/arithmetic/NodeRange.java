// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic;

import java.math.BigInteger;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

/**
 * What a node of a filter would have to hold, before overflow, over all inputs of the input format.
 *
 * @param kind
 *            what the node is
 * @param phase
 *            branch of an interpolator, otherwise 0
 * @param index
 *            for a product, its place in the order of {@link Arithmetic#terms}; for a sum, the last term that was added; in a
 *            transposed structure the sum that coefficient {@code index} enters; for an output 0
 * @param min
 *            least integer
 * @param max
 *            largest integer
 * @param step
 *            what one step of the integers is worth
 * @param format
 *            what the node can hold, if that is limited
 * @param decisive
 *            whether the output can be wrong when the node overflows; not so for sums on the way that wrap, since only the last
 *            one decides
 */
public record NodeRange(Kind kind, int phase, int index, BigInteger min, BigInteger max, BigFraction step,
		Optional<NumberFormat> format, boolean decisive) {

	/** Kinds of nodes. */
	public enum Kind {
		/** A product in product format. */
		PRODUCT,
		/** The sum so far in accumulator format. */
		SUM,
		/** A finished output. */
		OUTPUT
	}

	/** Whether the node never overflows. */
	public boolean fits() {
		return format.map(limits -> limits.contains(min) && limits.contains(max)).orElse(true);
	}

	/** Bits of the shortest two's complement word that holds the range. */
	public int signedBits() {
		return Math.max(min.bitLength(), max.bitLength()) + 1;
	}
}
