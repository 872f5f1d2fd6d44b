// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/** What a proof says of a requirement. */
public enum Verdict {
	/** Proven to hold everywhere that the requirement speaks of. */
	MET,
	/** Proven not to hold: at least one place breaks it. */
	MISSED,
	/** Neither could be proven within the given effort; the note of the proof says why. */
	UNPROVEN
}
