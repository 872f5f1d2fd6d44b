// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

/**
 * How a picture is drawn.
 *
 * @param kind
 *            what it shows
 * @param decibels
 *            whether magnitudes are in decibels, otherwise plain numbers
 * @param logarithmic
 *            whether frequencies are spread by their logarithm
 */
public record PictureStyle(PictureKind kind, boolean decibels, boolean logarithmic) {

	/** Magnitude in decibels over frequency. */
	public static final PictureStyle USUAL = new PictureStyle(PictureKind.MAGNITUDE, true, false);

	/** The same with another kind. */
	public PictureStyle with(PictureKind other) {
		return new PictureStyle(other, decibels, logarithmic);
	}
}
