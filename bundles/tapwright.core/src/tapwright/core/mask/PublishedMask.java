// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import java.util.List;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.model.Requirement;

/** Limits that a standard prints. Stateless. */
public interface PublishedMask {

	/** Stands beside every mask that is shown. */
	String CAUTION = "Conformity is decided by the standard's own tests with the document at hand, not by this mask.";

	/** Short stable name. */
	String id();

	/** What a person calls it. */
	String title();

	/** Number, edition, clause or table of the standard, and how its numbers came here. */
	String source();

	/** What has to be chosen, with usual values. */
	List<MaskChoice> choices();

	/**
	 * The requirements.
	 *
	 * @param sampleRate
	 *            in hertz; the mask is cut at half of it
	 * @param values
	 *            of the choices, by their names; missing ones take the usual value
	 * @throws InputException
	 *             when a value makes no sense, or the mask does not fit below half the sample rate
	 */
	List<Requirement> requirements(double sampleRate, Map<String, Double> values) throws InputException;

	/** All masks. */
	static List<PublishedMask> all() {
		return List.of(new OctaveBandMask(1), new OctaveBandMask(3), new AWeightingMask());
	}
}
