// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

/** What a picture of a filter shows. */
public enum PictureKind {
	/** Magnitude over frequency, with limits. */
	MAGNITUDE("Magnitude"),
	/** Phase over frequency. */
	PHASE("Phase"),
	/** Group delay over frequency. */
	GROUP_DELAY("Group delay"),
	/** Coefficients over time. */
	IMPULSE("Impulse response"),
	/** Running sum of the coefficients over time. */
	STEP("Step response"),
	/** Zeros of the transfer function in the z plane. */
	ZEROS("Zeros");

	private final String label;

	PictureKind(String label) {
		this.label = label;
	}

	/** Its name for a person. */
	public String label() {
		return label;
	}

	/** Whether its horizontal axis is a frequency. */
	public boolean isOverFrequency() {
		return this == MAGNITUDE || this == PHASE || this == GROUP_DELAY;
	}
}
