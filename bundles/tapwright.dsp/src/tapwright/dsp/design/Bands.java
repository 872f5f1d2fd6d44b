// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.util.List;

/** Checks on lists of bands that several methods share. */
public final class Bands {

	private Bands() {
	}

	/**
	 * Takes bands in rising order.
	 *
	 * @param touching
	 *            whether one band may begin where the one before ends
	 * @return an unmodifiable copy
	 * @throws IllegalArgumentException
	 *             when there is none, they overlap, fall, or touch though they must not; says which and what to do
	 */
	public static List<Band> rising(List<Band> bands, boolean touching) {
		List<Band> copy = List.copyOf(bands);
		if (copy.isEmpty()) {
			throw new IllegalArgumentException("a design needs at least one band");
		}
		for (int k = 1; k < copy.size(); k++) {
			Band before = copy.get(k - 1);
			Band band = copy.get(k);
			if (band.from() < before.to()) {
				throw new IllegalArgumentException("band " + (k + 1) + " starts at " + band.from() + ", before band "
						+ k + " ends at "
						+ before.to() + " (cycles per sample); bands must rise and not overlap");
			}
			if (!touching && band.from() == before.to()) {
				throw new IllegalArgumentException("bands " + k + " and " + (k + 1) + " meet at " + band.from()
						+ " (cycles per sample) without a transition; leave a gap between them");
			}
		}
		return copy;
	}
}
