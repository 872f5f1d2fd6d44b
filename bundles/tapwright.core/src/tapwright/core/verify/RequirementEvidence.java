// SPDX-License-Identifier: EPL-2.0
package tapwright.core.verify;

import tapwright.dsp.verify.Proof;
import tapwright.model.Severity;

/**
 * What was proven of one requirement.
 *
 * @param id
 *            of the requirement in its filter
 * @param kind
 *            name of the kind, as in interchange files
 * @param severity
 *            how grave a miss is
 * @param description
 *            the statement in a few words
 * @param valueUnit
 *            unit of limit, value and margin
 * @param placeUnit
 *            unit of the worst place; empty when there is none
 * @param proof
 *            verdict and numbers
 */
public record RequirementEvidence(String id, String kind, Severity severity, String description, String valueUnit,
		String placeUnit, Proof proof) {

	/** One line for a person: 'stop: gain from 8 to 24 kHz at most -80 dB: -79.62 dB at 8.013 kHz, short by 0.38 dB'. */
	public String message() {
		return EvidenceWords.message(this);
	}

	/** Value, place and distance to the limit, without the statement: '-79.62 dB at 8.013 kHz, short by 0.38 dB'. */
	public String result() {
		return EvidenceWords.result(this);
	}
}
